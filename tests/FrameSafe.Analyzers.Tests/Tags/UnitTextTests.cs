using FrameSafe.Analyzers.Tags;

namespace FrameSafe.Analyzers.Tests.Tags;

public class UnitTextTests
{
    [Theory]
    // SI Brochure, 9th ed., Table 2 and the rules of section 5.4.
    [InlineData("m/s", "m·s⁻¹", 1.0)]
    [InlineData("m s⁻¹", "m·s⁻¹", 1.0)]
    [InlineData("m·s^-1", "m·s⁻¹", 1.0)]
    [InlineData("m.s-1", "m·s⁻¹", 1.0)]
    [InlineData("km/s", "m·s⁻¹", 1000.0)]
    [InlineData("kg·m²·s⁻²", "kg·m²·s⁻²", 1.0)]
    [InlineData("N m", "kg·m²·s⁻²", 1.0)]
    [InlineData("J/(kg K)", "m²·s⁻²·K⁻¹", 1.0)]
    [InlineData("W/m2/sr", "kg·s⁻³", 1.0)]
    [InlineData("V/m", "kg·m·s⁻³·A⁻¹", 1.0)]
    [InlineData("1/s", "s⁻¹", 1.0)]
    [InlineData("/s", "s⁻¹", 1.0)]
    [InlineData("(m/s)^2", "m²·s⁻²", 1.0)]
    [InlineData("m^(1/2)", "m^(1/2)", 1.0)]
    [InlineData("nV/sqrt(Hz)", "kg·m²·s^(-5/2)·A⁻¹", 1e-9)]
    [InlineData("nT/√Hz", "kg·s^(-3/2)·A⁻¹", 1e-9)]
    [InlineData("µm", "m", 1e-6)]
    [InlineData("um", "m", 1e-6)]
    [InlineData("μs", "s", 1e-6)]
    [InlineData("10*-7.N/A2", "kg·m·s⁻²·A⁻²", 1e-7)]
    [InlineData("1e-3 m", "m", 1e-3)]
    [InlineData("{turns}/s", "s⁻¹", 1.0)]
    [InlineData("g", "kg", 1e-3)]
    [InlineData("mg", "kg", 1e-6)]
    // SI Brochure, Table 8.
    [InlineData("min", "s", 60.0)]
    [InlineData("h", "s", 3600.0)]
    [InlineData("d", "s", 86400.0)]
    [InlineData("au", "m", 149597870700.0)]
    [InlineData("°", "1", Math.PI / 180)]
    [InlineData("eV", "kg·m²·s⁻²", 1.602176634e-19)]
    [InlineData("L", "m³", 1e-3)]
    [InlineData("t", "kg", 1e3)]
    [InlineData("ha", "m²", 1e4)]
    // UCUM 2.1.
    [InlineData("[c]", "m·s⁻¹", 299792458.0)]
    [InlineData("[ft_i]", "m", 0.3048)]
    [InlineData("[mi_i]/h", "m·s⁻¹", 0.44704)]
    [InlineData("[kn_i]", "m·s⁻¹", 1852.0 / 3600.0)]
    [InlineData("G", "kg·s⁻²·A⁻¹", 1e-4)]
    [InlineData("b", "m²", 1e-28)]
    [InlineData("ly", "m", 9460730472580800.0)]
    [InlineData("a", "s", 31557600.0)]
    [InlineData("%", "1", 0.01)]
    [InlineData("GeV/c", "kg·m·s⁻¹", 1.602176634e-10 / 299792458.0)]
    [InlineData("GeV/c2", "kg", 1.602176634e-10 / (299792458.0 * 299792458.0))]
    [InlineData("GeV/c^2", "kg", 1.602176634e-10 / (299792458.0 * 299792458.0))]
    [InlineData("MeV/[c]2", "kg", 1.602176634e-13 / (299792458.0 * 299792458.0))]
    // IAU 2015 resolution B2: 1 pc = 648000/π au.
    [InlineData("pc", "m", 3.0856775814913673e16)]
    [InlineData("mas", "1", 4.8481368110953599e-9)]
    public void Reads_a_unit_with_its_dimension_and_factor(string text, string dimension, double factor)
    {
        Assert.True(UnitText.TryRead(text, out Unit? unit, out UnitTextError? error), error?.Message);
        Assert.Equal(dimension, unit.Dimension.ToString());
        Assert.Equal(factor, unit.Scale.ToDouble(), Math.Abs(factor) * 4e-16);
    }

    [Theory]
    [InlineData("Km/s", 0, 2, "Km", "km")]
    [InlineData("m/sec", 2, 3, "sec", "s")]
    [InlineData("kph", 0, 3, "kph", "km/h")]
    [InlineData("meter", 0, 5, "meter", "m")]
    [InlineData("GEV", 0, 3, "GEV", "GeV")]
    [InlineData("kgg", 0, 3, "kgg", "kg")]
    public void Points_at_an_unknown_symbol_and_names_the_nearest(string text, int column, int length, string symbol, string nearest)
    {
        Assert.False(UnitText.TryRead(text, out _, out UnitTextError? error));
        Assert.Equal(new UnitTextError(UnitTextReason.UnknownSymbol, column, length, symbol, nearest), error);
    }
}
