namespace FrameSafe;

/// <summary>Epochs and elapsed times to and from the types of .NET, whose tick is 100 ns.</summary>
/// <remarks>
/// In: exact to the 15 ps of an epoch. Out: rounded to the nearest tick, and the loss (up to 50 ns) is part of the answer. .NET has no
/// leap seconds: an epoch within one comes out as the last tick of its day, with all that follows (up to 1 s) counted as lost, and
/// the difference of two <see cref="DateTimeOffset"/> across one is not the elapsed time.
/// </remarks>
public static class SystemTime
{
    /// <summary>The UTC date of a .NET instant.</summary>
    /// <param name="instant">From 1972-01-01 to the end of <see cref="LeapSecondTable.Current"/>.</param>
    /// <exception cref="ArgumentOutOfRangeException">The instant is before 1972-01-01.</exception>
    /// <exception cref="LeapSecondTableExpiredException">The instant is beyond the end of the table.</exception>
    public static Epoch<Utc> ToEpoch(this DateTimeOffset instant)
    {
        DateTime utc = instant.UtcDateTime;
        double second = utc.TimeOfDay.Ticks / (double)TimeSpan.TicksPerSecond;
        return Epoch<Utc>.FromDate(DateOnly.FromDateTime(utc), second);
    }

    /// <summary>The nearest .NET instant, and what it could not hold.</summary>
    /// <param name="epoch">The date.</param>
    public static WithLoss<DateTimeOffset> ToDateTimeOffset(this Epoch<Utc> epoch)
    {
        DateTime midnight = epoch.Date.ToDateTime(TimeOnly.MinValue, DateTimeKind.Utc);
        double second = epoch.SecondOfDay;
        long ticks = second < DayAndSecond.SecondsInDay
            ? (long)Math.Round(second * TimeSpan.TicksPerSecond)
            : TimeSpan.TicksPerDay - 1;
        // A day that ends with the calendar has no tick beyond it.
        ticks = Math.Min(ticks, DateTime.MaxValue.Ticks - midnight.Ticks);
        return new WithLoss<DateTimeOffset>(new DateTimeOffset(midnight.AddTicks(ticks)), second - SecondsOf(ticks));
    }

    /// <summary>The elapsed time of a <see cref="TimeSpan"/> that is known to count seconds of the scale.</summary>
    /// <param name="span">Any.</param>
    /// <typeparam name="TScale">The scale.</typeparam>
    public static ElapsedTime<TScale> ToElapsedTime<TScale>(this TimeSpan span) where TScale : struct, ITimeScale
    {
        (long seconds, long ticks) = Math.DivRem(span.Ticks, TimeSpan.TicksPerSecond);
        return ElapsedTime<TScale>.FromSeconds(seconds, ticks / (double)TimeSpan.TicksPerSecond);
    }

    /// <summary>The nearest <see cref="TimeSpan"/>, and what it could not hold.</summary>
    /// <param name="elapsed">Up to 29 000 years either way.</param>
    /// <typeparam name="TScale">The scale.</typeparam>
    /// <exception cref="OverflowException">The time is beyond the range of <see cref="TimeSpan"/>.</exception>
    public static WithLoss<TimeSpan> ToTimeSpan<TScale>(this ElapsedTime<TScale> elapsed) where TScale : struct, ITimeScale
    {
        double whole = Math.Truncate(elapsed.InSeconds);
        double part = elapsed.InSeconds - whole + elapsed.RestInSeconds;
        long ticks = (long)Math.Round(part * TimeSpan.TicksPerSecond);
        TimeSpan span = new(checked(checked((long)whole * TimeSpan.TicksPerSecond) + ticks));
        return new WithLoss<TimeSpan>(span, part - SecondsOf(ticks));
    }

    private static double SecondsOf(long ticks) => ticks / (double)TimeSpan.TicksPerSecond;
}
