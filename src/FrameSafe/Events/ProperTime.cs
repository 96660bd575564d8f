using System.Numerics;

namespace FrameSafe;

/// <summary>Time elapsed on one clock, along its worldline: the same in every frame.</summary>
/// <typeparam name="TClock">The clock; a frame stands for a clock at rest in it.</typeparam>
/// <remarks>Readings of different clocks do not mix; <see cref="OffsetInSeconds{TOther}"/> compares them.</remarks>
[Unit("s")]
[OnClock(nameof(TClock))]
[Kind(QuantityKind.ProperTime)]
public readonly struct ProperTime<TClock> :
    IEquatable<ProperTime<TClock>>,
    IEqualityOperators<ProperTime<TClock>, ProperTime<TClock>, bool>,
    IComparable<ProperTime<TClock>>,
    IComparisonOperators<ProperTime<TClock>, ProperTime<TClock>, bool>,
    IAdditionOperators<ProperTime<TClock>, ProperTime<TClock>, ProperTime<TClock>>,
    ISubtractionOperators<ProperTime<TClock>, ProperTime<TClock>, ProperTime<TClock>>,
    IUnaryNegationOperators<ProperTime<TClock>, ProperTime<TClock>>,
    ISpanFormattable
    where TClock : struct, IClock
{
    private readonly double _value;

    internal ProperTime(double value) => _value = value;

    /// <summary>No time.</summary>
    public static ProperTime<TClock> Zero => default;

    /// <summary>The time in seconds.</summary>
    [Unit("s")]
    [OnClock(nameof(TClock))]
    [Kind(QuantityKind.ProperTime)]
    public double InSeconds => _value;

    /// <summary>A time from seconds.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is not finite.</exception>
    public static ProperTime<TClock> FromSeconds([Unit("s"), OnClock(nameof(TClock)), Kind(QuantityKind.ProperTime)] double seconds)
        => new(Require.Finite(seconds));

    /// <summary>This clock's reading less another's: a clock offset, which is neither's time.</summary>
    [return: Unit("s")]
    [return: Kind(QuantityKind.ClockOffset)]
    public double OffsetInSeconds<TOther>(ProperTime<TOther> other)
        where TOther : struct, IClock
        => _value - other.InSeconds;

    /// <summary>The sum.</summary>
    public static ProperTime<TClock> operator +(ProperTime<TClock> left, ProperTime<TClock> right) => new(left._value + right._value);

    /// <summary>The difference.</summary>
    public static ProperTime<TClock> operator -(ProperTime<TClock> left, ProperTime<TClock> right) => new(left._value - right._value);

    /// <summary>The same time the other way.</summary>
    public static ProperTime<TClock> operator -(ProperTime<TClock> value) => new(-value._value);

    /// <summary>A multiple.</summary>
    public static ProperTime<TClock> operator *(ProperTime<TClock> time, double factor) => new(time._value * factor);

    /// <summary>A multiple.</summary>
    public static ProperTime<TClock> operator *(double factor, ProperTime<TClock> time) => new(time._value * factor);

    /// <summary>A part.</summary>
    public static ProperTime<TClock> operator /(ProperTime<TClock> time, double divisor) => new(time._value / divisor);

    /// <summary>How many times the one goes into the other.</summary>
    public static double operator /(ProperTime<TClock> left, ProperTime<TClock> right) => left._value / right._value;

    /// <summary>The same.</summary>
    public static bool operator ==(ProperTime<TClock> left, ProperTime<TClock> right) => left._value == right._value;

    /// <summary>Another.</summary>
    public static bool operator !=(ProperTime<TClock> left, ProperTime<TClock> right) => left._value != right._value;

    /// <summary>Whether the left one is less.</summary>
    public static bool operator <(ProperTime<TClock> left, ProperTime<TClock> right) => left._value < right._value;

    /// <summary>Whether the left one is more.</summary>
    public static bool operator >(ProperTime<TClock> left, ProperTime<TClock> right) => left._value > right._value;

    /// <summary>Whether the left one is not more.</summary>
    public static bool operator <=(ProperTime<TClock> left, ProperTime<TClock> right) => left._value <= right._value;

    /// <summary>Whether the left one is not less.</summary>
    public static bool operator >=(ProperTime<TClock> left, ProperTime<TClock> right) => left._value >= right._value;

    /// <inheritdoc/>
    public int CompareTo(ProperTime<TClock> other) => _value.CompareTo(other._value);

    /// <inheritdoc/>
    public bool Equals(ProperTime<TClock> other) => _value.Equals(other._value);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is ProperTime<TClock> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _value.GetHashCode();

    /// <summary>The number, the unit and whose it is, in the round-trip format.</summary>
    public override string ToString() => ToString(null, null);

    /// <inheritdoc/>
    public string ToString(string? format, IFormatProvider? formatProvider)
        => QuantityText.Of(_value, "s", QuantityText.By<TClock>(), format, formatProvider);

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider)
        => destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);
}
