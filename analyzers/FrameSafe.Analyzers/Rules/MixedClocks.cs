using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME203: proper times of different clocks are added, ordered, or put where the other is wanted.</summary>
internal sealed class MixedClocks : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME203",
        "Proper times of different clocks meet",
        "{0} is told by {1}; {2} by {3}; only their difference, a clock offset, has a meaning",
        Category.Time,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "A proper time belongs to the worldline of its clock. Readings of two clocks are compared by their difference, the clock offset.",
        helpLinkUri: RulePage.Link("FRAME203"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash.Kind != ClashKind.Clock)
            return null;
        (string left, string right) = (ClockName(encounter.Left.Value.Tag), ClockName(encounter.Right.Value.Tag));
        return Report(encounter, "is told by " + left, "is told by " + right, Left(encounter), left, Right(encounter), right);
    }
}
