using FrameSafe.Analyzers.Tags;

namespace FrameSafe.Analyzers.Tests.Tags;

/// <summary>The table of units against the standards that define them, as equalities of unit texts: exact, dimension and factor both.</summary>
public class UnitTableTests
{
    [Theory]
    // SI Brochure, 9th ed. (2019), Table 4: derived units with special names in terms of others.
    [InlineData("rad", "m/m")]
    [InlineData("sr", "m2/m2")]
    [InlineData("Hz", "s-1")]
    [InlineData("N", "kg m s-2")]
    [InlineData("Pa", "N/m2")]
    [InlineData("J", "N m")]
    [InlineData("W", "J/s")]
    [InlineData("C", "A s")]
    [InlineData("V", "W/A")]
    [InlineData("F", "C/V")]
    [InlineData("Ω", "V/A")]
    [InlineData("Ohm", "V/A")]
    [InlineData("S", "A/V")]
    [InlineData("Wb", "V s")]
    [InlineData("T", "Wb/m2")]
    [InlineData("H", "Wb/A")]
    [InlineData("lm", "cd sr")]
    [InlineData("lx", "lm/m2")]
    [InlineData("Bq", "s-1")]
    [InlineData("Gy", "J/kg")]
    [InlineData("Sv", "J/kg")]
    [InlineData("kat", "mol/s")]
    // Table 8: units accepted for use with the SI.
    [InlineData("min", "60 s")]
    [InlineData("h", "60 min")]
    [InlineData("d", "24 h")]
    [InlineData("au", "149597870700 m")]
    [InlineData("′", "60 arcsec")]
    [InlineData("'", "60 ''")]
    [InlineData("°", "60 arcmin")]
    [InlineData("deg", "3600 ″")]
    [InlineData("mas", "1e-3 arcsec")]
    [InlineData("µas", "1e-6 arcsec")]
    [InlineData("ha", "1e4 m2")]
    [InlineData("L", "dm3")]
    [InlineData("l", "1e-3 m3")]
    [InlineData("t", "1000 kg")]
    [InlineData("Da", "u")]
    [InlineData("eV", "1.602176634e-19 J")]
    // The defining constants (section 2.2).
    [InlineData("[c]", "299792458 m/s")]
    [InlineData("[h]", "6.62607015e-34 J s")]
    [InlineData("[e]", "1.602176634e-19 C")]
    [InlineData("[k]", "1.380649e-23 J/K")]
    // UCUM 2.1, tables of customary, CGS and astronomical units.
    [InlineData("[in_i]", "2.54 cm")]
    [InlineData("[ft_i]", "12 [in_i]")]
    [InlineData("[yd_i]", "3 [ft_i]")]
    [InlineData("[mi_i]", "5280 [ft_i]")]
    [InlineData("[nmi_i]", "1852 m")]
    [InlineData("[kn_i]", "[nmi_i]/h")]
    [InlineData("[lb_av]", "453.59237 g")]
    [InlineData("[lbf_av]", "[lb_av].[g]")]
    [InlineData("[g]", "9.80665 m/s2")]
    [InlineData("kgf", "kg.[g]")]
    [InlineData("dyn", "g.cm/s2")]
    [InlineData("erg", "dyn.cm")]
    [InlineData("P", "dyn.s/cm2")]
    [InlineData("St", "cm2/s")]
    [InlineData("Mx", "1e-8 Wb")]
    [InlineData("G", "1e-4 T")]
    [InlineData("Gal", "cm/s2")]
    [InlineData("b", "100 fm2")]
    [InlineData("Ao", "0.1 nm")]
    [InlineData("Å", "0.1 nm")]
    [InlineData("bar", "1e5 Pa")]
    [InlineData("atm", "101325 Pa")]
    [InlineData("Ci", "37e9 Bq")]
    [InlineData("cal_th", "4.184 J")]
    [InlineData("a_j", "365.25 d")]
    [InlineData("a", "a_j")]
    [InlineData("wk", "7 d")]
    [InlineData("[ly]", "[c].a_j")]
    [InlineData("ly", "[ly]")]
    [InlineData("%", "10*-2")]
    [InlineData("[ppm]", "10*-6")]
    [InlineData("Torr", "(1/760) atm")]
    // Of derived habits: no source but the meaning of the words.
    [InlineData("Wh", "3600 J")]
    [InlineData("Ah", "3600 C")]
    [InlineData("cy", "36525 d")]
    [InlineData("yr", "a")]
    [InlineData("GeV/c", "1e9 eV/[c]")]
    [InlineData("MeV/c²", "1e6 eV/[c]^2")]
    [InlineData("‰", "1e-3")]
    // Jansky: IAU Style Manual (1989), Table 7.
    [InlineData("Jy", "1e-26 W/(m2 Hz)")]
    public void Means_what_the_standard_says(string symbol, string definition)
    {
        Unit unit = Units.Read(symbol);
        Unit defined = Units.Read(definition);
        Assert.Equal(defined.Dimension, unit.Dimension);
        Assert.Equal(defined.Scale, unit.Scale);
    }

