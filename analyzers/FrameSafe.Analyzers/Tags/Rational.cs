using System;
using System.Globalization;
using System.Numerics;

namespace FrameSafe.Analyzers.Tags;

/// <summary>
/// A reduced fraction of two <see cref="long"/>s, the exponent of a base dimension. What does not fit becomes
/// <see cref="Unknown"/>, which every operation hands on: arithmetic never throws and never wraps around.
/// </summary>
internal readonly struct Rational : IEquatable<Rational>, IComparable<Rational>
{
    // Kept as denominator − 1, so that default(Rational) is a proper zero; −1 (denominator 0) stands for Unknown.
    private readonly long _denominatorLessOne;

    public Rational(long numerator)
    {
        Numerator = numerator == long.MinValue ? 0 : numerator;
        _denominatorLessOne = numerator == long.MinValue ? -1 : 0;
    }

    public Rational(long numerator, long denominator)
        : this(new BigInteger(numerator), new BigInteger(denominator))
    {
    }

    private Rational(BigInteger numerator, BigInteger denominator)
    {
        Numerator = 0;
        _denominatorLessOne = -1;
        if (denominator.IsZero)
            return;

        BigInteger divisor = BigInteger.GreatestCommonDivisor(numerator, denominator) * denominator.Sign;
        numerator /= divisor;
        denominator /= divisor;
        if (BigInteger.Abs(numerator) > long.MaxValue || denominator > long.MaxValue)
            return;

        Numerator = (long)numerator;
        _denominatorLessOne = (long)denominator - 1;
    }

    public static Rational Zero => default;

    public static Rational One { get; } = new(1);

    public static Rational Half { get; } = new(1, 2);

    /// <summary>The result of what could not be computed: a division by zero, a fraction that does not fit.</summary>
    public static Rational Unknown { get; } = new(0, 0);

    public long Numerator { get; }

    /// <summary>Positive; 0 only for <see cref="Unknown"/>.</summary>
    public long Denominator => _denominatorLessOne + 1;

    public bool IsKnown => Denominator != 0;

    public bool IsZero => IsKnown && Numerator == 0;

    public bool IsInteger => Denominator == 1;

    public int Sign => Math.Sign(Numerator);

    public static implicit operator Rational(int value) => new(value);

    public static Rational operator +(Rational left, Rational right)
    {
        if (left._denominatorLessOne == 0 && right._denominatorLessOne == 0 && Small(left.Numerator) && Small(right.Numerator))
            return new(left.Numerator + right.Numerator);
        return new(
            ((BigInteger)left.Numerator * right.Denominator) + ((BigInteger)right.Numerator * left.Denominator),
            (BigInteger)left.Denominator * right.Denominator);
    }

    public static Rational operator -(Rational value) => new(-(BigInteger)value.Numerator, value.Denominator);

    public static Rational operator -(Rational left, Rational right) => left + -right;

    public static Rational operator *(Rational left, Rational right)
        => new((BigInteger)left.Numerator * right.Numerator, (BigInteger)left.Denominator * right.Denominator);

    public static Rational operator /(Rational left, Rational right)
        => left.IsKnown && right.IsKnown
            ? new((BigInteger)left.Numerator * right.Denominator, (BigInteger)left.Denominator * right.Numerator)
            : Unknown;

    public static bool operator ==(Rational left, Rational right) => left.Equals(right);

    public static bool operator !=(Rational left, Rational right) => !left.Equals(right);

    public static bool operator <(Rational left, Rational right) => left.CompareTo(right) < 0;

    public static bool operator >(Rational left, Rational right) => left.CompareTo(right) > 0;

    public bool Equals(Rational other) => Numerator == other.Numerator && _denominatorLessOne == other._denominatorLessOne;

    public override bool Equals(object? obj) => obj is Rational other && Equals(other);

    public override int GetHashCode() => unchecked(((int)Numerator * 397) ^ (int)_denominatorLessOne);

    /// <summary>By value; <see cref="Unknown"/> sorts as zero.</summary>
    public int CompareTo(Rational other)
        => ((BigInteger)Numerator * other.Denominator).CompareTo((BigInteger)other.Numerator * Denominator);

    /// <summary>The exact fraction of a floating-point exponent such as <c>0.5</c> or <c>-1.5</c>; thirds by their nearest double.</summary>
    public static Rational FromDouble(double value)
    {
        for (int denominator = 1; denominator <= 12; denominator++)
        {
            double numerator = Math.Round(value * denominator);
            if (Math.Abs(numerator) < 1e9 && numerator / denominator == value)
                return new((long)numerator, denominator);
        }

        return Unknown;
    }

    public override string ToString()
    {
        string numerator = Numerator.ToString(CultureInfo.InvariantCulture);
        return !IsKnown ? "?" : IsInteger ? numerator : numerator + "/" + Denominator.ToString(CultureInfo.InvariantCulture);
    }

    private static bool Small(long value) => value is > -0x4000_0000 and < 0x4000_0000;
}
