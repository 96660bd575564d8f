using System;

namespace FrameSafe.Analyzers.Formulas;

/// <summary>
/// The worst relative error of a Newtonian shortcut where speeds reach up to given fractions of c. Each grows with the speed, so
/// that the worst is at the largest; the forms are those that lose no digits at small speeds.
/// </summary>
internal static class Shortcuts
{
    /// <summary>u + v for (u + v)/(1 + uv): uv, at u and v in one direction. W. Rindler, Relativity, section 3.6.</summary>
    internal static double CollinearSum(double one, double other) => one * other;

    /// <summary>A coordinate time for a proper time: γ − 1.</summary>
    internal static double Dilation(double speed)
    {
        double reciprocal = Math.Sqrt((1 - speed) * (1 + speed));
        return speed * speed / (reciprocal * (1 + reciprocal));
    }

    /// <summary>½β² for γ − 1, relative to γ − 1: 1 − (1 + 1/γ)/(2γ)·… in closed form 1 − s(1 + s)/2 with s = 1/γ.</summary>
    internal static double KineticEnergy(double speed)
    {
        double reciprocal = Math.Sqrt((1 - speed) * (1 + speed));
        // 1 - s(1+s)/2 = (1-s)(2+s)/2, and 1 - s = β²/(1+s).
        return speed * speed / (1 + reciprocal) * (2 + reciprocal) / 2;
    }

    /// <summary>mv for γmv: 1 − 1/γ.</summary>
    internal static double Momentum(double speed)
    {
        double reciprocal = Math.Sqrt((1 - speed) * (1 + speed));
        return speed * speed / (1 + reciprocal);
    }
}
