namespace FrameSafe.Tests.Links;

/// <summary>Light time, link corrections, sampled worldlines and ensembles, against closed forms and published values.</summary>
public sealed class LinkTests
{
    private const double C = 299_792_458.0;

    [Theory]
    [InlineData(0.1)]
    [InlineData(0.9)]
    [InlineData(-0.9)]
    [InlineData(0.999)]
    public void Light_catches_a_body_in_uniform_motion_where_the_closed_form_says(double beta)
    {
        // x = d + βct meets ct at t = d/(c(1 − β)).
        SpacetimeEvent<Harbour> met = LightTime.Reception(
            default(SpacetimeEvent<Harbour>), time => Displacement<Harbour>.FromMetres(1e9 + (beta * C * time.InSeconds)));

        Assert.Equal(1e9 / C / (1 - beta), met.Time.InSeconds, 2e-15 / (1 - beta) * met.Time.InSeconds);
    }

    [Fact]
    public void A_body_is_seen_where_it_was()
    {
        SpacetimeEvent<Harbour> seen = LightTime.Emission(
            SpacetimeEvent<Harbour>.FromSecondsAndMetres(100, 0), time => Displacement<Harbour>.FromMetres(0.5 * C * time.InSeconds));

        // c(100 − t) = 0.5ct.
        Assert.Equal(200.0 / 3, seen.Time.InSeconds, 1e-11);
        Assert.Equal(C * 100 / 3, seen.Place.XInMetres, 1.0);
    }

    [Fact]
    public void Light_never_reaches_what_is_faster()
        => Assert.Throws<ArgumentException>(() => LightTime.Reception(
            default(SpacetimeEvent<Harbour>), time => Displacement<Harbour>.FromMetres(1e9 + (1.5 * C * time.InSeconds))));

    [Fact]
    public void Around_the_equator_the_sagnac_correction_is_207_nanoseconds()
    {
        // N. Ashby, Living Rev. Relativ. 6 (2003) 1, section 2 (from memory): 207.4 ns.
        Assert.Equal(207.4e-9, LinkCorrections.SagnacAroundCircleInSeconds(7.2921151467e-5, 6378137), 0.05e-9);

        // A quarter of the way by its chords is the same area but for the segments: the polygon of many sides comes to the circle.
        double sum = 0;
        for (int i = 0; i < 3600; i++)
        {
            (double a, double b) = (i * Math.PI / 1800, (i + 1) * Math.PI / 1800);
            sum += LinkCorrections.SagnacInSeconds(7.2921151467e-5, (6378137 * Math.Cos(a), 6378137 * Math.Sin(a)), (6378137 * Math.Cos(b), 6378137 * Math.Sin(b)));
        }

        Assert.Equal(207.4e-9, sum, 0.05e-9);
    }

    [Fact]
    public void An_eccentricity_of_a_hundredth_is_23_nanoseconds()
    {
        // N. Ashby, section 5 (from memory): 23 ns of amplitude for e = 0.01; IS-GPS-200: F = −4.442807633e-10 s/√m.
        Assert.Equal(23e-9, LinkCorrections.EccentricityInSeconds(3.986004418e14, 26561750, 0.01, Math.PI / 2), 0.5e-9);
        Assert.Equal(4.442807633e-10, LinkCorrections.EccentricityInSeconds(3.986005e14, 1, 0.01, Math.PI / 2) * 100, 5e-20);
    }

    [Fact]
    public void Both_forms_of_the_eccentricity_term_agree_along_an_orbit()
    {
        // Kepler's ellipse: r = a(cos E − e, √(1 − e²) sin E), v = √(GM/a)(−sin E, √(1 − e²) cos E)/(1 − e cos E).
        const double gm = 3.986004418e14;
        const double a = 26561750;
        const double e = 0.02;
        for (double anomaly = 0.1; anomaly < 6; anomaly += 0.7)
        {
            double speed = Math.Sqrt(gm / a) / (1 - (e * Math.Cos(anomaly)));
            double ratio = Math.Sqrt(1 - (e * e));
            Displacement<Harbour> place = Displacement<Harbour>.FromMetres(a * (Math.Cos(anomaly) - e), a * ratio * Math.Sin(anomaly));
            Velocity<Harbour> velocity = Velocity<Harbour>.FromMetresPerSecond(-speed * Math.Sin(anomaly), speed * ratio * Math.Cos(anomaly));

            Assert.Equal(
                LinkCorrections.EccentricityInSeconds(gm, a, e, anomaly),
                LinkCorrections.EccentricityInSeconds(place, velocity),
                1e-18);
        }
    }

    [Fact]
    public void Light_past_the_sun_is_late_by_some_hundred_and_twenty_microseconds_each_way()
    {
        // I. I. Shapiro, Phys. Rev. Lett. 13 (1964) 789: about 200 µs to Venus and back past the limb of the Sun (from memory).
        const double astronomicalUnit = 149597870700;
        double first = astronomicalUnit;
        double second = 0.723 * astronomicalUnit;
        double impact = 6.96e8;
        double between = Math.Sqrt((first * first) - (impact * impact)) + Math.Sqrt((second * second) - (impact * impact));

        Assert.InRange(2 * LinkCorrections.ShapiroInSeconds(1.32712442e20, first, second, between), 2.0e-4, 2.6e-4);
        Assert.Throws<ArgumentOutOfRangeException>(() => LinkCorrections.ShapiroInSeconds(1.32712442e20, 1, 1, 3));
    }

