using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME407: numbers in natural units and in the SI meet.</summary>
internal sealed class NaturalUnits : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME407",
        "Natural units and the SI meet",
        "{0} is in {1}; {2} in {3}; a power of c or ħ is missing between them",
        Category.Units,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "Where c is one, lengths are times and masses energies; the SI wants the factor back.",
        helpLinkUri: RulePage.Link("FRAME407"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash.Kind != ClashKind.NaturalUnits)
            return null;
        (string left, string right) = (Wording.Unit(encounter.Left.Value.Tag), Wording.Unit(encounter.Right.Value.Tag));
        return Report(encounter, "is in " + left, "is in " + right, Left(encounter), left, Right(encounter), right);
    }
}
