using System.Numerics;

namespace FrameSafe;

/// <summary>The rapidity artanh β of the motion of one frame in another, along one line.</summary>
/// <typeparam name="TFrame">Where the motion is measured.</typeparam>
/// <typeparam name="TOther">The frame that moves.</typeparam>
/// <remarks>Along one line rapidities add where velocities do not.</remarks>
[Unit("1")]
[Between(nameof(TFrame), nameof(TOther))]
[Kind(QuantityKind.Rapidity)]
public readonly struct Rapidity<TFrame, TOther> :
    IEquatable<Rapidity<TFrame, TOther>>,
    IEqualityOperators<Rapidity<TFrame, TOther>, Rapidity<TFrame, TOther>, bool>,
    IComparable<Rapidity<TFrame, TOther>>,
    IComparisonOperators<Rapidity<TFrame, TOther>, Rapidity<TFrame, TOther>, bool>,
    ISpanFormattable
    where TFrame : struct, IFrame
    where TOther : struct, IFrame
{
    private readonly double _value;

    internal Rapidity(double value) => _value = value;

    /// <summary>The rapidity; negative backwards.</summary>
    [Between(nameof(TFrame), nameof(TOther))]
    [Kind(QuantityKind.Rapidity)]
    public double Value => _value;

    /// <summary>The same motion seen from the other frame.</summary>
    public Rapidity<TOther, TFrame> Inverse => new(-_value);

    /// <summary>The rapidity of the motion along x; its other components are 0.</summary>
    /// <exception cref="ArgumentException">The velocity is not along x.</exception>
    public static Rapidity<TFrame, TOther> Of(Velocity<TFrame> velocityOfOther)
        => velocityOfOther.YCelerityRatio == 0 && velocityOfOther.ZCelerityRatio == 0
            ? new(Math.Asinh(velocityOfOther.XCelerityRatio))
            : throw new ArgumentException(
                $"Rapidities of one line add; the velocity {velocityOfOther} is not along x. Use a boost.", nameof(velocityOfOther));

    /// <summary>From its value.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Its size is above 346, where γ passes 1e150.</exception>
    public static Rapidity<TFrame, TOther> FromValue([Kind(QuantityKind.Rapidity), Between(nameof(TFrame), nameof(TOther))] double value)
        => new(Require.Within(value, -346, 346));

    /// <summary>The velocity of the other frame in the first, along x.</summary>
    public Velocity<TFrame> ToVelocity() => new(new(Math.Sinh(_value), 0, 0));

    /// <summary>The Lorentz factor.</summary>
    public LorentzFactor<TFrame, TOther> ToLorentzFactor()
    {
        double half = Math.Sinh(_value / 2);
        return new(2 * half * half);
    }

    /// <summary>This motion followed by a further one along the same line: rapidities add.</summary>
    /// <remarks>The same as <c>+</c>, for language versions that do not know generic extension operators.</remarks>
    public Rapidity<TFrame, TNext> Then<TNext>(Rapidity<TOther, TNext> next)
        where TNext : struct, IFrame
        => new(_value + next.Value);

    /// <summary>The same.</summary>
    public static bool operator ==(Rapidity<TFrame, TOther> left, Rapidity<TFrame, TOther> right) => left._value == right._value;

    /// <summary>Another.</summary>
    public static bool operator !=(Rapidity<TFrame, TOther> left, Rapidity<TFrame, TOther> right) => left._value != right._value;

    /// <summary>Whether the left one is less.</summary>
    public static bool operator <(Rapidity<TFrame, TOther> left, Rapidity<TFrame, TOther> right) => left._value < right._value;

    /// <summary>Whether the left one is more.</summary>
    public static bool operator >(Rapidity<TFrame, TOther> left, Rapidity<TFrame, TOther> right) => left._value > right._value;

    /// <summary>Whether the left one is not more.</summary>
    public static bool operator <=(Rapidity<TFrame, TOther> left, Rapidity<TFrame, TOther> right) => left._value <= right._value;

    /// <summary>Whether the left one is not less.</summary>
    public static bool operator >=(Rapidity<TFrame, TOther> left, Rapidity<TFrame, TOther> right) => left._value >= right._value;

    /// <inheritdoc/>
    public int CompareTo(Rapidity<TFrame, TOther> other) => _value.CompareTo(other._value);

    /// <inheritdoc/>
    public bool Equals(Rapidity<TFrame, TOther> other) => _value.Equals(other._value);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is Rapidity<TFrame, TOther> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _value.GetHashCode();

    /// <summary>The number and whose it is, in the round-trip format.</summary>
    public override string ToString() => ToString(null, null);

    /// <inheritdoc/>
    public string ToString(string? format, IFormatProvider? formatProvider)
        => QuantityText.Of(_value, "", QuantityText.Between<TFrame, TOther>(), format, formatProvider);

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider)
        => destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);
}
