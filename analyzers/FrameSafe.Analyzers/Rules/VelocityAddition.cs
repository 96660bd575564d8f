using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Formulas;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME301: velocities of different frames are added or subtracted as plain numbers, beyond the budget.</summary>
internal sealed class VelocityAddition : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME301",
        "Velocities of different frames are added as plain numbers",
        "{0} is a velocity in {1}; {2} in {3}; {4} these velocities is {5}",
        Category.Motion,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "Rapidities of one direction add, velocities do not: (u + v)/(1 + uv/c²).",
        helpLinkUri: RulePage.Link("FRAME301"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash.Kind != ClashKind.VelocityFrames)
            return null;
        (Tag left, Tag right) = (encounter.Left.Value.Tag, encounter.Right.Value.Tag);
        double? one = bench.MaxSpeed(left);
        double? other = bench.MaxSpeed(right);
        double? error = one is { } u && other is { } v ? Shortcuts.CollinearSum(u, v) : null;
        if (error <= bench.Budget)
            return null;
        string size = error is { } computed
            ? ErrorText.WrongBy(computed, ErrorText.Speeds(one!.Value, other!.Value), bench.Budget)
            : "wrong by uv/c² (no largest speed is declared)";
        string verb = encounter.Clash.Meeting == Meeting.Sum ? "adding" : "subtracting";
        return Report(
                encounter,
                "is a velocity in " + FrameName(left),
                "is a velocity in " + FrameName(right),
                Left(encounter), FrameName(left), Right(encounter), FrameName(right), verb, size)
            .With(FindingProperties.Error, error)
            .With(FindingProperties.MaxSpeed, one is null || other is null ? null : System.Math.Max(one.Value, other.Value))
            .With(FindingProperties.Budget, bench.Budget)
            .With(FindingProperties.Repair, "rapidity-sum")
            .With(FindingProperties.LightSpeed, LightSpeed.In(left));
    }
}
