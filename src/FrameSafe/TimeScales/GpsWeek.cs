namespace FrameSafe;

/// <summary>GPS time as receivers give it: the week since 1980-01-06 and the second of that week.</summary>
/// <remarks>Source: IS-GPS-200, section 3.3.4 (from memory). The week is not cut to the 10 or 13 bits that are sent.</remarks>
public static class GpsWeek
{
    private static readonly double FirstSunday = Calendar.DayNumber(1980, 1, 6);

    /// <summary>The date of a second of a week.</summary>
    /// <param name="week">The full week number, from 0.</param>
    /// <param name="secondOfWeek">From 0 to below 604 800.</param>
    /// <exception cref="ArgumentOutOfRangeException">The week is negative or beyond the year 9999, or the second is outside the week.</exception>
    public static Epoch<Gps> ToEpoch(int week, [Unit("s"), OnClock<Gps>] double secondOfWeek)
    {
        if (week < 0) throw new ArgumentOutOfRangeException(nameof(week), week, $"A GPS week is counted from 0; it is {week}.");
        if (!(secondOfWeek >= 0 && secondOfWeek < 7 * DayAndSecond.SecondsInDay))
        {
            throw new ArgumentOutOfRangeException(
                nameof(secondOfWeek), secondOfWeek,
                FormattableString.Invariant($"The second of a week is from 0 to below 604 800; it is {secondOfWeek:R}."));
        }

        return Epoch<Gps>.Create(DayAndSecond.Normalised(FirstSunday + 7.0 * week, secondOfWeek), nameof(week));
    }

    /// <summary>The full week number of a date.</summary>
    public static int Week(this Epoch<Gps> epoch) => (int)Math.Floor((epoch.Parts.Day - FirstSunday) / 7);

    /// <summary>The second of the week of a date, to 60 ps.</summary>
    [return: Unit("s")]
    [return: OnClock<Gps>]
    public static double SecondOfWeek(this Epoch<Gps> epoch) =>
        (epoch.Parts.Day - FirstSunday - 7.0 * epoch.Week()) * DayAndSecond.SecondsInDay + epoch.SecondOfDay;
}
