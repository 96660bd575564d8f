namespace FrameSafe.Tests.TimeScales;

public class LeapSecondTableTests
{
    // IERS Bulletin C: the steps of 1972, 1999 and 2017.
    [Theory]
    [InlineData("1972-01-01", 10)]
    [InlineData("1972-06-30", 10)]
    [InlineData("1972-07-01", 11)]
    [InlineData("1998-12-31", 31)]
    [InlineData("1999-01-01", 32)]
    [InlineData("2016-12-31", 36)]
    [InlineData("2017-01-01", 37)]
    [InlineData("2027-06-27", 37)]
    public void The_offset_of_a_day(string day, int expected) =>
        Assert.Equal(expected, LeapSecondTable.Shipped.TaiMinusUtcInSeconds(Day(day)));

    [Fact]
    public void Twenty_seven_leap_seconds_so_far() => Assert.Equal(28, LeapSecondTable.Shipped.Steps.Count);

    [Fact]
    public void Beyond_its_end_the_table_refuses_and_says_what_to_do()
    {
        LeapSecondTableExpiredException fault = Assert.Throws<LeapSecondTableExpiredException>(
            () => LeapSecondTable.Shipped.TaiMinusUtcInSeconds(Day("2027-06-28")));
        Assert.Equal(Day("2027-06-28"), fault.ValidUntil);
        Assert.Contains("2027-06-28", fault.Message);
        Assert.Contains("Extrapolated", fault.Message);
        Assert.Throws<LeapSecondTableExpiredException>(() => Epoch<Tai>.FromCalendar(2040, 1, 1).ToUtc());
    }

    [Fact]
    public void Told_to_extrapolate_it_holds_the_last_offset()
    {
        LeapSecondTable table = LeapSecondTable.Shipped.Extrapolated();
        Assert.Equal(37, table.TaiMinusUtcInSeconds(Day("2090-01-01")));
        Assert.Equal(86400 - 37, Epoch<Tai>.FromCalendar(2040, 1, 1).ToUtc(table).SecondOfDay);
    }

    [Fact]
    public void The_leap_second_has_a_name_of_its_own()
    {
        Epoch<Tai> before = Epoch<Tai>.FromCalendar(2017, 1, 1, 0, 0, 35.5);
        Epoch<Tai> within = Epoch<Tai>.FromCalendar(2017, 1, 1, 0, 0, 36.5);
        Epoch<Tai> after = Epoch<Tai>.FromCalendar(2017, 1, 1, 0, 0, 37.5);
        Assert.Equal("2016-12-31T23:59:59.5 UTC", before.ToUtc().ToString());
        Assert.Equal("2016-12-31T23:59:60.5 UTC", within.ToUtc().ToString());
        Assert.Equal("2017-01-01T00:00:00.5 UTC", after.ToUtc().ToString());
        Assert.Equal(within, within.ToUtc().ToTai());
    }

    [Fact]
    public void Elapsed_utc_counts_leap_seconds()
    {
        ElapsedTime<Utc> elapsed = Epoch<Utc>.FromCalendar(2017, 1, 1) - Epoch<Utc>.FromCalendar(2016, 12, 31);
        Assert.Equal(86401, elapsed.InSeconds);
        Assert.Equal(Epoch<Utc>.FromCalendar(2017, 1, 1), Epoch<Utc>.FromCalendar(2016, 12, 31) + elapsed);
    }

    [Fact]
    public void A_second_that_was_removed_cannot_be_named()
    {
        LeapSecondTable table = LeapSecondTable.FromSteps(
            [new(Day("1972-01-01"), 10), new(Day("1973-01-01"), 9)], Day("1972-06-01"), Day("1980-01-01"));
        Assert.Equal(86399, table.DayLength(Calendar.DayNumber(1972, 12, 31)));
        // The second after 23:59:58 is midnight.
        Epoch<Tai> last = Epoch<Tai>.FromCalendar(1973, 1, 1, 0, 0, 8.5);
        Assert.Equal("1972-12-31T23:59:58.5 UTC", last.ToUtc(table).ToString());
        Assert.Equal("1973-01-01T00:00:00.5 UTC", (last + ElapsedTime<Tai>.FromSeconds(1)).ToUtc(table).ToString());
    }

    [Fact]
    public void A_list_with_a_changed_number_is_refused()
    {
        string changed = ShippedLeapSeconds.List.Replace("3692217600 37", "3692217600 38").Replace("3644697600 36", "3644697600 37");
        Assert.Contains("check sum", Assert.Throws<FormatException>(() => LeapSecondTable.Parse(changed)).Message);
    }

    [Theory]
    [InlineData("#@ 4023129600\n2272060800", "columns")]
    [InlineData("#@ 4023129600\nabc 10", "no NTP time")]
    [InlineData("2272060800 10", "#@")]
    public void A_list_that_cannot_be_read_says_where(string text, string expected) =>
        Assert.Contains(expected, Assert.Throws<FormatException>(() => LeapSecondTable.Parse(text)).Message);

    [Fact]
    public void Steps_out_of_order_are_refused() =>
        Assert.Contains(
            "step 1",
            Assert.Throws<ArgumentException>(() => LeapSecondTable.FromSteps(
                [new(Day("1980-01-01"), 10), new(Day("1979-01-01"), 11)], Day("1980-01-01"), Day("1990-01-01"))).Message);

    private static DateOnly Day(string text) => DateOnly.ParseExact(text, "yyyy-MM-dd");
}
