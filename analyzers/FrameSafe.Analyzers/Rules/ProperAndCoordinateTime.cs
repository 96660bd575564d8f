using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Formulas;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME201: a proper time and a coordinate time meet, or one goes where the other is wanted.</summary>
internal sealed class ProperAndCoordinateTime : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME201",
        "Proper and coordinate time meet",
        "{0} is {1}; {2} is {3}; taking one for the other is {4}",
        Category.Time,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "The proper time of a moving clock is its coordinate time divided by the Lorentz factor.",
        helpLinkUri: RulePage.Link("FRAME201"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash.Kind != ClashKind.ProperAndCoordinateTime)
            return null;
        (Tag left, Tag right) = (encounter.Left.Value.Tag, encounter.Right.Value.Tag);
        (Tag proper, Tag coordinate) = left.Kind == QuantityKind.ProperTime ? (left, right) : (right, left);

        double? speed = proper.Clock is { } clock && coordinate.Frame is { } frame ? bench.Frames.MaxSpeedBetween(clock.Id, frame.Id) : null;
        double? error = speed is { } known ? Shortcuts.Dilation(known) : null;
        if (error <= bench.Budget)
            return null;
        string size = error is { } computed
            ? ErrorText.WrongBy(computed, ErrorText.SpeedsUpTo(speed!.Value), bench.Budget)
            : "wrong by γ − 1 (no largest speed between them is declared)";

        // A proper time is mended into a coordinate time by γ, unless it is the proper time that is wanted.
        bool target = encounter.Clash.Meeting == Meeting.Target;
        bool wantsProper = target ? right.Kind == QuantityKind.ProperTime : encounter.Wanted?.Kind == QuantityKind.ProperTime;
        bool mendLeft = (left.Kind == QuantityKind.ProperTime) != wantsProper;
        return Report(encounter, "is " + Describe(left), "is " + Describe(right), Left(encounter), Describe(left), Right(encounter), Describe(right), size)
            .With(FindingProperties.Error, error)
            .With(FindingProperties.MaxSpeed, speed)
            .With(FindingProperties.Budget, bench.Budget)
            .With(FindingProperties.Repair, proper.Clock is null || coordinate.Frame is null ? null : "lorentz")
            .With(FindingProperties.Operand, target ? "whole" : mendLeft ? "left" : "right")
            .With(FindingProperties.Form, wantsProper ? "divide" : "multiply")
            .With(FindingProperties.From, proper.Clock?.Id)
            .With(FindingProperties.To, coordinate.Frame?.Id);
    }

    private static string Describe(Tag tag) => tag.Kind == QuantityKind.ProperTime
        ? "a proper time" + (tag.Clock is { } clock ? " of " + clock.DisplayName : "")
        : "a coordinate time" + (tag.Frame?.DisplayName ?? tag.Clock?.DisplayName) switch { { } frame => " of " + frame, null => "" };
}
