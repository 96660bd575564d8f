using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME402: a number goes where another unit is wanted.</summary>
internal sealed class WrongUnit : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME402",
        "A number goes where another unit is wanted",
        "{0} is in {1}; {2} wants {3}",
        Category.Units,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "The number is of the right dimension, but counts another unit than the parameter, field, property or result that it goes to.",
        helpLinkUri: RulePage.Link("FRAME402"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash is not { Kind: ClashKind.Unit, Meeting: Meeting.Target } || encounter.Verb == "function")
            return null;
        (Tag value, Tag target) = (encounter.Left.Value.Tag, encounter.Right.Value.Tag);
        return Report(
                encounter,
                "is in " + Wording.Unit(value),
                "is in " + Wording.Unit(target),
                Left(encounter), Wording.Unit(value), Right(encounter), Wording.Unit(target))
            .WithConversion(value, target, "whole");
    }
}
