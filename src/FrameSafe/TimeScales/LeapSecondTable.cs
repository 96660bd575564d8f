using System.Globalization;
using System.Security.Cryptography;
using System.Text;

namespace FrameSafe;

/// <summary>TAI − UTC by date, with the day up to which it is known to hold.</summary>
/// <remarks>
/// <para>A new step is announced by the IERS about half a year ahead (Bulletin C), so every table has an end. Beyond it a
/// conversion throws <see cref="LeapSecondTableExpiredException"/>, unless the table was told by <see cref="Extrapolated"/> that
/// no further step is to be assumed.</para>
/// <para>Whole-second steps exist since 1972-01-01 (ITU-R TF.460); earlier dates are refused. Immutable, safe to share.</para>
/// </remarks>
public sealed class LeapSecondTable
{
    private static readonly double NtpOrigin = Calendar.DayNumber(1900, 1, 1);

    private static LeapSecondTable? _current;

    private readonly LeapSecondStep[] _steps;
    private readonly double[] _days;
    private readonly double _validUntil;

    private LeapSecondTable(LeapSecondStep[] steps, DateOnly published, DateOnly validUntil, bool isExtrapolated)
    {
        _steps = steps;
        _days = Array.ConvertAll(steps, step => Calendar.DayNumber(step.From));
        _validUntil = Calendar.DayNumber(validUntil);
        Published = published;
        ValidUntil = validUntil;
        IsExtrapolated = isExtrapolated;
    }

    /// <summary>The table that came with this version of the library: issued 2026-07-06, valid until 2027-06-28.</summary>
    public static LeapSecondTable Shipped { get; } = Parse(ShippedLeapSeconds.List);

    /// <summary>The table used where none is given: <see cref="Shipped"/> until another is put here.</summary>
    /// <remarks>
    /// Set it once, as the program starts. Text and JSON of UTC epochs, their differences and the conversions that name no table
    /// read it; an epoch that was made under another table keeps its own value.
    /// </remarks>
    /// <exception cref="ArgumentNullException">The value is null.</exception>
    public static LeapSecondTable Current
    {
        get => Volatile.Read(ref _current) ?? Shipped;
        set
        {
            ArgumentNullException.ThrowIfNull(value);
            Volatile.Write(ref _current, value);
        }
    }

    /// <summary>The steps, the earliest first.</summary>
    public IReadOnlyList<LeapSecondStep> Steps => _steps;

    /// <summary>The day on which the table was issued.</summary>
    public DateOnly Published { get; }

    /// <summary>The first UTC day for which the table says nothing.</summary>
    public DateOnly ValidUntil { get; }

    /// <summary>Whether the last offset is used for dates beyond <see cref="ValidUntil"/>.</summary>
    public bool IsExtrapolated { get; }

    /// <summary>The same table, which takes its last offset to hold for ever: the explicit wish to go on beyond its end.</summary>
    public LeapSecondTable Extrapolated() => new(_steps, Published, ValidUntil, isExtrapolated: true);

    /// <summary>A table from steps of one's own.</summary>
    /// <param name="steps">The steps, the earliest first; each differs from the one before by one second.</param>
    /// <param name="published">The day on which the table was issued.</param>
    /// <param name="validUntil">The first UTC day for which it says nothing; after the last step.</param>
    /// <exception cref="ArgumentException">
    /// There is no step, the first is before 1972-01-01, two are out of order or differ by other than one second, or
    /// <paramref name="validUntil"/> is not after the last.
    /// </exception>
    public static LeapSecondTable FromSteps(IEnumerable<LeapSecondStep> steps, DateOnly published, DateOnly validUntil)
    {
        ArgumentNullException.ThrowIfNull(steps);
        LeapSecondStep[] list = [.. steps];
        if (list.Length == 0) throw new ArgumentException("A leap-second table needs at least one step.", nameof(steps));
        if (list[0].From < new DateOnly(1972, 1, 1))
            throw Bad($"step 0 is at {list[0].From:yyyy-MM-dd}; UTC steps by whole seconds from 1972-01-01 on");
        for (int i = 1; i < list.Length; i++)
        {
            if (list[i].From <= list[i - 1].From)
                throw Bad($"step {i} ({list[i].From:yyyy-MM-dd}) is not after step {i - 1} ({list[i - 1].From:yyyy-MM-dd})");
            if (Math.Abs(list[i].TaiMinusUtcInSeconds - list[i - 1].TaiMinusUtcInSeconds) != 1)
                throw Bad($"step {i} ({list[i].From:yyyy-MM-dd}) changes TAI − UTC by other than one second");
        }

        if (validUntil <= list[^1].From)
            throw Bad($"the table would end on {validUntil:yyyy-MM-dd}, not after its last step ({list[^1].From:yyyy-MM-dd})");
        return new LeapSecondTable(list, published, validUntil, isExtrapolated: false);

        static ArgumentException Bad(string what) => new($"The leap-second table is not usable: {what}.", nameof(steps));
    }

