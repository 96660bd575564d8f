using CsCheck;
using FrameSafe.Analyzers.Tags;

namespace FrameSafe.Analyzers.Tests.Tags;

public class RationalTests
{
    private static readonly Gen<Rational> Rationals =
        Gen.Select(Gen.Int[-1000, 1000], Gen.Int[1, 60], (n, d) => new Rational(n, d));

    [Fact]
    public void Addition_and_multiplication_form_a_field()
        => Gen.Select(Rationals, Rationals, Rationals).Sample((a, b, c) =>
            (a + b) + c == a + (b + c) && a + b == b + a && a * (b + c) == (a * b) + (a * c) && a - a == Rational.Zero
            && (a.IsZero || a / a == Rational.One));

    [Fact]
    public void Order_agrees_with_subtraction()
        => Gen.Select(Rationals, Rationals).Sample((a, b) => Math.Sign(a.CompareTo(b)) == (a - b).Sign);

    [Theory]
    [InlineData(6, 4, 3, 2)]
    [InlineData(6, -4, -3, 2)]
    [InlineData(0, -7, 0, 1)]
    [InlineData(-9, 3, -3, 1)]
    public void Is_kept_in_lowest_terms_with_a_positive_denominator(long n, long d, long numerator, long denominator)
    {
        var value = new Rational(n, d);
        Assert.Equal((numerator, denominator), (value.Numerator, value.Denominator));
    }

    [Fact]
    public void What_does_not_fit_is_unknown_and_stays_so()
    {
        var large = new Rational(long.MaxValue);
        Assert.False((large + 1).IsKnown);
        Assert.False((large * large).IsKnown);
        Assert.False((Rational.One / Rational.Zero).IsKnown);
        Assert.False((Rational.Unknown - Rational.Unknown).IsKnown);
        Assert.False((Rational.Unknown * Rational.Zero).IsKnown);
        Assert.False(new Rational(long.MinValue).IsKnown);
        Assert.Equal(new Rational(1, long.MaxValue), Rational.One / large);
    }

    [Theory]
    [InlineData(0.5, 1, 2)]
    [InlineData(-1.5, -3, 2)]
    [InlineData(1.0 / 3.0, 1, 3)]
    [InlineData(2.0, 2, 1)]
    public void Reads_the_exponents_that_code_states(double value, long numerator, long denominator)
        => Assert.Equal(new Rational(numerator, denominator), Rational.FromDouble(value));

    [Theory]
    [InlineData(0.1234567)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(1e300)]
    public void Other_exponents_are_unknown(double value) => Assert.False(Rational.FromDouble(value).IsKnown);

    [Fact]
    public void The_default_value_is_zero() => Assert.Equal(new Rational(0), default(Rational));
}
