namespace FrameSafe;

/// <summary>Energy and momentum of a body or a system, measured in a frame.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
/// <remarks>
/// Energy and momentum are kept in twice the precision of a double, so that the mass of a fast particle, a small difference of large
/// squares, comes back as it went in.
/// </remarks>
public readonly struct FourMomentum<TFrame> : IEquatable<FourMomentum<TFrame>>
    where TFrame : struct, IFrame
{
    private readonly Extended _energy;
    private readonly ExtendedTriple _momentum;
    private readonly bool _isMegaelectronvolts;

    // E and pc in one unit: joules, or the mega-electronvolts that they were given in, so that a photon's mass is zero and not a rounding.
    internal FourMomentum(Extended energy, ExtendedTriple momentum, bool isMegaelectronvolts = false)
    {
        _energy = energy;
        _momentum = momentum;
        _isMegaelectronvolts = isMegaelectronvolts;
    }

    /// <summary>The total energy.</summary>
    public TotalEnergy<TFrame> Energy => new(EnergyInJoules.High);

    /// <summary>The momentum.</summary>
    public Momentum<TFrame> Momentum => new((MomentumInJoules * ((Extended)1 / PhysicsOfLight.Speed)).High);

    /// <summary>m²c⁴ = E² − p²c², the same in every frame; negative where no body could have it.</summary>
    [Unit("J2")]
    [Kind(QuantityKind.InvariantMass)]
    public double InvariantSquareInSquareJoules => (Square * Unit * Unit).High;

    /// <summary>m²c⁴ in square mega-electronvolts.</summary>
    [Unit("MeV2")]
    [Kind(QuantityKind.InvariantMass)]
    public double InvariantSquareInSquareMegaelectronvolts => _isMegaelectronvolts ? Square.High : PhysicsOfLight.FromSquareJoules(Square);

    internal Extended EnergyInJoules => _energy * Unit;

    internal ExtendedTriple MomentumInJoules => _momentum * Unit;

    private Extended Unit => _isMegaelectronvolts ? PhysicsOfLight.JoulePerMegaelectronvolt : 1;

    private Extended Square => (_energy * _energy) - _momentum.Square;

    /// <summary>The four-momentum of a mass with a momentum.</summary>
    public static FourMomentum<TFrame> Of(Mass mass, Momentum<TFrame> momentum)
    {
        ExtendedTriple pc = ExtendedTriple.Of(momentum.NewtonSeconds) * PhysicsOfLight.Speed;
        Extended rest = Extended.SpeedOfLightSquared * mass.InKilograms;
        return new(Extended.Sqrt(pc.Square + (rest * rest)), pc);
    }

    /// <summary>The four-momentum of a mass with a velocity.</summary>
    public static FourMomentum<TFrame> Of(Mass mass, Velocity<TFrame> velocity)
    {
        Extended rest = Extended.SpeedOfLightSquared * mass.InKilograms;
        ExtendedTriple ratio = ExtendedTriple.Of(velocity.Ratio);
        return new(rest * Extended.Sqrt(ratio.Square + 1), ratio * rest);
    }

    /// <summary>A four-momentum from an energy and a momentum as they are.</summary>
    public static FourMomentum<TFrame> Of(TotalEnergy<TFrame> energy, Momentum<TFrame> momentum)
        => new(energy.InJoules, ExtendedTriple.Of(momentum.NewtonSeconds) * PhysicsOfLight.Speed);

    /// <summary>A four-momentum from numbers in MeV and MeV/c, kept as they are.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The energy is negative, or a number is not finite.</exception>
    public static FourMomentum<TFrame> FromMegaelectronvolts(
        [Unit("MeV"), InFrame(nameof(TFrame)), Kind(QuantityKind.TotalEnergy)] double energy,
        [Unit("MeV/c"), InFrame(nameof(TFrame)), Kind(QuantityKind.Momentum)] double x,
        [Unit("MeV/c"), InFrame(nameof(TFrame)), Kind(QuantityKind.Momentum)] double y = 0,
        [Unit("MeV/c"), InFrame(nameof(TFrame)), Kind(QuantityKind.Momentum)] double z = 0)
        => new(
            Require.NotNegative(energy),
            ExtendedTriple.Of(new(Require.Finite(x), Require.Finite(y), Require.Finite(z))),
            isMegaelectronvolts: true);

    /// <summary>The energy and momentum of this in another frame, by the celerity ratio of that frame.</summary>
    internal FourMomentum<TOther> Carried<TOther>(Triple ratio)
        where TOther : struct, IFrame
    {
        ExtendedTriple w = ExtendedTriple.Of(ratio);
        Extended lorentz = Extended.Sqrt(w.Square + 1);
        Extended along = w.Dot(_momentum);
        return new(
            (lorentz * _energy) - along,
            _momentum + (w * ((along / (lorentz + 1)) - _energy)),
            _isMegaelectronvolts);
    }

    /// <summary>The invariant mass.</summary>
    /// <exception cref="InvalidOperationException">The momentum is larger than the energy allows: no mass has both.</exception>
    public Mass InvariantMass()
    {
        Extended square = Square;
        return square.High >= 0
            ? new((Extended.Sqrt(square) * Unit / Extended.SpeedOfLightSquared).High)
            : throw new InvalidOperationException(
                FormattableString.Invariant($"No mass has an energy of {EnergyInJoules.High:R} J with a momentum of {MomentumInJoules.High.Norm:R} J/c."));
    }

    /// <summary>The velocity of the body, or of the system's centre of momentum.</summary>
    /// <exception cref="InvalidOperationException">It is that of light, or more.</exception>
    public Velocity<TFrame> Velocity()
    {
        Extended square = Square;
        if (!(square.High > 0))
            throw new InvalidOperationException(FormattableString.Invariant($"What has no mass has no rest frame; E² − p²c² is {square.High:R} J²."));
        Extended mass = Extended.Sqrt(square);
        return new(new((_momentum.X / mass).High, (_momentum.Y / mass).High, (_momentum.Z / mass).High));
    }

    /// <summary>The boost into the centre-of-momentum frame, where the momentum is zero.</summary>
    /// <typeparam name="TCentre">That frame.</typeparam>
    /// <exception cref="InvalidOperationException">There is none: the whole has no mass.</exception>
    public Boost<TFrame, TCentre> IntoCentreOfMomentum<TCentre>()
        where TCentre : struct, IFrame
        => Boost<TFrame, TCentre>.Into(Velocity());

    /// <summary>The sum: of a system, its parts' together.</summary>
    public static FourMomentum<TFrame> operator +(FourMomentum<TFrame> left, FourMomentum<TFrame> right)
        => left._isMegaelectronvolts == right._isMegaelectronvolts
            ? new(left._energy + right._energy, left._momentum + right._momentum, left._isMegaelectronvolts)
            : new(left.EnergyInJoules + right.EnergyInJoules, left.MomentumInJoules + right.MomentumInJoules);

    /// <summary>The difference, as in a momentum transfer.</summary>
    public static FourMomentum<TFrame> operator -(FourMomentum<TFrame> left, FourMomentum<TFrame> right)
        => left + new FourMomentum<TFrame>(-right._energy, right._momentum * -1, right._isMegaelectronvolts);

    /// <summary>The same.</summary>
    public static bool operator ==(FourMomentum<TFrame> left, FourMomentum<TFrame> right) => left.Equals(right);

    /// <summary>Another.</summary>
    public static bool operator !=(FourMomentum<TFrame> left, FourMomentum<TFrame> right) => !left.Equals(right);

    /// <inheritdoc/>
    public bool Equals(FourMomentum<TFrame> other) => EnergyInJoules.High == other.EnergyInJoules.High && MomentumInJoules.High.Equals(other.MomentumInJoules.High);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is FourMomentum<TFrame> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(EnergyInJoules.High, MomentumInJoules.High);

    /// <summary>Energy and momentum and the frame.</summary>
    public override string ToString() => Energy + ", " + Momentum;
}
