using System.Numerics;

namespace FrameSafe;

/// <summary>The total energy γmc² of a body, rest energy included, measured in a frame.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
[Unit("J")]
[InFrame(nameof(TFrame))]
[Kind(QuantityKind.TotalEnergy)]
public readonly struct TotalEnergy<TFrame> :
    IEquatable<TotalEnergy<TFrame>>,
    IEqualityOperators<TotalEnergy<TFrame>, TotalEnergy<TFrame>, bool>,
    IComparable<TotalEnergy<TFrame>>,
    IComparisonOperators<TotalEnergy<TFrame>, TotalEnergy<TFrame>, bool>,
    IAdditionOperators<TotalEnergy<TFrame>, TotalEnergy<TFrame>, TotalEnergy<TFrame>>,
    ISubtractionOperators<TotalEnergy<TFrame>, TotalEnergy<TFrame>, TotalEnergy<TFrame>>,
    ISpanFormattable
    where TFrame : struct, IFrame
{
    private readonly double _value;

    internal TotalEnergy(double value) => _value = value;

    /// <summary>The energy in joules.</summary>
    [Unit("J")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.TotalEnergy)]
    public double InJoules => _value;

    /// <summary>The energy in mega-electronvolts.</summary>
    [Unit("MeV")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.TotalEnergy)]
    public double InMegaelectronvolts => PhysicsOfLight.FromJoules(_value);

    /// <summary>An energy from joules.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is negative or not finite.</exception>
    public static TotalEnergy<TFrame> FromJoules([Unit("J"), InFrame(nameof(TFrame)), Kind(QuantityKind.TotalEnergy)] double joules)
        => new(Require.NotNegative(joules));

    /// <summary>An energy from mega-electronvolts.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is negative or not finite.</exception>
    public static TotalEnergy<TFrame> FromMegaelectronvolts([Unit("MeV"), InFrame(nameof(TFrame)), Kind(QuantityKind.TotalEnergy)] double energy)
        => new(PhysicsOfLight.ToJoules(Require.NotNegative(energy)));

    /// <summary>What is left without the rest energy of a mass.</summary>
    /// <remarks>Of an energy near the rest energy few digits are left: keep the kinetic energy instead.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">The energy is below the rest energy.</exception>
    public KineticEnergy<TFrame> WithoutRestEnergyOf(Mass mass)
    {
        double rest = mass.RestEnergyInJoules;
        return _value >= rest
            ? new(_value - rest)
            : throw Require.Outside(_value, "energy", FormattableString.Invariant($"at least the rest energy, {rest:R} J"));
    }

    internal static TotalEnergy<TFrame> Of(double kinetic, Mass mass) => new(kinetic + mass.RestEnergyInJoules);

    /// <summary>The sum.</summary>
    public static TotalEnergy<TFrame> operator +(TotalEnergy<TFrame> left, TotalEnergy<TFrame> right) => new(left._value + right._value);

    /// <summary>The difference.</summary>
    public static TotalEnergy<TFrame> operator -(TotalEnergy<TFrame> left, TotalEnergy<TFrame> right) => new(left._value - right._value);

    /// <summary>The same.</summary>
    public static bool operator ==(TotalEnergy<TFrame> left, TotalEnergy<TFrame> right) => left._value == right._value;

    /// <summary>Another.</summary>
    public static bool operator !=(TotalEnergy<TFrame> left, TotalEnergy<TFrame> right) => left._value != right._value;

    /// <summary>Whether the left one is less.</summary>
    public static bool operator <(TotalEnergy<TFrame> left, TotalEnergy<TFrame> right) => left._value < right._value;

    /// <summary>Whether the left one is more.</summary>
    public static bool operator >(TotalEnergy<TFrame> left, TotalEnergy<TFrame> right) => left._value > right._value;

    /// <summary>Whether the left one is not more.</summary>
    public static bool operator <=(TotalEnergy<TFrame> left, TotalEnergy<TFrame> right) => left._value <= right._value;

    /// <summary>Whether the left one is not less.</summary>
    public static bool operator >=(TotalEnergy<TFrame> left, TotalEnergy<TFrame> right) => left._value >= right._value;

    /// <inheritdoc/>
    public int CompareTo(TotalEnergy<TFrame> other) => _value.CompareTo(other._value);

    /// <inheritdoc/>
    public bool Equals(TotalEnergy<TFrame> other) => _value.Equals(other._value);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is TotalEnergy<TFrame> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _value.GetHashCode();

    /// <summary>The number, the unit and whose it is, in the round-trip format.</summary>
    public override string ToString() => ToString(null, null);

    /// <inheritdoc/>
    public string ToString(string? format, IFormatProvider? formatProvider)
        => QuantityText.Of(_value, "J", QuantityText.In<TFrame>(), format, formatProvider);

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider)
        => destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);
}
