using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME401: numbers of one dimension in different units meet.</summary>
internal sealed class MixedUnits : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME401",
        "Numbers in different units meet",
        "{0} is in {1}; {2} in {3}; they are {4} without a conversion",
        Category.Units,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "Both are of one dimension, but their numbers count different units.",
        helpLinkUri: RulePage.Link("FRAME401"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash is not { Kind: ClashKind.Unit, Meeting: not Meeting.Target })
            return null;
        (Tag left, Tag right) = (encounter.Left.Value.Tag, encounter.Right.Value.Tag);
        (string leftUnit, string rightUnit) = (Wording.Unit(left), Wording.Unit(right));
        Finding finding = Report(
            encounter, "is in " + leftUnit, "is in " + rightUnit, Left(encounter), leftUnit, Right(encounter), rightUnit, encounter.Verb);
        // The unit that the target wants, else the coherent one of the SI, else the left operand's stays.
        Scale? wanted = encounter.Wanted?.Scale;
        bool convertLeft = wanted is not null
            ? right.Scale == wanted
            : right.Scale is { IsOne: true } && left.Scale is not { IsOne: true };
        return convertLeft ? finding.WithConversion(left, right, "left") : finding.WithConversion(right, left, "right");
    }
}