    [Theory]
    // With π in the definition: ISO 80000-3 (degree, revolution), IAU 2015 resolution B2 (parsec), UCUM (oersted), SI (ħ = h/2π).
    [InlineData("deg", "1", 180, 1)]
    [InlineData("r", "1", 2, 1)]
    [InlineData("gon", "1", 200, 1)]
    [InlineData("ħ", "[h]", 2, -1)]
    [InlineData("pc", "648000 au", 1, -1)]
    [InlineData("Oe", "250 A/m", 1, -1)]
    public void Pi_stays_exact(string symbol, string of, int divisor, int pi)
    {
        Scale expected = divisor == 2 && pi == 1
            ? (Scale.Of(2, 1) * Scale.Pi)!
            : (Units.Read(of).Scale / Scale.Of(divisor, 1) * Scale.Pi.Pow(pi))!;
        Assert.Equal(expected, Units.Read(symbol).Scale);
    }

    [Theory]
    // SI Brochure, Table 7, with the prefixes of CGPM resolution 3 (2022).
    [InlineData("Q", 30)]
    [InlineData("R", 27)]
    [InlineData("Y", 24)]
    [InlineData("Z", 21)]
    [InlineData("E", 18)]
    [InlineData("P", 15)]
    [InlineData("T", 12)]
    [InlineData("G", 9)]
    [InlineData("M", 6)]
    [InlineData("k", 3)]
    [InlineData("h", 2)]
    [InlineData("da", 1)]
    [InlineData("d", -1)]
    [InlineData("c", -2)]
    [InlineData("m", -3)]
    [InlineData("µ", -6)]
    [InlineData("n", -9)]
    [InlineData("p", -12)]
    [InlineData("f", -15)]
    [InlineData("a", -18)]
    [InlineData("z", -21)]
    [InlineData("y", -24)]
    [InlineData("r", -27)]
    [InlineData("q", -30)]
    public void Prefixes_are_powers_of_ten(string prefix, int exponent)
    {
        foreach (string symbol in new[] { "m", "s", "Hz", "eV", "V", "N" })
        {
            if (prefix + symbol is "min" or "cd" or "Pa")
                continue;
            Assert.Equal(Units.Read(symbol).Scale * Scale.PowerOfTen(exponent), Units.Read(prefix + symbol).Scale);
        }
    }

    [Theory]
    // A symbol of its own comes before a prefixed one (SI Brochure, section 5.2: min is the minute, cd the candela).
    [InlineData("min", "60 s")]
    [InlineData("cd", "cd")]
    [InlineData("Pa", "N/m2")]
    [InlineData("ha", "1e4 m2")]
    [InlineData("kg", "1000 g")]
    [InlineData("as", "1e-18 s")]
    [InlineData("T", "Wb/m2")]
    [InlineData("h", "3600 s")]
    public void Prefixes_never_hide_a_symbol(string symbol, string meaning)
        => Assert.Equal((Units.Read(meaning).Dimension, Units.Read(meaning).Scale), (Units.Read(symbol).Dimension, Units.Read(symbol).Scale));

    [Theory]
    // CODATA 2022 recommended values (NIST SP 961, May 2024).
    [InlineData("u", 1.66053906892e-27)]
    [InlineData("[m_e]", 9.1093837139e-31)]
    [InlineData("[m_p]", 1.67262192595e-27)]
    [InlineData("[G]", 6.67430e-11)]
    [InlineData("[eps_0]", 8.8541878188e-12)]
    [InlineData("[mu_0]", 1.25663706127e-6)]
    public void Measured_constants_are_those_of_CODATA_2022(string symbol, double value)
        => Assert.Equal(value, Units.Read(symbol).Scale.ToDouble());

    [Fact]
    public void Every_symbol_is_read_alone_and_in_a_compound()
    {
        foreach (UnitSymbol symbol in UnitTable.All)
        {
            Assert.Equal(symbol.Scale, Units.Read(symbol.Text).Scale);
            if (!symbol.IsAffine)
                Assert.Equal(symbol.Scale.Pow(-2) * symbol.Scale, Units.Read($"{symbol.Text}/{symbol.Text}^2").Scale);
        }
    }

    [Theory]
    [InlineData("rad", "Angle")]
    [InlineData("deg", "Angle")]
    [InlineData("mrad", "Angle")]
    [InlineData("sr", "SolidAngle")]
    [InlineData("rad/s", "AngularVelocity")]
    [InlineData("deg/h", "AngularVelocity")]
    [InlineData("r/min", "AngularVelocity")]
    [InlineData("Hz", "Frequency")]
    [InlineData("GHz", "Frequency")]
    [InlineData("1/s", "Unspecified")]
    [InlineData("Bq", "Activity")]
    [InlineData("J", "Energy")]
    [InlineData("GeV", "Energy")]
    [InlineData("N·m", "Torque")]
    [InlineData("kN m", "Torque")]
    [InlineData("m·N", "Torque")]
    [InlineData("kg m2/s2", "Unspecified")]
    [InlineData("T", "MagneticField")]
    [InlineData("V/m", "ElectricField")]
    [InlineData("kV/cm", "ElectricField")]
    [InlineData("T·m", "Unspecified")]
    [InlineData("m/s", "Unspecified")]
    public void A_unit_kept_for_one_kind_implies_it(string text, string kind)
        => Assert.Equal(kind, Units.Read(text).ImpliedKind.ToString());
}
