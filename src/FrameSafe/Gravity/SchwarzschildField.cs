namespace FrameSafe;

/// <summary>The field outside a spherical body that does not turn, or of a black hole: clocks at rest and in orbit in it.</summary>
/// <remarks>
/// <para>Radii are areal (a circle has circumference 2πr); the coordinate time is the time of a clock at rest far away. Exact in the theory at any
/// radius outside the horizon; each rate − 1 within 1 ulp, from a laboratory's centimetre to a nanometre above a horizon.</para>
/// <para>Sources: C. W. Misner, K. S. Thorne, J. A. Wheeler, Gravitation (1973), chapters 25 and 31; R. M. Wald, General Relativity (1984),
/// section 6.3.</para>
/// </remarks>
public readonly struct SchwarzschildField
{
    private readonly Extended _horizon;

    private SchwarzschildField(Extended horizon) => _horizon = horizon;

    /// <summary>The field of the Earth's mass: GM = 3.986004418e14 m³/s² (IERS Conventions 2010, table 1.1).</summary>
    public static SchwarzschildField Earth => FromGravitationalParameter(3.986004418e14);

    /// <summary>The field of the Sun: GM = 1.32712442099e20 m³/s² (IERS Conventions 2010, table 1.1).</summary>
    public static SchwarzschildField Sun => FromGravitationalParameter(1.32712442099e20);

    /// <summary>The radius of the horizon, 2GM/c².</summary>
    [Unit("m")]
    public double HorizonRadius => _horizon.High;

    /// <summary>The radius 3GM/c² of light's circular orbit: a body circles only outside it.</summary>
    [Unit("m")]
    public double PhotonSphereRadius => (_horizon * 1.5).High;

    /// <summary>The radius 6GM/c² of the smallest stable circular orbit.</summary>
    [Unit("m")]
    public double InnermostStableOrbitRadius => (_horizon * 3).High;

    /// <summary>The gravitational parameter GM.</summary>
    [Unit("m3/s2")]
    public double GravitationalParameter => GM.High;

    private Extended GM => _horizon * Extended.SpeedOfLightSquared * 0.5;

    /// <summary>The field of a mass by its gravitational parameter.</summary>
    /// <param name="gm">GM; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">It is not.</exception>
    public static SchwarzschildField FromGravitationalParameter([Unit("m3/s2")] double gm) =>
        new((Extended)(2 * Require.Positive(gm)) / Extended.SpeedOfLightSquared);

    /// <summary>The field of a mass by the radius of its horizon.</summary>
    /// <param name="horizonRadius">2GM/c²; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">It is not.</exception>
    public static SchwarzschildField FromHorizonRadius([Unit("m")] double horizonRadius) => new(Require.Positive(horizonRadius));

    /// <summary>2GM/rc²: 0 far away, 1 at the horizon; within 1 ulp.</summary>
    /// <param name="radius">Above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">It is not.</exception>
    [return: Unit("1")]
    public double Compactness([Unit("m")] double radius) => (_horizon / Require.Positive(radius)).High;

    /// <summary>A clock at rest: (dτ/dt)² = 1 − 2GM/rc².</summary>
    /// <param name="radius">Above the horizon's radius.</param>
    /// <param name="height">Added to the radius as it is, however small; the sum is above the horizon's radius.</param>
    /// <typeparam name="TClock">The clock's name.</typeparam>
    /// <exception cref="ArgumentOutOfRangeException">The clock is at the horizon or below it.</exception>
    public FieldClock<TClock> StaticClock<TClock>([Unit("m")] double radius, [Unit("m")] double height = 0)
        where TClock : struct, IClock
    {
        Extended place = Place(radius, height);
        RequireOutside(place, 1, "the horizon", nameof(radius));
        return FieldClock<TClock>.InField(_horizon, 1, place);
    }

    /// <summary>A clock at rest, by its distance from the horizon in the radial coordinate: for places that no double radius tells apart.</summary>
    /// <param name="distance">r − 2GM/c²; above 0.</param>
    /// <typeparam name="TClock">The clock's name.</typeparam>
    /// <exception cref="ArgumentOutOfRangeException">The clock is at the horizon or below it.</exception>
    public FieldClock<TClock> StaticClockAboveHorizon<TClock>([Unit("m")] double distance) where TClock : struct, IClock
    {
        Require.Positive(distance);
        Extended radius = _horizon + distance;
        return FieldClock<TClock>.FromSquare(-(_horizon / radius), (Extended)distance / radius);
    }

    /// <summary>A clock in a circular orbit, falling freely: (dτ/dt)² = 1 − 3GM/rc².</summary>
    /// <param name="radius">Above the radius of the photon sphere.</param>
    /// <typeparam name="TClock">The clock's name.</typeparam>
    /// <exception cref="ArgumentOutOfRangeException">The orbit is inside the photon sphere, where none is slower than light.</exception>
    public FieldClock<TClock> OrbitingClock<TClock>([Unit("m")] double radius) where TClock : struct, IClock
    {
        Extended place = Place(radius, 0);
        RequireOutside(place, 1.5, "the photon sphere", nameof(radius));
        return FieldClock<TClock>.InField(_horizon, 1.5, place);
    }

    /// <summary>A clock that moves across the radius, such as one on turning ground: (dτ/dt)² = 1 − 2GM/rc² − v²/c².</summary>
    /// <param name="radius">Above the horizon's radius.</param>
    /// <param name="speed">The coordinate speed r·dφ/dt; from 0 to below that of light there.</param>
    /// <typeparam name="TClock">The clock's name.</typeparam>
    /// <exception cref="ArgumentOutOfRangeException">The clock is at the horizon or below it, or as fast as light there.</exception>
    public FieldClock<TClock> MovingClock<TClock>([Unit("m")] double radius, [Unit("m/s")] double speed) where TClock : struct, IClock
    {
        Extended place = Place(radius, 0);
        RequireOutside(place, 1, "the horizon", nameof(radius));
        Require.NotNegative(speed);
        Extended motion = Extended.Product(speed, speed) / Extended.SpeedOfLightSquared;
        Extended square = (place - _horizon) / place - motion;
        if (!(square.High > 0))
        {
            double light = Math.Sqrt(((place - _horizon) / place).High) * PhysicsOfLight.Speed;
            throw Require.Outside(speed, nameof(speed), FormattableString.Invariant($"below light's coordinate speed there ({light:R} m/s)"));
        }

        return FieldClock<TClock>.FromSquare(-(_horizon / place + motion), square);
    }

    /// <summary>The period of a circular orbit in coordinate time: 2π√(r³/GM); within 1 ulp.</summary>
    /// <param name="radius">Above the radius of the photon sphere.</param>
    /// <exception cref="ArgumentOutOfRangeException">The orbit is inside the photon sphere.</exception>
    [return: Unit("s")]
    [return: OnClock<FarClock>]
    public double OrbitalPeriod([Unit("m")] double radius)
    {
        Extended place = Orbit(radius);
        return (Extended.Sqrt(place / GM) * place * Tau).High;
    }

    /// <summary>The coordinate speed r·dφ/dt of a circular orbit: √(GM/r); within 1 ulp.</summary>
    /// <inheritdoc cref="OrbitalPeriod"/>
    [return: Unit("m/s")]
    public double OrbitalSpeed([Unit("m")] double radius) => Extended.Sqrt(GM / Orbit(radius)).High;

    /// <summary>The speed of a circular orbit as clocks at rest beside it measure it, as a fraction of c; within 1 ulp.</summary>
    /// <inheritdoc cref="OrbitalPeriod"/>
    [return: Unit("[c]")]
    [return: Kind(QuantityKind.SpeedRatio)]
    public double LocalOrbitalSpeedRatio([Unit("m")] double radius)
    {
        Extended place = Orbit(radius);
        return Extended.Sqrt(_horizon * 0.5 / (place - _horizon)).High;
    }

    /// <summary>The Newtonian potential at a height less that at the radius below it, without cancellation: GMh/(r(r + h)); within 1 ulp.</summary>
    /// <param name="radius">Above 0.</param>
    /// <param name="height">The radius plus it is above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">A radius is not above 0.</exception>
    [return: Unit("m2/s2")]
    [return: Kind(QuantityKind.GravitationalPotential)]
    public double NewtonianPotentialDifference([Unit("m")] double radius, [Unit("m")] double height) =>
        (GM * height / (Place(radius, height) * radius)).High;

    /// <summary>The same by c²: the shift between the two places to first order, GMh/(r(r + h)c²); within 1 ulp.</summary>
    /// <inheritdoc cref="NewtonianPotentialDifference"/>
    [return: Unit("1")]
    public double NewtonianShift([Unit("m")] double radius, [Unit("m")] double height) =>
        (_horizon * 0.5 * height / (Place(radius, height) * radius)).High;

    private static Extended Tau => Extended.Sum(6.283185307179586, 2.4492935982947064e-16);

    private Extended Orbit(double radius)
    {
        Extended place = Place(radius, 0);
        RequireOutside(place, 1.5, "the photon sphere", nameof(radius));
        return place;
    }

    private static Extended Place(double radius, double height)
    {
        Require.Positive(radius);
        Require.Finite(height);
        Extended place = Extended.Sum(radius, height);
        return place.High > 0 ? place : throw Require.Outside(height, nameof(height), FormattableString.Invariant($"above −radius ({-radius:R})"));
    }

    private void RequireOutside(Extended place, double horizons, string what, string parameter)
    {
        if ((place - _horizon * horizons).High > 0) return;
        throw Require.Outside(
            place.High, parameter, FormattableString.Invariant($"outside {what}, which is at {(_horizon * horizons).High:R} m"));
    }
}
