namespace FrameSafe;

/// <summary>What a clock shows along its way: the sum over straight legs, in twice the precision.</summary>
/// <typeparam name="TFrame">The inertial frame in which the way is given.</typeparam>
/// <typeparam name="TClock">The clock.</typeparam>
/// <remarks>
/// dτ = dt/γ (W. Rindler, Relativity, 2nd ed., section 3.5). What the clock falls behind by is summed on its own, so that nanoseconds out of
/// years keep their digits. <c>default</c> is no way.
/// </remarks>
public readonly struct Worldline<TFrame, TClock>
    where TFrame : struct, IFrame
    where TClock : struct, IClock
{
    private readonly Extended _time;
    private readonly Extended _behind;
    private readonly ExtendedTriple _way;

    private Worldline(Extended time, Extended behind, ExtendedTriple way)
    {
        _time = time;
        _behind = behind;
        _way = way;
    }

    /// <summary>The coordinate time from the start to the end.</summary>
    public CoordinateTime<TFrame> Time => new(_time.High);

    /// <summary>What the clock shows of it; within 1 ulp of the legs as they are given.</summary>
    public ProperTime<TClock> ProperTime => new((_time - _behind).High);

    /// <summary>What the clock falls behind by, t − τ; within 1 ulp of the legs as they are given.</summary>
    [Unit("s")]
    [Kind(QuantityKind.ClockOffset)]
    public double BehindInSeconds => _behind.High;

    /// <summary>The way from the start to the end.</summary>
    public Displacement<TFrame> Displacement => new(_way.High);

    /// <summary>A further leg of constant velocity.</summary>
    /// <param name="time">How long it takes; from 0 on.</param>
    /// <param name="velocity">The velocity.</param>
    /// <exception cref="ArgumentOutOfRangeException">The time is negative.</exception>
    public Worldline<TFrame, TClock> Then(CoordinateTime<TFrame> time, Velocity<TFrame> velocity)
    {
        Extended elapsed = Require.NotNegative(time.InSeconds, nameof(time));
        ExtendedTriple w = ExtendedTriple.Of(velocity.Ratio);
        Extended square = w.Square;
        Extended lorentz = Extended.Sqrt(square + 1);
        // 1 − 1/γ = w²/(γ(1 + γ)).
        return new(
            _time + elapsed,
            _behind + (elapsed * square / lorentz / (lorentz + 1)),
            _way + (w * (elapsed * PhysicsOfLight.Speed / lorentz)));
    }

    /// <summary>A further straight leg from one event to another.</summary>
    /// <param name="interval">The way; timelike or along light, and forward in time.</param>
    /// <exception cref="ArgumentOutOfRangeException">It is faster than light, or goes back in time.</exception>
    public Worldline<TFrame, TClock> Then(SpacetimeInterval<TFrame> interval)
    {
        Require.NotNegative(interval.Seconds, nameof(interval));
        if (interval.Class == IntervalClass.Spacelike)
            throw Require.Outside(interval.Metres.Norm, nameof(interval), FormattableString.Invariant($"no longer than light goes in {interval.Seconds:R} s"));
        ExtendedTriple way = ExtendedTriple.Of(interval.Metres);
        Extended time = interval.Seconds;
        Extended square = way.Square / Extended.SpeedOfLightSquared;
        Extended proper = Extended.Sqrt((time * time) - square);
        // t − τ = (r/c)²/(t + τ).
        return new(_time + time, square.High == 0 ? _behind : _behind + (square / (time + proper)), _way + way);
    }

    /// <summary>Which of two clocks that meet twice is ahead at the second meeting, and by how much: the other's time less this one's.</summary>
    /// <remarks>The difference of what each falls behind by: nothing cancels that is not given to cancel.</remarks>
    [return: Unit("s")]
    [return: Kind(QuantityKind.ClockOffset)]
    public double BehindOtherInSeconds<TOther>(Worldline<TFrame, TOther> other)
        where TOther : struct, IClock
        => (_behind - other.Behind).High;

    internal Extended Behind => _behind;
}
