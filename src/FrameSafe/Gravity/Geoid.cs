namespace FrameSafe;

/// <summary>Clocks on the geoid, where terrestrial time is told, and above it.</summary>
/// <remarks>
/// The geoid is a surface of one potential, the Earth's rotation counted in: every clock at rest on it runs at one rate, 1 − L_G by TCG.
/// Sources: IAU 2000 Resolution B1.9 (L_G); IERS Conventions (2010), table 1.1 (W₀); World Geodetic System 1984 (normal gravity).
/// </remarks>
public static class Geoid
{
    /// <summary>W₀, the geopotential on the geoid (IERS Conventions 2010, table 1.1): L_G·c².</summary>
    [Unit("m2/s2")]
    public const double Geopotential = 62636856.0;

    // WGS 84: gravity at the equator, Somigliana's constant, first eccentricity squared; semi-major axis, flattening, m = ω²a²b/GM.
    private const double EquatorialGravity = 9.7803253359;
    private const double Somigliana = 0.00193185265241;
    private const double EccentricitySquared = 0.00669437999014;
    private const double SemiMajorAxis = 6378137.0;
    private const double Flattening = 1 / 298.257223563;
    private const double CentrifugalRatio = 0.00344978650684;

    /// <summary>A clock at rest on the turning geoid; its coordinate time is TCG.</summary>
    /// <typeparam name="TClock">The clock's name; <see cref="Tt"/> for terrestrial time itself.</typeparam>
    public static FieldClock<TClock> Clock<TClock>() where TClock : struct, IClock => AtPotential<TClock>(0);

    /// <summary>A clock at rest at a height above the geoid, by normal gravity.</summary>
    /// <param name="height">Above the geoid (mean sea level), negative below; from −20 km to 100 km.</param>
    /// <param name="sineOfLatitude">The sine of the geodetic latitude; from −1 to 1.</param>
    /// <typeparam name="TClock">The clock's name.</typeparam>
    /// <remarks>
    /// The Earth's real gravity differs from the normal one by up to some parts in 10⁴, and so does the gain by height: about 1e-17 at 1 km. Where
    /// the geopotential was levelled, use <see cref="ClockAtGeopotential{TClock}"/>.
    /// </remarks>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static FieldClock<TClock> ClockAtHeight<TClock>([Unit("m")] double height, [Unit("1")] double sineOfLatitude)
        where TClock : struct, IClock
    {
        Require.Within(height, -2e4, 1e5);
        Require.Within(sineOfLatitude, -1, 1);
        double square = sineOfLatitude * sineOfLatitude;
        double atSurface = EquatorialGravity * (1 + Somigliana * square) / Math.Sqrt(1 - EccentricitySquared * square);
        // The mean of normal gravity from the surface to the height, to second order in it.
        double inRadii = height / SemiMajorAxis;
        double mean = atSurface * (1 - (1 + Flattening + CentrifugalRatio - 2 * Flattening * square) * inRadii + inRadii * inRadii);
        return AtPotential<TClock>(mean * height);
    }

    /// <summary>A clock at rest on the turning Earth, where the geopotential is known.</summary>
    /// <param name="geopotential">W: positive, less than <see cref="Geopotential"/> above the geoid; from 6.0e7 to 6.4e7.</param>
    /// <typeparam name="TClock">The clock's name.</typeparam>
    /// <exception cref="ArgumentOutOfRangeException">The geopotential is not one near the Earth's surface.</exception>
    public static FieldClock<TClock> ClockAtGeopotential<TClock>([Unit("m2/s2")] double geopotential) where TClock : struct, IClock =>
        AtPotential<TClock>(Geopotential - Require.Within(geopotential, 6.0e7, 6.4e7));

    private static FieldClock<TClock> AtPotential<TClock>(double aboveGeoid) where TClock : struct, IClock
    {
        Extended onGeoid = Extended.Sum(-2 * TimeScaleConversions.TcgRateOffset, TimeScaleConversions.TcgRateOffset * TimeScaleConversions.TcgRateOffset);
        return FieldClock<TClock>.FromSquareMinusOne(onGeoid + (Extended)(2 * aboveGeoid) / Extended.SpeedOfLightSquared);
    }
}
