using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME105: coordinate times of different frames are compared.</summary>
internal sealed class Simultaneity : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME105",
        "Coordinate times of different frames are compared",
        "{0} is a coordinate time of {1}; {2} of {3}; which of two events is earlier depends on the frame: carry the events over, then compare",
        Category.Frames,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "Simultaneity is relative: coordinate times of two frames have no order of their own.",
        helpLinkUri: RulePage.Link("FRAME105"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash.Kind != ClashKind.Simultaneity)
            return null;
        (Tag left, Tag right) = (encounter.Left.Value.Tag, encounter.Right.Value.Tag);
        return Report(
            encounter,
            "is a coordinate time of " + FrameName(left),
            "is a coordinate time of " + FrameName(right),
            Left(encounter), FrameName(left), Right(encounter), FrameName(right));
    }
}
