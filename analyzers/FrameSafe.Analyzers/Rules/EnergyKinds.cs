using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME310: kinetic, total and rest energy, or energies by nucleon or charge, meet.</summary>
internal sealed class EnergyKinds : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME310",
        "Energies of different kinds meet",
        "{0} is {1}; {2} is {3}",
        Category.Motion,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "Total energy holds the rest energy, kinetic energy does not; energies by nucleon or charge are to be multiplied first.",
        helpLinkUri: RulePage.Link("FRAME310"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash.Kind != ClashKind.EnergyKind)
            return null;
        (string left, string right) = (Wording.Kind(encounter.Left.Value.Tag), Wording.Kind(encounter.Right.Value.Tag));
        return Report(encounter, "is " + left, "is " + right, Left(encounter), left, Right(encounter), right);
    }
}
