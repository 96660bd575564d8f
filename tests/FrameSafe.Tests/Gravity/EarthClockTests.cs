namespace FrameSafe.Tests.Gravity;

/// <summary>Clocks on and around the Earth against published parts of their rates.</summary>
public sealed class EarthClockTests
{
    // N. Ashby, Living Rev. Relativ. 6 (2003) 1, section 3 (from memory): the parts of the potential on the equator by c².
    private const double Monopole = 6.95348e-10;
    private const double Quadrupole = 3.764e-13;
    private const double Rotation = 1.203e-12;

    private static readonly double CSquared = 299_792_458.0 * 299_792_458.0;

    [Fact]
    public void The_potential_on_the_equator_is_a_monopole_and_a_quadrupole()
    {
        double whole = -OblateField.Earth.Potential(6378137, 0) / CSquared;
        double round = -OblateField.FromConstants(3.986004418e14, 0, 6378137).Potential(6378137, 0) / CSquared;

        Assert.Equal(Monopole, round, 1e-15);
        Assert.Equal(Quadrupole, whole - round, 1e-16);
    }

    [Fact]
    public void A_clock_on_the_turning_equator_runs_slow_by_the_geoids_rate()
    {
        double rate = OblateField.Earth.Clock<Harbour>(6378137, 0, 7.2921151467e-5 * 6378137).Rate.MinusOne;

        Assert.Equal(-(Monopole + Quadrupole + Rotation), rate, 2e-15);
        // IAU 2000 Resolution B1.9: L_G = 6.969290134e-10, exact by definition; the real equator is near the geoid, not on it.
        Assert.Equal(-6.969290134e-10, Geoid.Clock<Harbour>().Rate.MinusOne, 1e-18);
        Assert.Equal(-6.969290134e-10, rate, 1e-14);
    }

    [Fact]
    public void The_pole_and_the_equator_of_the_geoid_keep_step()
    {
        // The polar radius of WGS 84 is 6 356 752.3 m; what the equator loses by turning it gains by height.
        double pole = OblateField.Earth.Clock<Tug>(6356752.3, 1).Rate.MinusOne;
        double equator = OblateField.Earth.Clock<Harbour>(6378137, 0, 7.2921151467e-5 * 6378137).Rate.MinusOne;

        Assert.Equal(equator, pole, 2e-15);
    }

    [Fact]
    public void A_clock_on_a_mountain_gains_by_its_height()
    {
        // gh/c² of normal gravity at 45° (9.80620 m/s², WGS 84): 1.0911e-13 a kilometre, 9.43 ns a day.
        double gain = Geoid.ClockAtHeight<Tug>(1000, Math.Sqrt(0.5)).Against(Geoid.Clock<Harbour>()).MinusOne;

        Assert.Equal(9.80620 * 1000 / CSquared, gain, 3e-17);
    }

    [Fact]
    public void Clocks_flown_around_the_world_gain_and_lose_what_was_predicted()
    {
        // J. C. Hafele, R. E. Keating, Science 177 (1972) 166: predicted −40 ± 23 ns eastward and 275 ± 21 ns westward. Their flights in
        // rough (from memory): 41.2 h at 8.9 km and 243 m/s over ground eastward, 48.6 h at 9.4 km and 218 m/s westward, at about 34° north.
        Assert.Equal(-40e-9, Flown(41.2, 8900, 243), 40e-9);
        Assert.Equal(275e-9, Flown(48.6, 9400, -218), 40e-9);
    }

    // Against a clock that stays on the turning ground below.
    private static double Flown(double hours, double height, double eastward)
    {
        double ground = 7.2921151467e-5 * 6371000 * Math.Cos(34 * Math.PI / 180);
        SchwarzschildField earth = SchwarzschildField.Earth;
        return earth.MovingClock<Tug>(6371000 + height, ground + eastward)
            .Against(earth.MovingClock<Harbour>(6371000, ground))
            .GainInSeconds(hours * 3600);
    }

    [Fact]
    public void Orbits_and_clocks_that_cannot_be_are_refused_by_name()
    {
        SchwarzschildField hole = SchwarzschildField.FromHorizonRadius(3000);
        Assert.Contains("outside the photon sphere, which is at 4500 m", Assert.Throws<ArgumentOutOfRangeException>(() => hole.OrbitingClock<Tug>(4000)).Message);
        Assert.Contains("outside the horizon", Assert.Throws<ArgumentOutOfRangeException>(() => hole.StaticClock<Tug>(3000)).Message);
        Assert.Contains("light's coordinate speed", Assert.Throws<ArgumentOutOfRangeException>(() => hole.MovingClock<Tug>(6000, 2.9e8)).Message);
    }
}
