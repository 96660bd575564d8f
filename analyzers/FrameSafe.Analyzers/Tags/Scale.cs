using System;
using System.Numerics;

namespace FrameSafe.Analyzers.Tags;

/// <summary>
/// The exact factor from a unit to the coherent SI unit of its dimension: the q-th root of a positive ratio of integers, times
/// a rational power of π. Products, quotients and powers stay exact; a <see langword="null"/> scale is an unknown one, and
/// what would grow beyond all sense becomes unknown.
/// </summary>
internal sealed class Scale : IEquatable<Scale>
{
    // A unit's factor has at most some 350 bits (quecto, cubed); the limits only stop hostile input.
    private const int MaxBits = 8192;
    private const int MaxRoot = 64;

    private readonly BigInteger _numerator;
    private readonly BigInteger _denominator;
    private readonly int _root;
    private readonly Rational _pi;

    private Scale(BigInteger numerator, BigInteger denominator, int root, Rational pi)
    {
        _numerator = numerator;
        _denominator = denominator;
        _root = root;
        _pi = pi;
    }

    public static Scale One { get; } = new(BigInteger.One, BigInteger.One, 1, Rational.Zero);

    public static Scale Pi { get; } = new(BigInteger.One, BigInteger.One, 1, Rational.One);

    public bool IsOne => _numerator.IsOne && _denominator.IsOne && _pi.IsZero;

    /// <summary>The ratio and the power of π where no root is involved: what a conversion can write down.</summary>
    public bool IsRatio => _root == 1;

    public BigInteger Numerator => _numerator;

    public BigInteger Denominator => _denominator;

    public Rational PiExponent => _pi;

    public Scale? Reciprocal => Pow(-1);

    /// <summary>A ratio of positive integers; null if either is not positive.</summary>
    public static Scale? Of(BigInteger numerator, BigInteger denominator) => Normal(numerator, denominator, 1, Rational.Zero);

    /// <summary>The exact value of decimal notation such as <c>1.602176634e-19</c>; null if it is not a positive number.</summary>
    public static Scale? OfDecimal(string text)
    {
        BigInteger digits = BigInteger.Zero;
        int decimals = 0;
        bool point = false;
        int i = 0;
        for (; i < text.Length && text[i] is not ('e' or 'E'); i++)
        {
            if (text[i] == '.' && !point)
            {
                point = true;
                continue;
            }

            if (text[i] is < '0' or > '9' || i > 400)
                return null;
            digits = (digits * 10) + (text[i] - '0');
            decimals += point ? 1 : 0;
        }

        int exponent = 0;
        if (i < text.Length && !int.TryParse(text.Substring(i + 1), out exponent))
            return null;
        if (Math.Abs((long)exponent) > 2000)
            return null;
        exponent -= decimals;
        return exponent >= 0
            ? Of(digits * BigInteger.Pow(10, exponent), BigInteger.One)
            : Of(digits, BigInteger.Pow(10, -exponent));
    }

    public static Scale PowerOfTen(int exponent)
        => exponent >= 0
            ? new(BigInteger.Pow(10, exponent), BigInteger.One, 1, Rational.Zero)
            : new(BigInteger.One, BigInteger.Pow(10, -exponent), 1, Rational.Zero);

    public static Scale? operator *(Scale? left, Scale? right)
    {
        if (left is null || right is null)
            return null;
        if (left.IsOne)
            return right;
        if (right.IsOne)
            return left;

        int common = left._root / (int)BigInteger.GreatestCommonDivisor(left._root, right._root) * right._root;
        if (common > MaxRoot)
            return null;
        int raiseLeft = common / left._root;
        int raiseRight = common / right._root;
        if (left.Bits * raiseLeft + right.Bits * raiseRight > 2 * MaxBits)
            return null;
        return Normal(
            BigInteger.Pow(left._numerator, raiseLeft) * BigInteger.Pow(right._numerator, raiseRight),
            BigInteger.Pow(left._denominator, raiseLeft) * BigInteger.Pow(right._denominator, raiseRight),
            common,
            left._pi + right._pi);
    }

    public static Scale? operator /(Scale? left, Scale? right) => left * right?.Reciprocal;

    public static bool operator ==(Scale? left, Scale? right) => Equals(left, right);

    public static bool operator !=(Scale? left, Scale? right) => !Equals(left, right);

    public Scale? Pow(Rational exponent)
    {
        if (!exponent.IsKnown || IsOne)
            return exponent.IsKnown ? this : null;
        if (exponent.IsZero)
            return One;
        if (Math.Abs(exponent.Numerator) > MaxBits || exponent.Denominator * _root > MaxRoot)
            return null;

        int power = (int)Math.Abs(exponent.Numerator);
        if (Bits * power > MaxBits)
            return null;
        BigInteger numerator = BigInteger.Pow(_numerator, power);
        BigInteger denominator = BigInteger.Pow(_denominator, power);
        int root = _root * (int)exponent.Denominator;
        return exponent.Sign > 0
            ? Normal(numerator, denominator, root, _pi * exponent)
            : Normal(denominator, numerator, root, _pi * exponent);
    }

    public bool Equals(Scale? other)
        => other is not null && _root == other._root && _pi == other._pi
            && _numerator == other._numerator && _denominator == other._denominator;

    public override bool Equals(object? obj) => Equals(obj as Scale);

    public override int GetHashCode()
        => unchecked((((_numerator.GetHashCode() * 397) ^ _denominator.GetHashCode()) * 397) ^ (_root * 31) ^ _pi.GetHashCode());

    /// <summary>The double nearest to the exact value (ties to even); infinity or zero beyond the range.</summary>
    public double ToDouble() => ExactDouble.Nearest(_numerator, _denominator, _root, _pi);

    public override string ToString()
    {
        string ratio = _denominator.IsOne ? _numerator.ToString() : _numerator + "/" + _denominator;
        string rooted = _root == 1 ? ratio : "(" + ratio + ")^(1/" + _root + ")";
        return _pi.IsZero ? rooted : (rooted == "1" ? "" : rooted + "·") + "π" + Superscript.Of(_pi);
    }

    private long Bits => BitLength(_numerator) + BitLength(_denominator);

    private static long BitLength(BigInteger value) => 8L * value.ToByteArray().Length;

    // One value, one form: the ratio in lowest terms, and the smallest root that leaves it rational. So equality is by fields.
    private static Scale? Normal(BigInteger numerator, BigInteger denominator, int root, Rational pi)
    {
        if (numerator.Sign <= 0 || denominator.Sign <= 0 || !pi.IsKnown)
            return null;
        BigInteger divisor = BigInteger.GreatestCommonDivisor(numerator, denominator);
        numerator /= divisor;
        denominator /= divisor;
        if (BitLength(numerator) + BitLength(denominator) > MaxBits)
            return null;

        for (int prime = 2; prime <= root; prime++)
        {
            while (root % prime == 0
                && IntegerRoot.TryExact(numerator, prime, out BigInteger top)
                && IntegerRoot.TryExact(denominator, prime, out BigInteger bottom))
            {
                numerator = top;
                denominator = bottom;
                root /= prime;
            }
        }

        return new(numerator, denominator, root, pi);
    }
}
