namespace FrameSafe;

/// <summary>From when on a time scale exists.</summary>
internal static class TimeScaleLimits
{
    // BIPM: TAI's origin. Before 1972 UTC ran at other rates than TAI and its steps were no whole seconds.
    private static readonly double TaiFirst = Calendar.DayNumber(1958, 1, 1);
    private static readonly double UtcFirst = Calendar.DayNumber(1972, 1, 1);
    private static readonly double GpsFirst = Calendar.DayNumber(1980, 1, 6);

    /// <summary>The first day of the scale; the dynamical and coordinate scales reach as far back as the calendar.</summary>
    internal static double FirstDay<TScale>() where TScale : struct, ITimeScale =>
        typeof(TScale) == typeof(Tai) ? TaiFirst
        : typeof(TScale) == typeof(Utc) ? UtcFirst
        : typeof(TScale) == typeof(Gps) ? GpsFirst
        : DayAndSecond.FirstDay;

    /// <summary>The name in text: the marker's own, in capitals as the trade writes it.</summary>
    internal static string Name<TScale>() where TScale : struct, ITimeScale => typeof(TScale).Name.ToUpperInvariant();

    internal static void Check<TScale>(double day, string parameter) where TScale : struct, ITimeScale
    {
        double first = FirstDay<TScale>();
        if (day >= first && day <= DayAndSecond.LastDay) return;
        throw new ArgumentOutOfRangeException(
            parameter,
            $"{Name<TScale>()} is kept from {Calendar.Date(first):yyyy-MM-dd} to 9999-12-31; the date is {Describe(day)}.");
    }

    private static string Describe(double day) =>
        day >= DayAndSecond.FirstDay && day <= DayAndSecond.LastDay
            ? Calendar.Date(day).ToString("yyyy-MM-dd", System.Globalization.CultureInfo.InvariantCulture)
            : FormattableString.Invariant($"Julian Date {day + DayAndSecond.OriginJulianDate:R}");
}
