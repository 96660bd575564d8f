using System;
using System.Collections.Generic;

namespace FrameSafe.Analyzers.Formulas;

/// <summary>How many digits a spelling loses, by evaluating it and the stable form at the same points.</summary>
internal static class Digits
{
    private const double Rounding = 1.1102230246251565e-16;

    // Neighbouring points, for at one the rounding may happen to be kind.
    private const int Neighbours = 25;

    /// <summary>
    /// The digits that γ − 1 by subtraction loses at a speed, of the sixteen of a double, by comparison with β²/(s(1 + s)),
    /// s = √((1 − β)(1 + β)), which is within 4 roundings everywhere.
    /// </summary>
    internal static double LostByLorentzFactorMinusOne(Formula formula, int components, double lightSpeed, double speed)
    {
        double worst = 0;
        for (int i = 0; i < Neighbours; i++)
        {
            double beta = speed * (1 - (i * 0.0037));
            var values = new double[components];
            values[0] = beta * lightSpeed;
            double ratio = values[0] / lightSpeed;
            double reciprocal = Math.Sqrt((1 - ratio) * (1 + ratio));
            double stable = ratio * ratio / (reciprocal * (1 + reciprocal));
            double error = Math.Abs((formula.At((IReadOnlyList<double>)values) / stable) - 1);
            worst = Math.Max(worst, error);
        }

        return worst <= Rounding ? 0 : Math.Min(16, Math.Log10(worst / Rounding));
    }
}
