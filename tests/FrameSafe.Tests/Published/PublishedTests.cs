namespace FrameSafe.Tests.Published;

/// <summary>
/// Published values, each beside its source; the tolerance is half a unit of the last published digit, or the stated uncertainty
/// where the comparison is with a measurement. "From memory" says that the number was not looked up in the source itself.
/// </summary>
public sealed class PublishedTests
{
    private const double Year = 365.25 * 86400;
    private const double LightYear = Year * 299_792_458;

    [Fact]
    public void Electron_mass_in_MeV_agrees_with_its_mass_in_kilograms()
        // CODATA 2018: 9.1093837015e-31 kg and 0.51099895000(15) MeV.
        => Assert.Equal(0.51099895000, Mass.FromKilograms(9.1093837015e-31).InMegaelectronvoltsPerLightSpeedSquared, 1e-10);

    [Theory]
    // Usenet Physics FAQ, "The Relativistic Rocket", first table (from memory); a = 1.03 ly/yr².
    [InlineData(1, 1.19, 5e-3, 0.56, 5e-3, 1.58, 5e-3)]
    [InlineData(2, 3.75, 5e-3, 2.90, 5e-3, 3.99, 5e-3)]
    [InlineData(5, 83.7, 0.05, 82.7, 0.05, 86.2, 0.05)]
    [InlineData(8, 1840, 0.5, 1839, 0.5, 1895, 0.5)]
    [InlineData(12, 113243, 0.5, 113242, 0.5, 116641, 0.5)]
    public void A_ship_at_one_g(double shipYears, double homeYears, double homeUnit, double lightYears, double wayUnit, double gamma, double gammaUnit)
    {
        AcceleratedMotion<Harbour, Tug> ship = AcceleratedMotion<Harbour, Tug>.AfterProperTime(
            1.03 * LightYear / Year / Year, ProperTime<Tug>.FromSeconds(shipYears * Year));

        Assert.Equal(homeYears, ship.Time.InSeconds / Year, homeUnit);
        Assert.Equal(lightYears, ship.Distance.XInMetres / LightYear, wayUnit);
        Assert.Equal(gamma, ship.Velocity.LorentzFactor, gammaUnit);
    }

    [Theory]
    // The same, second table: accelerating half the way and braking the other half (from memory).
    [InlineData(4.3, 3.6, 0.05)]
    [InlineData(27, 6.6, 0.05)]
    [InlineData(30000, 20, 0.5)]
    [InlineData(2e6, 28, 0.6)]
    public void A_trip_at_one_g_with_a_flip(double lightYears, double shipYears, double unit)
        => Assert.Equal(
            shipYears,
            Trip<Harbour, Tug>.Flip(1.03 * LightYear / Year / Year, lightYears * LightYear).ShipTime.InSeconds / Year,
            unit);

    [Fact]
    public void A_return_trip_over_20_8_light_years_in_all_at_0_99_c_takes_the_crew_about_three_years()
    {
        // Common practice, no source.
        Velocity<Harbour> velocity = Velocity<Harbour>.FromSpeedRatio(0.99);
        var way = default(Worldline<Harbour, Tug>).Then(CoordinateTime<Harbour>.FromSeconds(20.8 / 0.99 * Year), velocity);

        Assert.InRange(way.ProperTime.InSeconds / Year, 2.9, 3.05);
    }

    [Fact]
    public void Stored_muons_live_longer_by_their_lorentz_factor()
    {
        // J. Bailey et al., Nature 268 (1977) 301: τ⁺ = 64.419(58) µs at γ = 29.327; τ₀ = 2.1969811 µs (PDG).
        var gamma = LorentzFactor<Harbour, Tug>.FromValue(29.327);

        Assert.Equal(64.419e-6, (ProperTime<Tug>.FromSeconds(2.1969811e-6) * gamma).InSeconds, 0.058e-6);
        Assert.Equal(2.1948e-6, (CoordinateTime<Harbour>.FromSeconds(64.368e-6) / gamma).InSeconds, 5e-11);
    }

    [Fact]
    public void The_magic_energy_of_the_muon()
    {
        // Muon g − 2 experiments (Phys. Rev. D 73 (2006) 072003): γ = 29.3, p = 3.094 GeV/c at a = 0.00116592059.
        Mass muon = Mass.FromMegaelectronvoltsPerLightSpeedSquared(105.6583755);
        double gamma = SpinPrecession<Harbour>.Of(1.602176634e-19, muon, 0.00116592059).MagicLorentzFactor();

        Assert.Equal(29.3, gamma, 0.05);
        Assert.Equal(3.094e3, Momentum<Harbour>.Of(muon, Velocity<Harbour>.FromLorentzFactorMinusOne(gamma - 1)).InMegaelectronvoltsPerLightSpeed, 0.5);
    }

