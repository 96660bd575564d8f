using NodaTime;

namespace FrameSafe;

/// <summary>Epochs and elapsed times to and from the types of NodaTime, whose finest step is a nanosecond.</summary>
/// <remarks>
/// In: exact to the 15 ps of an epoch. Out: rounded to the nearest nanosecond, and the loss (up to 0.5 ns) is part of the answer. NodaTime
/// has no leap seconds: an epoch within one comes out as the last nanosecond of its day, with all that follows counted as lost, and
/// the difference of two instants across one is not the elapsed time.
/// </remarks>
public static class NodaTimeConversions
{
    private const double SecondsInDay = 86400;
    private const long NanosecondsInDay = 86_400_000_000_000;
    private const double NanosecondsInSecond = 1e9;

    /// <summary>The UTC date of an instant.</summary>
    /// <param name="instant">From 1972-01-01 to the end of <see cref="LeapSecondTable.Current"/>.</param>
    /// <exception cref="ArgumentOutOfRangeException">The instant is before 1972-01-01, or after the year 9999.</exception>
    /// <exception cref="LeapSecondTableExpiredException">The instant is beyond the end of the table.</exception>
    public static Epoch<Utc> ToEpoch(this Instant instant)
    {
        LocalDateTime utc = instant.InUtc().LocalDateTime;
        return Epoch<Utc>.FromDate(new DateOnly(utc.Year, utc.Month, utc.Day), utc.NanosecondOfDay / NanosecondsInSecond);
    }

    /// <summary>The nearest instant, and what it could not hold.</summary>
    /// <param name="epoch">The date.</param>
    public static WithLoss<Instant> ToInstant(this Epoch<Utc> epoch)
    {
        DateOnly date = epoch.Date;
        double second = epoch.SecondOfDay;
        long nanoseconds = second < SecondsInDay ? (long)Math.Round(second * NanosecondsInSecond) : NanosecondsInDay - 1;
        Instant midnight = new LocalDate(date.Year, date.Month, date.Day).AtMidnight().InUtc().ToInstant();
        return new(midnight + Duration.FromNanoseconds(nanoseconds), second - (nanoseconds / NanosecondsInSecond));
    }

    /// <summary>The elapsed time of a duration that is known to count seconds of the scale.</summary>
    /// <typeparam name="TScale">The scale.</typeparam>
    public static ElapsedTime<TScale> ToElapsedTime<TScale>(this Duration duration)
        where TScale : struct, ITimeScale
        => ElapsedTime<TScale>.FromSeconds(
            (duration.Days * SecondsInDay) + (duration.NanosecondOfDay / 1_000_000_000),
            duration.NanosecondOfDay % 1_000_000_000 / NanosecondsInSecond);

    /// <summary>The nearest duration, and what it could not hold.</summary>
    /// <typeparam name="TScale">The scale.</typeparam>
    /// <exception cref="ArgumentOutOfRangeException">The time is beyond the range of a duration.</exception>
    public static WithLoss<Duration> ToDuration<TScale>(this ElapsedTime<TScale> elapsed)
        where TScale : struct, ITimeScale
    {
        double whole = Math.Truncate(elapsed.InSeconds);
        double part = elapsed.InSeconds - whole + elapsed.RestInSeconds;
        double nanoseconds = Math.Round(part * NanosecondsInSecond);
        return new(Duration.FromSeconds((long)whole) + Duration.FromNanoseconds((long)nanoseconds), part - (nanoseconds / NanosecondsInSecond));
    }
}
