using System.Numerics;
using CsCheck;
using FrameSafe.Analyzers.Tags;

namespace FrameSafe.Analyzers.Tests.Tags;

public class ScaleTests
{
    private static readonly Gen<Scale> Scales = Gen.Select(
        Gen.Int[1, 10_000], Gen.Int[1, 10_000], Gen.Int[-20, 20], Gen.Int[-2, 2], Gen.Int[1, 3],
        (n, d, ten, pi, root) => ((Scale.Of(n, d) * Scale.PowerOfTen(ten))!.Pow(new Rational(1, root)) * Scale.Pi.Pow(pi))!);

    [Fact]
    public void Scales_form_an_abelian_group()
        => Gen.Select(Scales, Scales, Scales).Sample((a, b, c) =>
            (a * b) * c == a * (b * c) && a * b == b * a && (a / a)!.IsOne && (a * b) / b == a);

    [Fact]
    public void A_root_is_undone_by_its_power_and_has_one_form()
        => Gen.Select(Scales, Gen.Int[1, 6]).Sample((a, n) =>
        {
            Scale root = a.Pow(new Rational(1, n))!;
            return root.Pow(n) == a && a.Pow(n)!.Pow(new Rational(1, n)) == a
                && root.Pow(n)!.GetHashCode() == a.GetHashCode();
        });

    [Fact]
    public void The_root_of_a_kilometre_squares_to_a_kilometre_and_of_a_square_kilometre_is_one()
    {
        Scale kilometre = Scale.PowerOfTen(3);
        Assert.Equal(kilometre, kilometre.Pow(Rational.Half)!.Pow(2));
        Assert.Equal(kilometre, Scale.PowerOfTen(6).Pow(Rational.Half));
        Assert.NotEqual(kilometre, kilometre.Pow(Rational.Half));
    }

    [Fact]
    public void A_ratio_goes_to_the_nearest_double()
        => Gen.Select(Gen.Long[1, long.MaxValue], Gen.Long[1, long.MaxValue], Gen.Int[-310, 290]).Sample((n, d, ten) =>
        {
            Scale scale = (Scale.Of(n, d) * Scale.PowerOfTen(ten))!;
            return IsNearest(scale.ToDouble(), scale.Numerator, scale.Denominator);
        });

    [Theory]
    // Halfway between two doubles: to the even one (IEEE 754-2019, 4.3.1).
    [InlineData("9007199254740993", "1", 9007199254740992.0)]
    [InlineData("9007199254740995", "1", 9007199254740996.0)]
    [InlineData("1", "3", 1.0 / 3.0)]
    public void Ties_go_to_even(string numerator, string denominator, double expected)
        => Assert.Equal(expected, Scale.Of(BigInteger.Parse(numerator), BigInteger.Parse(denominator))!.ToDouble());

    [Fact]
    public void Beyond_the_range_it_is_infinite_or_zero_and_at_its_lower_end_denormal()
    {
        Assert.Equal(double.PositiveInfinity, Scale.PowerOfTen(400).ToDouble());
        Assert.Equal(0.0, Scale.PowerOfTen(-400).ToDouble());
        Assert.Equal(double.Epsilon, Scale.OfDecimal("4.9406564584124654e-324")!.ToDouble());
        Assert.Equal(double.MaxValue, Scale.OfDecimal("1.7976931348623157e308")!.ToDouble());
    }

    [Fact]
    public void Multiples_of_pi_go_to_the_nearest_double()
    {
        // π from Machin's formula, π = 16 arctan(1/5) − 4 arctan(1/239), to 120 decimals: independent of the table in the code.
        BigInteger unit = BigInteger.Pow(10, 120);
        BigInteger pi = (16 * ArcCotangent(5, unit)) - (4 * ArcCotangent(239, unit));
        Gen.Select(Gen.Int[1, 1_000_000], Gen.Int[1, 1_000_000]).Sample((n, d) =>
            IsNearest((Scale.Of(n, d) * Scale.Pi)!.ToDouble(), n * pi, d * unit)
            && IsNearest((Scale.Of(n, d) / Scale.Pi)!.ToDouble(), n * unit, d * pi)
            && IsNearest((Scale.Of(n, d) * Scale.Pi.Pow(2))!.ToDouble(), n * pi * pi, d * unit * unit));
        Assert.Equal(Math.PI, Scale.Pi.ToDouble());
    }

    [Fact]
    public void Square_roots_go_to_the_nearest_double()
        => Gen.Double[1e-300, 1e300].Sample(x => Exact(x).Pow(Rational.Half)!.ToDouble() == Math.Sqrt(x));

