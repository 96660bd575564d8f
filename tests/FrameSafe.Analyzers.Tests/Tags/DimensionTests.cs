using CsCheck;
using FrameSafe.Analyzers.Tags;

namespace FrameSafe.Analyzers.Tests.Tags;

public class DimensionTests
{
    internal static readonly Gen<Dimension> Dimensions =
        Gen.Select(Gen.Int[-6, 6], Gen.Int[1, 4], (n, d) => new Rational(n, d)).Array[7].Select(e => Dimension.From(e)!);

    [Fact]
    public void Dimensions_form_an_abelian_group()
        => Gen.Select(Dimensions, Dimensions, Dimensions).Sample((a, b, c) =>
            (a * b) * c == a * (b * c) && a * b == b * a && a * Dimension.One == a && (a / a)!.IsOne && (a * b) / b == a);

    [Fact]
    public void Powers_follow_the_laws_of_exponents()
        => Gen.Select(Dimensions, Gen.Int[-5, 5], Gen.Int[1, 5]).Sample((a, n, d) =>
        {
            var p = new Rational(n, d);
            return a.Pow(p)! * a.Pow(-p)! == Dimension.One && a.Pow(2)!.Pow(p) == a.Pow(p + p)
                && a.Pow(new Rational(1, d))!.Pow(d) == a;
        });

    [Fact]
    public void Equal_dimensions_have_equal_hashes()
        => Gen.Select(Dimensions, Dimensions).Sample((a, b) => ((a * b) / b)!.GetHashCode() == a.GetHashCode());

    [Fact]
    public void An_unknown_dimension_makes_every_result_unknown()
    {
        Dimension? unknown = null;
        Assert.Null(unknown * Dimension.Length);
        Assert.Null(Dimension.Length / unknown);
        Assert.Null(Dimension.Length.Pow(Rational.Unknown));
    }

    [Fact]
    public void Relations_of_mechanics_and_electrodynamics_hold()
    {
        Assert.Equal(Dimension.Speed, Dimension.Length / Dimension.Time);
        Assert.Equal(Dimension.Energy, Dimension.Force * Dimension.Length);
        Assert.Equal(Dimension.Energy, Dimension.Mass * Dimension.Speed.Pow(2));
        Assert.Equal(Dimension.Momentum, Dimension.Mass * Dimension.Speed);
        Assert.Equal(Dimension.Power, Dimension.Energy / Dimension.Time);
        Assert.Equal(Dimension.Power, Dimension.ElectricPotential * Dimension.Current);
        Assert.Equal(Dimension.Force, Dimension.Charge * Dimension.ElectricField);
        Assert.Equal(Dimension.Force, (Dimension.Charge * Dimension.Speed)! * Dimension.MagneticField);
        Assert.Equal(Dimension.Rigidity, Dimension.Momentum / Dimension.Charge);
        Assert.Equal(Dimension.ElectricPotential, Dimension.Resistance * Dimension.Current);
        Assert.Equal(Dimension.Charge, Dimension.Capacitance * Dimension.ElectricPotential);
        Assert.Equal(Dimension.MagneticFlux, Dimension.Inductance * Dimension.Current);
        Assert.Equal(Dimension.MagneticFlux, Dimension.MagneticField * Dimension.Area);
        Assert.Equal(Dimension.Action, Dimension.Energy * Dimension.Time);
    }

    [Theory]
    // The expressions in base units of the SI Brochure, 9th ed., Tables 4 and 5.
    [InlineData("N", "kg·m·s⁻²", "force")]
    [InlineData("J", "kg·m²·s⁻²", "energy")]
    [InlineData("V", "kg·m²·s⁻³·A⁻¹", "electric potential")]
    [InlineData("m/s", "m·s⁻¹", "speed")]
    [InlineData("kg/m3", "kg·m⁻³", "density")]
    [InlineData("1", "1", "number")]
    [InlineData("m5", "m⁵", null)]
    public void Is_written_in_base_units_and_named_where_the_trade_has_a_name(string unit, string text, string? name)
    {
        Dimension dimension = Units.Read(unit).Dimension;
        Assert.Equal(text, dimension.ToString());
        Assert.Equal(name, dimension.Name);
    }
}
