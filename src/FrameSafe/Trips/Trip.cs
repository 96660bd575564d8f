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
    private readonly Extended _coastTime;
    private readonly Extended _coastAhead;
    private readonly Extended _coastDistance;

    private Trip(AcceleratedMotion<THome, TShip> peak, Extended coastDistance)
    {
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

    /// <summary>Accelerating half the way and braking the other half.</summary>
    /// <param name="acceleration">The proper acceleration; above 0.</param>
    /// <param name="metres">The distance as home measures it; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static Trip<THome, TShip> Flip(
        [Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration, [Unit("m"), InFrame(nameof(THome))] double metres)
        => new(AcceleratedMotion<THome, TShip>.AtDistance(acceleration, Require.Positive(metres) / 2), 0);

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
            ? new(peak, left)
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
        return new(AcceleratedMotion<THome, TShip>.AfterProperTime(acceleration, time / 2), 0);
    }

    /// <summary>Accelerating so that the whole trip takes a time at home, half of it each way.</summary>
    /// <param name="acceleration">The proper acceleration; above 0.</param>
    /// <param name="time">The time at home; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static Trip<THome, TShip> FlipInHomeTime(
        [Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration, CoordinateTime<THome> time)
    {
        Require.Positive(time.InSeconds, nameof(time));
        return new(AcceleratedMotion<THome, TShip>.AfterTime(acceleration, time / 2), 0);
    }
}
