using CsCheck;

namespace FrameSafe.Tests.TimeScales;

public class TimeScaleConversionTests
{
    // ERFA's own answers are rounded to a double day, 10 ps near one.
    private const double Erfa = 3e-11;

    private static readonly Gen<Epoch<Tt>> AnyTt =
        Gen.Select(Gen.Int[-146097, 146097], Gen.Double[0, 86399.999999], (day, second) =>
            Epoch<Tt>.FromDate(new DateOnly(2000, 1, 1).AddDays(day), second));

    private static readonly Gen<Epoch<Utc>> AnyUtc =
        Gen.Select(Gen.Int[0, 20000], Gen.Double[0, 86399.999999], (day, second) =>
            Epoch<Utc>.FromDate(new DateOnly(1972, 1, 1).AddDays(day), second));

    public static TheoryData<double[]> TtToTcg => ErfaDates.Rows("tttcg");

    public static TheoryData<double[]> TdbToTcb => ErfaDates.Rows("tdbtcb");

    public static TheoryData<double[]> UtcToTai => ErfaDates.Rows("utctai");

    [Theory]
    [MemberData(nameof(TtToTcg))]
    public void Tt_to_Tcg_as_ERFA_has_it(double[] row)
    {
        Epoch<Tt> tt = Epoch<Tt>.FromJulianDate(row[0], row[1]);
        Assert.InRange(ErfaDates.SecondsFrom(tt.ToTcg(), row[2], row[3]), -Erfa, Erfa);
    }

    [Theory]
    [MemberData(nameof(TdbToTcb))]
    public void Tdb_to_Tcb_as_ERFA_has_it(double[] row)
    {
        Epoch<Tdb> tdb = Epoch<Tdb>.FromJulianDate(row[0], row[1]);
        Assert.InRange(ErfaDates.SecondsFrom(tdb.ToTcb(), row[2], row[3]), -Erfa, Erfa);
    }

    [Theory]
    [MemberData(nameof(UtcToTai))]
    public void Utc_to_Tai_as_ERFA_has_it(double[] row)
    {
        Epoch<Utc> utc = Epoch<Utc>.FromJulianDate(row[0], row[1]);
        Assert.InRange(ErfaDates.SecondsFrom(utc.ToTai(), row[2], row[3]), -Erfa, Erfa);
    }

    // ERFA's test program (t_erfa_c.c), quoted to 1e-12 d.
    [Fact]
    public void The_four_rate_conversions_of_ERFAs_test_program()
    {
        const double Day = 2453750.5, Tolerance = 1e-12 * 86400;
        Assert.InRange(ErfaDates.SecondsFrom(Epoch<Tt>.FromJulianDate(Day, 0.892482639).ToTcg(), Day, 0.8924900312508587113), -Tolerance, Tolerance);
        Assert.InRange(ErfaDates.SecondsFrom(Epoch<Tcg>.FromJulianDate(Day, 0.892862531).ToTt(), Day, 0.8928551387488816828), -Tolerance, Tolerance);
        Assert.InRange(ErfaDates.SecondsFrom(Epoch<Tcb>.FromJulianDate(Day, 0.893019599).ToTdb(), Day, 0.8928551362746343397), -Tolerance, Tolerance);
        Assert.InRange(ErfaDates.SecondsFrom(Epoch<Tdb>.FromJulianDate(Day, 0.892855137).ToTcb(), Day, 0.8930195997253656716), -Tolerance, Tolerance);
    }

    // IAU 2000 Resolution B1.9, IAU 2006 Resolution B3; IERS Conventions (2010), Technical Note 36, Table 1.1.
    [Fact]
    public void The_IAU_constants()
    {
        Assert.Equal(6.969290134e-10, TimeScaleConversions.TcgRateOffset);
        Assert.Equal(1.550519768e-8, TimeScaleConversions.TcbRateOffset);
        Assert.Equal(-6.55e-5, TimeScaleConversions.TdbAtOriginInSeconds);
    }

    // IAU 2006 Resolution B3: TT, TCG and TCB read 1977-01-01T00:00:32.184 (JD 2443144.5003725) together; TDB reads TDB0 more.
    [Fact]
    public void The_origin_of_the_coordinate_scales()
    {
        Epoch<Tt> tt = Epoch<Tai>.FromCalendar(1977, 1, 1).ToTt();
        Assert.Equal(Epoch<Tt>.FromJulianDate(2443144.5, 0.0003725), tt);
        Assert.Equal(32.184, tt.ToTcg().SecondOfDay);
        Epoch<Tcb> tcb = Epoch<Tcb>.FromJulianDate(2443144.5, 0.0003725);
        Assert.Equal(32.184 - 6.55e-5, tcb.ToTdb().SecondOfDay, 1e-12);
    }

    // Common practice, no source: GPS time runs 18 s ahead of UTC since 2017, TAI 37 s.
    [Fact]
    public void The_offsets_of_these_years()
    {
        Epoch<Utc> utc = Epoch<Utc>.FromCalendar(2026, 7, 1, 12);
        Assert.Equal(Epoch<Tai>.FromCalendar(2026, 7, 1, 12, 0, 37), utc.ToTai());
        Assert.Equal(Epoch<Gps>.FromCalendar(2026, 7, 1, 12, 0, 18), utc.ToGps());
        Assert.Equal(69.184, utc.ToTt().SecondOfDay - 43200, 1e-11);
    }

    [Fact]
    public void There_and_back_is_the_same_date_to_15_ps() =>
        AnyTt.Sample(tt =>
        {
            Close(tt.ToTcg().ToTt(), tt);
            Close(tt.ToTdb().ToTt(), tt);
            Epoch<Tdb> tdb = tt.ToTdb();
            Close(tdb.ToTcb().ToTdb(), tdb);
            if (tt < Epoch<Tt>.FromCalendar(1980, 1, 7)) return;
            Close(tt.ToTai().ToTt(), tt);
            Close(tt.ToGps().ToTt(), tt);
        }, iter: 300);

    [Fact]
    public void Utc_there_and_back_is_the_same_date_to_15_ps() =>
        AnyUtc.Sample(utc => Close(utc.ToTai().ToUtc(), utc), iter: 2000);

    [Fact]
    public void A_date_before_the_scale_is_refused_by_name()
    {
        ArgumentOutOfRangeException fault =
            Assert.Throws<ArgumentOutOfRangeException>(() => Epoch<Tt>.FromCalendar(1979, 12, 31).ToGps());
        Assert.Contains("GPS is kept from 1980-01-06", fault.Message);
        Assert.Contains("1979-12-30", fault.Message);
        Assert.Throws<ArgumentOutOfRangeException>(() => Epoch<Tai>.FromCalendar(1971, 12, 31).ToUtc());
        Assert.Throws<ArgumentOutOfRangeException>(() => Epoch<Tai>.FromCalendar(1957, 1, 1));
    }

    private static void Close<TScale>(Epoch<TScale> actual, Epoch<TScale> expected) where TScale : struct, ITimeScale =>
        Assert.InRange((actual - expected).InSeconds, -1.5e-11, 1.5e-11);
}
