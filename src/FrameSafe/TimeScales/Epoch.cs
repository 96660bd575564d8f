using System.Numerics;

namespace FrameSafe;

/// <summary>A date on a time scale, to 15 ps in any century.</summary>
/// <typeparam name="TScale">The time scale: <see cref="Tai"/>, <see cref="Tt"/>, <see cref="Utc"/>, …</typeparam>
/// <remarks>
/// <para>Kept as the day and the second of the day (in UTC up to 86 401 on a day that ends with a leap second). Two epochs of one scale
/// compare and subtract; epochs of different scales do neither before one of them is converted by name
/// (<see cref="TimeScaleConversions"/>).</para>
/// <para>Range: from the year 1, or from when the scale exists (TAI 1958-01-01, UTC 1972-01-01, GPS 1980-01-06), to the year 9999 of
/// the Gregorian calendar. <c>default</c> is 2000-01-01T00:00:00.</para>
/// </remarks>
[OnClock(nameof(TScale))]
[Kind(QuantityKind.Epoch)]
public readonly partial struct Epoch<TScale> :
    IEquatable<Epoch<TScale>>,
    IComparable<Epoch<TScale>>,
    IComparisonOperators<Epoch<TScale>, Epoch<TScale>, bool>,
    IAdditionOperators<Epoch<TScale>, ElapsedTime<TScale>, Epoch<TScale>>,
    ISubtractionOperators<Epoch<TScale>, ElapsedTime<TScale>, Epoch<TScale>>,
    ISubtractionOperators<Epoch<TScale>, Epoch<TScale>, ElapsedTime<TScale>>
    where TScale : struct, ITimeScale
{
    private const double ModifiedOrigin = 51544;

    private readonly DayAndSecond _date;

    private Epoch(DayAndSecond date) => _date = date;

    private static bool HasLeapSeconds => typeof(TScale) == typeof(Utc);

    /// <summary>The calendar day.</summary>
    public DateOnly Date => Calendar.Date(_date.Day);

    /// <summary>The seconds since the day began: from 0 to below 86 400, in UTC to below the length of the day.</summary>
    [Unit("s")]
    [OnClock(nameof(TScale))]
    public double SecondOfDay => _date.Second;

    /// <summary>The Julian Date in one double: rounded to 40 µs in this century. For angles and plots; not for time.</summary>
    [TimeScale(nameof(TScale), Origin = "JD", Unit = "d")]
    public double JulianDate => JulianDateOfMidnight + DayFraction;

    /// <summary>The large part of the two-part Julian Date: that of the midnight the day began with; exact.</summary>
    [TimeScale(nameof(TScale), Origin = "JD", Unit = "d", Part = 1)]
    public double JulianDateOfMidnight => _date.Day + DayAndSecond.OriginJulianDate;

    /// <summary>The large part of the two-part Modified Julian Date: a whole number; exact.</summary>
    [TimeScale(nameof(TScale), Origin = "MJD", Unit = "d", Part = 1)]
    public double ModifiedJulianDay => _date.Day + ModifiedOrigin;

    /// <summary>
    /// The small part of either two-part date: the part of the day that has passed, from 0 to below 1, to 10 ps. In UTC it is a part of
    /// that day's own length, as the astronomers' quasi-Julian dates have it.
    /// </summary>
    [TimeScale(nameof(TScale), Origin = "JD", Unit = "d", Part = 2)]
    public double DayFraction => _date.Second / DayLength(_date.Day);

    internal DayAndSecond Parts => _date;

    /// <summary>The date that a Julian Date in two parts gives.</summary>
    /// <param name="part1">One part, in days; how the date is split between them does not matter.</param>
    /// <param name="part2">The other part, in days.</param>
    /// <exception cref="ArgumentOutOfRangeException">The date is out of the scale's range, or not a number.</exception>
    /// <exception cref="LeapSecondTableExpiredException">A UTC date beyond the end of <see cref="LeapSecondTable.Current"/>.</exception>
    public static Epoch<TScale> FromJulianDate(
        [TimeScale(nameof(TScale), Origin = "JD", Unit = "d", Part = 1)] double part1,
        [TimeScale(nameof(TScale), Origin = "JD", Unit = "d", Part = 2)] double part2) =>
        FromTwoParts(part1, part2, DayAndSecond.OriginJulianDate);

    /// <summary>The date that a Modified Julian Date in two parts gives.</summary>
    /// <inheritdoc cref="FromJulianDate"/>
    public static Epoch<TScale> FromModifiedJulianDate(
        [TimeScale(nameof(TScale), Origin = "MJD", Unit = "d", Part = 1)] double part1,
        [TimeScale(nameof(TScale), Origin = "MJD", Unit = "d", Part = 2)] double part2) =>
        FromTwoParts(part1, part2, ModifiedOrigin);

    /// <summary>A date of the Gregorian calendar and a time of day.</summary>
    /// <param name="year">From 1 to 9999.</param>
    /// <param name="month">From 1 to 12.</param>
    /// <param name="day">From 1 to the length of the month.</param>
    /// <param name="hour">From 0 to 23.</param>
    /// <param name="minute">From 0 to 59.</param>
    /// <param name="second">From 0 to below 60; below 61 in the last minute of a UTC day that ends with a leap second.</param>
    /// <exception cref="ArgumentOutOfRangeException">A part is out of its range, or the scale did not exist then.</exception>
    /// <exception cref="LeapSecondTableExpiredException">A UTC date beyond the end of <see cref="LeapSecondTable.Current"/>.</exception>
    public static Epoch<TScale> FromCalendar(
        int year, int month, int day, int hour = 0, int minute = 0, [Unit("s")] double second = 0)
    {
        ThrowIfOutside(hour, 0, 23, nameof(hour));
        ThrowIfOutside(minute, 0, 59, nameof(minute));
        double dayNumber = Calendar.DayNumber(year, month, day);
        double ofMinute = hour * 3600.0 + minute * 60.0;
        TimeScaleLimits.Check<TScale>(dayNumber, nameof(year));
        double dayLength = DayLength(dayNumber);
        bool lastMinute = hour == 23 && minute == 59;
        double minuteLength = lastMinute ? dayLength - ofMinute : 60;
        if (!(second >= 0 && second < minuteLength))
        {
            throw new ArgumentOutOfRangeException(
                nameof(second), second, FormattableString.Invariant($"The second is from 0 to below {minuteLength}; it is {second:R}."));
        }

        return Create(new DayAndSecond(dayNumber, ofMinute + second), nameof(year));
    }

    /// <summary>A day of the Gregorian calendar and the seconds since it began.</summary>
    /// <param name="date">The day.</param>
    /// <param name="secondOfDay">From 0 to below the length of the day.</param>
    /// <exception cref="ArgumentOutOfRangeException">The second is out of the day, or the scale did not exist then.</exception>
    /// <exception cref="LeapSecondTableExpiredException">A UTC date beyond the end of <see cref="LeapSecondTable.Current"/>.</exception>
    public static Epoch<TScale> FromDate(DateOnly date, [Unit("s"), OnClock(nameof(TScale))] double secondOfDay)
    {
        double day = Calendar.DayNumber(date);
        TimeScaleLimits.Check<TScale>(day, nameof(date));
        double length = DayLength(day);
        if (!(secondOfDay >= 0 && secondOfDay < length))
        {
            throw new ArgumentOutOfRangeException(
                nameof(secondOfDay), secondOfDay,
                FormattableString.Invariant($"{date:yyyy-MM-dd} has seconds from 0 to below {length}; the second is {secondOfDay:R}."));
        }

        return Create(new DayAndSecond(day, secondOfDay), nameof(date));
    }

    internal static Epoch<TScale> Create(DayAndSecond date, string parameter)
    {
        TimeScaleLimits.Check<TScale>(date.Day, parameter);
        return new Epoch<TScale>(date);
    }

    /// <summary>The date an elapsed time later; within 8 ps. UTC counts leap seconds by <see cref="LeapSecondTable.Current"/>.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The sum is out of the scale's range.</exception>
    /// <exception cref="LeapSecondTableExpiredException">A UTC date beyond the end of the table.</exception>
    public static Epoch<TScale> operator +(Epoch<TScale> left, ElapsedTime<TScale> right)
    {
        if (!HasLeapSeconds) return Create(right.After(left._date), nameof(right));
        LeapSecondTable table = LeapSecondTable.Current;
        return Create(table.TaiToUtc(right.After(table.UtcToTai(left._date))), nameof(right));
    }

    /// <summary>The date an elapsed time earlier; within 8 ps. UTC counts leap seconds by <see cref="LeapSecondTable.Current"/>.</summary>
    /// <inheritdoc cref="op_Addition"/>
    public static Epoch<TScale> operator -(Epoch<TScale> left, ElapsedTime<TScale> right) => left + -right;

    /// <summary>
    /// The time elapsed from the right epoch to the left one: exact, and in SI seconds where the scale ticks them (TAI, TT, GPS, UTC: leap
    /// seconds are counted, by <see cref="LeapSecondTable.Current"/>).
    /// </summary>
    /// <exception cref="LeapSecondTableExpiredException">A UTC date beyond the end of the table.</exception>
    public static ElapsedTime<TScale> operator -(Epoch<TScale> left, Epoch<TScale> right)
    {
        if (!HasLeapSeconds) return ElapsedTime<TScale>.Between(right._date, left._date);
        LeapSecondTable table = LeapSecondTable.Current;
        ElapsedTime<TScale> leaps = ElapsedTime<TScale>.FromSeconds(table.Offset(left._date.Day) - table.Offset(right._date.Day));
        return ElapsedTime<TScale>.Between(right._date, left._date) + leaps;
    }

    /// <summary>Whether both are the same date.</summary>
    public static bool operator ==(Epoch<TScale> left, Epoch<TScale> right) => left._date == right._date;

    /// <summary>Whether the dates differ.</summary>
    public static bool operator !=(Epoch<TScale> left, Epoch<TScale> right) => left._date != right._date;

    /// <summary>Whether the left one is earlier.</summary>
    public static bool operator <(Epoch<TScale> left, Epoch<TScale> right) => left.CompareTo(right) < 0;

    /// <summary>Whether the left one is later.</summary>
    public static bool operator >(Epoch<TScale> left, Epoch<TScale> right) => left.CompareTo(right) > 0;

    /// <summary>Whether the left one is not later.</summary>
    public static bool operator <=(Epoch<TScale> left, Epoch<TScale> right) => left.CompareTo(right) <= 0;

    /// <summary>Whether the left one is not earlier.</summary>
    public static bool operator >=(Epoch<TScale> left, Epoch<TScale> right) => left.CompareTo(right) >= 0;

    /// <inheritdoc/>
    public int CompareTo(Epoch<TScale> other)
    {
        int order = _date.Day.CompareTo(other._date.Day);
        return order != 0 ? order : _date.Second.CompareTo(other._date.Second);
    }

    /// <inheritdoc/>
    public bool Equals(Epoch<TScale> other) => this == other;

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is Epoch<TScale> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _date.GetHashCode();

    private static double DayLength(double day) =>
        HasLeapSeconds ? LeapSecondTable.Current.DayLength(day) : DayAndSecond.SecondsInDay;

    private static Epoch<TScale> FromTwoParts(double part1, double part2, double origin)
    {
        if (!(Math.Abs(part1) < 1e9 && Math.Abs(part2) < 1e9))
        {
            throw new ArgumentOutOfRangeException(
                nameof(part1), FormattableString.Invariant($"The parts of a date are below 10⁹ days; they are {part1:R} and {part2:R}."));
        }

        (double day, double part, double rest) = DayAndSecond.SplitJulianDate(part1, part2, origin);
        TimeScaleLimits.Check<TScale>(day, nameof(part1));
        double length = DayLength(day);
        double second = DayAndSecond.Scale(part, length, rest);
        return second < length
            ? Create(new DayAndSecond(day, second), nameof(part1))
            : Create(new DayAndSecond(day + 1, 0), nameof(part1));
    }

    private static void ThrowIfOutside(int value, int lowest, int highest, string parameter)
    {
        if (value < lowest || value > highest)
            throw new ArgumentOutOfRangeException(parameter, value, $"The {parameter} is from {lowest} to {highest}; it is {value}.");
    }
}