    /// <summary>Reads a table in the format of the IERS file <c>leap-seconds.list</c>.</summary>
    /// <param name="text">
    /// Lines of an NTP time (seconds of UTC days from 1900-01-01) and TAI − UTC in seconds; <c>#$</c> gives the time of issue,
    /// <c>#@</c> the end of validity, <c>#h</c> the SHA-1 check sum over the numbers, which is compared where it stands.
    /// </param>
    /// <exception cref="FormatException">A line cannot be read, the end of validity is missing, or the check sum differs.</exception>
    public static LeapSecondTable Parse(string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        List<LeapSecondStep> steps = [];
        DateOnly? published = null, validUntil = null;
        string? checkSum = null;
        StringBuilder summed = new();
        int number = 0;
        foreach (string raw in text.Split('\n'))
        {
            number++;
            string line = raw.Trim();
            if (line.StartsWith("#$", StringComparison.Ordinal)) published = NtpDay(line[2..], number, summed);
            else if (line.StartsWith("#@", StringComparison.Ordinal)) validUntil = NtpDay(line[2..], number, summed);
            else if (line.StartsWith("#h", StringComparison.Ordinal)) checkSum = line[2..];
            else if (line.Length > 0 && line[0] != '#') steps.Add(Step(line, number, summed));
        }

        if (validUntil is not { } end) throw new FormatException("The leap-second list has no line '#@' that says until when it holds.");
        if (checkSum is not null) Verify(checkSum, summed.ToString());
        return FromSteps(steps, published ?? end, end);
    }

    /// <summary>TAI − UTC on a UTC day.</summary>
    /// <param name="day">The day; from the first step on, and before <see cref="ValidUntil"/> unless <see cref="IsExtrapolated"/>.</param>
    /// <returns>The offset in seconds.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The day is before the first step.</exception>
    /// <exception cref="LeapSecondTableExpiredException">The day is beyond the end of the table.</exception>
    [return: Unit("s")]
    public int TaiMinusUtcInSeconds(DateOnly day) => Offset(Calendar.DayNumber(day));

    internal int Offset(double day)
    {
        if (day < _days[0])
        {
            throw new ArgumentOutOfRangeException(
                nameof(day), $"The leap-second table begins at {_steps[0].From:yyyy-MM-dd}; {Calendar.Date(day):yyyy-MM-dd} is before it.");
        }

        ThrowIfBeyond(day);
        return _steps[StepAt(day)].TaiMinusUtcInSeconds;
    }

    /// <summary>86 400 s, and one more or less on a day that ends with a step.</summary>
    internal double DayLength(double day)
    {
        int offset = Offset(day);
        int next = StepAt(day) + 1;
        bool stepsAtItsEnd = next < _days.Length && _days[next] == day + 1;
        return DayAndSecond.SecondsInDay + (stepsAtItsEnd ? _steps[next].TaiMinusUtcInSeconds - offset : 0);
    }

    internal DayAndSecond TaiToUtc(DayAndSecond tai)
    {
        for (int i = _steps.Length - 1; i >= 0; i--)
        {
            int offset = _steps[i].TaiMinusUtcInSeconds;
            DayAndSecond utc = DayAndSecond.Normalised(tai.Day, tai.Second - offset);
            if (utc.Day >= _days[i])
            {
                ThrowIfBeyond(utc.Day);
                return utc;
            }

            bool inLeapSecond = i > 0 && utc.Day == _days[i] - 1
                && utc.Second >= DayAndSecond.SecondsInDay - (offset - _steps[i - 1].TaiMinusUtcInSeconds);
            if (inLeapSecond) return new DayAndSecond(utc.Day, utc.Second + 1);
        }

        throw new ArgumentOutOfRangeException(
            nameof(tai), $"UTC is kept from {_steps[0].From:yyyy-MM-dd}; the TAI date is {Calendar.Date(tai.Day):yyyy-MM-dd}.");
    }

    internal DayAndSecond UtcToTai(DayAndSecond utc) => DayAndSecond.Normalised(utc.Day, utc.Second + Offset(utc.Day));

    private int StepAt(double day)
    {
        int at = Array.BinarySearch(_days, day);
        return at >= 0 ? at : ~at - 1;
    }

    private void ThrowIfBeyond(double day)
    {
        if (day >= _validUntil && !IsExtrapolated) throw new LeapSecondTableExpiredException(Calendar.Date(day), ValidUntil);
    }

    private static DateOnly NtpDay(string text, int line, StringBuilder summed)
    {
        string digits = text.Trim();
        if (!long.TryParse(digits, NumberStyles.None, CultureInfo.InvariantCulture, out long seconds))
            throw new FormatException($"Line {line} of the leap-second list: '{digits}' is no NTP time.");
        summed.Append(digits);
        double day = NtpOrigin + Math.Floor(seconds / DayAndSecond.SecondsInDay);
        if (day > DayAndSecond.LastDay)
            throw new FormatException($"Line {line} of the leap-second list: '{digits}' is later than the year 9999.");
        return Calendar.Date(day);
    }

    private static LeapSecondStep Step(string line, int number, StringBuilder summed)
    {
        string[] columns = line.Split('#')[0].Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries);
        if (columns.Length != 2)
            throw new FormatException($"Line {number} of the leap-second list has {columns.Length} columns, not two: '{line}'.");
        DateOnly from = NtpDay(columns[0], number, summed);
        if (!int.TryParse(columns[1], NumberStyles.None, CultureInfo.InvariantCulture, out int offset))
            throw new FormatException($"Line {number} of the leap-second list: '{columns[1]}' is no whole number of seconds.");
        summed.Append(columns[1]);
        return new LeapSecondStep(from, offset);
    }

    private static void Verify(string written, string summed)
    {
        // The file writes five 32-bit words and may drop their leading zeros.
        string expected = string.Concat(
            written.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries).Select(word => word.PadLeft(8, '0')));
        string actual = Convert.ToHexString(SHA1.HashData(Encoding.ASCII.GetBytes(summed)));
        if (!actual.Equals(expected, StringComparison.OrdinalIgnoreCase))
            throw new FormatException($"The check sum of the leap-second list is {actual}, not {expected.ToUpperInvariant()}: the list was changed.");
    }
}
