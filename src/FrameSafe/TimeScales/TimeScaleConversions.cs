namespace FrameSafe;

/// <summary>The conversions between time scales: each by its name, none implicit.</summary>
/// <remarks>
/// <para>TAI, TT and GPS differ by constants. UTC differs from TAI by whole seconds, by date. TCG runs at a rate against TT, and TCB
/// against TDB, that the IAU has fixed; TDB − TT is a periodic function (<see cref="BarycentricTime"/>).</para>
/// <para>Each conversion rounds once, to the second of the day: within 8 ps; there and back within 15 ps. Conversions by way of
/// TDB − TT are moreover as good as that series.</para>
/// <para>Sources: BIPM SI Brochure (9th ed.), appendix 2; IAU 2000 Resolution B1.9 (TCG); IAU 2006 Resolution B3 (TDB); IS-GPS-200
/// (GPS time).</para>
/// </remarks>
public static class TimeScaleConversions
{
    /// <summary>L_G = 1 − dTT/dTCG, by definition (IAU 2000 Resolution B1.9).</summary>
    [Unit("1")]
    public const double TcgRateOffset = 6.969290134e-10;

    /// <summary>L_B = 1 − dTDB/dTCB, by definition (IAU 2006 Resolution B3).</summary>
    [Unit("1")]
    public const double TcbRateOffset = 1.550519768e-8;

    /// <summary>TDB₀, the constant of the definition of TDB (IAU 2006 Resolution B3).</summary>
    [Unit("s")]
    public const double TdbAtOriginInSeconds = -6.55e-5;

    private const double TtMinusTai = 32.184;

    private const double TaiMinusGps = 19;

    // 1977-01-01T00:00:00 TAI, where TT, TCG and TCB agree: Julian Date 2443144.5003725 in each.
    private static readonly DayAndSecond Origin = new(Calendar.DayNumber(1977, 1, 1), TtMinusTai);

    /// <summary>TAI to TT: TT = TAI + 32.184 s.</summary>
    public static Epoch<Tt> ToTt(this Epoch<Tai> epoch) => Later<Tai, Tt>(epoch, TtMinusTai);

    /// <summary>TT to TAI.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The date is before TAI's origin.</exception>
    public static Epoch<Tai> ToTai(this Epoch<Tt> epoch) => Later<Tt, Tai>(epoch, -TtMinusTai);

    /// <summary>TAI to GPS time: GPS = TAI − 19 s.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The date is before GPS time's origin, 1980-01-06.</exception>
    public static Epoch<Gps> ToGps(this Epoch<Tai> epoch) => Later<Tai, Gps>(epoch, -TaiMinusGps);

    /// <summary>GPS time to TAI.</summary>
    public static Epoch<Tai> ToTai(this Epoch<Gps> epoch) => Later<Gps, Tai>(epoch, TaiMinusGps);

    /// <summary>UTC to TAI.</summary>
    /// <param name="epoch">The date.</param>
    /// <param name="table">The leap seconds; <see cref="LeapSecondTable.Current"/> if not given.</param>
    /// <exception cref="LeapSecondTableExpiredException">The date is beyond the end of the table.</exception>
    public static Epoch<Tai> ToTai(this Epoch<Utc> epoch, LeapSecondTable? table = null) =>
        Epoch<Tai>.Create((table ?? LeapSecondTable.Current).UtcToTai(epoch.Parts), nameof(epoch));

    /// <summary>TAI to UTC.</summary>
    /// <param name="epoch">The date.</param>
    /// <param name="table">The leap seconds; <see cref="LeapSecondTable.Current"/> if not given.</param>
    /// <exception cref="ArgumentOutOfRangeException">The date is before 1972-01-01 UTC.</exception>
    /// <exception cref="LeapSecondTableExpiredException">The date is beyond the end of the table.</exception>
    public static Epoch<Utc> ToUtc(this Epoch<Tai> epoch, LeapSecondTable? table = null) =>
        Epoch<Utc>.Create((table ?? LeapSecondTable.Current).TaiToUtc(epoch.Parts), nameof(epoch));

    /// <summary>TT to TCG, the coordinate time of the geocentric frame.</summary>
    public static Epoch<Tcg> ToTcg(this Epoch<Tt> epoch) =>
        Later<Tt, Tcg>(epoch, TcgRateOffset / (1 - TcgRateOffset) * SinceOrigin(epoch));

    /// <summary>TCG to TT.</summary>
    public static Epoch<Tt> ToTt(this Epoch<Tcg> epoch) => Later<Tcg, Tt>(epoch, -TcgRateOffset * SinceOrigin(epoch));

