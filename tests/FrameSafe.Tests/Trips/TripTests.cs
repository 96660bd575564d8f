namespace FrameSafe.Tests.Trips;

/// <summary>A trip given by any two of its numbers is the same trip; its course is continuous; signals take light's time.</summary>
public sealed class TripTests
{
    private const double C = 299_792_458.0;
    private static readonly Trip<Harbour, Tug> Known = Trip<Harbour, Tug>.Flip(9.80665, 4e16);
    private static readonly Trip<Harbour, Tug> Coasting = Trip<Harbour, Tug>.Coast(9.80665, 4e16, 2);

    public static TheoryData<string> Ways => ["ship", "home", "peak", "distance and home", "distance and ship", "home and ship"];

    [Theory]
    [MemberData(nameof(Ways))]
    public void Any_two_of_its_numbers_give_the_same_trip(string way)
    {
        Trip<Harbour, Tug> same = way switch
        {
            "ship" => Trip<Harbour, Tug>.FlipInShipTime(9.80665, Known.ShipTime),
            "home" => Trip<Harbour, Tug>.FlipInHomeTime(9.80665, Known.HomeTime),
            "peak" => Trip<Harbour, Tug>.FlipWithPeak(4e16, Known.Peak.Velocity.SpeedRatio),
            "distance and home" => Trip<Harbour, Tug>.FlipOver(4e16, Known.HomeTime),
            "distance and ship" => Trip<Harbour, Tug>.FlipOver(4e16, Known.ShipTime),
            _ => Trip<Harbour, Tug>.FlipIn(Known.HomeTime, Known.ShipTime),
        };

        Assert.Equal(1, same.ShipTime / Known.ShipTime, 1e-13);
        Assert.Equal(1, same.HomeTime / Known.HomeTime, 1e-13);
        Assert.Equal(1, same.Peak.Distance.XInMetres / 2e16, 1e-13);
        Assert.Equal(1, same.Peak.Velocity.CelerityRatio / Known.Peak.Velocity.CelerityRatio, 1e-13);
    }

    [Fact]
    public void A_slow_trip_is_newtons()
    {
        // d = at²/4 there and braking: 1 km at 1 m/s² takes 63.2 s.
        Trip<Harbour, Tug> slow = Trip<Harbour, Tug>.Flip(1, 1000);
        Assert.Equal(2 * Math.Sqrt(1000), slow.HomeTime.InSeconds, 1e-11);
        Assert.Equal(2 * Math.Sqrt(1000), slow.ShipTime.InSeconds, 1e-11);
        // t − τ is the integral of v²/2c²: a²T³/24c² to leading order.
        Assert.Equal(Math.Pow(slow.HomeTime.InSeconds, 3) / 24 / C / C, slow.HomeAheadInSeconds, 1e-12 * slow.HomeAheadInSeconds);
    }

    [Fact]
    public void The_course_is_continuous_and_its_clock_goes_both_ways()
    {
        double end = Coasting.HomeTime.InSeconds;
        double last = 0;
        for (int i = 0; i <= 400; i++)
        {
            CoordinateTime<Harbour> time = CoordinateTime<Harbour>.FromSeconds(end * i / 400);
            double place = Coasting.PlaceAt(time).XInMetres;
            Assert.InRange(place - last, 0, C * end / 400);
            last = place;
            Assert.Equal(time.InSeconds, Coasting.HomeTimeAt(Coasting.ShipTimeAt(time)).InSeconds, 1e-12 * end);
        }

        Assert.Equal(4e16, last, 1e2);
        Assert.Equal(Coasting.ShipTime.InSeconds, Coasting.ShipTimeAt(Coasting.HomeTime).InSeconds, 1e-6);
        Assert.Equal(2 * Coasting.ShipTime.InSeconds, Coasting.ThereAndBack.Ship.InSeconds);
    }

    [Fact]
    public void Signals_take_lights_time()
    {
        (CoordinateTime<Harbour> received, ProperTime<Tug> aboard) = Coasting.SignalFromHome(CoordinateTime<Harbour>.FromSeconds(3e7));
        Assert.Equal(Coasting.PlaceAt(received).XInMetres / C, received.InSeconds - 3e7, 1e-6);
        Assert.Equal(Coasting.ShipTimeAt(received), aboard);

        (CoordinateTime<Harbour> sent, CoordinateTime<Harbour> home) = Coasting.SignalFromShip(ProperTime<Tug>.FromSeconds(3e7));
        Assert.Equal(Coasting.PlaceAt(sent).XInMetres / C, (home - sent).InSeconds, 1e-6);
    }

    [Fact]
    public void What_cannot_be_is_refused_by_name()
    {
        Assert.Contains("longer than light takes", Assert.Throws<ArgumentOutOfRangeException>(
            () => Trip<Harbour, Tug>.FlipOver(3e8, CoordinateTime<Harbour>.FromSeconds(1))).Message);
        double light = 1;
        Assert.Contains("below 1, the speed of light", Assert.Throws<ArgumentOutOfRangeException>(() => Trip<Harbour, Tug>.FlipWithPeak(1, light)).Message);
        Assert.Contains("metres must be above 0", Assert.Throws<ArgumentOutOfRangeException>(() => Trip<Harbour, Tug>.Flip(9.8, -1)).Message);
        Assert.Contains("the way to reach that celerity", Assert.Throws<ArgumentOutOfRangeException>(() => Trip<Harbour, Tug>.Coast(9.8, 1e3, 1)).Message);
        Assert.Contains("longer than the ship's time", Assert.Throws<ArgumentOutOfRangeException>(
            () => Trip<Harbour, Tug>.FlipIn(CoordinateTime<Harbour>.FromSeconds(1), ProperTime<Tug>.FromSeconds(2))).Message);
    }
}
