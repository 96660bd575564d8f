using System.Globalization;

namespace FrameSafe;

/// <content>Text: the seconds, the unit and the name of the scale: <c>86400.5 s TAI</c>.</content>
public readonly partial struct ElapsedTime<TScale> : ISpanFormattable
{
    /// <summary>The seconds in one double, in the round-trip format.</summary>
    public override string ToString() => ToString(null, null);

    /// <summary>The seconds in one double, as <see cref="double.ToString(string, IFormatProvider)"/> writes them; the same in every culture unless one is given.</summary>
    public string ToString(string? format, IFormatProvider? formatProvider) =>
        string.Create(
            CultureInfo.InvariantCulture,
            $"{_seconds.ToString(format, formatProvider ?? CultureInfo.InvariantCulture)} s {TimeScaleLimits.Name<TScale>()}");

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider) =>
        destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);
}
