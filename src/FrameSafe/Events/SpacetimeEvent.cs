using System.Numerics;

namespace FrameSafe;

/// <summary>An event, by its time and place in a frame, counted from the frame's origin event.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
/// <remarks>Frames that a <see cref="Boost{TFrom, TTo}"/> relates share the origin event.</remarks>
[InFrame(nameof(TFrame))]
public readonly struct SpacetimeEvent<TFrame> :
    IEquatable<SpacetimeEvent<TFrame>>,
    IEqualityOperators<SpacetimeEvent<TFrame>, SpacetimeEvent<TFrame>, bool>,
    ISubtractionOperators<SpacetimeEvent<TFrame>, SpacetimeEvent<TFrame>, SpacetimeInterval<TFrame>>,
    ISpanFormattable
    where TFrame : struct, IFrame
{
    private readonly double _seconds;
    private readonly Triple _metres;

    internal SpacetimeEvent(double seconds, Triple metres)
    {
        _seconds = seconds;
        _metres = metres;
    }

    /// <summary>The time since the origin event.</summary>
    public CoordinateTime<TFrame> Time => new(_seconds);

    /// <summary>The place, from the origin event's.</summary>
    public Displacement<TFrame> Place => new(_metres);

    internal double Seconds => _seconds;

    internal Triple Metres => _metres;

    /// <summary>An event at a time and a place.</summary>
    public static SpacetimeEvent<TFrame> At(CoordinateTime<TFrame> time, Displacement<TFrame> place) => new(time.InSeconds, place.Metres);

    /// <summary>An event from numbers.</summary>
    /// <exception cref="ArgumentOutOfRangeException">A number is not finite.</exception>
    public static SpacetimeEvent<TFrame> FromSecondsAndMetres(
        [Unit("s"), InFrame(nameof(TFrame)), Kind(QuantityKind.CoordinateTime)] double time,
        [Unit("m"), InFrame(nameof(TFrame))] double x,
        [Unit("m"), InFrame(nameof(TFrame))] double y = 0,
        [Unit("m"), InFrame(nameof(TFrame))] double z = 0)
        => new(Require.Finite(time), new(Require.Finite(x), Require.Finite(y), Require.Finite(z)));

    /// <summary>The interval from one event to another.</summary>
    public static SpacetimeInterval<TFrame> operator -(SpacetimeEvent<TFrame> to, SpacetimeEvent<TFrame> from)
        => new(to._seconds - from._seconds, to._metres - from._metres);

    /// <summary>The same event.</summary>
    public static bool operator ==(SpacetimeEvent<TFrame> left, SpacetimeEvent<TFrame> right) => left.Equals(right);

    /// <summary>Another event.</summary>
    public static bool operator !=(SpacetimeEvent<TFrame> left, SpacetimeEvent<TFrame> right) => !left.Equals(right);

    /// <inheritdoc/>
    public bool Equals(SpacetimeEvent<TFrame> other) => _seconds.Equals(other._seconds) && _metres.Equals(other._metres);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is SpacetimeEvent<TFrame> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(_seconds, _metres);

    /// <summary>Time, place and frame.</summary>
    public override string ToString() => ToString(null, null);

    /// <inheritdoc/>
    public string ToString(string? format, IFormatProvider? formatProvider)
        => QuantityText.Of(_seconds, "s", " at ", format, formatProvider)
            + QuantityText.Of(_metres, "m", QuantityText.In<TFrame>(), format, formatProvider);

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider)
        => destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);
}
