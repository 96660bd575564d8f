using CsCheck;

namespace FrameSafe.Tests.Motion;

/// <summary>What holds of boosts whatever the numbers: there and back, invariants, composition, small speeds.</summary>
public sealed class BoostTests
{
    // Celerity ratios over the whole range of sizes, in any direction.
    private static readonly Gen<(double X, double Y, double Z)> Celerities =
        from size in Gen.Double[-150, 150]
        from theta in Gen.Double[0, Math.PI]
        from phi in Gen.Double[0, 2 * Math.PI]
        let w = Math.Pow(10, size) / 2
        select (w * Math.Sin(theta) * Math.Cos(phi), w * Math.Sin(theta) * Math.Sin(phi), w * Math.Cos(theta));

    private static readonly Gen<(double X, double Y, double Z)> Moderate =
        from size in Gen.Double[-8, 2]
        from theta in Gen.Double[0, Math.PI]
        from phi in Gen.Double[0, 2 * Math.PI]
        let w = Math.Pow(10, size)
        select (w * Math.Sin(theta) * Math.Cos(phi), w * Math.Sin(theta) * Math.Sin(phi), w * Math.Cos(theta));

    [Fact]
    public void The_target_frame_rests_in_itself()
        => Celerities.Sample(w =>
        {
            Velocity<Harbour> velocity = Velocity<Harbour>.FromCelerityRatio(w.X, w.Y, w.Z);
            Velocity<Tug> own = Boost<Harbour, Tug>.Into(velocity).Map(velocity);
            Assert.Equal(0, own.SpeedRatio, 1e-15 * velocity.LorentzFactor);
        });

    [Fact]
    public void A_velocity_comes_back_as_it_was()
        => Gen.Select(Moderate, Moderate).Sample((w, u) =>
        {
            Boost<Harbour, Tug> boost = Boost<Harbour, Tug>.Into(Velocity<Harbour>.FromCelerityRatio(w.X, w.Y, w.Z));
            Velocity<Harbour> velocity = Velocity<Harbour>.FromCelerityRatio(u.X, u.Y, u.Z);
            Velocity<Harbour> back = boost.Inverse.Map(boost.Map(velocity));

            // The way through the other frame loses what its own rounding is, seen from here: γ of both.
            double bound = 1e-14 * boost.LorentzFactor.Value * boost.LorentzFactor.Value * velocity.LorentzFactor * velocity.LorentzFactor;
            Assert.Equal(velocity.XCelerityRatio, back.XCelerityRatio, bound);
            Assert.Equal(velocity.YCelerityRatio, back.YCelerityRatio, bound);
            Assert.Equal(velocity.ZCelerityRatio, back.ZCelerityRatio, bound);
        });

    [Fact]
    public void Relative_speed_is_the_same_from_either_side()
        => Gen.Select(Moderate, Moderate).Sample((a, b) =>
        {
            Velocity<Harbour> one = Velocity<Harbour>.FromCelerityRatio(a.X, a.Y, a.Z);
            Velocity<Harbour> other = Velocity<Harbour>.FromCelerityRatio(b.X, b.Y, b.Z);
            double there = Boost<Harbour, Tug>.Into(one).Map(other).LorentzFactor;
            double back = Boost<Harbour, Drone>.Into(other).Map(one).LorentzFactor;
            Assert.Equal(1, there / back, 1e-9);
        });

    [Fact]
    public void The_interval_is_invariant()
        => Gen.Select(Moderate, Gen.Double[-1e3, 1e3], Gen.Double[-1e11, 1e11], Gen.Double[-1e11, 1e11]).Sample((w, t, x, y) =>
        {
            Boost<Harbour, Tug> boost = Boost<Harbour, Tug>.Into(Velocity<Harbour>.FromCelerityRatio(w.X, w.Y, w.Z));
            SpacetimeInterval<Harbour> interval = SpacetimeEvent<Harbour>.FromSecondsAndMetres(t, x, y) - default(SpacetimeEvent<Harbour>);
            double size = (9e16 * t * t) + (x * x) + (y * y);
            double gamma = boost.LorentzFactor.Value;
            Assert.Equal(interval.SquareInSquareMetres, boost.Map(interval).SquareInSquareMetres, 1e-14 * gamma * gamma * size);
        });

    [Fact]
    public void Two_boosts_in_a_row_are_their_transform()
        => Gen.Select(Moderate, Moderate).Sample((a, b) =>
        {
            Boost<Harbour, Tug> first = Boost<Harbour, Tug>.Into(Velocity<Harbour>.FromCelerityRatio(a.X, a.Y, a.Z));
            Boost<Tug, Drone> second = Boost<Tug, Drone>.Into(Velocity<Tug>.FromCelerityRatio(b.X, b.Y, b.Z));
            SpacetimeEvent<Harbour> @event = SpacetimeEvent<Harbour>.FromSecondsAndMetres(1, 2e8, -1e8, 5e7);

            SpacetimeEvent<Drone> stepwise = second.Map(first.Map(@event));
            LorentzTransform<Harbour, Drone> whole = first.Then(second);
            SpacetimeEvent<Drone> atOnce = whole.Map(@event);

            double scale = 1e-13 * first.LorentzFactor.Value * second.LorentzFactor.Value * 4e8;
            Assert.Equal(stepwise.Time.InSeconds * 3e8, atOnce.Time.InSeconds * 3e8, scale);
            Assert.Equal(stepwise.Place.XInMetres, atOnce.Place.XInMetres, scale);
            Assert.Equal(stepwise.Place.YInMetres, atOnce.Place.YInMetres, scale);
            Assert.Equal(stepwise.Place.ZInMetres, atOnce.Place.ZInMetres, scale);

            SpacetimeEvent<Harbour> back = whole.Inverse.Map(atOnce);
            Assert.Equal(2e8, back.Place.XInMetres, scale * first.LorentzFactor.Value * second.LorentzFactor.Value);
        });

