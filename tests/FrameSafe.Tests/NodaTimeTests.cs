using NodaTime;

namespace FrameSafe.Tests;

/// <summary>Instants and durations of NodaTime in and out, with what is lost.</summary>
public sealed class NodaTimeTests
{
    [Fact]
    public void An_instant_comes_back_to_the_nanosecond()
    {
        Instant instant = Instant.FromUtc(2016, 7, 4, 12, 30, 15) + Duration.FromNanoseconds(123456789);

        WithLoss<Instant> back = instant.ToEpoch().ToInstant();

        Assert.Equal(instant, back.Value);
        Assert.Equal(0, back.LostSeconds, 1e-11);
    }

    [Fact]
    public void A_leap_second_is_said_to_be_lost()
    {
        // The leap second at the end of 2016 (IERS Bulletin C 52).
        WithLoss<Instant> within = Epoch<Utc>.FromDate(new DateOnly(2016, 12, 31), 86400.25).ToInstant();

        Assert.Equal(Instant.FromUtc(2017, 1, 1, 0, 0) - Duration.FromNanoseconds(1), within.Value);
        Assert.Equal(0.25, within.LostSeconds, 1e-8);
    }

    [Fact]
    public void Durations_keep_their_nanoseconds_over_a_century()
    {
        Duration duration = Duration.FromDays(36525) + Duration.FromNanoseconds(7);

        Assert.Equal(duration, duration.ToElapsedTime<Tai>().ToDuration().Value);
        Assert.Equal(-duration, (-duration).ToElapsedTime<Tai>().ToDuration().Value);
    }
}
