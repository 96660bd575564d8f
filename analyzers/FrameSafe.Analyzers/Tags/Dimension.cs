using System;
using System.Collections.Generic;
using System.Text;

namespace FrameSafe.Analyzers.Tags;

/// <summary>
/// The dimension of a quantity: rational exponents of the seven base quantities of the ISQ, in the order of the SI Brochure
/// (time, length, mass, electric current, thermodynamic temperature, amount of substance, luminous intensity).
/// A <see langword="null"/> dimension is an unknown one, and every operation hands it on.
/// </summary>
internal sealed class Dimension : IEquatable<Dimension>
{
    internal const int BaseCount = 7;

    private static readonly string[] BaseUnits = ["s", "m", "kg", "A", "K", "mol", "cd"];

    // The order in which the SI Brochure writes base units in derived ones (Table 4): kg, m, s, A, K, mol, cd.
    private static readonly int[] WritingOrder = [2, 1, 0, 3, 4, 5, 6];

    private readonly Rational[] _exponents;

    private readonly int _hash;

    private Dimension(Rational[] exponents)
    {
        _exponents = exponents;
        foreach (Rational exponent in exponents)
            _hash = unchecked((_hash * 31) + exponent.GetHashCode());
    }

    public static Dimension One { get; } = Of();

    public static Dimension Time { get; } = Of(time: 1);

    public static Dimension Length { get; } = Of(length: 1);

    public static Dimension Mass { get; } = Of(mass: 1);

    public static Dimension Current { get; } = Of(current: 1);

    public static Dimension Temperature { get; } = Of(temperature: 1);

    public static Dimension Amount { get; } = Of(amount: 1);

    public static Dimension LuminousIntensity { get; } = Of(intensity: 1);

    public static Dimension Area { get; } = Of(length: 2);

    public static Dimension Volume { get; } = Of(length: 3);

    public static Dimension Speed { get; } = Of(time: -1, length: 1);

    public static Dimension Acceleration { get; } = Of(time: -2, length: 1);

    public static Dimension Frequency { get; } = Of(time: -1);

    public static Dimension WaveNumber { get; } = Of(length: -1);

    public static Dimension Force { get; } = Of(time: -2, length: 1, mass: 1);

    public static Dimension Pressure { get; } = Of(time: -2, length: -1, mass: 1);

    public static Dimension Energy { get; } = Of(time: -2, length: 2, mass: 1);

    public static Dimension Power { get; } = Of(time: -3, length: 2, mass: 1);

    public static Dimension Momentum { get; } = Of(time: -1, length: 1, mass: 1);

    public static Dimension Action { get; } = Of(time: -1, length: 2, mass: 1);

    public static Dimension Density { get; } = Of(length: -3, mass: 1);

    /// <summary>Of a specific energy, a gravitational potential, a squared speed.</summary>
    public static Dimension SpecificEnergy { get; } = Of(time: -2, length: 2);

    public static Dimension Charge { get; } = Of(time: 1, current: 1);

    public static Dimension ElectricPotential { get; } = Of(time: -3, length: 2, mass: 1, current: -1);

    public static Dimension ElectricField { get; } = Of(time: -3, length: 1, mass: 1, current: -1);

    public static Dimension MagneticField { get; } = Of(time: -2, mass: 1, current: -1);

    /// <summary>Of a momentum by charge, T·m.</summary>
    public static Dimension Rigidity { get; } = Of(time: -2, length: 1, mass: 1, current: -1);

    public static Dimension Resistance { get; } = Of(time: -3, length: 2, mass: 1, current: -2);

    public static Dimension Capacitance { get; } = Of(time: 4, length: -2, mass: -1, current: 2);

    public static Dimension Inductance { get; } = Of(time: -2, length: 2, mass: 1, current: -2);

    public static Dimension MagneticFlux { get; } = Of(time: -2, length: 2, mass: 1, current: -1);

