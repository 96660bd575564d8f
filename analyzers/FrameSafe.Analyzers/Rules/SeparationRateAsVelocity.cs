using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME306: the difference of two velocities in one frame is taken for a velocity.</summary>
internal sealed class SeparationRateAsVelocity : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME306",
        "A separation rate is used as a velocity",
        "{0} is a separation rate, the velocity of nothing; {1} wants a velocity: use the relative velocity",
        Category.Motion,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "The difference of two velocities in one frame may reach 2c. The velocity of one body in the other's rest frame is another quantity.",
        helpLinkUri: RulePage.Link("FRAME306"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
        => encounter.Clash.Kind != ClashKind.SeparationRateAsVelocity
            ? null
            : Report(encounter, "is a separation rate", "is a velocity", Left(encounter), Right(encounter));
}
