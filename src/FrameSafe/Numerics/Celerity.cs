namespace FrameSafe;

/// <summary>
/// The forms of one speed, each from the celerity ratio w = γβ, which holds every speed from rest to γ = 1e150 without loss;
/// and w from each of them. None cancels anywhere.
/// </summary>
internal static class Celerity
{
    /// <summary>The largest celerity ratio that is built.</summary>
    internal const double Largest = 1e150;

    // Beyond this 1 + w² is w² to rounding, and within it w² does not overflow.
    private const double OneIsLost = 1e8;

    /// <summary>γ = √(1 + w²).</summary>
    internal static double LorentzFactor(double w)
    {
        double size = Math.Abs(w);
        return size < OneIsLost ? Math.Sqrt(Math.FusedMultiplyAdd(w, w, 1)) : size;
    }

    /// <summary>γ − 1 = w²/(1 + γ).</summary>
    internal static double LorentzFactorMinusOne(double w)
    {
        double size = Math.Abs(w);
        return size < OneIsLost ? w * w / (1 + LorentzFactor(w)) : size - 1;
    }

    /// <summary>β = w/γ.</summary>
    internal static double SpeedRatio(double w) => w / LorentzFactor(w);

    /// <summary>1 − |β| = 1/(γ(γ + |w|)), with γ² written out.</summary>
    internal static double OneMinusSpeedRatio(double w)
    {
        double size = Math.Abs(w);
        return 1 / Math.FusedMultiplyAdd(size, size + LorentzFactor(w), 1);
    }

    /// <summary>The rapidity, arsinh w.</summary>
    internal static double Rapidity(double w) => Math.Asinh(w);

    /// <summary>w of β, exact in 1 − β and 1 + β.</summary>
    internal static double FromSpeedRatio(double ratio)
        => ratio / Math.Sqrt((1 - ratio) * (1 + ratio));

    /// <summary>w of a speed in metres per second, exact in c − v and c + v.</summary>
    internal static double FromMetresPerSecond(double speed)
        => speed / Math.Sqrt((PhysicsOfLight.Speed - speed) * (PhysicsOfLight.Speed + speed));

    /// <summary>w of γ − 1.</summary>
    internal static double FromLorentzFactorMinusOne(double excess)
        => excess < 1e150 ? Math.Sqrt(excess) * Math.Sqrt(excess + 2) : excess;

    /// <summary>w of a rapidity.</summary>
    internal static double FromRapidity(double rapidity) => Math.Sinh(rapidity);

    /// <summary>w of two collinear speeds in a row: w₁γ₂ + w₂γ₁, without the cancellation of opposite ones.</summary>
    internal static double Composed(double first, double second)
    {
        double firstLorentz = LorentzFactor(first);
        double secondLorentz = LorentzFactor(second);
        if (first == 0 || second == 0 || (first > 0) == (second > 0))
            return (first * secondLorentz) + (second * firstLorentz);
        // (w₁γ₂)² − (w₂γ₁)² = w₁² − w₂².
        return (first + second) * ((first - second) / ((first * secondLorentz) - (second * firstLorentz)));
    }
}
