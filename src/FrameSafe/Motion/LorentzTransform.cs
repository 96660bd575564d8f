namespace FrameSafe;

/// <summary>A boost followed by a rotation of the axes: what two boosts in a row are.</summary>
/// <typeparam name="TFrom">The frame of what goes in.</typeparam>
/// <typeparam name="TTo">The frame of what comes out.</typeparam>
/// <remarks>
/// Two boosts that are not along one line leave the axes turned by the Wigner rotation (E. P. Wigner, Ann. Math. 40 (1939) 149):
/// tan(θ/2) = |t₁ × t₂|/(1 + t₁·t₂) with t = w/(1 + γ). <c>default</c> is no motion and no rotation.
/// </remarks>
[Carries(nameof(TFrom), nameof(TTo), Map = nameof(Map), Inverse = nameof(Inverse), Then = nameof(Then))]
public readonly struct LorentzTransform<TFrom, TTo>
    where TFrom : struct, IFrame
    where TTo : struct, IFrame
{
    private readonly Triple _ratio;
    private readonly Rotation _rotation;

    private LorentzTransform(Triple ratio, Rotation rotation)
    {
        _ratio = ratio;
        _rotation = rotation;
    }

    /// <summary>The velocity of the second frame in the first.</summary>
    public Velocity<TFrom> Velocity => new(_ratio);

    /// <summary>The angle by which the axes are turned, from 0 to π.</summary>
    [Unit("rad")]
    public double RotationAngle => _rotation.Angle;

    /// <summary>The components of the unit vector about which the axes are turned, right-handed; zero where they are not.</summary>
    public (double X, double Y, double Z) RotationAxis
    {
        get
        {
            Triple axis = _rotation.Axis;
            return (axis.X, axis.Y, axis.Z);
        }
    }

    /// <summary>The rotation as a matrix that acts on columns, row by row.</summary>
    [return: Unit("1")]
    public double[] RotationMatrix()
    {
        Triple x = _rotation.Turn(new(1, 0, 0));
        Triple y = _rotation.Turn(new(0, 1, 0));
        Triple z = _rotation.Turn(new(0, 0, 1));
        return [x.X, y.X, z.X, x.Y, y.Y, z.Y, x.Z, y.Z, z.Z];
    }

    /// <summary>The way back.</summary>
    public LorentzTransform<TTo, TFrom> Inverse
    {
        get
        {
            // (R·B(w))⁻¹ = B(−w)·R⁻¹ = R⁻¹·B(−Rw).
            return LorentzTransform<TTo, TFrom>.From(-_rotation.Turn(_ratio), _rotation.Inverse);
        }
    }

    /// <summary>A boost without rotation.</summary>
    public static implicit operator LorentzTransform<TFrom, TTo>(Boost<TFrom, TTo> boost) => new(boost.Ratio, default);

    /// <summary>The same event in the other frame.</summary>
    public SpacetimeEvent<TTo> Map(SpacetimeEvent<TFrom> @event)
    {
        (double light, Triple space) = BoostKernel.Apply(_ratio, PhysicsOfLight.Speed * @event.Seconds, @event.Metres, -1);
        return new(light / PhysicsOfLight.Speed, _rotation.Turn(space));
    }

    /// <summary>The same motion in the other frame.</summary>
    public Velocity<TTo> Map(Velocity<TFrom> velocity)
        => new(_rotation.Turn(BoostKernel.Compose(_ratio, velocity.Ratio, -1)));

    /// <summary>This transform followed by a boost.</summary>
    public LorentzTransform<TFrom, TNext> Then<TNext>(Boost<TTo, TNext> next)
        where TNext : struct, IFrame
    {
        // B(u)·R·B(w) = R·B(R⁻¹u)·B(w).
        LorentzTransform<TFrom, TNext> unturned = LorentzTransform<TFrom, TNext>.Of(_ratio, _rotation.Inverse.Turn(next.Ratio));
        return LorentzTransform<TFrom, TNext>.From(unturned._ratio, unturned._rotation.Then(_rotation));
    }

    internal static LorentzTransform<TFrom, TTo> From(Triple ratio, Rotation rotation) => new(ratio, rotation);

    /// <summary>Two boosts in a row: into the frame of the first, then by the second as measured there.</summary>
    internal static LorentzTransform<TFrom, TTo> Of(Triple first, Triple second)
    {
        // The target's celerity in the first frame is the second's carried back out of the first boost.
        return new(BoostKernel.Compose(first, second, +1), Rotation.OfBoosts(second, first));
    }
}
