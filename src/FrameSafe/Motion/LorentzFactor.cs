using System.Numerics;

namespace FrameSafe;

/// <summary>The Lorentz factor γ of the motion of one frame in another.</summary>
/// <typeparam name="TFrame">Where the motion is measured.</typeparam>
/// <typeparam name="TOther">The frame that moves.</typeparam>
/// <remarks>Kept as γ − 1. A proper time of the moving clock times γ is a coordinate time; the division of the same pair does not exist.</remarks>
[Unit("1")]
[Between(nameof(TFrame), nameof(TOther))]
[Kind(QuantityKind.LorentzFactor)]
public readonly struct LorentzFactor<TFrame, TOther> :
    IEquatable<LorentzFactor<TFrame, TOther>>,
    IEqualityOperators<LorentzFactor<TFrame, TOther>, LorentzFactor<TFrame, TOther>, bool>,
    IComparable<LorentzFactor<TFrame, TOther>>,
    IComparisonOperators<LorentzFactor<TFrame, TOther>, LorentzFactor<TFrame, TOther>, bool>,
    ISpanFormattable
    where TFrame : struct, IFrame
    where TOther : struct, IFrame
{
    private readonly double _value;

    internal LorentzFactor(double value) => _value = value;

    /// <summary>γ. <c>default</c> is no motion: 1.</summary>
    [Between(nameof(TFrame), nameof(TOther))]
    [Kind(QuantityKind.LorentzFactor)]
    public double Value => _value + 1;

    /// <summary>γ − 1, which a γ near 1 cannot hold.</summary>
    [Unit("1")]
    public double MinusOne => _value;

    /// <summary>The same two frames the other way round: γ is symmetric.</summary>
    public LorentzFactor<TOther, TFrame> Inverse => new(_value);

    /// <summary>γ of a velocity of the other frame in the first.</summary>
    public static LorentzFactor<TFrame, TOther> Of(Velocity<TFrame> velocityOfOther) => new(velocityOfOther.LorentzFactorMinusOne);

    /// <summary>From γ − 1.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is negative or not finite.</exception>
    public static LorentzFactor<TFrame, TOther> FromMinusOne([Unit("1")] double minusOne) => new(Require.NotNegative(minusOne));

    /// <summary>From γ.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is below 1 or not finite.</exception>
    public static LorentzFactor<TFrame, TOther> FromValue([Kind(QuantityKind.LorentzFactor), Between(nameof(TFrame), nameof(TOther))] double value)
        => new(Require.Within(value, 1, double.MaxValue) - 1);

    /// <summary>How long the first frame finds a time that a clock at rest in the other shows: γτ.</summary>
    public static CoordinateTime<TFrame> operator *(ProperTime<TOther> time, LorentzFactor<TFrame, TOther> factor) => new(time.InSeconds + (time.InSeconds * factor._value));

    /// <summary>What a clock at rest in the other frame shows of a time of the first: t/γ.</summary>
    public static ProperTime<TOther> operator /(CoordinateTime<TFrame> time, LorentzFactor<TFrame, TOther> factor) => new(time.InSeconds / factor.Value);

    /// <summary>The same.</summary>
    public static bool operator ==(LorentzFactor<TFrame, TOther> left, LorentzFactor<TFrame, TOther> right) => left._value == right._value;

    /// <summary>Another.</summary>
    public static bool operator !=(LorentzFactor<TFrame, TOther> left, LorentzFactor<TFrame, TOther> right) => left._value != right._value;

    /// <summary>Whether the left one is less.</summary>
    public static bool operator <(LorentzFactor<TFrame, TOther> left, LorentzFactor<TFrame, TOther> right) => left._value < right._value;

    /// <summary>Whether the left one is more.</summary>
    public static bool operator >(LorentzFactor<TFrame, TOther> left, LorentzFactor<TFrame, TOther> right) => left._value > right._value;

    /// <summary>Whether the left one is not more.</summary>
    public static bool operator <=(LorentzFactor<TFrame, TOther> left, LorentzFactor<TFrame, TOther> right) => left._value <= right._value;

    /// <summary>Whether the left one is not less.</summary>
    public static bool operator >=(LorentzFactor<TFrame, TOther> left, LorentzFactor<TFrame, TOther> right) => left._value >= right._value;

    /// <inheritdoc/>
    public int CompareTo(LorentzFactor<TFrame, TOther> other) => _value.CompareTo(other._value);

    /// <inheritdoc/>
    public bool Equals(LorentzFactor<TFrame, TOther> other) => _value.Equals(other._value);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is LorentzFactor<TFrame, TOther> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _value.GetHashCode();

    /// <summary>The number and whose it is, in the round-trip format.</summary>
    public override string ToString() => ToString(null, null);

    /// <inheritdoc/>
    public string ToString(string? format, IFormatProvider? formatProvider)
        => QuantityText.Of(Value, "", QuantityText.Between<TFrame, TOther>(), format, formatProvider);

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider)
        => destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);
}
