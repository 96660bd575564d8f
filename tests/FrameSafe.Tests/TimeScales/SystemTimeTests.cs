using CsCheck;

namespace FrameSafe.Tests.TimeScales;

public class SystemTimeTests
{
    [Fact]
    public void A_tick_there_and_back() =>
        Gen.Long[new DateTime(1972, 1, 1).Ticks, new DateTime(2027, 6, 27).Ticks].Sample(ticks =>
        {
            DateTimeOffset instant = new(ticks, TimeSpan.Zero);
            WithLoss<DateTimeOffset> back = instant.ToEpoch().ToDateTimeOffset();
            Assert.Equal(instant, back.Value);
            Assert.InRange(back.LostSeconds, -8e-12, 8e-12);
        });

    [Fact]
    public void An_offset_from_utc_is_taken_off()
    {
        DateTimeOffset instant = new(2026, 12, 1, 1, 30, 0, TimeSpan.FromHours(5.5));
        Assert.Equal("2026-11-30T20:00:00 UTC", instant.ToEpoch().ToString());
    }

    [Fact]
    public void What_a_tick_cannot_hold_is_stated()
    {
        WithLoss<DateTimeOffset> rounded = Epoch<Utc>.FromCalendar(2026, 12, 1, 0, 0, 1.00000003).ToDateTimeOffset();
        Assert.Equal(new DateTimeOffset(2026, 12, 1, 0, 0, 1, TimeSpan.Zero), rounded.Value);
        Assert.Equal(3e-8, rounded.LostSeconds, 1e-15);
    }

    [Fact]
    public void A_leap_second_comes_out_as_the_last_tick_of_its_day()
    {
        WithLoss<DateTimeOffset> rounded = Epoch<Utc>.FromCalendar(2016, 12, 31, 23, 59, 60.5).ToDateTimeOffset();
        Assert.Equal(new DateTimeOffset(2017, 1, 1, 0, 0, 0, TimeSpan.Zero).AddTicks(-1), rounded.Value);
        Assert.Equal(0.5000001, rounded.LostSeconds, 1e-11);
    }

    [Fact]
    public void Spans_there_and_back() =>
        Gen.Long.Sample(ticks =>
        {
            TimeSpan span = new(ticks);
            WithLoss<TimeSpan> back = span.ToElapsedTime<Tai>().ToTimeSpan();
            Assert.Equal(span, back.Value);
            Assert.InRange(back.LostSeconds, -3e-16, 3e-16);
        });

    [Fact]
    public void A_span_that_is_too_long_overflows() =>
        Assert.Throws<OverflowException>(() => ElapsedTime<Tai>.FromDays(1e9).ToTimeSpan());
}
