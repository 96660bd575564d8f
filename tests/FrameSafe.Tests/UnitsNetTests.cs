using UnitsNet;

namespace FrameSafe.Tests;

/// <summary>Quantities of UnitsNet in and out, against exact definitions of units.</summary>
public sealed class UnitsNetTests
{
    [Fact]
    public void Times_lengths_and_energies_come_in_by_their_units()
    {
        // SI Brochure, 9th ed., table 8: 1 h = 3600 s; international yard and pound agreement of 1959: 1 mile = 1609.344 m.
        Assert.Equal(3600, Duration.FromHours(1).ToCoordinateTime<Harbour>().InSeconds);
        Assert.Equal(0.001, Duration.FromMilliseconds(1).ToProperTime<Tug>().InSeconds, 1e-18);
        Assert.Equal(1609.344, (Length.FromMiles(1), Length.Zero, Length.Zero).ToDisplacement<Harbour>().XInMetres, 1e-12);
        // 1 eV = 1.602176634e-19 J exactly.
        Assert.Equal(1.602176634e-13, Energy.FromMegaelectronVolts(1).ToKineticEnergy<Harbour>().InJoules, 1e-27);
    }

    [Fact]
    public void What_goes_out_comes_back()
    {
        Velocity<Harbour> velocity = Velocity<Harbour>.FromMetresPerSecond(1e8, -2e7, 3);
        Assert.Equal(velocity.XInMetresPerSecond, velocity.ToSpeeds().ToVelocity<Harbour>().XInMetresPerSecond, 1e-7);
        Assert.Equal(2.5, ProperTime<Tug>.FromSeconds(2.5).ToDuration().ToProperTime<Tug>().InSeconds);
        Assert.Equal(850, Mass.FromKilograms(850).ToUnitsNet().ToMass().InKilograms);
        Assert.Equal(1.5e9, Frequency.FromGigahertz(1.5).ToPlaneWave(default(Direction<Harbour>)).ToFrequency().Hertz);
    }

    [Fact]
    public void A_speed_beyond_that_of_light_is_refused()
        => Assert.Throws<ArgumentOutOfRangeException>(() => (Speed.FromKilometersPerSecond(3e5), Speed.Zero, Speed.Zero).ToVelocity<Harbour>());
}
