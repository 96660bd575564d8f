using System.Globalization;
using System.Numerics;

namespace FrameSafe.Analyzers.Tags;

/// <summary>How C# converts a number from one unit to another: multiplied or divided by a number that stands in the code.</summary>
/// <param name="Text">
/// The operand in C#, to stand behind <c>*</c> or <c>/</c> as it is: <c>1000</c>, <c>3.6</c>, <c>1e9</c>, or with lower
/// precedence inside: <c>(Math.PI / 180)</c>. Integer literals are written as such: an operand of an integer type needs its own cast.
/// </param>
/// <param name="Divides">Whether the number is divided by it.</param>
/// <param name="IsExact">Whether the literal is exactly the factor as a double, so that only the operation itself rounds.</param>
internal sealed record ConversionFactor(string Text, bool Divides, bool IsExact)
{
    private static readonly BigInteger ExactIntegers = BigInteger.One << 53;

    /// <summary>
    /// The factor from one scale to the other: an integer to multiply by, or to divide by where that is exact; else the decimal
    /// number, on the side where it is the shorter; else a quotient. Null where a root keeps it from being written down.
    /// </summary>
    public static ConversionFactor? Between(Scale? from, Scale? to)
    {
        if (from / to is not { IsRatio: true } factor || !factor.PiExponent.IsInteger)
            return null;

        int pi = (int)factor.PiExponent.Numerator;
        if (pi is < -1 or > 1)
            return null;
        if (pi != 0)
            return WithPi(factor, pi);

        string? multiplier = Decimal(factor.Numerator, factor.Denominator, out bool exactMultiplier);
        string? divisor = Decimal(factor.Denominator, factor.Numerator, out bool exactDivisor);
        if (multiplier is not null && (exactMultiplier || divisor is null || (!exactDivisor && multiplier.Length <= divisor.Length)))
            return new(multiplier, Divides: false, exactMultiplier);
        if (divisor is not null)
            return new(divisor, Divides: true, exactDivisor);

        string? numerator = Decimal(factor.Numerator, BigInteger.One, out _);
        string? denominator = Decimal(factor.Denominator, BigInteger.One, out _);
        return numerator is null || denominator is null
            ? null
            : new("(" + AsDouble(numerator) + " / " + denominator + ")", Divides: false, IsExact: false);
    }

    private static ConversionFactor? WithPi(Scale factor, int pi)
    {
        string? numerator = Decimal(factor.Numerator, BigInteger.One, out _);
        string? denominator = Decimal(factor.Denominator, BigInteger.One, out _);
        if (numerator is null || denominator is null)
            return null;
        string top = pi > 0 ? (numerator == "1" ? "Math.PI" : numerator + " * Math.PI") : AsDouble(numerator);
        string bottom = pi < 0 ? (denominator == "1" ? "Math.PI" : "(" + denominator + " * Math.PI)") : denominator;
        return new(bottom == "1" ? top : "(" + top + " / " + bottom + ")", Divides: false, IsExact: false);
    }

    // The shortest literal of a ratio that ends as a decimal number of at most 17 digits.
    private static string? Decimal(BigInteger numerator, BigInteger denominator, out bool exact)
    {
        exact = denominator.IsOne && numerator <= ExactIntegers;
        int exponent = 0;
        while (!denominator.IsOne)
        {
            BigInteger divisor = BigInteger.GreatestCommonDivisor(denominator, 10);
            if (divisor.IsOne)
                return null;
            numerator *= 10 / divisor;
            denominator /= divisor;
            exponent--;
        }

        while (!numerator.IsZero && (numerator % 10).IsZero)
        {
            numerator /= 10;
            exponent++;
        }

        string digits = numerator.ToString(CultureInfo.InvariantCulture);
        if (digits.Length > 17)
            return null;
        // Powers of ten up to 10^22 are exact doubles, though beyond 2^53.
        exact |= exponent is >= 0 and <= 22 && digits == "1";
        // A binary fraction (0.5, 0.25) is exact too.
        exact |= exponent < 0 && (numerator % BigInteger.Pow(5, -exponent)).IsZero;

        int point = digits.Length + exponent;
        if (exponent >= 0 && point <= 6)
            return digits + new string('0', exponent);
        if (exponent >= 0 && digits.Length > 3 && point <= 9)
            return digits + new string('0', exponent);
        if (exponent < 0 && point is > -3 and <= 9)
            return point > 0 ? digits.Insert(point, ".") : "0." + new string('0', -point) + digits;
        string mantissa = digits.Length == 1 ? digits : digits.Insert(1, ".");
        return mantissa + "e" + (point - 1).ToString(CultureInfo.InvariantCulture);
    }

    private static string AsDouble(string literal) => literal.IndexOfAny(['.', 'e']) >= 0 ? literal : literal + ".0";
}
