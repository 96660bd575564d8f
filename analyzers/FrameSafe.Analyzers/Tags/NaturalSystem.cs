using System.Numerics;

namespace FrameSafe.Analyzers.Tags;

/// <summary>
/// A system of units in which constants are one, so that dimensions fall together. A unit text says it at its end, in a
/// notation of our own: <c>"GeV [c=1]"</c>, <c>"1 [c=1]"</c> (a velocity as a fraction of c), <c>"GeV [c=ħ=1]"</c>.
/// </summary>
internal enum NaturalSystem
{
    /// <summary>The SI: nothing is one.</summary>
    None = 0,

    /// <summary>c = 1: a length is a time, a mass an energy and a momentum.</summary>
    LightSpeed,

    /// <summary>c = ħ = 1: a mass, too, is an inverse time.</summary>
    LightSpeedAndAction,
}

/// <summary>How a natural system makes dimensions fall together.</summary>
internal static class NaturalSystems
{
    // 299 792 458 m/s and h = 6.626 070 15e-34 J s, exact by definition (SI Brochure, 9th ed., section 2.2).
    private static readonly Scale LightSpeed = Scale.Of(new BigInteger(299_792_458), BigInteger.One)!;
    private static readonly Scale ReducedPlanck = (Scale.OfDecimal("6.62607015e-34") / (Scale.OfDecimal("2") * Scale.Pi))!;

    /// <summary>The system of both: one knows no more than its coarser partner.</summary>
    internal static NaturalSystem Common(NaturalSystem left, NaturalSystem right) => left > right ? left : right;

    /// <summary>
    /// The one representative of a dimension and scale in a system: lengths become times by c, masses inverse times by ħ/c².
    /// Two numbers may meet in the system exactly where these agree.
    /// </summary>
    internal static (Dimension? Dimension, Scale? Scale) Reduce(NaturalSystem system, Dimension? dimension, Scale? scale)
    {
        if (dimension is null || system == NaturalSystem.None)
            return (dimension, scale);

        var exponents = new Rational[Dimension.BaseCount];
        for (int i = 0; i < exponents.Length; i++)
            exponents[i] = dimension[i];

        if (system == NaturalSystem.LightSpeedAndAction)
        {
            // kg = (c²/ħ)·(ħ/c²)kg, and ħ/c² has the dimension kg·s.
            Rational mass = exponents[2];
            exponents[0] -= mass;
            exponents[2] = 0;
            scale *= (LightSpeed * LightSpeed / ReducedPlanck)?.Pow(mass);
        }

        Rational length = exponents[1];
        exponents[0] += length;
        exponents[1] = 0;
        scale /= LightSpeed.Pow(length);
        return (Dimension.From(exponents), scale);
    }
}
