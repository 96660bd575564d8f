using System.Numerics;

namespace FrameSafe;

/// <summary>The kinetic energy (γ − 1)mc² of a body, measured in a frame.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
[Unit("J")]
[InFrame(nameof(TFrame))]
[Kind(QuantityKind.KineticEnergy)]
public readonly struct KineticEnergy<TFrame> :
    IEquatable<KineticEnergy<TFrame>>,
    IEqualityOperators<KineticEnergy<TFrame>, KineticEnergy<TFrame>, bool>,
    IComparable<KineticEnergy<TFrame>>,
    IComparisonOperators<KineticEnergy<TFrame>, KineticEnergy<TFrame>, bool>,
    IAdditionOperators<KineticEnergy<TFrame>, KineticEnergy<TFrame>, KineticEnergy<TFrame>>,
    ISubtractionOperators<KineticEnergy<TFrame>, KineticEnergy<TFrame>, KineticEnergy<TFrame>>,
    ISpanFormattable
    where TFrame : struct, IFrame
{
    private readonly double _value;

    internal KineticEnergy(double value) => _value = value;

    /// <summary>The energy in joules.</summary>
    [Unit("J")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.KineticEnergy)]
    public double InJoules => _value;

    /// <summary>The energy in mega-electronvolts.</summary>
    [Unit("MeV")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.KineticEnergy)]
    public double InMegaelectronvolts => PhysicsOfLight.FromJoules(_value);

    /// <summary>(γ − 1)mc²; within 4 ulp at every speed.</summary>
    /// <remarks>W. Rindler, Relativity, 2nd ed., section 6.3.</remarks>
    public static KineticEnergy<TFrame> Of(Mass mass, Velocity<TFrame> velocity) => new(velocity.LorentzFactorMinusOne * mass.RestEnergyInJoules);

    /// <summary>An energy from joules.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is negative or not finite.</exception>
    public static KineticEnergy<TFrame> FromJoules([Unit("J"), InFrame(nameof(TFrame)), Kind(QuantityKind.KineticEnergy)] double joules)
        => new(Require.NotNegative(joules));

    /// <summary>An energy from mega-electronvolts.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is negative or not finite.</exception>
    public static KineticEnergy<TFrame> FromMegaelectronvolts([Unit("MeV"), InFrame(nameof(TFrame)), Kind(QuantityKind.KineticEnergy)] double energy)
        => new(PhysicsOfLight.ToJoules(Require.NotNegative(energy)));

    /// <summary>The total energy, rest energy included.</summary>
    public TotalEnergy<TFrame> WithRestEnergyOf(Mass mass) => TotalEnergy<TFrame>.Of(_value, mass);

    /// <summary>The Lorentz factor less one that a mass has with it.</summary>
    /// <exception cref="ArgumentException">The mass is zero.</exception>
    [return: Unit("1")]
    public double LorentzFactorMinusOneOf(Mass mass)
        => mass.InKilograms > 0 ? _value / mass.RestEnergyInJoules : throw new ArgumentException("Nothing without mass has a Lorentz factor.", nameof(mass));

    /// <summary>The sum.</summary>
    public static KineticEnergy<TFrame> operator +(KineticEnergy<TFrame> left, KineticEnergy<TFrame> right) => new(left._value + right._value);

    /// <summary>The difference.</summary>
    public static KineticEnergy<TFrame> operator -(KineticEnergy<TFrame> left, KineticEnergy<TFrame> right) => new(left._value - right._value);

    /// <summary>The same.</summary>
    public static bool operator ==(KineticEnergy<TFrame> left, KineticEnergy<TFrame> right) => left._value == right._value;

    /// <summary>Another.</summary>
    public static bool operator !=(KineticEnergy<TFrame> left, KineticEnergy<TFrame> right) => left._value != right._value;

    /// <summary>Whether the left one is less.</summary>
    public static bool operator <(KineticEnergy<TFrame> left, KineticEnergy<TFrame> right) => left._value < right._value;

    /// <summary>Whether the left one is more.</summary>
    public static bool operator >(KineticEnergy<TFrame> left, KineticEnergy<TFrame> right) => left._value > right._value;

    /// <summary>Whether the left one is not more.</summary>
    public static bool operator <=(KineticEnergy<TFrame> left, KineticEnergy<TFrame> right) => left._value <= right._value;

    /// <summary>Whether the left one is not less.</summary>
    public static bool operator >=(KineticEnergy<TFrame> left, KineticEnergy<TFrame> right) => left._value >= right._value;

    /// <inheritdoc/>
    public int CompareTo(KineticEnergy<TFrame> other) => _value.CompareTo(other._value);

    /// <inheritdoc/>
    public bool Equals(KineticEnergy<TFrame> other) => _value.Equals(other._value);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is KineticEnergy<TFrame> other && Equals(other);

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
