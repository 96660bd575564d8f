using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME102: a number goes where one of another frame, or between other frames, is wanted.</summary>
internal sealed class WrongFrame : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME102",
        "A number goes where another frame is wanted",
        "{0} {1}; {2} wants {3}",
        Category.Frames,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "A parameter, field, property, return value or element that is tagged with a frame takes numbers of that frame.",
        helpLinkUri: RulePage.Link("FRAME102"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        (Tag left, Tag right) = (encounter.Left.Value.Tag, encounter.Right.Value.Tag);
        if (encounter.Clash.Kind == ClashKind.FramePair)
        {
            return Report(
                encounter,
                "relates " + Pair(left),
                "relates " + Pair(right),
                Left(encounter), "relates " + Pair(left), Right(encounter), Pair(right));
        }

        if (encounter.Clash is not { Kind: ClashKind.Frame, Meeting: Meeting.Target } || encounter.Verb == Walk.Backwards)
            return null;
        return Report(
                encounter,
                "is measured in " + FrameName(left),
                "is measured in " + FrameName(right),
                Left(encounter), "is measured in " + FrameName(left), Right(encounter), FrameName(right))
            .With(FindingProperties.Repair, "carry")
            .With(FindingProperties.Operand, "whole")
            .With(FindingProperties.From, left.Frame?.Id)
            .With(FindingProperties.To, right.Frame?.Id);
    }

    private static string Pair(Tag tag) => tag.Between!.Frame.DisplayName + " and " + tag.Between.Other.DisplayName;
}
