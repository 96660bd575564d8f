namespace FrameSafe;

/// <summary>TDB − TT: how the barycentre's dynamical time runs against terrestrial time.</summary>
/// <remarks>
/// <para>The analytical series of Fairhead and Bretagnon (Astron. Astrophys. 229 (1990) 240) with all 787 terms down to 0.1 ns and the
/// corrections to the planetary masses of JPL's ephemerides. Its main term is 1.657 ms by the year; what it leaves out stays
/// below 3 ns from 1950 to 2050 (against numerical integration, as the IERS Conventions 2003, section 10.1, state; the figure is
/// from memory). Before 1600 and after 2200 the powers of time in it are extrapolated.</para>
/// <para>A cheap formula of one or two sines is off by up to 30 µs, a double Julian Date by 40 µs.</para>
/// </remarks>
public static class BarycentricTime
{
    // JPL's masses against those of IAU 1976: amplitude in µs, frequency in rad/millennium, phase in rad.
    private static ReadOnlySpan<double> MassCorrections =>
    [
        0.00065, 6069.776754, 4.021194,
        0.00033, 213.299095, 5.543132,
        -0.00196, 6208.294251, 5.696701,
        -0.00173, 74.781599, 2.435900,
    ];

    private const double QuadraticMassCorrection = 0.03638;

    private const double DaysInMillennium = 365250;

    private const double Degree = Math.PI / 180;

    /// <summary>TDB − TT at the geocentre.</summary>
    /// <param name="epoch">The date in TT.</param>
    /// <returns>From −1.8 ms to 1.8 ms in the centuries about 2000; to 1e-15 s of the series summed exactly.</returns>
    [return: Unit("s")]
    [return: Kind(QuantityKind.ClockOffset)]
    public static double TdbMinusTtInSeconds(Epoch<Tt> epoch) => 1e-6 * Geocentric(Millennia(epoch));

    /// <summary>TDB − TT at a place on the ground, with the daily terms that the place's own motion adds (up to 2 µs).</summary>
    /// <param name="epoch">The date in TT.</param>
    /// <param name="universalTime">UT1, as the part of its day that has passed (UTC will do: 1 s of it is 0.2 ns).</param>
    /// <param name="eastLongitude">The longitude, east positive.</param>
    /// <param name="fromSpinAxis">The distance of the place from the Earth's axis.</param>
    /// <param name="northOfEquator">The distance of the place from the equator's plane, north positive.</param>
    /// <returns>From −1.8 ms to 1.8 ms.</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not finite, or a distance is beyond 100 000 km.</exception>
    /// <remarks>Daily terms: T. D. Moyer, Cel. Mech. 23 (1981) 33, and C. A. Murray, Vectorial Astrometry (1983).</remarks>
    [return: Unit("s")]
    [return: Kind(QuantityKind.ClockOffset)]
    public static double TdbMinusTtInSeconds(
        Epoch<Tt> epoch,
        [Unit("d")] double universalTime,
        [Unit("rad")] double eastLongitude,
        [Unit("m")] double fromSpinAxis,
        [Unit("m")] double northOfEquator)
    {
        ThrowIfOutside(universalTime, 1e9, nameof(universalTime));
        ThrowIfOutside(eastLongitude, 1e9, nameof(eastLongitude));
        ThrowIfOutside(fromSpinAxis, 1e8, nameof(fromSpinAxis));
        ThrowIfOutside(northOfEquator, 1e8, nameof(northOfEquator));
        double millennia = Millennia(epoch);
        return 1e-6 * (Geocentric(millennia) + Daily(millennia, universalTime, eastLongitude, fromSpinAxis, northOfEquator));
    }

    // TT stands in for TDB as the argument: 2 ms of it change the sum by less than 1e-12 s.
    private static double Millennia(Epoch<Tt> epoch) =>
        (epoch.Parts.Day - 0.5) / DaysInMillennium + epoch.Parts.Second / (DayAndSecond.SecondsInDay * DaysInMillennium);

    private static double Geocentric(double millennia)
    {
        double sum = 0;
        for (int power = FairheadBretagnonTerms.HighestPower; power >= 0; power--)
            sum = sum * millennia + SumOfSines(FairheadBretagnonTerms.OfPower(power), millennia);
        return sum + SumOfSines(MassCorrections, millennia) + QuadraticMassCorrection * millennia * millennia;
    }

    private static double SumOfSines(ReadOnlySpan<double> terms, double millennia)
    {
        double sum = 0;
        for (int i = terms.Length - 3; i >= 0; i -= 3)
            sum += terms[i] * Math.Sin(terms[i + 1] * millennia + terms[i + 2]);
        return sum;
    }

    private static double Daily(double millennia, double universalTime, double eastLongitude, double fromSpinAxis, double northOfEquator)
    {
        double localSolarTime = (universalTime - Math.Floor(universalTime)) * Math.Tau + eastLongitude;
        double sun = MeanAngle(280.46645683, 1296027711.03429, millennia);
        double sunAnomaly = MeanAngle(357.52910918, 1295965810.481, millennia);
        double moonElongation = MeanAngle(297.85019547, 16029616012.090, millennia);
        double jupiter = MeanAngle(34.35151874, 109306899.89453, millennia);
        double saturn = MeanAngle(50.07744430, 44046398.47038, millennia);

        double acrossAxis =
            0.00029e-7 * Math.Sin(localSolarTime + sun - saturn)
            + 0.00100e-7 * Math.Sin(localSolarTime - 2 * sunAnomaly)
            + 0.00133e-7 * Math.Sin(localSolarTime - moonElongation)
            + 0.00133e-7 * Math.Sin(localSolarTime + sun - jupiter)
            - 0.00229e-7 * Math.Sin(localSolarTime + 2 * sun + sunAnomaly)
            + 0.05312e-7 * Math.Sin(localSolarTime - sunAnomaly)
            - 0.13677e-7 * Math.Sin(localSolarTime + 2 * sun)
            + 3.17679e-7 * Math.Sin(localSolarTime);
        double alongAxis = -0.02200e-7 * Math.Cos(sun + sunAnomaly) - 1.31840e-7 * Math.Cos(sun);
        return fromSpinAxis * acrossAxis + northOfEquator * alongAxis;
    }

    private static double MeanAngle(double degrees, double arcsecondsInMillennium, double millennia) =>
        Math.IEEERemainder(degrees + arcsecondsInMillennium * millennia / 3600, 360) * Degree;

    private static void ThrowIfOutside(double value, double bound, string parameter)
    {
        if (!(Math.Abs(value) <= bound))
        {
            throw new ArgumentOutOfRangeException(
                parameter, value, FormattableString.Invariant($"{parameter} is from {-bound:R} to {bound:R}; it is {value:R}."));
        }
    }
}