    private static readonly Dictionary<Dimension, string> Names = new()
    {
        [One] = "number",
        [Time] = "time",
        [Length] = "length",
        [Mass] = "mass",
        [Current] = "electric current",
        [Temperature] = "temperature",
        [Amount] = "amount of substance",
        [LuminousIntensity] = "luminous intensity",
        [Area] = "area",
        [Volume] = "volume",
        [Speed] = "speed",
        [Acceleration] = "acceleration",
        [Frequency] = "frequency",
        [WaveNumber] = "wave number",
        [Force] = "force",
        [Pressure] = "pressure",
        [Energy] = "energy",
        [Power] = "power",
        [Momentum] = "momentum",
        [Action] = "action",
        [Density] = "density",
        [SpecificEnergy] = "squared speed",
        [Charge] = "electric charge",
        [ElectricPotential] = "electric potential",
        [ElectricField] = "electric field",
        [MagneticField] = "magnetic flux density",
        [Rigidity] = "magnetic rigidity",
        [Resistance] = "resistance",
        [Capacitance] = "capacitance",
        [Inductance] = "inductance",
        [MagneticFlux] = "magnetic flux",
    };

    public bool IsOne => Equals(One);

    /// <summary>The trade's name of this dimension ("length", "speed"), or null where it has none.</summary>
    public string? Name => Names.TryGetValue(this, out string? name) ? name : null;

    /// <summary>The exponent of one base quantity, by its place in the order time, length, mass, current, temperature, amount, intensity.</summary>
    public Rational this[int baseQuantity] => _exponents[baseQuantity];

    public static Dimension Of(
        int time = 0, int length = 0, int mass = 0, int current = 0, int temperature = 0, int amount = 0, int intensity = 0)
        => new([time, length, mass, current, temperature, amount, intensity]);

    /// <summary>The dimension of these exponents, or null if one of them is unknown.</summary>
    public static Dimension? From(IReadOnlyList<Rational> exponents)
    {
        var copy = new Rational[BaseCount];
        for (int i = 0; i < BaseCount; i++)
        {
            if (!exponents[i].IsKnown)
                return null;
            copy[i] = exponents[i];
        }

        return new(copy);
    }

    public static Dimension? operator *(Dimension? left, Dimension? right) => Combine(left, right, static (a, b) => a + b);

    public static Dimension? operator /(Dimension? left, Dimension? right) => Combine(left, right, static (a, b) => a - b);

    public static bool operator ==(Dimension? left, Dimension? right) => Equals(left, right);

    public static bool operator !=(Dimension? left, Dimension? right) => !Equals(left, right);

    public Dimension? Pow(Rational exponent)
    {
        var powers = new Rational[BaseCount];
        for (int i = 0; i < BaseCount; i++)
            powers[i] = _exponents[i] * exponent;
        return From(powers);
    }

    public bool Equals(Dimension? other)
    {
        if (ReferenceEquals(this, other))
            return true;
        if (other is null || _hash != other._hash)
            return false;
        for (int i = 0; i < BaseCount; i++)
        {
            if (_exponents[i] != other._exponents[i])
                return false;
        }

        return true;
    }

    public override bool Equals(object? obj) => Equals(obj as Dimension);

    public override int GetHashCode() => _hash;

    /// <summary>In SI base units, as the SI Brochure writes derived ones: <c>kg·m²·s⁻²</c>; <c>1</c> for a number.</summary>
    public override string ToString()
    {
        var text = new StringBuilder();
        foreach (int i in WritingOrder)
        {
            if (_exponents[i].IsZero)
                continue;
            if (text.Length > 0)
                text.Append('·');
            text.Append(BaseUnits[i]).Append(Superscript.Of(_exponents[i]));
        }

        return text.Length == 0 ? "1" : text.ToString();
    }

    private static Dimension? Combine(Dimension? left, Dimension? right, Func<Rational, Rational, Rational> combine)
    {
        if (left is null || right is null)
            return null;
        var exponents = new Rational[BaseCount];
        for (int i = 0; i < BaseCount; i++)
            exponents[i] = combine(left._exponents[i], right._exponents[i]);
        return From(exponents);
    }
}
