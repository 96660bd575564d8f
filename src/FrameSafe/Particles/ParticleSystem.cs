namespace FrameSafe;

/// <summary>Several particles together, by their masses and momenta.</summary>
/// <remarks>Particle Data Group, Review of Particle Physics, section "Kinematics". Computed in twice the precision.</remarks>
public static class ParticleSystem
{
    /// <summary>The four-momentum of all.</summary>
    /// <exception cref="ArgumentException">There are not as many momenta as masses.</exception>
    public static FourMomentum<TFrame> Total<TFrame>(ReadOnlySpan<Mass> masses, ReadOnlySpan<Momentum<TFrame>> momenta)
        where TFrame : struct, IFrame
    {
        RequireSameLength(masses, momenta);
        FourMomentum<TFrame> total = default;
        for (int i = 0; i < masses.Length; i++)
            total += FourMomentum<TFrame>.Of(masses[i], momenta[i]);
        return total;
    }

    /// <summary>
    /// The invariant mass beyond the masses of the particles, times c²: what there is to make more of. Also where the particles hardly
    /// move against each other: from M² − (Σm)² = 2Σ(EᵢEⱼ − pᵢ·pⱼ − mᵢmⱼ), with the rest energies taken out of each term.
    /// </summary>
    /// <exception cref="ArgumentException">There are not as many momenta as masses.</exception>
    [return: Unit("MeV")]
    [return: Kind(QuantityKind.Energy)]
    public static double AvailableInMegaelectronvolts<TFrame>(ReadOnlySpan<Mass> masses, ReadOnlySpan<Momentum<TFrame>> momenta)
        where TFrame : struct, IFrame
    {
        RequireSameLength(masses, momenta);
        Extended gain = 0;
        Extended rest = 0;
        for (int i = 0; i < masses.Length; i++)
        {
            (Extended mass, Extended kinetic, ExtendedTriple momentum) = Parts(masses[i], momenta[i]);
            rest += mass;
            for (int j = 0; j < i; j++)
            {
                (Extended otherMass, Extended otherKinetic, ExtendedTriple otherMomentum) = Parts(masses[j], momenta[j]);
                gain += ((kinetic * otherMass) + (otherKinetic * mass) + (kinetic * otherKinetic) - momentum.Dot(otherMomentum)) * 2;
            }
        }

        return PhysicsOfLight.FromJoules(gain / (Extended.Sqrt((rest * rest) + gain) + rest));
    }

    private static (Extended Mass, Extended Kinetic, ExtendedTriple Momentum) Parts<TFrame>(Mass mass, Momentum<TFrame> momentum)
        where TFrame : struct, IFrame
    {
        Extended rest = Extended.SpeedOfLightSquared * mass.InKilograms;
        ExtendedTriple pc = ExtendedTriple.Of(momentum.NewtonSeconds) * PhysicsOfLight.Speed;
        Extended square = pc.Square;
        return (rest, square.High == 0 ? 0 : square / (Extended.Sqrt(square + (rest * rest)) + rest), pc);
    }

    private static void RequireSameLength<TFrame>(ReadOnlySpan<Mass> masses, ReadOnlySpan<Momentum<TFrame>> momenta)
        where TFrame : struct, IFrame
    {
        if (masses.Length != momenta.Length)
            throw new ArgumentException($"{masses.Length} masses and {momenta.Length} momenta; each particle has one of either.", nameof(momenta));
    }
}
