using System.Numerics;

namespace FrameSafe;

/// <summary>Time elapsed in a frame, as its clocks at rest tell it together.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
/// <remarks>Proper times and coordinate times of other frames do not mix with it; a <see cref="LorentzFactor{TFrame, TOther}"/> leads from one to the other.</remarks>
[Unit("s")]
[InFrame(nameof(TFrame))]
[Kind(QuantityKind.CoordinateTime)]
public readonly struct CoordinateTime<TFrame> :
    IEquatable<CoordinateTime<TFrame>>,
    IEqualityOperators<CoordinateTime<TFrame>, CoordinateTime<TFrame>, bool>,
    IComparable<CoordinateTime<TFrame>>,
    IComparisonOperators<CoordinateTime<TFrame>, CoordinateTime<TFrame>, bool>,
    IAdditionOperators<CoordinateTime<TFrame>, CoordinateTime<TFrame>, CoordinateTime<TFrame>>,
    ISubtractionOperators<CoordinateTime<TFrame>, CoordinateTime<TFrame>, CoordinateTime<TFrame>>,
    IUnaryNegationOperators<CoordinateTime<TFrame>, CoordinateTime<TFrame>>,
    ISpanFormattable
    where TFrame : struct, IFrame
{
    private readonly double _value;

    internal CoordinateTime(double value) => _value = value;

    /// <summary>No time.</summary>
    public static CoordinateTime<TFrame> Zero => default;

    /// <summary>The time in seconds.</summary>
    [Unit("s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.CoordinateTime)]
    public double InSeconds => _value;

    /// <summary>A time from seconds.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is not finite.</exception>
    public static CoordinateTime<TFrame> FromSeconds([Unit("s"), InFrame(nameof(TFrame)), Kind(QuantityKind.CoordinateTime)] double seconds)
        => new(Require.Finite(seconds));

    /// <summary>What a clock at rest in the frame shows of it.</summary>
    public ProperTime<TFrame> OnClockAtRest() => new(_value);

    /// <summary>How far light goes in it.</summary>
    [return: Unit("m")]
    [return: InFrame(nameof(TFrame))]
    public double LightDistanceInMetres() => PhysicsOfLight.Speed * _value;

    /// <summary>The sum.</summary>
    public static CoordinateTime<TFrame> operator +(CoordinateTime<TFrame> left, CoordinateTime<TFrame> right) => new(left._value + right._value);

    /// <summary>The difference.</summary>
    public static CoordinateTime<TFrame> operator -(CoordinateTime<TFrame> left, CoordinateTime<TFrame> right) => new(left._value - right._value);

    /// <summary>The same time the other way.</summary>
    public static CoordinateTime<TFrame> operator -(CoordinateTime<TFrame> value) => new(-value._value);

    /// <summary>A multiple.</summary>
    public static CoordinateTime<TFrame> operator *(CoordinateTime<TFrame> time, double factor) => new(time._value * factor);

    /// <summary>A multiple.</summary>
    public static CoordinateTime<TFrame> operator *(double factor, CoordinateTime<TFrame> time) => new(time._value * factor);

    /// <summary>A part.</summary>
    public static CoordinateTime<TFrame> operator /(CoordinateTime<TFrame> time, double divisor) => new(time._value / divisor);

    /// <summary>How many times the one goes into the other.</summary>
    public static double operator /(CoordinateTime<TFrame> left, CoordinateTime<TFrame> right) => left._value / right._value;

    /// <summary>The same.</summary>
    public static bool operator ==(CoordinateTime<TFrame> left, CoordinateTime<TFrame> right) => left._value == right._value;

    /// <summary>Another.</summary>
    public static bool operator !=(CoordinateTime<TFrame> left, CoordinateTime<TFrame> right) => left._value != right._value;

    /// <summary>Whether the left one is less.</summary>
    public static bool operator <(CoordinateTime<TFrame> left, CoordinateTime<TFrame> right) => left._value < right._value;

    /// <summary>Whether the left one is more.</summary>
    public static bool operator >(CoordinateTime<TFrame> left, CoordinateTime<TFrame> right) => left._value > right._value;

    /// <summary>Whether the left one is not more.</summary>
    public static bool operator <=(CoordinateTime<TFrame> left, CoordinateTime<TFrame> right) => left._value <= right._value;

    /// <summary>Whether the left one is not less.</summary>
    public static bool operator >=(CoordinateTime<TFrame> left, CoordinateTime<TFrame> right) => left._value >= right._value;

    /// <inheritdoc/>
    public int CompareTo(CoordinateTime<TFrame> other) => _value.CompareTo(other._value);

    /// <inheritdoc/>
    public bool Equals(CoordinateTime<TFrame> other) => _value.Equals(other._value);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is CoordinateTime<TFrame> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _value.GetHashCode();

    /// <summary>The number, the unit and whose it is, in the round-trip format.</summary>
    public override string ToString() => ToString(null, null);

    /// <inheritdoc/>
    public string ToString(string? format, IFormatProvider? formatProvider)
        => QuantityText.Of(_value, "s", QuantityText.In<TFrame>(), format, formatProvider);

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider)
        => destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);
}
