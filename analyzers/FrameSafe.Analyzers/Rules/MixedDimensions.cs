using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME403: dimensions, or kinds of quantity that share one, do not agree.</summary>
internal sealed class MixedDimensions : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME403",
        "Dimensions do not agree",
        "{0} is {1}; {2} is {3}; {4}",
        Category.Units,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "Only quantities of one kind can be added, compared or put in each other's place.",
        helpLinkUri: RulePage.Link("FRAME403"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash.Kind is not (ClashKind.Dimension or ClashKind.Quantity) || encounter.Verb == "function")
            return null;
        bool kinds = encounter.Clash.Kind == ClashKind.Quantity;
        (Tag left, Tag right) = (encounter.Left.Value.Tag, encounter.Right.Value.Tag);
        string leftIs = kinds ? Wording.Kind(left) : Wording.Dimension(left);
        string rightIs = kinds ? Wording.Kind(right) : Wording.Dimension(right);
        string cannot = encounter.Clash.Meeting == Meeting.Target
            ? "one cannot go where the other is wanted"
            : "they cannot be " + encounter.Verb;
        return Report(encounter, "is " + leftIs, "is " + rightIs, Left(encounter), leftIs, Right(encounter), rightIs, cannot);
    }
}
