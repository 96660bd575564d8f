namespace FrameSafe;

/// <summary>The proleptic Gregorian calendar of ISO 8601 against the count of days from 2000-01-01.</summary>
internal static class Calendar
{
    private static readonly int Origin = new DateOnly(2000, 1, 1).DayNumber;

    internal static double DayNumber(int year, int month, int day) => DayNumber(new DateOnly(year, month, day));

    internal static double DayNumber(DateOnly date) => date.DayNumber - Origin;

    internal static DateOnly Date(double dayNumber) => DateOnly.FromDayNumber((int)dayNumber + Origin);
}
