using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME103: numbers that two different transforms carried into one family of frames meet directly.</summary>
internal sealed class MixedTransforms : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME103",
        "Results of different transforms meet",
        "{0} and {1} were both carried into {2}, but by different transforms; they are {3} as if the frames were one",
        Category.Frames,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "One tag may stand for a family of frames, such as the rest frames of many particles. Numbers of different members do not meet.",
        helpLinkUri: RulePage.Link("FRAME103"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
        => encounter.Clash.Kind != ClashKind.Passage
            ? null
            : Report(
                encounter,
                "was carried over by one transform",
                "was carried over by another",
                Left(encounter), Right(encounter), FrameName(encounter.Left.Value.Tag), encounter.Verb);
}
