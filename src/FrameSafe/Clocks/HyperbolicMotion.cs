namespace FrameSafe;

/// <summary>A point of the motion with constant proper acceleration from rest, all its coordinates in units of c and a.</summary>
/// <remarks>
/// With η the rapidity: aτ/c = η, at/c = sinh η, ax/c² = cosh η − 1 (W. Rindler, Relativity, 2nd ed., section 3.7; C. W. Misner, K. S.
/// Thorne, J. A. Wheeler, Gravitation, section 6.2). Given any one of them the others follow with none lost.
/// </remarks>
internal readonly struct HyperbolicMotion
{
    /// <summary>The largest rapidity: γ there is 1e150.</summary>
    internal const double LargestRapidity = 346;

    internal static readonly double LargestCelerity = Math.Sinh(LargestRapidity);

    private HyperbolicMotion(Extended rapidity, Extended celerity, Extended lorentzMinusOne)
    {
        Rapidity = rapidity;
        Celerity = celerity;
        LorentzMinusOne = lorentzMinusOne;
        TimeMinusProperTime =
            Math.Abs(rapidity.High) < 0.5 ? Extended.SinhMinusArgument(rapidity) : celerity - rapidity;
    }

    /// <summary>η, the proper time in units of c/a.</summary>
    internal Extended Rapidity { get; }

    /// <summary>sinh η, the celerity in units of c and the coordinate time in units of c/a.</summary>
    internal Extended Celerity { get; }

    /// <summary>cosh η − 1, which is γ − 1 and the distance in units of c²/a.</summary>
    internal Extended LorentzMinusOne { get; }

    /// <summary>sinh η − η, by which the coordinate time is ahead, in units of c/a.</summary>
    internal Extended TimeMinusProperTime { get; }

    internal static HyperbolicMotion AtRapidity(Extended rapidity) =>
        new(rapidity, Extended.Sinh(rapidity), Extended.CoshMinusOne(rapidity));

    internal static HyperbolicMotion AtCelerity(Extended celerity)
    {
        Extended square = celerity * celerity;
        Extended lorentz = Extended.Sqrt(square + 1);
        return new(Extended.Asinh(celerity), celerity, square / (lorentz + 1));
    }

    internal static HyperbolicMotion AtLorentzMinusOne(Extended excess)
    {
        Extended celerity = Extended.Sqrt(excess * (excess + 2));
        return new(Extended.Asinh(celerity), celerity, excess);
    }

    internal static HyperbolicMotion AtSpeedRatio(double ratio)
    {
        // Both factors are exact in two parts.
        Extended inverseSquare = Extended.Sum(1, -ratio) * Extended.Sum(1, ratio);
        return AtCelerity((Extended)ratio / Extended.Sqrt(inverseSquare));
    }
}