    [Fact]
    public void Rapidities_of_one_line_add()
    {
        Gen.Select(Gen.Double[-150, 150], Gen.Double[-150, 150]).Sample((a, b) =>
        {
            Rapidity<Harbour, Drone> sum = Rapidity<Harbour, Tug>.FromValue(a) + Rapidity<Tug, Drone>.FromValue(b);
            Assert.Equal(a + b, sum.Value);
            Assert.Equal(sum, Rapidity<Harbour, Tug>.FromValue(a).Then(Rapidity<Tug, Drone>.FromValue(b)));
        });
        Gen.Select(Gen.Double[-10, 10], Gen.Double[-10, 10]).Sample((a, b) =>
        {
            Velocity<Harbour> tug = Velocity<Harbour>.FromRapidity(a);
            Velocity<Harbour> drone = Boost<Harbour, Tug>.Into(tug).Inverse.Map(Velocity<Tug>.FromRapidity(b));
            Assert.Equal(a + b, Rapidity<Harbour, Drone>.Of(drone).Value, 1e-13 * (1 + Math.Abs(a) + Math.Abs(b)));
        });
    }

    [Fact]
    public void Slow_velocities_add_as_they_always_did()
    {
        Velocity<Harbour> sum = Boost<Harbour, Tug>.Into(Velocity<Harbour>.FromMetresPerSecond(30)).Inverse.Map(Velocity<Tug>.FromMetresPerSecond(0, 40));

        Assert.Equal(30, sum.XInMetresPerSecond, 1e-12);
        Assert.Equal(40, sum.YInMetresPerSecond, 1e-12);
    }

    [Fact]
    public void Times_go_through_the_lorentz_factor_both_ways()
        => Gen.Select(Gen.Double[0, 1e3], Gen.Double[-1e6, 1e6]).Sample((excess, seconds) =>
        {
            var gamma = LorentzFactor<Harbour, Tug>.FromMinusOne(excess);
            ProperTime<Tug> reading = ProperTime<Tug>.FromSeconds(seconds);
            Assert.Equal(seconds, (reading * gamma / gamma).InSeconds, Math.Abs(seconds) * 1e-15);
        });

    [Theory]
    [InlineData(299_792_458.0, "below the speed of light")]
    [InlineData(double.NaN, "below the speed of light")]
    [InlineData(double.PositiveInfinity, "below the speed of light")]
    [InlineData(-3e8, "below the speed of light")]
    public void Nothing_goes_as_fast_as_light(double speed, string message)
    {
        var refused = Assert.Throws<ArgumentOutOfRangeException>(() => Velocity<Harbour>.FromMetresPerSecond(speed));

        Assert.Equal("x", refused.ParamName);
        Assert.Contains(message, refused.Message);
    }

    [Theory]
    [InlineData(42)]
    public void A_percentage_is_refused_with_a_hint(double percentage)
        => Assert.Contains("a percentage", Assert.Throws<ArgumentOutOfRangeException>(() => Velocity<Harbour>.FromSpeedRatio(percentage)).Message);

    [Fact]
    public void The_default_of_everything_is_a_valid_zero()
    {
        Assert.Equal(0, default(Velocity<Harbour>).SpeedRatio);
        Assert.Equal(1, default(LorentzFactor<Harbour, Tug>).Value);
        Assert.Equal(Velocity<Tug>.FromMetresPerSecond(5), default(Boost<Harbour, Tug>).Map(Velocity<Harbour>.FromMetresPerSecond(5)));
        Assert.Equal(1, default(Direction<Harbour>).X);
        Assert.Equal(0, default(LorentzTransform<Harbour, Tug>).RotationAngle);
        Assert.Equal(1, default(FieldClock<Tug>).Rate.Rate);
    }

    [Fact]
    public void Quantities_are_written_with_unit_and_frame()
    {
        Assert.Equal("2.5 s in Harbour", CoordinateTime<Harbour>.FromSeconds(2.5).ToString());
        Assert.Equal("2.5 s by Tug", ProperTime<Tug>.FromSeconds(2.5).ToString());
        Assert.Equal("(1, 2, 3) m in Harbour", Displacement<Harbour>.FromMetres(1, 2, 3).ToString());
        Assert.Equal("(1,0; 2,0; 3,0) m in Harbour", Displacement<Harbour>.FromMetres(1, 2, 3).ToString("F1", System.Globalization.CultureInfo.GetCultureInfo("de-DE")));
    }
}
