namespace FrameSafe;

/// <summary>Clocks in a weak field that is known by its Newtonian potential.</summary>
/// <remarks>
/// The potential φ is negative, and 0 far away (the geopotential W of geodesy is −φ). The coordinate time is that of the frame at rest with the
/// source. Source: N. Ashby, Living Rev. Relativ. 6 (2003) 1, section 3; what the form leaves out is of the size of (φ/c²)²: 5e-19 on
/// the Earth's surface.
/// </remarks>
public static class WeakField
{
    /// <summary>A clock at a potential, at rest or moving: (dτ/dt)² = 1 + 2φ/c² − v²/c²; the form within 1 ulp.</summary>
    /// <param name="potential">φ; negative or 0.</param>
    /// <param name="speed">The speed v in the frame of the coordinate time; from 0 on.</param>
    /// <typeparam name="TClock">The clock's name.</typeparam>
    /// <exception cref="ArgumentOutOfRangeException">The potential is positive, the speed negative, or the field not weak: 2φ − v² at or below −c².</exception>
    public static FieldClock<TClock> Clock<TClock>(
        [Unit("m2/s2"), Kind(QuantityKind.GravitationalPotential)] double potential, [Unit("m/s")] double speed = 0)
        where TClock : struct, IClock => Clock<TClock>((Extended)Potential(potential, nameof(potential)), speed);

    /// <summary>dτ/dt − 1 to first order, φ/c² − v²/2c²; the form within 1 ulp.</summary>
    /// <inheritdoc cref="Clock{TClock}(double, double)"/>
    [return: Unit("1")]
    public static double FirstOrderRateMinusOne(
        [Unit("m2/s2"), Kind(QuantityKind.GravitationalPotential)] double potential, [Unit("m/s")] double speed = 0)
    {
        Potential(potential, nameof(potential));
        Require.NotNegative(speed);
        return (((Extended)potential - Extended.Product(speed, speed) * 0.5) / Extended.SpeedOfLightSquared).High;
    }

    /// <summary>The rate of an upper clock by a lower one, less one, in the uniform field of a laboratory: gh/c².</summary>
    /// <param name="gravity">g at the lower clock.</param>
    /// <param name="height">The height of the upper clock above it; negative if it is below.</param>
    /// <remarks>Exact for two clocks at rest in a rigid accelerated laboratory (Rindler, Relativity, section 3.8); within 1.5 ulp.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not finite, or gh/c² is −1 or below: the clock would be behind the laboratory's horizon.</exception>
    [return: Unit("1")]
    public static double UniformFieldRateMinusOne([Unit("m/s2")] double gravity, [Unit("m")] double height)
    {
        Require.Finite(gravity);
        Require.Finite(height);
        double rate = (Extended.Product(gravity, height) / Extended.SpeedOfLightSquared).High;
        return rate > -1 ? rate : throw Require.Outside(height, nameof(height), "above the laboratory's horizon, −c²/g");
    }

    internal static FieldClock<TClock> Clock<TClock>(Extended potential, double speed) where TClock : struct, IClock
    {
        Require.NotNegative(speed);
        Extended excess = (potential * 2 - Extended.Product(speed, speed)) / Extended.SpeedOfLightSquared;
        return excess.High > -1
            ? FieldClock<TClock>.FromSquareMinusOne(excess)
            : throw Require.Outside(potential.High, nameof(potential), "such that 2φ − v² is above −c²");
    }

    private static double Potential(double value, string parameter) =>
        value <= 0 && double.IsFinite(value)
            ? value
            : throw Require.Outside(value, parameter, "negative or 0, and finite (the geopotential W is −φ)");
}
