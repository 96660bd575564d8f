using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME101: numbers measured in different frames meet in a sum, comparison or choice.</summary>
internal sealed class MixedFrames : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME101",
        "Numbers of different frames meet",
        "{0} is measured in {1}; {2} in {3}; they are {4} as if the frames were one",
        Category.Frames,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "A number means something in the frame that it was measured in. Before two of them meet, one has to be carried over.",
        helpLinkUri: RulePage.Link("FRAME101"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash is not { Kind: ClashKind.Frame, Meeting: not Meeting.Target })
            return null;
        (Tag left, Tag right) = (encounter.Left.Value.Tag, encounter.Right.Value.Tag);
        // The operand that is not in the frame wanted of the result is the one to carry; the right one where nothing tells.
        bool carryLeft = encounter.Wanted?.Frame is { } wanted && right.Frame!.Equals(wanted);
        return Report(
                encounter,
                "is measured in " + FrameName(left),
                "is measured in " + FrameName(right),
                Left(encounter), FrameName(left), Right(encounter), FrameName(right), encounter.Verb)
            .With(FindingProperties.Repair, "carry")
            .With(FindingProperties.Operand, carryLeft ? "left" : "right")
            .With(FindingProperties.From, (carryLeft ? left : right).Frame?.Id)
            .With(FindingProperties.To, (carryLeft ? right : left).Frame?.Id);
    }
}
