using System.Diagnostics.CodeAnalysis;
using System.Globalization;

namespace FrameSafe;

/// <content>Text: the ISO 8601 date and time, a space and the name of the scale: <c>2026-12-01T07:12:35.25 TAI</c>.</content>
public readonly partial struct Epoch<TScale> : ISpanFormattable, ISpanParsable<Epoch<TScale>>
{
    private const int MostDecimals = 12;

    /// <summary>The date in the round-trip format.</summary>
    public override string ToString() => ToString(null, null);

    /// <summary>The date as text; the same in every culture.</summary>
    /// <param name="format">
    /// Null, empty or <c>O</c> for as many decimals of the second as bring the same epoch back (at most 40); <c>F0</c> to <c>F12</c> for so many decimals,
    /// rounded.
    /// </param>
    /// <param name="formatProvider">Not used.</param>
    /// <exception cref="FormatException">The format is none of these.</exception>
    public string ToString(string? format, IFormatProvider? formatProvider)
    {
        (DateOnly date, int minutes, string second) = Rounded(Decimals(format));
        return string.Create(
            CultureInfo.InvariantCulture,
            $"{date:yyyy-MM-dd}T{minutes / 60:00}:{minutes % 60:00}:{second} {TimeScaleLimits.Name<TScale>()}");
    }

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider) =>
        destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);

    /// <summary>Reads a date as it is written; the scale's name must stand in it, and be this one (<c>Z</c> will do for UTC).</summary>
    /// <exception cref="FormatException">The text is no such date, or is one on another scale.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A part of the date is out of its range.</exception>
    public static Epoch<TScale> Parse(ReadOnlySpan<char> s, IFormatProvider? provider)
    {
        string? fault = Read(s, out Epoch<TScale> epoch);
        return fault is null ? epoch : throw new FormatException(fault);
    }

    /// <inheritdoc cref="Parse(ReadOnlySpan{char}, IFormatProvider?)"/>
    public static Epoch<TScale> Parse(string s, IFormatProvider? provider = null)
    {
        ArgumentNullException.ThrowIfNull(s);
        return Parse(s.AsSpan(), provider);
    }

    /// <inheritdoc/>
    public static bool TryParse(ReadOnlySpan<char> s, IFormatProvider? provider, out Epoch<TScale> result)
    {
        try
        {
            return Read(s, out result) is null;
        }
        catch (Exception fault) when (fault is ArgumentOutOfRangeException or LeapSecondTableExpiredException)
        {
            result = default;
            return false;
        }
    }

    /// <inheritdoc/>
    public static bool TryParse([NotNullWhen(true)] string? s, IFormatProvider? provider, out Epoch<TScale> result) =>
        TryParse(s.AsSpan(), provider, out result);

    private static int? Decimals(ReadOnlySpan<char> format)
    {
        if (format.IsEmpty || format is "O" or "o") return null;
        if (format[0] is 'F' or 'f' && int.TryParse(format[1..], NumberStyles.None, CultureInfo.InvariantCulture, out int decimals)
            && decimals <= MostDecimals)
            return decimals;
        throw new FormatException($"An epoch is written by the format O, or F0 to F{MostDecimals}; not '{format}'.");
    }

    private (DateOnly Date, int Minutes, string Second) Rounded(int? decimals)
    {
        double day = _date.Day, ofDay = _date.Second;
        if (decimals is { } count)
        {
            ofDay = (double)Math.Round((decimal)Math.Floor(ofDay) + (decimal)(ofDay - Math.Floor(ofDay)), count);
            if (ofDay >= DayLength(day)) (day, ofDay) = (day + 1, 0);
        }

        // A leap second is the sixty-first of the last minute.
        int minutes = Math.Min((int)(ofDay / 60), 24 * 60 - 1);
        double second = ofDay - 60.0 * minutes;
        string digits = second.ToString(decimals is null ? "R" : "F" + decimals, CultureInfo.InvariantCulture);
        if (digits.Contains('E')) digits = second.ToString("F40", CultureInfo.InvariantCulture).TrimEnd('0').TrimEnd('.');
        return (Calendar.Date(day), minutes, digits.Length == 1 || digits[1] == '.' ? "0" + digits : digits);
    }

    private static string? Read(ReadOnlySpan<char> text, out Epoch<TScale> epoch)
    {
        epoch = default;
        string scale = TimeScaleLimits.Name<TScale>();
        text = text.Trim();
        int end = text.LastIndexOf(' ');
        ReadOnlySpan<char> name = end >= 0 ? text[(end + 1)..] : text.EndsWith("Z") ? text[^1..] : default;
        bool isThisScale = name.Equals(scale, StringComparison.OrdinalIgnoreCase) || (HasLeapSeconds && name is "Z");
        if (!isThisScale) return $"'{text}' is no date on {scale}: it does not end with that name.";

        ReadOnlySpan<char> date = text[..^name.Length].TrimEnd();
        const string Layout = "yyyy-MM-ddTHH:mm:s";
        bool hasLayout = date.Length >= Layout.Length && date[4] == '-' && date[7] == '-' && date[10] == 'T' && date[13] == ':' && date[16] == ':';
        if (hasLayout
            && Whole(date[..4], out int year) && Whole(date[5..7], out int month) && Whole(date[8..10], out int day)
            && Whole(date[11..13], out int hour) && Whole(date[14..16], out int minute)
            && double.TryParse(date[17..], NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out double second))
        {
            epoch = FromCalendar(year, month, day, hour, minute, second);
            return null;
        }

        return $"'{text}' is not of the form yyyy-MM-ddTHH:mm:ss.s {scale}.";

        static bool Whole(ReadOnlySpan<char> digits, out int value) =>
            int.TryParse(digits, NumberStyles.None, CultureInfo.InvariantCulture, out value);
    }
}
