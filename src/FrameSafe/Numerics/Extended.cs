namespace FrameSafe;

/// <summary>A number kept as the unevaluated sum of two doubles: 106 bits, the exponent range of one.</summary>
/// <remarks>
/// <para>Clock effects are small differences of nearly equal numbers. Carried in this type from the exact inputs to the difference, a
/// result is right to a rounding however ill-conditioned the way to it is, and no formula needs a variant for each range.</para>
/// <para>Error-free sum and product, quotient and root by one correction: T. J. Dekker, Numer. Math. 18 (1971) 224; M. Joldes,
/// J.-M. Muller, V. Popescu, ACM Trans. Math. Softw. 44 (2017) 15. Where a low part would fall below 2⁻¹⁰⁷⁴ the precision is that of a double.</para>
/// </remarks>
internal readonly struct Extended
{
    private Extended(double high, double low)
    {
        High = high;
        Low = low;
    }

    /// <summary>The number rounded to a double.</summary>
    internal double High { get; }

    /// <summary>What the rounding left out.</summary>
    internal double Low { get; }

    /// <summary>c², which no double holds.</summary>
    internal static Extended SpeedOfLightSquared => Product(299_792_458, 299_792_458);

    private static Extended Ln2 => new(0.6931471805599453, 2.3190468138462996e-17);

    public static implicit operator Extended(double value) => new(value, 0);

    public static explicit operator double(Extended value) => value.High;

    public static Extended operator -(Extended value) => new(-value.High, -value.Low);

    public static Extended operator +(Extended left, Extended right)
    {
        Extended high = Sum(left.High, right.High);
        Extended low = Sum(left.Low, right.Low);
        high = Renormalised(high.High, high.Low + low.High);
        return Renormalised(high.High, high.Low + low.Low);
    }

    public static Extended operator -(Extended left, Extended right) => left + -right;

    public static Extended operator *(Extended left, Extended right)
    {
        Extended product = Product(left.High, right.High);
        double cross = Math.FusedMultiplyAdd(left.Low, right.High, left.High * right.Low);
        return Renormalised(product.High, product.Low + cross);
    }

    public static Extended operator /(Extended left, Extended right)
    {
        double first = left.High / right.High;
        Extended rest = left - right * first;
        double second = rest.High / right.High;
        rest -= right * second;
        return Renormalised(first, second) + rest.High / right.High;
    }

    /// <summary>The sum of two doubles, exactly.</summary>
    internal static Extended Sum(double a, double b)
    {
        double sum = a + b;
        double shadow = sum - a;
        return new Extended(sum, (a - (sum - shadow)) + (b - shadow));
    }

    /// <summary>The product of two doubles, exactly.</summary>
    internal static Extended Product(double a, double b)
    {
        double product = a * b;
        return new Extended(product, Math.FusedMultiplyAdd(a, b, -product));
    }

    internal static Extended Sqrt(Extended value)
    {
        if (value.High <= 0) return Math.Sqrt(value.High);
        double root = Math.Sqrt(value.High);
        Extended rest = value - Product(root, root);
        return Renormalised(root, rest.High / (2 * root));
    }

    internal static Extended Exp(Extended value)
    {
        // e^x = 2^k e^r, and e^r − 1 by its series at r/64, doubled six times.
        double binary = Math.Round(value.High / Ln2.High);
        const int Halvings = 6;
        Extended small = (value - Ln2 * binary) * (1.0 / (1 << Halvings));
        Extended term = small, sum = small;
        for (int n = 2; n <= 9; n++)
        {
            term = term * small / n;
            sum += term;
        }

        for (int i = 0; i < Halvings; i++) sum = sum * 2 + sum * sum;
        Extended result = sum + 1;
        return new Extended(Math.ScaleB(result.High, (int)binary), Math.ScaleB(result.Low, (int)binary));
    }

    internal static Extended Sinh(Extended value) =>
        Math.Abs(value.High) < SeriesBound ? value + SinhTail(value) : SinhByExp(value);

    /// <summary>sinh x − x, without the cancellation near zero.</summary>
    internal static Extended SinhMinusArgument(Extended value) =>
        Math.Abs(value.High) < SeriesBound ? SinhTail(value) : SinhByExp(value) - value;

    /// <summary>cosh x − 1, without the cancellation near zero.</summary>
    internal static Extended CoshMinusOne(Extended value)
    {
        Extended half = Sinh(value * 0.5);
        return half * half * 2;
    }

    internal static Extended Asinh(Extended value)
    {
        // One Newton step doubles the digits of the double result.
        double near = Math.Asinh(value.High);
        Extended miss = value - Sinh(near);
        return (Extended)near + miss.High / Math.Cosh(near);
    }

    internal static Extended Log(Extended value)
    {
        double near = Math.Log(value.High);
        return (Extended)near + (value * Exp(-near) - 1);
    }

    private const double SeriesBound = 0.5;

    private static Extended SinhByExp(Extended value)
    {
        Extended growth = Exp(value);
        return (growth - (Extended)1 / growth) * 0.5;
    }

    private static Extended SinhTail(Extended value)
    {
        Extended square = value * value;
        Extended term = value, sum = 0;
        for (int n = 2; n <= 24; n += 2)
        {
            term = term * square / (n * (n + 1));
            sum += term;
        }

        return sum;
    }

    private static Extended Renormalised(double high, double low)
    {
        double sum = high + low;
        return new Extended(sum, low - (sum - high));
    }
}
