namespace FrameSafe;

/// <summary>A trip from rest to rest: accelerating, coasting for some way or none, braking.</summary>
/// <typeparam name="THome">The inertial frame in which it starts and ends at rest.</typeparam>
/// <typeparam name="TShip">The ship's clock.</typeparam>
/// <remarks>
/// Two hyperbolic motions and a straight line between them (<see cref="AcceleratedMotion{THome, TShip}"/>). The mass ratio is that of the
/// ideal photon rocket, e^η for each change of the rapidity by η (W. Rindler, Relativity, 2nd ed., section 6.4, exercise); none flies better.
/// </remarks>
public readonly struct Trip<THome, TShip>
    where THome : struct, IFrame
    where TShip : struct, IClock
{
    private readonly double _acceleration;
    private readonly Extended _coastTime;
    private readonly Extended _coastAhead;
    private readonly Extended _coastDistance;

    private Trip(double acceleration, AcceleratedMotion<THome, TShip> peak, Extended coastDistance)
    {
        _acceleration = acceleration;
        Peak = peak;
        _coastDistance = coastDistance;
        if (coastDistance.High > 0)
        {
            // t = d/v = dγ/(cw), and t − τ = t(γ − 1)/γ = d·w/(c(1 + γ)).
            Extended w = peak.Velocity.XCelerityRatio;
            Extended lorentz = Extended.Sqrt((w * w) + 1);
            Extended light = coastDistance / PhysicsOfLight.Speed;
            _coastTime = light * lorentz / w;
            _coastAhead = light * w / (lorentz + 1);
        }
    }

    /// <summary>The end of the first acceleration: the largest velocity, when and where it is reached.</summary>
    public AcceleratedMotion<THome, TShip> Peak { get; }

    /// <summary>What the ship's clock shows at the end.</summary>
    public ProperTime<TShip> ShipTime => new(((Peak.ExtendedProperTime * 2) + _coastTime - _coastAhead).High);

    /// <summary>What home's clocks show at the end.</summary>
    public CoordinateTime<THome> HomeTime => new(((Peak.ExtendedTime * 2) + _coastTime).High);

    /// <summary>What home's clocks are ahead by at the end, without the cancellation of the two times.</summary>
    [Unit("s")]
    [Kind(QuantityKind.ClockOffset)]
    public double HomeAheadInSeconds => ((Peak.ExtendedAhead * 2) + _coastAhead).High;

    /// <summary>The time at home while the ship coasts.</summary>
    public CoordinateTime<THome> CoastHomeTime => new(_coastTime.High);

    /// <summary>The ship's time while it coasts.</summary>
    public ProperTime<TShip> CoastShipTime => new((_coastTime - _coastAhead).High);

    /// <summary>The way that the ship coasts.</summary>
    [Unit("m")]
    [InFrame(nameof(THome))]
    public double CoastDistanceInMetres => _coastDistance.High;

    /// <summary>The rapidity to bring up and to take away again.</summary>
    [Kind(QuantityKind.Rapidity)]
    public double RapidityBudget => 2 * Peak.Rapidity;

    /// <summary>Mass at the start by mass at the end of an ideal photon rocket.</summary>
    [Unit("1")]
    public double IdealMassRatio => Math.Exp(RapidityBudget);

    /// <summary>What ship and home show after the trip and the same trip back: twice the time of either.</summary>
    public (ProperTime<TShip> Ship, CoordinateTime<THome> Home) ThereAndBack => (ShipTime * 2, HomeTime * 2);

    /// <summary>Where the ship is at a time of home; at home before the start, at its goal after the end.</summary>
    public Displacement<THome> PlaceAt(CoordinateTime<THome> time)
    {
        CoordinateTime<THome> left = HomeTime - time;
        Displacement<THome> way = Peak.Distance * 2 + Displacement<THome>.FromMetres(CoastDistanceInMetres);
        if (time.InSeconds <= 0)
            return default;
        if (left.InSeconds <= 0)
            return way;
        if (time <= Peak.Time)
            return AcceleratedMotion<THome, TShip>.AfterTime(_acceleration, time).Distance;
        if (left <= Peak.Time)
            return way - AcceleratedMotion<THome, TShip>.AfterTime(_acceleration, left).Distance;
        return Peak.Distance + Displacement<THome>.FromMetres(Peak.Velocity.XInMetresPerSecond * (time - Peak.Time).InSeconds);
    }

    /// <summary>What the ship's clock shows at a time of home; it goes on at its goal.</summary>
    public ProperTime<TShip> ShipTimeAt(CoordinateTime<THome> time)
    {
        CoordinateTime<THome> left = HomeTime - time;
        if (time.InSeconds <= 0)
            return new(time.InSeconds);
        if (left.InSeconds <= 0)
            return ShipTime - new ProperTime<TShip>(left.InSeconds);
        if (time <= Peak.Time)
            return AcceleratedMotion<THome, TShip>.AfterTime(_acceleration, time).ProperTime;
        if (left <= Peak.Time)
            return ShipTime - AcceleratedMotion<THome, TShip>.AfterTime(_acceleration, left).ProperTime;
        return Peak.ProperTime + new ProperTime<TShip>((time - Peak.Time).InSeconds / Peak.Velocity.LorentzFactor);
    }

    /// <summary>The time of home at which the ship's clock shows a reading.</summary>
    public CoordinateTime<THome> HomeTimeAt(ProperTime<TShip> reading)
    {
        ProperTime<TShip> left = ShipTime - reading;
        if (reading.InSeconds <= 0)
            return new(reading.InSeconds);
        if (left.InSeconds <= 0)
            return HomeTime - new CoordinateTime<THome>(left.InSeconds);
        if (reading <= Peak.ProperTime)
            return AcceleratedMotion<THome, TShip>.AfterProperTime(_acceleration, reading).Time;
        if (left <= Peak.ProperTime)
            return HomeTime - AcceleratedMotion<THome, TShip>.AfterProperTime(_acceleration, left).Time;
        return Peak.Time + new CoordinateTime<THome>((reading - Peak.ProperTime).InSeconds * Peak.Velocity.LorentzFactor);
    }

    /// <summary>When a signal that home sends reaches the ship, by home's clocks and by the ship's.</summary>
    /// <param name="sent">When home sends it.</param>
    public (CoordinateTime<THome> HomeTime, ProperTime<TShip> ShipTime) SignalFromHome(CoordinateTime<THome> sent)
    {
        SpacetimeEvent<THome> received = LightTime.Reception(SpacetimeEvent<THome>.At(sent, default), PlaceAt);
        return (received.Time, ShipTimeAt(received.Time));
    }

    /// <summary>When a signal that the ship sends was sent by home's clocks, and when home receives it.</summary>
    /// <param name="sent">When the ship sends it, by its own clock.</param>
    public (CoordinateTime<THome> Sent, CoordinateTime<THome> Received) SignalFromShip(ProperTime<TShip> sent)
    {
        CoordinateTime<THome> time = HomeTimeAt(sent);
        return (time, time + new CoordinateTime<THome>(PlaceAt(time).LengthInMetres / PhysicsOfLight.Speed));
    }

    /// <summary>Accelerating half the way and braking the other half.</summary>
    /// <param name="acceleration">The proper acceleration; above 0.</param>
    /// <param name="metres">The distance as home measures it; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static Trip<THome, TShip> Flip(
        [Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration, [Unit("m"), InFrame(nameof(THome))] double metres)
        => new(acceleration, AcceleratedMotion<THome, TShip>.AtDistance(acceleration, Require.Positive(metres) / 2), 0);

    /// <summary>Accelerating to a celerity, coasting, braking.</summary>
    /// <param name="acceleration">The proper acceleration; above 0.</param>
    /// <param name="metres">The distance as home measures it; long enough to reach the celerity and to brake from it.</param>
    /// <param name="cruiseCelerityRatio">The celerity to coast at, as a multiple of c; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range, or the distance too short.</exception>
    public static Trip<THome, TShip> Coast(
        [Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration,
        [Unit("m"), InFrame(nameof(THome))] double metres,
        [Kind(QuantityKind.CelerityRatio), InFrame(nameof(THome))] double cruiseCelerityRatio)
    {
        Require.Positive(cruiseCelerityRatio);
        AcceleratedMotion<THome, TShip> peak = AcceleratedMotion<THome, TShip>.AtCelerityRatio(acceleration, cruiseCelerityRatio);
        Extended left = (Extended)Require.Positive(metres) - (peak.ExtendedDistance * 2);
        return left.High >= 0
            ? new(acceleration, peak, left)
            : throw Require.Outside(
                metres, nameof(metres), FormattableString.Invariant($"at least {(peak.ExtendedDistance * 2).High:R}, the way to reach that celerity and to brake from it"));
    }

    /// <summary>Accelerating so that the whole trip takes a time on the ship's clock, half of it each way.</summary>
    /// <param name="acceleration">The proper acceleration; above 0.</param>
    /// <param name="time">The ship's time; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static Trip<THome, TShip> FlipInShipTime(
        [Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration, ProperTime<TShip> time)
    {
        Require.Positive(time.InSeconds, nameof(time));
        return new(acceleration, AcceleratedMotion<THome, TShip>.AfterProperTime(acceleration, time / 2), 0);
    }

    /// <summary>Accelerating so that the whole trip takes a time at home, half of it each way.</summary>
    /// <param name="acceleration">The proper acceleration; above 0.</param>
    /// <param name="time">The time at home; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static Trip<THome, TShip> FlipInHomeTime(
        [Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration, CoordinateTime<THome> time)
    {
        Require.Positive(time.InSeconds, nameof(time));
        return new(acceleration, AcceleratedMotion<THome, TShip>.AfterTime(acceleration, time / 2), 0);
    }

    /// <summary>Over a distance with a largest speed on the way, reached in the middle: a = 2c²(γ − 1)/d.</summary>
    /// <param name="metres">The distance as home measures it; above 0.</param>
    /// <param name="peakSpeedRatio">The largest speed as a fraction of c; above 0 and below 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static Trip<THome, TShip> FlipWithPeak(
        [Unit("m"), InFrame(nameof(THome))] double metres, [Kind(QuantityKind.SpeedRatio), InFrame(nameof(THome))] double peakSpeedRatio)
    {
        Require.Positive(metres);
        if (!(peakSpeedRatio is > 0 and < 1))
            throw Require.Outside(peakSpeedRatio, nameof(peakSpeedRatio), "above 0 and below 1, the speed of light");
        double excess = Celerity.LorentzFactorMinusOne(Celerity.FromSpeedRatio(peakSpeedRatio));
        return Flip(2 * PhysicsOfLight.Speed * PhysicsOfLight.Speed * excess / metres, metres);
    }

    /// <summary>Over a distance in a time at home: tanh(η/2) = d/cT, a = 2c·sinh η/T.</summary>
    /// <param name="metres">The distance as home measures it; above 0.</param>
    /// <param name="time">The time at home; longer than light takes.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range, or light itself takes longer.</exception>
    public static Trip<THome, TShip> FlipOver([Unit("m"), InFrame(nameof(THome))] double metres, CoordinateTime<THome> time)
    {
        double light = Require.Positive(metres) / PhysicsOfLight.Speed;
        if (!(time.InSeconds > light))
            throw Require.Outside(time.InSeconds, nameof(time), FormattableString.Invariant($"longer than light takes over that distance, {light:R} s"));
        double rapidity = 2 * Math.Atanh(light / time.InSeconds);
        return Flip(2 * PhysicsOfLight.Speed * Math.Sinh(rapidity) / time.InSeconds, metres);
    }

    /// <summary>Over a distance in a time on the ship's clock: (cosh η − 1)/η = d/cT, a = 2cη/T.</summary>
    /// <param name="metres">The distance as home measures it; above 0.</param>
    /// <param name="time">The ship's time; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static Trip<THome, TShip> FlipOver([Unit("m"), InFrame(nameof(THome))] double metres, ProperTime<TShip> time)
    {
        double wanted = Require.Positive(metres) / PhysicsOfLight.Speed / Require.Positive(time.InSeconds, nameof(time));
        double rapidity = Solve(
            static eta =>
            {
                double half = Math.Sinh(eta / 2);
                return 2 * half * half / eta;
            },
            wanted);
        return Flip(2 * PhysicsOfLight.Speed * rapidity / time.InSeconds, metres);
    }

    /// <summary>In a time at home and a time on the ship's clock: sinh η/η = T/τ, a = 2cη/τ.</summary>
    /// <param name="home">The time at home.</param>
    /// <param name="ship">The ship's time; above 0 and shorter.</param>
    /// <exception cref="ArgumentOutOfRangeException">The ship's time is not the shorter one.</exception>
    [FrameBoundary]
    public static Trip<THome, TShip> FlipIn(CoordinateTime<THome> home, ProperTime<TShip> ship)
    {
        Require.Positive(ship.InSeconds, nameof(ship));
        if (!(home.InSeconds > ship.InSeconds))
            throw Require.Outside(home.InSeconds, nameof(home), FormattableString.Invariant($"longer than the ship's time, {ship.InSeconds:R} s"));
        // sinh η/η − 1 grows from 0; the wanted excess is taken before the division rounds it away.
        double rapidity = Solve(
            static eta => (Extended.SinhMinusArgument(eta) / eta).High,
            (home.InSeconds - ship.InSeconds) / ship.InSeconds);
        return FlipInShipTime(2 * PhysicsOfLight.Speed * rapidity / ship.InSeconds, ship);
    }

    // The rapidity at which a growing function has a value, by halving to the last digit.
    private static double Solve(Func<double, double> growing, double value)
    {
        double low = 0;
        double high = HyperbolicMotion.LargestRapidity;
        if (!(growing(high) > value))
            throw Require.Outside(value, nameof(value), FormattableString.Invariant($"such that the rapidity stays below {high:R}"));
        while (true)
        {
            double middle = low + ((high - low) / 2);
            if (middle <= low || middle >= high)
                return high;
            if (growing(middle) < value)
                low = middle;
            else
                high = middle;
        }
    }
}
