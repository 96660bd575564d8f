namespace FrameSafe;

/// <summary>Relativistic corrections of time links near a turning, gravitating body.</summary>
public static class LinkCorrections
{
    /// <summary>The Earth's rate of rotation: 7.292115e-5 rad/s (IERS Conventions 2010, table 1.1).</summary>
    [Unit("rad/s")]
    public const double EarthRotationRate = 7.292115e-5;

    /// <summary>
    /// The Sagnac correction of a link in a frame that turns: 2ω·A/c², with the area that the path sweeps from the axis.
    /// </summary>
    /// <param name="rotationRate">ω, about z.</param>
    /// <param name="sender">The sender's x and y in the turning frame.</param>
    /// <param name="receiver">The receiver's x and y in the turning frame.</param>
    /// <returns>What is to be added to the straight light time of the turning frame; positive eastward.</returns>
    /// <remarks>N. Ashby, Living Rev. Relativ. 6 (2003) 1, section 2; exact to first order in ωr/c.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">A number is not finite.</exception>
    [return: Unit("s")]
    public static double SagnacInSeconds(
        [Unit("rad/s")] double rotationRate, [Unit("m")] (double X, double Y) sender, [Unit("m")] (double X, double Y) receiver)
    {
        Triple from = Door.Finite(new(sender.X, sender.Y, 0), nameof(sender));
        Triple to = Door.Finite(new(receiver.X, receiver.Y, 0), nameof(receiver));
        double twiceArea = (Extended.Product(from.X, to.Y) - Extended.Product(from.Y, to.X)).High;
        return Require.Finite(rotationRate) * twiceArea / PhysicsOfLight.Speed / PhysicsOfLight.Speed;
    }

    /// <summary>The Sagnac correction once around a circle: 2ωπr²/c².</summary>
    /// <exception cref="ArgumentOutOfRangeException">A number is negative or not finite.</exception>
    [return: Unit("s")]
    public static double SagnacAroundCircleInSeconds([Unit("rad/s")] double rotationRate, [Unit("m")] double radius)
        => 2 * Require.NotNegative(rotationRate) * Math.PI * Require.NotNegative(radius) * radius / PhysicsOfLight.Speed / PhysicsOfLight.Speed;

    /// <summary>The Shapiro delay of light that passes a mass: (2GM/c³) ln((r₁ + r₂ + d)/(r₁ + r₂ − d)).</summary>
    /// <param name="gravitationalParameter">GM of the mass.</param>
    /// <param name="first">The distance of one end from the mass.</param>
    /// <param name="second">The distance of the other end from the mass.</param>
    /// <param name="between">The distance between the ends.</param>
    /// <remarks>I. I. Shapiro, Phys. Rev. Lett. 13 (1964) 789; to first order in GM/rc².</remarks>
    /// <exception cref="ArgumentOutOfRangeException">The three distances make no triangle, or a number is not positive.</exception>
    [return: Unit("s")]
    public static double ShapiroInSeconds(
        [Unit("m3/s2")] double gravitationalParameter, [Unit("m")] double first, [Unit("m")] double second, [Unit("m")] double between)
    {
        Require.Positive(gravitationalParameter);
        double sum = Require.Positive(first) + Require.Positive(second);
        if (!(between >= Math.Abs(first - second) && between < sum))
            throw Require.Outside(between, nameof(between), FormattableString.Invariant($"from {Math.Abs(first - second):R} to below {sum:R}, so that the three make a triangle that leaves the mass out"));
        // ln((s + d)/(s − d)) = 2 artanh(d/s): nothing is lost where the ends are near each other.
        return 4 * gravitationalParameter * Math.Atanh(between / sum) / PhysicsOfLight.Speed / PhysicsOfLight.Speed / PhysicsOfLight.Speed;
    }

    /// <summary>The periodic part of an orbiting clock's reading, by its elements: (2/c²)√(GMa)·e·sin E.</summary>
    /// <param name="gravitationalParameter">GM.</param>
    /// <param name="semiMajorAxis">a.</param>
    /// <param name="eccentricity">e, from 0 to below 1.</param>
    /// <param name="eccentricAnomaly">E.</param>
    /// <returns>What the clock is behind by beyond its mean rate; it is subtracted from −this to correct the clock.</returns>
    /// <remarks>N. Ashby, Living Rev. Relativ. 6 (2003) 1, section 5; IS-GPS-200, section 20.3.3.3.3.1, where F = −2√GM/c².</remarks>
    /// <exception cref="ArgumentOutOfRangeException">A number is out of its range.</exception>
    [return: Unit("s")]
    [return: Kind(QuantityKind.ClockOffset)]
    public static double EccentricityInSeconds(
        [Unit("m3/s2")] double gravitationalParameter, [Unit("m")] double semiMajorAxis, [Unit("1")] double eccentricity, [Unit("rad")] double eccentricAnomaly)
        => 2 * Math.Sqrt(Require.Positive(gravitationalParameter)) * Math.Sqrt(Require.Positive(semiMajorAxis))
            * Require.Within(eccentricity, 0, Math.BitDecrement(1.0)) * Math.Sin(Require.Finite(eccentricAnomaly)) / PhysicsOfLight.Speed / PhysicsOfLight.Speed;

    /// <summary>The same by place and velocity: 2r·v/c².</summary>
    /// <exception cref="ArgumentOutOfRangeException">A number is not finite.</exception>
    [return: Unit("s")]
    [return: Kind(QuantityKind.ClockOffset)]
    public static double EccentricityInSeconds<TFrame>(Displacement<TFrame> place, Velocity<TFrame> velocity)
        where TFrame : struct, IFrame
    {
        Triple speed = new(velocity.XInMetresPerSecond, velocity.YInMetresPerSecond, velocity.ZInMetresPerSecond);
        return 2 * place.Metres.Dot(speed) / PhysicsOfLight.Speed / PhysicsOfLight.Speed;
    }
}