    [Theory]
    [InlineData("0")]
    [InlineData("-1")]
    [InlineData("1e99999")]
    [InlineData("1e")]
    [InlineData("1..2")]
    [InlineData("x")]
    public void What_is_no_positive_decimal_number_has_no_scale(string text) => Assert.Null(Scale.OfDecimal(text));

    [Fact]
    public void Growth_without_sense_becomes_unknown()
    {
        Assert.Null(Scale.PowerOfTen(30).Pow(5000));
        Assert.Null(Scale.PowerOfTen(1).Pow(new Rational(1, 1000)));
        Assert.Null(Scale.PowerOfTen(3)!.Pow(Rational.Unknown));
    }

    [Theory]
    [InlineData("km", "m", "1000", false)]
    [InlineData("m", "km", "1000", true)]
    [InlineData("ns", "s", "1e9", true)]
    [InlineData("s", "ns", "1e9", false)]
    [InlineData("km/h", "m/s", "3.6", true)]
    [InlineData("m/s", "km/h", "3.6", false)]
    [InlineData("mi", "km", "1.609344", false)]
    [InlineData("h", "s", "3600", false)]
    [InlineData("deg", "rad", "(Math.PI / 180)", false)]
    [InlineData("rad", "deg", "(180.0 / Math.PI)", false)]
    [InlineData("[c]", "m/s", "299792458", false)]
    [InlineData("m/s", "c", "299792458", true)]
    [InlineData("MeV", "J", "1.602176634e-13", false)]
    [InlineData("%", "1", "100", true)]
    [InlineData("h", "d", "24", true)]
    [InlineData("kn", "km/h", "1.852", false)]
    [InlineData("arcsec", "deg", "3600", true)]
    [InlineData("min", "m/s*ns", null, false)]
    public void Writes_the_conversion_as_an_engineer_would(string from, string to, string? text, bool divides)
    {
        ConversionFactor? factor = text is null ? null : ConversionFactor.Between(Units.Read(from).Scale, Units.Read(to).Scale);
        Assert.Equal(text, factor?.Text);
        Assert.Equal(divides, factor?.Divides ?? false);
    }

    [Fact]
    public void An_exact_conversion_is_exact()
    {
        string[] units = ["nm", "mm", "m", "km", "au", "ly", "ft", "mi", "nmi"];
        foreach (string from in units)
        {
            foreach (string to in units)
            {
                Scale exact = (Units.Read(from).Scale / Units.Read(to).Scale)!;
                ConversionFactor? factor = ConversionFactor.Between(Units.Read(from).Scale, Units.Read(to).Scale);
                if (factor is not { IsExact: true })
                    continue;
                double literal = double.Parse(factor.Text, System.Globalization.CultureInfo.InvariantCulture);
                Assert.Equal(factor.Divides ? exact.Reciprocal : exact, Exact(literal));
            }
        }
    }

    private static Scale Exact(double value)
    {
        long bits = BitConverter.DoubleToInt64Bits(value);
        int exponent = (int)((bits >> 52) & 0x7FF);
        BigInteger mantissa = (bits & 0xF_FFFF_FFFF_FFFF) | (exponent == 0 ? 0 : 1L << 52);
        int shift = Math.Max(exponent, 1) - 1075;
        return shift >= 0 ? Scale.Of(mantissa << shift, 1)! : Scale.Of(mantissa, BigInteger.One << -shift)!;
    }

    // Whether no neighbour of the double is nearer to the ratio, in exact arithmetic.
    private static bool IsNearest(double value, BigInteger numerator, BigInteger denominator)
    {
        if (value == 0 || double.IsInfinity(value))
            return value == 0 ? numerator * 2 * Exact(double.Epsilon).Denominator <= denominator : true;
        BigInteger distance = Distance(value);
        return distance <= Distance(Math.BitIncrement(value)) && distance <= Distance(Math.BitDecrement(value));

        // |value − n/d| over a common positive denominator 2^1074·d.
        BigInteger Distance(double candidate)
        {
            if (candidate == 0)
                return numerator << 1074;
            if (double.IsInfinity(candidate))
                return BigInteger.Pow(2, 5000) * denominator * numerator;
            Scale exact = Exact(candidate);
            return BigInteger.Abs((((exact.Numerator << 1074) / exact.Denominator) * denominator) - (numerator << 1074));
        }
    }

    private static BigInteger ArcCotangent(int x, BigInteger unit)
    {
        BigInteger guard = BigInteger.Pow(10, 10);
        BigInteger term = unit * guard / x;
        BigInteger sum = term;
        for (int n = 3; !term.IsZero; n += 2)
        {
            term /= -(x * x);
            sum += term / n;
        }

        return sum / guard;
    }
}
