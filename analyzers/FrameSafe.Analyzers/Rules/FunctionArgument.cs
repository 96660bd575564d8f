using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME404: a function of a plain number or of an angle in radians is given something else.</summary>
internal sealed class FunctionArgument : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME404",
        "A function of a plain number gets a quantity",
        "{0} is {1}; {2} wants {3}",
        Category.Units,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "Exponentials, logarithms and the like take plain numbers; trigonometric functions take radians.",
        helpLinkUri: RulePage.Link("FRAME404"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Verb != "function")
            return null;
        (Tag value, Tag wanted) = (encounter.Left.Value.Tag, encounter.Right.Value.Tag);
        bool isUnit = encounter.Clash.Kind == ClashKind.Unit;
        string given = isUnit ? "in " + Wording.Unit(value) : Wording.Dimension(value);
        string wants = wanted.Kind == QuantityKind.Angle ? "radians" : "a plain number";
        Finding finding = Report(encounter, "is " + given, wants, Left(encounter), given, encounter.Right.Description!, wants);
        return isUnit ? finding.WithConversion(value, wanted with { UnitText = wants == "radians" ? "rad" : "1" }, "whole") : finding;
    }
}
