using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME204: numbers on different time scales meet without a conversion.</summary>
internal sealed class MixedTimeScales : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME204",
        "Time scales meet without a conversion",
        "{0} is on {1}; {2} on {3}; convert one of them by name",
        Category.Time,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "TAI, TT, UTC, GPS time, TCG, TCB and TDB differ by seconds, by leap seconds, and in rate.",
        helpLinkUri: RulePage.Link("FRAME204"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash.Kind != ClashKind.TimeScale)
            return null;
        (string left, string right) = (Name(encounter.Left.Value.Tag), Name(encounter.Right.Value.Tag));
        return Report(encounter, "is on " + left, "is on " + right, Left(encounter), left, Right(encounter), right);
    }

    private static string Name(Tag tag) => ClockName(tag) switch { "Gps" => "GPS time", var name => name.ToUpperInvariant() };
}
