using System.Numerics;

namespace FrameSafe;

/// <summary>A mass: the invariant (rest) mass, the same in every frame.</summary>
/// <remarks>Masses add for bodies that do not move against each other; of a system in motion take the invariant mass.</remarks>
[Unit("kg")]
[Kind(QuantityKind.Mass)]
public readonly struct Mass :
    IEquatable<Mass>,
    IEqualityOperators<Mass, Mass, bool>,
    IComparable<Mass>,
    IComparisonOperators<Mass, Mass, bool>,
    IAdditionOperators<Mass, Mass, Mass>,
    ISubtractionOperators<Mass, Mass, Mass>,
    ISpanFormattable
{
    private readonly double _value;

    internal Mass(double value) => _value = value;

    /// <summary>No mass.</summary>
    public static Mass Zero => default;

    /// <summary>The mass in kilograms.</summary>
    [Unit("kg")]
    [Kind(QuantityKind.Mass)]
    public double InKilograms => _value;

    /// <summary>The rest energy in mega-electronvolts, which is the mass in MeV/c².</summary>
    [Unit("MeV/c2")]
    [Kind(QuantityKind.Mass)]
    public double InMegaelectronvoltsPerLightSpeedSquared => PhysicsOfLight.FromKilograms(_value);

    /// <summary>mc².</summary>
    [Unit("J")]
    [Kind(QuantityKind.RestEnergy)]
    public double RestEnergyInJoules => PhysicsOfLight.RestEnergy(_value);

    /// <summary>A mass from kilograms.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is negative or not finite.</exception>
    public static Mass FromKilograms([Unit("kg"), Kind(QuantityKind.Mass)] double kilograms) => new(Require.NotNegative(kilograms));

    /// <summary>A mass from MeV/c².</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is negative or not finite.</exception>
    public static Mass FromMegaelectronvoltsPerLightSpeedSquared([Unit("MeV/c2"), Kind(QuantityKind.Mass)] double mass)
        => new(PhysicsOfLight.ToKilograms(Require.NotNegative(mass)));

    /// <summary>The sum.</summary>
    public static Mass operator +(Mass left, Mass right) => new(left._value + right._value);

    /// <summary>The difference.</summary>
    public static Mass operator -(Mass left, Mass right) => new(left._value - right._value);

    /// <summary>The same.</summary>
    public static bool operator ==(Mass left, Mass right) => left._value == right._value;

    /// <summary>Another.</summary>
    public static bool operator !=(Mass left, Mass right) => left._value != right._value;

    /// <summary>Whether the left one is less.</summary>
    public static bool operator <(Mass left, Mass right) => left._value < right._value;

    /// <summary>Whether the left one is more.</summary>
    public static bool operator >(Mass left, Mass right) => left._value > right._value;

    /// <summary>Whether the left one is not more.</summary>
    public static bool operator <=(Mass left, Mass right) => left._value <= right._value;

    /// <summary>Whether the left one is not less.</summary>
    public static bool operator >=(Mass left, Mass right) => left._value >= right._value;

    /// <inheritdoc/>
    public int CompareTo(Mass other) => _value.CompareTo(other._value);

    /// <inheritdoc/>
    public bool Equals(Mass other) => _value.Equals(other._value);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is Mass other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _value.GetHashCode();

    /// <summary>The number, the unit and whose it is, in the round-trip format.</summary>
    public override string ToString() => ToString(null, null);

    /// <inheritdoc/>
    public string ToString(string? format, IFormatProvider? formatProvider)
        => QuantityText.Of(_value, "kg", "", format, formatProvider);

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider)
        => destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);
}
