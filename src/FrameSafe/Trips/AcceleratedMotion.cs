namespace FrameSafe;

/// <summary>A point of the motion of a ship that starts from rest and keeps its proper acceleration.</summary>
/// <typeparam name="THome">The inertial frame that it starts from, at its origin.</typeparam>
/// <typeparam name="TShip">The ship's clock.</typeparam>
/// <remarks>
/// at/c = sinh η, ax/c² = cosh η − 1, aτ/c = η with the rapidity η (W. Rindler, Relativity, 2nd ed., section 3.7). Given any one of them
/// the others follow within 4 ulp, from 1e-12 of c to rapidities of 346.
/// </remarks>
public readonly struct AcceleratedMotion<THome, TShip>
    where THome : struct, IFrame
    where TShip : struct, IClock
{
    private readonly Extended _unit;
    private readonly HyperbolicMotion _motion;

    private AcceleratedMotion(double acceleration, HyperbolicMotion motion)
    {
        // c/a, the unit of time.
        _unit = (Extended)PhysicsOfLight.Speed / acceleration;
        _motion = motion;
    }

    /// <summary>The ship's own time since the start.</summary>
    public ProperTime<TShip> ProperTime => new((_motion.Rapidity * _unit).High);

    /// <summary>The time at home since the start.</summary>
    public CoordinateTime<THome> Time => new((_motion.Celerity * _unit).High);

    /// <summary>The distance from home, as home measures it.</summary>
    public Displacement<THome> Distance => new(new((_motion.LorentzMinusOne * _unit * PhysicsOfLight.Speed).High, 0, 0));

    /// <summary>The velocity as home measures it.</summary>
    public Velocity<THome> Velocity => new(new(_motion.Celerity.High, 0, 0));

    /// <summary>γ − 1.</summary>
    [Unit("1")]
    public double LorentzFactorMinusOne => _motion.LorentzMinusOne.High;

    /// <summary>The rapidity reached: what a rocket has to bring up.</summary>
    [Kind(QuantityKind.Rapidity)]
    public double Rapidity => _motion.Rapidity.High;

    /// <summary>What home's clocks are ahead by, without the cancellation of the two times.</summary>
    [Unit("s")]
    [Kind(QuantityKind.ClockOffset)]
    public double TimeMinusProperTimeInSeconds => (_motion.TimeMinusProperTime * _unit).High;

    /// <summary>The distance beyond ½at² of the time at home; negative: −(c²/2a)(γ − 1)².</summary>
    [Unit("m")]
    public double DistanceBeyondNewtonianInMetres
        => (_motion.LorentzMinusOne * _motion.LorentzMinusOne * _unit * (-0.5 * PhysicsOfLight.Speed)).High;

    /// <summary>After a time on the ship's clock.</summary>
    /// <param name="acceleration">The proper acceleration; above 0.</param>
    /// <param name="time">From 0 on, so short that the rapidity stays below 346.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static AcceleratedMotion<THome, TShip> AfterProperTime(
        [Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration, ProperTime<TShip> time)
    {
        Extended rapidity = Extended.Product(Require.Positive(acceleration), Require.NotNegative(time.InSeconds, nameof(time))) / PhysicsOfLight.Speed;
        return rapidity.High <= HyperbolicMotion.LargestRapidity
            ? new(acceleration, HyperbolicMotion.AtRapidity(rapidity))
            : throw Require.Outside(time.InSeconds, nameof(time), FormattableString.Invariant($"so short that aτ/c is at most {HyperbolicMotion.LargestRapidity:R}"));
    }

    /// <summary>After a time at home.</summary>
    /// <param name="acceleration">The proper acceleration; above 0.</param>
    /// <param name="time">From 0 on.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static AcceleratedMotion<THome, TShip> AfterTime(
        [Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration, CoordinateTime<THome> time)
        => new(acceleration, HyperbolicMotion.AtCelerity(
            Extended.Product(Require.Positive(acceleration), Require.NotNegative(time.InSeconds, nameof(time))) / PhysicsOfLight.Speed));

    /// <summary>At a distance from home.</summary>
    /// <param name="acceleration">The proper acceleration; above 0.</param>
    /// <param name="metres">From 0 on.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static AcceleratedMotion<THome, TShip> AtDistance(
        [Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration, [Unit("m"), InFrame(nameof(THome))] double metres)
        => new(acceleration, HyperbolicMotion.AtLorentzMinusOne(
            Extended.Product(Require.Positive(acceleration), Require.NotNegative(metres)) / Extended.SpeedOfLightSquared));

    /// <summary>When a fraction of c is reached.</summary>
    /// <param name="acceleration">The proper acceleration; above 0.</param>
    /// <param name="ratio">From 0 up to but not including 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static AcceleratedMotion<THome, TShip> AtSpeedRatio(
        [Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration, [Kind(QuantityKind.SpeedRatio), InFrame(nameof(THome))] double ratio)
        => ratio is >= 0 and < 1
            ? new(Require.Positive(acceleration), HyperbolicMotion.AtSpeedRatio(ratio))
            : throw Require.Outside(ratio, nameof(ratio), "from 0 up to but not including 1, the speed of light");

    /// <summary>When a celerity is reached, as a multiple of c.</summary>
    /// <param name="acceleration">The proper acceleration; above 0.</param>
    /// <param name="ratio">From 0 to 1e150.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static AcceleratedMotion<THome, TShip> AtCelerityRatio(
        [Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration, [Kind(QuantityKind.CelerityRatio), InFrame(nameof(THome))] double ratio)
        => new(Require.Positive(acceleration), HyperbolicMotion.AtCelerity(Require.Within(ratio, 0, Celerity.Largest)));

    /// <summary>When a Lorentz factor is reached, given less one.</summary>
    /// <param name="acceleration">The proper acceleration; above 0.</param>
    /// <param name="excess">γ − 1, from 0 to 1e150.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static AcceleratedMotion<THome, TShip> AtLorentzFactorMinusOne(
        [Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration, [Unit("1")] double excess)
        => new(Require.Positive(acceleration), HyperbolicMotion.AtLorentzMinusOne(Require.Within(excess, 0, Celerity.Largest)));

    internal Extended ExtendedProperTime => _motion.Rapidity * _unit;

    internal Extended ExtendedTime => _motion.Celerity * _unit;

    internal Extended ExtendedAhead => _motion.TimeMinusProperTime * _unit;

    internal Extended ExtendedDistance => _motion.LorentzMinusOne * _unit * PhysicsOfLight.Speed;
}