    [Fact]
    public void A_circle_by_samples_and_by_function_is_the_circle_in_closed_form()
    {
        CircularMotion<Harbour, Tug> circle = CircularMotion<Harbour, Tug>.Of(1e6, 200);
        double exact = circle.BehindInSeconds(CoordinateTime<Harbour>.FromSeconds(10));
        Velocity<Harbour> At(double t) => Velocity<Harbour>.FromMetresPerSecond(-2e8 * Math.Sin(200 * t), 2e8 * Math.Cos(200 * t));

        (double byFunction, double error) = SampledWorldline.Behind(
            default(CoordinateTime<Harbour>), CoordinateTime<Harbour>.FromSeconds(10), time => At(time.InSeconds));
        Assert.Equal(exact, byFunction, 1e-13 * exact);
        Assert.True(error <= 1e-13 * exact);

        double[] seconds = [.. Enumerable.Range(0, 101).Select(i => i / 10.0)];
        (double bySamples, _) = SampledWorldline.Behind<Harbour>(
            [.. seconds.Select(CoordinateTime<Harbour>.FromSeconds)], [.. seconds.Select(At)]);
        Assert.Equal(exact, bySamples, 1e-12 * exact);
    }

    [Fact]
    public void The_error_of_an_accelerated_way_is_as_estimated()
    {
        // x = (c²/a)(cosh(aτ/c) − 1): t − τ in closed form.
        AcceleratedMotion<Harbour, Tug> ship = AcceleratedMotion<Harbour, Tug>.AfterTime(9.81, CoordinateTime<Harbour>.FromSeconds(3e7));
        Velocity<Harbour> At(double t) => AcceleratedMotion<Harbour, Tug>.AfterTime(9.81, CoordinateTime<Harbour>.FromSeconds(t)).Velocity;
        double[] seconds = [.. Enumerable.Range(0, 201).Select(i => i * 1.5e5)];

        (double bySamples, double error) = SampledWorldline.Behind<Harbour>(
            [.. seconds.Select(CoordinateTime<Harbour>.FromSeconds)], [.. seconds.Select(At)]);

        double missed = Math.Abs(bySamples - ship.TimeMinusProperTimeInSeconds);
        Assert.InRange(missed, error / 2, error * 2);
        (double byFunction, _) = SampledWorldline.Behind(
            default(CoordinateTime<Harbour>), CoordinateTime<Harbour>.FromSeconds(3e7), time => At(time.InSeconds));
        Assert.Equal(ship.TimeMinusProperTimeInSeconds, byFunction, 1e-12 * byFunction);
    }

    [Fact]
    public void Samples_out_of_order_are_named()
    {
        CoordinateTime<Harbour>[] times = [CoordinateTime<Harbour>.FromSeconds(1), CoordinateTime<Harbour>.FromSeconds(0)];
        var refused = Assert.Throws<ArgumentOutOfRangeException>(() => SampledWorldline.Behind<Harbour>(times, new Velocity<Harbour>[2]));

        Assert.Contains("times[1] must be after the one before it (1 s)", refused.Message);
    }

    [Fact]
    public void Any_clock_of_an_ensemble_is_rated_by_any_other()
    {
        SchwarzschildField earth = SchwarzschildField.Earth;
        ClockEnsemble ensemble = new ClockEnsemble()
            .Add(earth.StaticClock<Harbour>(6378137))
            .Add(earth.OrbitingClock<Tug>(26561750))
            .Add(earth.StaticClock<Drone>(6378137, 1000));

        Assert.Equal(
            earth.OrbitingClock<Tug>(26561750).Against(earth.StaticClock<Harbour>(6378137)).MinusOne,
            ensemble.Rate<Tug, Harbour>().MinusOne);
        double[,] gains = ensemble.GainsInSeconds(86400);
        Assert.Equal(["Drone", "Harbour", "Tug"], ensemble.Clocks.Select(clock => clock.Name));
        // gh/c² a kilometre up: 1.09e-13, 9.4 ns a day.
        Assert.Equal(9.4e-9, gains[0, 1], 0.05e-9);
        Assert.Equal(0, gains[2, 2]);
    }

    [Fact]
    public void Which_of_two_events_is_first_depends_on_the_frame()
    {
        SpacetimeEvent<Harbour> near = SpacetimeEvent<Harbour>.FromSecondsAndMetres(0, 0);
        SpacetimeEvent<Harbour> far = SpacetimeEvent<Harbour>.FromSecondsAndMetres(0, C);
        Boost<Harbour, Tug> outward = Boost<Harbour, Tug>.Into(Velocity<Harbour>.FromSpeedRatio(0.6));

        // γ(Δt − vΔx/c²) = −1.25 · 0.6 s.
        Assert.Equal(-0.75, outward.DelayBetween(near, far).InSeconds, 1e-15);
        Assert.Equal(0.75, Boost<Harbour, Tug>.Into(Velocity<Harbour>.FromSpeedRatio(-0.6)).DelayBetween(near, far).InSeconds, 1e-15);
    }
}