    /// <summary>TDB to TCB, the coordinate time of the barycentric frame.</summary>
    public static Epoch<Tcb> ToTcb(this Epoch<Tdb> epoch)
    {
        double rate = TcbRateOffset / (1 - TcbRateOffset);
        return Later<Tdb, Tcb>(epoch, rate * (SinceOrigin(epoch) - TdbAtOriginInSeconds) - TdbAtOriginInSeconds);
    }

    /// <summary>TCB to TDB.</summary>
    public static Epoch<Tdb> ToTdb(this Epoch<Tcb> epoch) =>
        Later<Tcb, Tdb>(epoch, TdbAtOriginInSeconds - TcbRateOffset * SinceOrigin(epoch));

    /// <summary>TT to TDB, by <see cref="BarycentricTime.TdbMinusTtInSeconds(Epoch{Tt})"/>.</summary>
    public static Epoch<Tdb> ToTdb(this Epoch<Tt> epoch) => Later<Tt, Tdb>(epoch, BarycentricTime.TdbMinusTtInSeconds(epoch));

    /// <summary>TDB to TT, by <see cref="BarycentricTime.TdbMinusTtInSeconds(Epoch{Tt})"/>.</summary>
    public static Epoch<Tt> ToTt(this Epoch<Tdb> epoch)
    {
        // TDB − TT changes by less than 4e-10 of what its argument does: one step brings the argument within 1e-12 s of TT.
        Epoch<Tt> near = Later<Tdb, Tt>(epoch, 0);
        return Later<Tdb, Tt>(epoch, -BarycentricTime.TdbMinusTtInSeconds(near));
    }

    /// <summary>UTC to TT, by way of TAI.</summary>
    /// <inheritdoc cref="ToTai(Epoch{Utc}, LeapSecondTable?)"/>
    public static Epoch<Tt> ToTt(this Epoch<Utc> epoch, LeapSecondTable? table = null) => epoch.ToTai(table).ToTt();

    /// <summary>TT to UTC, by way of TAI.</summary>
    /// <inheritdoc cref="ToUtc(Epoch{Tai}, LeapSecondTable?)"/>
    public static Epoch<Utc> ToUtc(this Epoch<Tt> epoch, LeapSecondTable? table = null) => epoch.ToTai().ToUtc(table);

    /// <summary>UTC to GPS time, by way of TAI.</summary>
    /// <inheritdoc cref="ToTai(Epoch{Utc}, LeapSecondTable?)"/>
    public static Epoch<Gps> ToGps(this Epoch<Utc> epoch, LeapSecondTable? table = null) => epoch.ToTai(table).ToGps();

    /// <summary>GPS time to UTC, by way of TAI.</summary>
    /// <inheritdoc cref="ToUtc(Epoch{Tai}, LeapSecondTable?)"/>
    public static Epoch<Utc> ToUtc(this Epoch<Gps> epoch, LeapSecondTable? table = null) => epoch.ToTai().ToUtc(table);

    /// <summary>GPS time to TT, by way of TAI.</summary>
    public static Epoch<Tt> ToTt(this Epoch<Gps> epoch) => Later<Gps, Tt>(epoch, TaiMinusGps + TtMinusTai);

    /// <summary>TT to GPS time, by way of TAI.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The date is before GPS time's origin, 1980-01-06.</exception>
    public static Epoch<Gps> ToGps(this Epoch<Tt> epoch) => Later<Tt, Gps>(epoch, -(TaiMinusGps + TtMinusTai));

    /// <summary>UTC to TDB, by way of TAI and TT.</summary>
    /// <inheritdoc cref="ToTai(Epoch{Utc}, LeapSecondTable?)"/>
    public static Epoch<Tdb> ToTdb(this Epoch<Utc> epoch, LeapSecondTable? table = null) => epoch.ToTt(table).ToTdb();

    /// <summary>TDB to UTC, by way of TT and TAI.</summary>
    /// <inheritdoc cref="ToUtc(Epoch{Tai}, LeapSecondTable?)"/>
    public static Epoch<Utc> ToUtc(this Epoch<Tdb> epoch, LeapSecondTable? table = null) => epoch.ToTt().ToUtc(table);

    private static Epoch<TTo> Later<TFrom, TTo>(Epoch<TFrom> epoch, double seconds)
        where TFrom : struct, ITimeScale
        where TTo : struct, ITimeScale
    {
        double second = DayAndSecond.TwoSum(epoch.Parts.Second, seconds, out double rest);
        return Epoch<TTo>.Create(DayAndSecond.Normalised(epoch.Parts.Day, second, rest), nameof(epoch));
    }

    private static double SinceOrigin<TScale>(Epoch<TScale> epoch) where TScale : struct, ITimeScale =>
        (epoch.Parts.Day - Origin.Day) * DayAndSecond.SecondsInDay + (epoch.Parts.Second - Origin.Second);
}
