using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME104: a transform is given what it should give.</summary>
internal sealed class TransformDirection : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME104",
        "A transform is used the wrong way round",
        "{0} is measured in {1} already; {2} wants {3}: the inverse transform is the one that takes it",
        Category.Frames,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "A transform takes numbers of the frame that it carries from.",
        helpLinkUri: RulePage.Link("FRAME104"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash.Kind != ClashKind.Frame || encounter.Verb != Walk.Backwards)
            return null;
        (string given, string wanted) = (FrameName(encounter.Left.Value.Tag), FrameName(encounter.Right.Value.Tag));
        return Report(
            encounter, "is measured in " + given, "is measured in " + wanted, Left(encounter), given, Right(encounter), wanted);
    }
}