    [Fact]
    public void The_muons_spin_gains_a_turn_in_4_37_microseconds()
    {
        // The same experiments, from memory: T = 4.37 µs at 1.4513 T.
        SpinPrecession<Harbour> muon = SpinPrecession<Harbour>.Of(1.602176634e-19, Mass.FromKilograms(1.883531627e-28), 0.00116592059);

        Assert.Equal(4.37e-6, 2 * Math.PI / Math.Abs(muon.AnomalousAngularVelocity(1.4513)), 5e-9);
    }

    [Fact]
    public void Protons_of_7_TeV()
    {
        // LHC Design Report, CERN-2004-003, table 2.1 (from memory): γ = 7461; 0.999999991 c; 8.33 T at 2803.95 m bend 7000 GeV/c.
        Mass proton = Mass.FromMegaelectronvoltsPerLightSpeedSquared(938.27208816);
        KineticEnergy<Harbour> kinetic = TotalEnergy<Harbour>.FromMegaelectronvolts(7e6).WithoutRestEnergyOf(proton);
        Velocity<Harbour> velocity = Velocity<Harbour>.FromLorentzFactorMinusOne(kinetic.LorentzFactorMinusOneOf(proton));

        Assert.Equal(7461, velocity.LorentzFactor, 0.5);
        Assert.Equal(0.999999991, velocity.SpeedRatio, 5e-10);
        Assert.Equal(8.33 * 2803.95, Momentum<Harbour>.Of(proton, kinetic).RigidityInTeslaMetres(1), 20.0);
        // 11.245 kHz around 26 658.883 m.
        Assert.Equal(11.245e3, velocity.SpeedInMetresPerSecond / 26658.883, 1.0);
    }

    [Theory]
    // Particle Data Group, listings of decay modes, column p in MeV/c; the masses are of the same listing.
    [InlineData(493.677, 139.57039, 134.9768, 205, 0.5)]
    [InlineData(1115.683, 938.27208816, 139.57039, 101, 0.5)]
    [InlineData(1189.37, 938.27208816, 134.9768, 189, 0.5)]
    [InlineData(1019.461, 493.677, 493.677, 127, 0.5)]
    [InlineData(139.57039, 105.6583755, 0, 29.79, 5e-3)]
    public void Momenta_of_two_body_decays(double parent, double first, double second, double momentum, double unit)
        => Assert.Equal(
            momentum,
            TwoBodyDecay<Tug>.Of(
                Mass.FromMegaelectronvoltsPerLightSpeedSquared(parent),
                Mass.FromMegaelectronvoltsPerLightSpeedSquared(first),
                Mass.FromMegaelectronvoltsPerLightSpeedSquared(second)).Momentum.InMegaelectronvoltsPerLightSpeed,
            unit);

    [Fact]
    public void A_tower_of_22_metres()
        // R. V. Pound, G. A. Rebka, Phys. Rev. Lett. 4 (1960) 337 (from memory): 4.92e-15 up minus down over 22.555 m.
        => Assert.Equal(4.92e-15, 2 * WeakField.UniformFieldRateMinusOne(9.804, 22.555), 5e-18);

    [Fact]
    public void A_clock_in_a_navigation_orbit_gains_4_4647e_10_on_the_geoid()
    {
        // N. Ashby, Living Rev. Relativ. 6 (2003) 1, section 5 (from memory): −4.4647e-10 as the satellite's factory offset, 38.6 µs a day.
        double gain = SchwarzschildField.FromGravitationalParameter(3.986004418e14).OrbitingClock<Tug>(26561750).Against(Geoid.Clock<Harbour>()).MinusOne;

        Assert.Equal(4.4647e-10, gain, 5e-15);
        Assert.Equal(38.6, gain * 86400e6, 0.05);
    }

    [Fact]
    public void Water_drags_light()
    {
        // A. Fresnel's coefficient 1 − 1/n² is 7/16 at n = 4/3; water at 7.059 m/s (H. Fizeau 1851, from memory).
        const double c = 299_792_458.0;
        Boost<Harbour, Tug> water = Boost<Harbour, Tug>.Into(Velocity<Harbour>.FromMetresPerSecond(7.059));
        Velocity<Harbour> light = water.Inverse.Map(Velocity<Tug>.FromMetresPerSecond(c * 3 / 4));

        Assert.Equal(0.4375, (light.XInMetresPerSecond - (c * 3 / 4)) / 7.059, 1e-6);
    }

    [Fact]
    public void Forward_and_backward_doppler_shifts_of_lithium_ions_cancel()
    {
        // B. Botermann et al., Phys. Rev. Lett. 113 (2014) 120405: √(ν₁ν₂)/ν₀ = 1 within 2.3e-9 at β = 0.338.
        Velocity<Harbour> ion = Velocity<Harbour>.FromSpeedRatio(0.338);
        double ahead = LightAtAngle<Harbour, Tug>.At(ion, 0).FrequencyRatio;
        double behind = LightAtAngle<Harbour, Tug>.At(ion, Math.PI).FrequencyRatio;

        Assert.Equal(1, Math.Sqrt(ahead * behind), 1e-15);
    }
}
