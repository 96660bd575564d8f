namespace FrameSafe;

/// <summary>The transform between two frames in uniform motion, axes parallel, that share an origin event.</summary>
/// <typeparam name="TFrom">The frame of what goes in.</typeparam>
/// <typeparam name="TTo">The frame of what comes out.</typeparam>
/// <remarks>
/// Made from the velocity of the second frame in the first, and kept as its celerity ratio w: t′ = γt − w·r/c,
/// r′ = r + w(w·r/(1 + γ) − ct) (W. Rindler, Relativity, 2nd ed., section 2.6, with w = γβ). <c>default</c> is the boost of frames at
/// relative rest. Results are within 4 ulp in the norm where the problem is well conditioned.
/// </remarks>
[Carries(nameof(TFrom), nameof(TTo), Map = nameof(Map), Inverse = nameof(Inverse), Then = nameof(Then))]
public readonly struct Boost<TFrom, TTo> : IEquatable<Boost<TFrom, TTo>>
    where TFrom : struct, IFrame
    where TTo : struct, IFrame
{
    private readonly Triple _ratio;

    // γ − 1 of γ as a double, which gives γ back exactly; so that the default is no motion.
    private readonly double _lorentzMinusOne;

    private Boost(Triple ratio)
    {
        _ratio = ratio;
        _lorentzMinusOne = Celerity.LorentzFactor(ratio.Norm) - 1;
    }

    /// <summary>The velocity of the second frame in the first.</summary>
    public Velocity<TFrom> Velocity => new(_ratio);

    /// <summary>The Lorentz factor between the frames.</summary>
    public LorentzFactor<TFrom, TTo> LorentzFactor => new(Celerity.LorentzFactorMinusOne(_ratio.Norm));

    /// <summary>The way back.</summary>
    public Boost<TTo, TFrom> Inverse => new(-_ratio);

    internal Triple Ratio => _ratio;

    /// <summary>The boost into a frame that moves with a velocity.</summary>
    public static Boost<TFrom, TTo> Into(Velocity<TFrom> velocityOfTarget) => new(velocityOfTarget.Ratio);

    /// <summary>The same event in the other frame.</summary>
    public SpacetimeEvent<TTo> Map(SpacetimeEvent<TFrom> @event)
    {
        (double seconds, Triple metres) = Carry(@event.Seconds, @event.Metres);
        return new(seconds, metres);
    }

    /// <summary>The same interval in the other frame.</summary>
    public SpacetimeInterval<TTo> Map(SpacetimeInterval<TFrom> interval)
    {
        (double seconds, Triple metres) = Carry(interval.Seconds, interval.Metres);
        return new(seconds, metres);
    }

    /// <summary>The same motion as the other frame measures it: the composition of the velocities.</summary>
    public Velocity<TTo> Map(Velocity<TFrom> velocity)
    {
        Triple moving = velocity.Ratio;
        if (Collinear(moving, _ratio))
            return new(new(Celerity.Composed(moving.X, -_ratio.X), 0, 0));
        return new(BoostKernel.Compose(_ratio, moving, -1));
    }

    /// <summary>The same energy and momentum in the other frame; both go together.</summary>
    public FourMomentum<TTo> Map(FourMomentum<TFrom> momentum) => momentum.Carried<TTo>(_ratio);

    /// <summary>The same field in the other frame; electric and magnetic go together.</summary>
    public ElectromagneticField<TTo> Map(ElectromagneticField<TFrom> field)
    {
        double lorentz = 1 + _lorentzMinusOne;
        Triple electric = field.Electric;
        Triple magnetic = field.Magnetic * PhysicsOfLight.Speed;
        Triple carriedElectric = ((electric * lorentz) + _ratio.Cross(magnetic)).Plus(_ratio, -_ratio.Dot(electric) / (1 + lorentz));
        Triple carriedMagnetic = ((magnetic * lorentz) - _ratio.Cross(electric)).Plus(_ratio, -_ratio.Dot(magnetic) / (1 + lorentz));
        return new(carriedElectric, carriedMagnetic * (1 / PhysicsOfLight.Speed));
    }

    /// <summary>The same light in the other frame: Doppler effect and aberration.</summary>
    public PlaneWave<TTo> Map(PlaneWave<TFrom> wave)
    {
        (double ratio, Triple direction) = Turn(1, wave.Direction.Components, -1);
        return new(wave.FrequencyInHertz * ratio, new(direction * (1 / direction.Norm)));
    }

    /// <summary>The same direction of light in the other frame: aberration.</summary>
    public Direction<TTo> Map(Direction<TFrom> direction)
    {
        (_, Triple carried) = Turn(1, direction.Components, -1);
        return new(carried * (1 / carried.Norm));
    }

    /// <summary>How much later the second of two events is than the first, in the other frame: 0 where they are simultaneous there.</summary>
    /// <remarks>γ(Δt − v·Δr/c²) of their interval: nothing of their dates is lost in it.</remarks>
    public CoordinateTime<TTo> DelayBetween(SpacetimeEvent<TFrom> first, SpacetimeEvent<TFrom> second) => Map(second - first).Time;

    /// <summary>This boost followed by another: a boost and a rotation.</summary>
    public LorentzTransform<TFrom, TNext> Then<TNext>(Boost<TTo, TNext> next)
        where TNext : struct, IFrame
        => LorentzTransform<TFrom, TNext>.Of(_ratio, next.Ratio);

    /// <inheritdoc/>
    public bool Equals(Boost<TFrom, TTo> other) => _ratio.Equals(other._ratio);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is Boost<TFrom, TTo> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _ratio.GetHashCode();

    /// <summary>The same boost.</summary>
    public static bool operator ==(Boost<TFrom, TTo> left, Boost<TFrom, TTo> right) => left._ratio == right._ratio;

    /// <summary>Another boost.</summary>
    public static bool operator !=(Boost<TFrom, TTo> left, Boost<TFrom, TTo> right) => left._ratio != right._ratio;

    /// <summary>The frames and the velocity.</summary>
    public override string ToString() => typeof(TFrom).Name + " to " + typeof(TTo).Name + ", which moves with " + Velocity;

    /// <summary>A four-vector of which time and space are in one unit.</summary>
    internal (double Time, Triple Space) Turn(double time, Triple space, int sign) => BoostKernel.Apply(_ratio, 1 + _lorentzMinusOne, time, space, sign);

    private static bool Collinear(Triple one, Triple other) => one is { Y: 0, Z: 0 } && other is { Y: 0, Z: 0 };

    private (double Seconds, Triple Metres) Carry(double seconds, Triple metres)
    {
        (double light, Triple space) = Turn(PhysicsOfLight.Speed * seconds, metres, -1);
        return (light / PhysicsOfLight.Speed, space);
    }
}
