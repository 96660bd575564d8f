using System.Diagnostics;
using CsCheck;
using FrameSafe.Analyzers.Tags;

namespace FrameSafe.Analyzers.Tests.Tags;

public class UnitTextErrorTests
{
    [Theory]
    [InlineData("", "Empty", 0, 0)]
    [InlineData("   ", "Empty", 0, 0)]
    [InlineData("m/", "MissingUnit", 2, 0)]
    [InlineData("m//s", "UnexpectedCharacter", 2, 1)]
    [InlineData("m/(s", "MissingParenthesis", 2, 2)]
    [InlineData("m)", "UnexpectedCharacter", 1, 1)]
    [InlineData("m^", "BadPower", 2, 0)]
    [InlineData("m^(1/0)", "BadPower", 1, 5)]
    [InlineData("m^x", "BadPower", 2, 1)]
    [InlineData("m999", "BadPower", 1, 3)]
    [InlineData("W/m2 sr", "AmbiguousProduct", 1, 5)]
    [InlineData("dB", "Logarithmic", 0, 2)]
    [InlineData("m/dB", "Logarithmic", 2, 2)]
    [InlineData("Np", "Logarithmic", 0, 2)]
    [InlineData("J/°C", "Affine", 2, 2)]
    [InlineData("°C^2", "Affine", 0, 2)]
    [InlineData("m#s", "UnexpectedCharacter", 1, 1)]
    [InlineData("m²²²", "BadPower", 1, 3)]
    [InlineData("{turns", "MissingParenthesis", 0, 6)]
    [InlineData("0 m", "TooLarge", 0, 1)]
    [InlineData("(10^99)^99", "TooLarge", 0, 10)]
    public void Says_what_is_wrong_and_where(string text, string reason, int column, int length)
    {
        Assert.False(UnitText.TryRead(text, out Unit? unit, out UnitTextError? error));
        Assert.Null(unit);
        Assert.Equal((reason, column, length), (error.Reason.ToString(), error.Column, error.Length));
        Assert.NotEmpty(error.Message);
    }

    [Theory]
    [InlineData("Meter", "m")]
    [InlineData("knots", "[kn_i]")]
    [InlineData("mph", "[mi_i]/h")]
    [InlineData("radians", "rad")]
    [InlineData("KM", "km")]
    [InlineData("hz", "Hz")]
    [InlineData("khz", "kHz")]
    [InlineData("Tesla", "T")]
    [InlineData("ev", "eV")]
    [InlineData("[ktn_i]", "[kn_i]")]
    [InlineData("[kn_i", "[kn_i]")]
    [InlineData("rpm", "r/min")]
    public void Names_the_nearest_symbol_and_it_can_be_read(string text, string nearest)
    {
        Assert.False(UnitText.TryRead(text, out _, out UnitTextError? error));
        Assert.Equal(nearest, error.Nearest);
        Units.Read(nearest);
    }

    [Theory]
    [InlineData("flurble")]
    [InlineData("xyzzyx")]
    public void Names_nothing_where_nothing_is_near(string text)
    {
        Assert.False(UnitText.TryRead(text, out _, out UnitTextError? error));
        Assert.Null(error.Nearest);
    }

    [Theory]
    [InlineData("ca", "abc", 3)]
    [InlineData("kitten", "sitting", 3)]
    [InlineData("ms", "sm", 1)]
    [InlineData("", "abc", 3)]
    public void Distance_counts_edits_and_swaps(string left, string right, int distance)
        => Assert.Equal(distance, SpellingDistance.Between(left, right));

    [Fact]
    public void Hostile_texts_fail_soon_and_never_throw()
    {
        string[] alphabet = ["m", "s", "/", "(", ")", "^", "99", "-", "²", "⁻", " ", "·", "[", "]", "{", "}", "sqrt(", "√", "10*", ".", "e", "dB",
            "°", "\0", "\ud83d", "'", "GeV", "_", "1e9", "\t"];
        Gen.Int[0, alphabet.Length - 1].Array[0, 60].Sample(
            indices => UnitText.TryRead(string.Concat(indices.Select(i => alphabet[i])), out Unit? unit, out UnitTextError? error)
                ? unit is not null && error is null
                : unit is null && error is not null && error.Column >= 0 && error.Length >= 0,
            iter: 20_000);
        Gen.String.Sample(text => UnitText.TryRead(text, out _, out _) || true, iter: 20_000);

        var watch = Stopwatch.StartNew();
        foreach (string text in new[]
        {
            new string('(', 120), new string('√', 120), string.Concat(Enumerable.Repeat("m^99·", 20)) + "m", new string('9', 120),
            "1e999999999", string.Concat(Enumerable.Repeat("(", 15)) + "Qm^9" + string.Concat(Enumerable.Repeat(")^9", 15)),
            new string('x', 1_000_000), "(10^99)^(1/97)^(1/97)", new string('a', 120), string.Concat(Enumerable.Repeat("e/", 60)),
        })
        {
            UnitText.TryRead(text, out _, out _);
        }

        Assert.True(watch.Elapsed < TimeSpan.FromSeconds(5), watch.Elapsed.ToString());
    }

    [Fact]
    public void What_is_printed_for_a_unit_reads_as_the_same_unit()
        => Gen.Select(DimensionTests.Dimensions, Gen.Int[-12, 12]).Sample((dimension, ten) =>
        {
            string text = UnitNames.Describe(dimension, Scale.PowerOfTen(ten))!;
            Unit read = Units.Read(text);
            return read.Dimension == dimension && read.Scale == Scale.PowerOfTen(ten);
        });
}
