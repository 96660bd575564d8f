using System.Globalization;
using System.Numerics;

namespace FrameSafe.Accuracy;

/// <summary>A decimal number of any length, exactly, as a quotient of integers.</summary>
internal readonly record struct Exact(BigInteger Numerator, BigInteger Denominator)
{
    internal static Exact Parse(string text)
    {
        int e = text.IndexOfAny(['e', 'E']);
        string mantissa = e < 0 ? text : text[..e];
        int exponent = e < 0 ? 0 : int.Parse(text.AsSpan(e + 1), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        int point = mantissa.IndexOf('.');
        if (point >= 0)
        {
            exponent -= mantissa.Length - point - 1;
            mantissa = mantissa.Remove(point, 1);
        }

        BigInteger digits = BigInteger.Parse(mantissa, NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        return exponent >= 0
            ? new(digits * BigInteger.Pow(10, exponent), 1)
            : new(digits, BigInteger.Pow(10, -exponent));
    }

    internal static Exact Of(double value)
    {
        long bits = BitConverter.DoubleToInt64Bits(value);
        int exponent = (int)((bits >> 52) & 0x7FF);
        long fraction = bits & 0xFFFFFFFFFFFFF;
        BigInteger significand = exponent == 0 ? fraction : fraction | (1L << 52);
        int power = Math.Max(exponent, 1) - 1075;
        if (bits < 0)
            significand = -significand;
        return power >= 0 ? new(significand << power, 1) : new(significand, BigInteger.One << -power);
    }

    public static Exact operator -(Exact left, Exact right)
        => new((left.Numerator * right.Denominator) - (right.Numerator * left.Denominator), left.Denominator * right.Denominator);

    /// <summary>This by a power of two, as a double; for errors in units of the last place, where a few digits do.</summary>
    internal double DividedByPowerOfTwo(int power)
    {
        BigInteger numerator = power < 0 ? Numerator << -power : Numerator;
        BigInteger denominator = power > 0 ? Denominator << power : Denominator;
        // Twenty digits behind the point are more than enough.
        BigInteger scaled = (numerator << 64) / denominator;
        return (double)scaled / Math.Pow(2, 64);
    }

    /// <summary>The exponent of the last place of a double of this size: subnormal ones end at −1074.</summary>
    internal int LastPlace()
    {
        if (Numerator.IsZero)
            return -1074;
        BigInteger size = BigInteger.Abs(Numerator);
        long estimate = size.GetBitLength() - Denominator.GetBitLength();
        // 2^estimate may be one too large.
        BigInteger left = estimate < 0 ? size << (int)-estimate : size;
        BigInteger right = estimate > 0 ? Denominator << (int)estimate : Denominator;
        long exponent = left < right ? estimate - 1 : estimate;
        return (int)Math.Max(exponent - 52, -1074);
    }
}
