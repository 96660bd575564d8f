using CsCheck;

namespace FrameSafe.Tests.TimeScales;

public class EpochTests
{
    private static readonly Gen<Epoch<Tai>> AnyTai =
        Gen.Select(Gen.Int[0, 2_900_000], Gen.Double[0, 86399.999999999], (day, second) =>
            Epoch<Tai>.FromDate(new DateOnly(1958, 1, 1).AddDays(day), second < 1e-20 ? 0 : second));

    // ISO 8601 and the Explanatory Supplement to the Astronomical Almanac: J2000.0 is JD 2451545.0, 2000-01-01T12:00:00.
    [Fact]
    public void J2000_by_every_door()
    {
        Epoch<Tt> epoch = Epoch<Tt>.FromCalendar(2000, 1, 1, 12);
        Assert.Equal(epoch, Epoch<Tt>.FromJulianDate(2451545.0, 0));
        Assert.Equal(epoch, Epoch<Tt>.FromJulianDate(0, 2451545.0));
        Assert.Equal(epoch, Epoch<Tt>.FromModifiedJulianDate(51544, 0.5));
        Assert.Equal(2451545.0, epoch.JulianDate);
        Assert.Equal(51544, epoch.ModifiedJulianDay);
        Assert.Equal(0.5, epoch.DayFraction);
        Assert.Equal(default, Epoch<Tt>.FromCalendar(2000, 1, 1));
    }

    [Fact]
    public void How_a_two_part_date_is_split_does_not_matter() =>
        Gen.Select(Gen.Int[2_400_000, 2_500_000], Gen.Int[0, 1 << 20], Gen.Int[-100, 100]).Sample((day, part, shift) =>
        {
            // Dyadic fractions, so that every split holds the same date exactly.
            double fraction = part / (double)(1 << 20);
            Epoch<Tt> whole = Epoch<Tt>.FromJulianDate(day, fraction);
            Assert.Equal(whole, Epoch<Tt>.FromJulianDate(day + fraction, 0));
            Assert.Equal(whole, Epoch<Tt>.FromJulianDate(shift + fraction, day - shift));
            Assert.Equal(whole, Epoch<Tt>.FromJulianDate(day + 1, fraction - 1));
        });

    [Fact]
    public void Differences_over_centuries_are_exact()
    {
        Epoch<Tt> early = Epoch<Tt>.FromDate(new DateOnly(1600, 1, 1), 0.125);
        Epoch<Tt> late = Epoch<Tt>.FromDate(new DateOnly(2200, 1, 1), 1e-9 + 0.125);
        ElapsedTime<Tt> elapsed = late - early;
        // 600 years of the Gregorian calendar from 1600 have 219 146 days.
        double seconds = 219146.0 * 86400;
        Assert.Equal(late.SecondOfDay - 0.125, (elapsed - ElapsedTime<Tt>.FromSeconds(seconds)).InSeconds);
        Assert.Equal(late, early + elapsed);
    }

    [Fact]
    public void Adding_a_difference_leads_back() =>
        Gen.Select(AnyTai, AnyTai).Sample((a, b) =>
        {
            Epoch<Tai> back = a + (b - a);
            Assert.InRange((back - b).InSeconds, -8e-12, 8e-12);
            Assert.Equal(b - a, -(a - b));
        });

    [Fact]
    public void Text_brings_the_same_epoch_back() =>
        AnyTai.Sample(epoch => Assert.Equal(epoch, Epoch<Tai>.Parse(epoch.ToString())));

    [Theory]
    [InlineData(7, 5, 3.25, null, "2026-12-01T07:05:03.25 TAI")]
    [InlineData(0, 0, 0, null, "2026-12-01T00:00:00 TAI")]
    [InlineData(23, 59, 59.9996, "F3", "2026-12-02T00:00:00.000 TAI")]
    [InlineData(23, 58, 59.9996, "F3", "2026-12-01T23:59:00.000 TAI")]
    [InlineData(1, 2, 9.996, "F2", "2026-12-01T01:02:10.00 TAI")]
    [InlineData(1, 2, 4, "F0", "2026-12-01T01:02:04 TAI")]
    public void Text(int hour, int minute, double second, string? format, string expected) =>
        Assert.Equal(expected, Epoch<Tai>.FromCalendar(2026, 12, 1, hour, minute, second).ToString(format, null));

    [Fact]
    public void The_name_of_the_scale_must_agree()
    {
        Assert.Contains("TAI", Assert.Throws<FormatException>(() => Epoch<Tai>.Parse("2026-12-01T00:00:00 UTC")).Message);
        Assert.False(Epoch<Tai>.TryParse("2026-12-01T00:00:00", null, out _));
        Assert.False(Epoch<Tai>.TryParse("2026-13-01T00:00:00 TAI", null, out _));
        Assert.Equal(Epoch<Utc>.FromCalendar(2026, 12, 1), Epoch<Utc>.Parse("2026-12-01T00:00:00Z"));
        Assert.False(Epoch<Utc>.TryParse("2030-12-01T00:00:00Z", null, out _));
    }

    [Fact]
    public void Sixty_is_a_second_only_where_one_was_added()
    {
        Assert.Equal(86400.25, Epoch<Utc>.FromCalendar(2016, 12, 31, 23, 59, 60.25).SecondOfDay);
        Assert.Throws<ArgumentOutOfRangeException>(() => Epoch<Utc>.FromCalendar(2015, 12, 31, 23, 59, 60.25));
        Assert.Throws<ArgumentOutOfRangeException>(() => Epoch<Utc>.FromCalendar(2016, 12, 31, 23, 58, 60.25));
        Assert.Contains(
            "from 0 to below 60", Assert.Throws<ArgumentOutOfRangeException>(() => Epoch<Tai>.FromCalendar(2016, 12, 31, 23, 59, 60.25)).Message);
    }

    [Theory]
    [InlineData(double.NaN, 0)]
    [InlineData(2451545, double.PositiveInfinity)]
    [InlineData(-1e8, 0)]
    [InlineData(6e6, 0)]
    public void A_date_that_is_none_is_refused(double part1, double part2) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Epoch<Tt>.FromJulianDate(part1, part2));

    // Common practice, no source: GPS week 2000 began on 2018-05-06.
    [Fact]
    public void Gps_weeks()
    {
        Epoch<Gps> epoch = GpsWeek.ToEpoch(2000, 345600.5);
        Assert.Equal(new DateOnly(2018, 5, 10), epoch.Date);
        Assert.Equal(2000, epoch.Week());
        Assert.Equal(345600.5, epoch.SecondOfWeek());
        Assert.Throws<ArgumentOutOfRangeException>(() => GpsWeek.ToEpoch(-1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => GpsWeek.ToEpoch(0, 604800));
    }

    [Fact]
    public void Order_and_equality_agree() =>
        Gen.Select(AnyTai, AnyTai).Sample((a, b) =>
        {
            Assert.Equal(a < b, b > a);
            Assert.Equal(a <= b, !(a > b));
            Assert.Equal(Math.Sign(a.CompareTo(b)), Math.Sign((a - b).InSeconds));
            Assert.True(a.Equals((object)a) && a.GetHashCode() == (a + ElapsedTime<Tai>.Zero).GetHashCode());
        });
}
