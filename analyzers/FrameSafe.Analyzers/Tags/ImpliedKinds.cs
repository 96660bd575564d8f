using System.Collections.Generic;

namespace FrameSafe.Analyzers.Tags;

/// <summary>Which kind of quantity the way a unit is written implies, where the trade keeps a way of writing for one kind.</summary>
internal static class ImpliedKinds
{
    /// <summary>
    /// One symbol speaks for itself (<c>Hz</c>, <c>rad</c>, <c>eV</c>). An angle by a time is an angular velocity. A force times a length
    /// is written <c>N·m</c> for a torque and <c>J</c> for an energy (SI Brochure, section 2.3.4).
    /// </summary>
    internal static QuantityKind Of(IReadOnlyList<KeyValuePair<UnitSymbol, Rational>> symbols, Dimension dimension)
    {
        if (symbols.Count == 1 && symbols[0].Value == Rational.One)
            return symbols[0].Key.Kind;
        if (symbols.Count != 2)
            return QuantityKind.Unspecified;

        (UnitSymbol first, Rational firstPower) = (symbols[0].Key, symbols[0].Value);
        (UnitSymbol second, Rational secondPower) = (symbols[1].Key, symbols[1].Value);
        if (first.Kind == QuantityKind.Angle && dimension == Dimension.Frequency)
            return QuantityKind.AngularVelocity;
        bool product = firstPower == Rational.One && secondPower == Rational.One;
        if (product && dimension == Dimension.Energy
            && (IsForceByLength(first, second) || IsForceByLength(second, first)))
        {
            return QuantityKind.Torque;
        }

        return firstPower == Rational.One && secondPower == -Rational.One && first.Dimension == Dimension.ElectricPotential
            && second.Dimension == Dimension.Length
            ? QuantityKind.ElectricField
            : QuantityKind.Unspecified;
    }

    private static bool IsForceByLength(UnitSymbol force, UnitSymbol length)
        => force.Dimension == Dimension.Force && length.Dimension == Dimension.Length;
}
