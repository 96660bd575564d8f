using System.Globalization;
using FrameSafe.Analyzers.Flow;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME305: a constant at or above the speed of light goes where a velocity is wanted.</summary>
internal sealed class FasterThanLightRule : Rule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME305",
        "A velocity is not below the speed of light",
        "`{0}` is {1} c; {2} is a velocity of something with a rest frame, below c",
        Category.Motion,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "Separation rates, phase speeds and the speed of light itself may be that large; velocities are not.",
        helpLinkUri: RulePage.Link("FRAME305"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    internal override Finding? Judge(Observation observation, Bench bench)
        => observation is FasterThanLight fast
            ? new Finding(
                    this,
                    fast.Place.GetLocation(),
                    Wording.Code(fast.Place),
                    fast.Ratio.ToString("0.####", CultureInfo.InvariantCulture),
                    Wording.Name(fast.Target, fast.Place))
                .From(fast.Target.Value.Origin?.Location, Wording.Origin(fast.Target, "is a velocity"))
            : null;
}
