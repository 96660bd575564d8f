using System;
using System.Collections.Generic;

namespace FrameSafe.Analyzers.Formulas;

/// <summary>
/// Known formulas, recognised by what they compute: two rational or algebraic expressions that agree at points chosen without
/// regard to either are the same expression (J. T. Schwartz, J. ACM 27 (1980) 701; R. Zippel, EUROSAM (1979) 216).
/// </summary>
internal static class KnownForms
{
    // In the units of c and 1, signs and sizes mixed; away from the special values 0, 1/2, 1/√2.
    private static readonly double[] Points = [0.3719, -0.6203, 0.1571, 0.8347, -0.2291, 0.5477, -0.7583, 0.4649, 0.0923, -0.4127];

    private const int Trials = 6;

    private const double Tolerance = 1e-9;

    /// <summary>Whether a formula of two velocities is their composition, (u ± v)/(1 ± uv/c²), up to an overall sign.</summary>
    internal static bool IsComposition(Formula formula, double lightSpeed)
        => Agrees(formula, 2, lightSpeed, static values => (values[0] + values[1]) / (1 + (values[0] * values[1])), lightSpeed)
            || Agrees(formula, 2, lightSpeed, static values => (values[0] - values[1]) / (1 - (values[0] * values[1])), lightSpeed)
            || Agrees(formula, 2, lightSpeed, static values => (values[1] - values[0]) / (1 - (values[0] * values[1])), lightSpeed);

    /// <summary>Whether a formula of one velocity, or of its components, is the Lorentz factor 1/√(1 − v²/c²).</summary>
    internal static bool IsLorentzFactor(Formula formula, int components, double lightSpeed)
        => Agrees(formula, components, lightSpeed, static values => 1 / Math.Sqrt(1 - SumOfSquares(values, -1)), 1);

    /// <summary>Whether a formula of one velocity, or of its components, is 1/γ, √(1 − v²/c²).</summary>
    internal static bool IsReciprocalLorentzFactor(Formula formula, int components, double lightSpeed)
        => Agrees(formula, components, lightSpeed, static values => Math.Sqrt(1 - SumOfSquares(values, -1)), 1);

    /// <summary>Whether a formula of one velocity, or of its components, is γ − 1.</summary>
    internal static bool IsLorentzFactorMinusOne(Formula formula, int components, double lightSpeed)
        => Agrees(formula, components, lightSpeed, static values => (1 / Math.Sqrt(1 - SumOfSquares(values, -1))) - 1, 1);

    /// <summary>
    /// What is wrong with a formula that is almost the Lorentz factor of a velocity; null where it is that, or nothing like it. A lost
    /// power of c shows where the velocity is taken in units of another power of it.
    /// </summary>
    internal static string? FlawOfLorentzFactor(Formula formula, int components, double lightSpeed)
    {
        Func<double[], double> right = static values => 1 / Math.Sqrt(1 - SumOfSquares(values, -1));
        if (lightSpeed != 1 && Agrees(formula, components, 1, right, 1))
            return "c is missing";
        if (lightSpeed != 1 && Agrees(formula, components, Math.Sqrt(lightSpeed), right, 1))
            return "c is not squared";
        if (Agrees(formula, components, lightSpeed, static values => 1 / Math.Sqrt(1 + SumOfSquares(values, -1)), 1))
            return "the sign of v²/c² is wrong";
        if (components != 1)
            return null;
        if (Agrees(formula, 1, lightSpeed, static values => 1 / Math.Sqrt(1 - values[0]), 1))
            return "v/c is not squared";
        return lightSpeed != 1 && Agrees(formula, 1, lightSpeed * lightSpeed, static values => 1 / Math.Sqrt(1 - values[0]), 1)
            ? "v is not squared"
            : null;
    }

    /// <summary>What is wrong with a formula that is almost the composition of two velocities; null where it is that, or nothing like it.</summary>
    internal static string? FlawOfComposition(Formula formula, double lightSpeed)
    {
        Func<double[], double> sum = static values => (values[0] + values[1]) / (1 + (values[0] * values[1]));
        Func<double[], double> difference = static values => (values[0] - values[1]) / (1 - (values[0] * values[1]));
        if (lightSpeed != 1 && (Agrees(formula, 2, 1, sum, 1) || Agrees(formula, 2, 1, difference, 1)))
            return "c² is missing";
        double root = Math.Sqrt(lightSpeed);
        if (lightSpeed != 1 && (Agrees(formula, 2, root, sum, root) || Agrees(formula, 2, root, difference, root)))
            return "c is not squared";
        return Agrees(formula, 2, lightSpeed, static values => (values[0] + values[1]) / (1 - (values[0] * values[1])), lightSpeed)
            || Agrees(formula, 2, lightSpeed, static values => (values[0] - values[1]) / (1 + (values[0] * values[1])), lightSpeed)
            ? "the sign of uv/c² is wrong"
            : null;
    }

    /// <summary>
    /// Whether a formula is ½m·Σv² of a mass (by its index) and any number of velocity components, also where they are large
    /// against c: a full form is not taken for its first term.
    /// </summary>
    internal static bool IsNewtonianEnergy(Formula formula, int variables, int mass, double lightSpeed)
        => Agrees(
            formula, variables, lightSpeed, values => values[mass] * SumOfSquares(values, mass) / 2, lightSpeed * lightSpeed, mass);

    /// <summary>Whether a formula is mv of a mass (by its index) and a velocity.</summary>
    internal static bool IsNewtonianMomentum(Formula formula, int mass, double lightSpeed)
        => Agrees(formula, 2, lightSpeed, static values => values[0] * values[1], lightSpeed, mass);

    private static double SumOfSquares(double[] values, int except)
    {
        double sum = 0;
        for (int i = 0; i < values.Length; i++)
            sum += i == except ? 0 : values[i] * values[i];
        return sum;
    }

    // The formula takes numbers in a unit, the form in multiples of that unit; one variable may be in a unit of its own.
    private static bool Agrees(Formula formula, int variables, double unit, Func<double[], double> form, double resultUnit, int except = -1)
    {
        for (int trial = 0; trial < Trials; trial++)
        {
            var values = new double[variables];
            var scaled = new double[variables];
            for (int i = 0; i < variables; i++)
            {
                // Components together stay below c.
                values[i] = Points[((trial * variables) + (i * 3) + trial) % Points.Length] / Math.Sqrt(variables);
                scaled[i] = i == except ? values[i] : values[i] * unit;
            }

            double expected = form(values) * resultUnit;
            double computed = formula.At((IReadOnlyList<double>)scaled);
            if (!(Math.Abs(computed - expected) <= Tolerance * Math.Abs(expected)))
                return false;
        }

        return true;
    }
}
