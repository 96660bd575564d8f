using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME202: the Lorentz factor is applied the wrong way round.</summary>
internal sealed class LorentzDirection : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME202",
        "The Lorentz factor is applied the wrong way round",
        "{0} is not {1}, which {2} is: {3}",
        Category.Time,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "A coordinate time is γ times the proper time; a measured length is the proper length divided by γ.",
        helpLinkUri: RulePage.Link("FRAME202"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash.Kind != ClashKind.LorentzDirection)
            return null;
        bool leftIsWrong = encounter.Left.Value.Tag.Misuse != Misuse.None;
        (Side wrong, Side wanted) = leftIsWrong ? (encounter.Left, encounter.Right) : (encounter.Right, encounter.Left);
        (string kind, string law) = wrong.Value.Tag.Misuse switch
        {
            Misuse.CoordinateTimeByLorentz => ("a proper time", "a proper time is the coordinate time divided by the Lorentz factor"),
            Misuse.ProperTimeOverLorentz => ("a coordinate time", "a coordinate time is the proper time multiplied by the Lorentz factor"),
            Misuse.ProperLengthByLorentz => ("a measured length", "a measured length is the proper length divided by the Lorentz factor"),
            _ => ("a proper length", "a proper length is the measured length multiplied by the Lorentz factor"),
        };
        return Report(
                encounter,
                leftIsWrong ? "comes of the Lorentz factor the wrong way round" : "is " + kind,
                leftIsWrong ? "is " + kind : "comes of the Lorentz factor the wrong way round",
                Wording.Name(wrong, encounter.Place), kind, Wording.Name(wanted, encounter.Place), law)
            .With(FindingProperties.Repair, "swap")
            .With(FindingProperties.Operand, encounter.Clash.Meeting == Meeting.Target ? "whole" : leftIsWrong ? "left" : "right");
    }
}
