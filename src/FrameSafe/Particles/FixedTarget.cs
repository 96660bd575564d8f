namespace FrameSafe;

/// <summary>A beam on a target at rest: what is available in their centre of momentum, and what a beam needs.</summary>
/// <remarks>Particle Data Group, Review of Particle Physics, section "Kinematics". Computed in twice the precision.</remarks>
public static class FixedTarget
{
    /// <summary>The four-momentum of a particle of a kinetic energy, along x, and a target at rest.</summary>
    public static FourMomentum<TLab> System<TLab>(Mass beam, KineticEnergy<TLab> energy, Mass target)
        where TLab : struct, IFrame
    {
        Extended rest = Extended.SpeedOfLightSquared * beam.InKilograms;
        Extended still = Extended.SpeedOfLightSquared * target.InKilograms;
        Extended kinetic = energy.InJoules;
        Extended momentum = Extended.Sqrt(kinetic * (kinetic + (rest * 2)));
        return new(kinetic + rest + still, new(momentum, 0, 0));
    }

    /// <summary>√s − m₁c² − m₂c²: what a beam makes available, without cancellation also where it is slow.</summary>
    public static KineticEnergy<TLab> Available<TLab>(Mass beam, KineticEnergy<TLab> energy, Mass target)
        where TLab : struct, IFrame
    {
        Extended first = Extended.SpeedOfLightSquared * beam.InKilograms;
        Extended second = Extended.SpeedOfLightSquared * target.InKilograms;
        // s = (m₁ + m₂)² + 2m₂T.
        Extended gain = second * energy.InJoules * 2;
        Extended sum = first + second;
        return new((gain / (Extended.Sqrt((sum * sum) + gain) + sum)).High);
    }

    /// <summary>The size of the momentum of either in their centre of momentum: m₂p/√s.</summary>
    public static Momentum<TLab> CentreMomentum<TLab>(Mass beam, KineticEnergy<TLab> energy, Mass target)
        where TLab : struct, IFrame
    {
        Extended first = Extended.SpeedOfLightSquared * beam.InKilograms;
        Extended second = Extended.SpeedOfLightSquared * target.InKilograms;
        Extended kinetic = energy.InJoules;
        Extended sum = first + second;
        Extended root = Extended.Sqrt((sum * sum) + (second * kinetic * 2));
        return new(new((second * Extended.Sqrt(kinetic * (kinetic + (first * 2))) / root / PhysicsOfLight.Speed).High, 0, 0));
    }

    /// <summary>The least kinetic energy with which a beam on a target at rest makes products of a total mass.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The target has no mass.</exception>
    public static KineticEnergy<TLab> Threshold<TLab>(Mass beam, Mass target, Mass products)
        where TLab : struct, IFrame
    {
        Require.Positive(target.InKilograms);
        Extended first = Extended.SpeedOfLightSquared * beam.InKilograms;
        Extended second = Extended.SpeedOfLightSquared * target.InKilograms;
        Extended final = Extended.SpeedOfLightSquared * products.InKilograms;
        Extended need = (final - first - second) * (final + first + second) / (second * 2);
        return new(Math.Max(0, need.High));
    }
}
