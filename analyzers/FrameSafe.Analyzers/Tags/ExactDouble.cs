using System;
using System.Numerics;

namespace FrameSafe.Analyzers.Tags;

/// <summary>Correct rounding of an exactly known number to double.</summary>
internal static class ExactDouble
{
    private const int PiDigits = 150;

    // π to 150 decimals, truncated (OEIS A000796).
    private static readonly BigInteger PiScaled = BigInteger.Parse(
        "3" + "14159265358979323846264338327950288419716939937510" + "58209749445923078164062862089986280348253421170679"
        + "82148086513282306647093844609550582231725359408128");

    private static readonly BigInteger PiUnit = BigInteger.Pow(10, PiDigits);

    /// <summary>
    /// The double nearest to (numerator/denominator)^(1/root)·π^pi. Exact ties occur only without root and π, and there the
    /// remainder decides; elsewhere 150 digits of π leave far more than the guard bits that rounding needs.
    /// </summary>
    internal static double Nearest(BigInteger numerator, BigInteger denominator, int root, Rational pi)
    {
        // Everything under one root: π^(p/q) becomes part of the radicand.
        long degree = root / (long)BigInteger.GreatestCommonDivisor(root, pi.Denominator) * pi.Denominator;
        long piPower = pi.Numerator * (degree / pi.Denominator);
        if (degree > 512 || Math.Abs(piPower) > 512)
            return double.NaN;

        int raise = (int)(degree / root);
        numerator = BigInteger.Pow(numerator, raise);
        denominator = BigInteger.Pow(denominator, raise);
        int power = (int)Math.Abs(piPower);
        BigInteger up = BigInteger.Pow(PiScaled, power);
        BigInteger down = BigInteger.Pow(PiUnit, power);
        numerator *= piPower >= 0 ? up : down;
        denominator *= piPower >= 0 ? down : up;

        // Shift so that the root has at least 64 + 53 bits, then round it with what is left over as a sticky bit.
        long shift = 120 - ((BitLength(numerator) - BitLength(denominator)) / degree);
        long radicandShift = shift * degree;
        BigInteger scaled = radicandShift >= 0
            ? BigInteger.DivRem(numerator << (int)radicandShift, denominator, out BigInteger rest)
            : BigInteger.DivRem(numerator, denominator << (int)-radicandShift, out rest);
        BigInteger whole = IntegerRoot.Floor(scaled, (int)degree);
        bool inexact = !rest.IsZero || BigInteger.Pow(whole, (int)degree) != scaled;
        return Round(whole, inexact, -shift);
    }

    // whole·2^exponent (plus a little if inexact), rounded to nearest, ties to even.
    private static double Round(BigInteger whole, bool inexact, long exponent)
    {
        long bits = BitLength(whole);
        long lowest = Math.Max(bits - 53, -1074 - exponent);
        if (lowest > bits + 1)
            return 0;
        if (bits + exponent > 1024)
            return double.PositiveInfinity;

        BigInteger kept = lowest > 0 ? whole >> (int)lowest : whole << (int)-lowest;
        if (lowest > 0)
        {
            BigInteger tail = whole - (kept << (int)lowest);
            int side = tail.CompareTo(BigInteger.One << (int)(lowest - 1));
            if (side > 0 || (side == 0 && (inexact || !kept.IsEven)))
                kept += 1;
        }

        long low = lowest + exponent;
        double mantissa = (double)(long)kept;
        return low >= -1022 && low <= 971
            ? mantissa * PowerOfTwo(low)
            : mantissa * PowerOfTwo(low / 2) * PowerOfTwo(low - (low / 2));
    }

    private static double PowerOfTwo(long exponent) => BitConverter.Int64BitsToDouble((exponent + 1023) << 52);

    private static long BitLength(BigInteger value)
    {
        byte[] bytes = value.ToByteArray();
        long bits = 8L * (bytes.Length - 1);
        for (int top = bytes[bytes.Length - 1]; top != 0; top >>= 1)
            bits++;
        return bits;
    }
}
