namespace FrameSafe;

/// <summary>The decay of a body at rest into two: what they carry away is fixed by the masses alone.</summary>
/// <remarks>
/// p = √((M − m₁ − m₂)(M + m₁ + m₂)(M − m₁ + m₂)(M + m₁ − m₂))/2M (Particle Data Group, Review of Particle Physics, section
/// "Kinematics", two-body decays). Computed in twice the precision, so that nothing is lost near threshold.
/// </remarks>
/// <typeparam name="TRest">The rest frame of the body that decays.</typeparam>
public readonly struct TwoBodyDecay<TRest>
    where TRest : struct, IFrame
{
    private readonly Extended _parent;
    private readonly Extended _first;
    private readonly Extended _second;

    private TwoBodyDecay(Mass parent, Mass first, Mass second)
    {
        _parent = Extended.SpeedOfLightSquared * parent.InKilograms;
        _first = Extended.SpeedOfLightSquared * first.InKilograms;
        _second = Extended.SpeedOfLightSquared * second.InKilograms;
    }

    /// <summary>The energy that is set free, (M − m₁ − m₂)c².</summary>
    public KineticEnergy<TRest> Released => new((_parent - _first - _second).High);

    /// <summary>The size of the momentum of either product.</summary>
    public Momentum<TRest> Momentum => new(new((Root / PhysicsOfLight.Speed).High, 0, 0));

    /// <summary>The kinetic energy of the first product.</summary>
    public KineticEnergy<TRest> FirstKineticEnergy => new(Kinetic(_first, _second));

    /// <summary>The kinetic energy of the second product.</summary>
    public KineticEnergy<TRest> SecondKineticEnergy => new(Kinetic(_second, _first));

    /// <summary>The total energy of the first product, (M² + m₁² − m₂²)c²/2M.</summary>
    public TotalEnergy<TRest> FirstEnergy => new(Energy(_first, _second).High);

    /// <summary>The total energy of the second product.</summary>
    public TotalEnergy<TRest> SecondEnergy => new(Energy(_second, _first).High);

    // pc, the root of the Källén function over 2M.
    private Extended Root
    {
        get
        {
            Extended product = (_parent - _first - _second) * (_parent + _first + _second) * (_parent - _first + _second) * (_parent + _first - _second);
            return Extended.Sqrt(product) / (_parent * 2);
        }
    }

    /// <summary>The decay of a mass into two.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The products are heavier than what decays.</exception>
    public static TwoBodyDecay<TRest> Of(Mass parent, Mass first, Mass second)
    {
        var decay = new TwoBodyDecay<TRest>(parent, first, second);
        if (!(parent.InKilograms > 0) || (decay._parent - decay._first - decay._second).High < 0)
        {
            throw Require.Outside(
                parent.InKilograms,
                nameof(parent),
                FormattableString.Invariant($"at least the mass of the products together, {(first + second).InKilograms:R} kg"));
        }

        return decay;
    }

    /// <summary>The first product's momentum in a direction.</summary>
    /// <param name="direction">Which way it goes.</param>
    public Momentum<TRest> FirstMomentum(Direction<TRest> direction) => new(direction.Components * (Root / PhysicsOfLight.Speed).High);

    // T₁ = (M − m₁ − m₂)(M − m₁ + m₂)/2M.
    private double Kinetic(Extended own, Extended other) => ((_parent - own - other) * (_parent - own + other) / (_parent * 2)).High;

    private Extended Energy(Extended own, Extended other)
        => (_parent * 0.5) + ((own - other) * (own + other) / (_parent * 2));
}
