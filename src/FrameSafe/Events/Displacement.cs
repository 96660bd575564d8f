using System.Numerics;

namespace FrameSafe;

/// <summary>The difference of two places in one frame, both taken at one coordinate time.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
[Unit("m")]
[InFrame(nameof(TFrame))]
[Kind(QuantityKind.Displacement)]
public readonly struct Displacement<TFrame> :
    IEquatable<Displacement<TFrame>>,
    IEqualityOperators<Displacement<TFrame>, Displacement<TFrame>, bool>,
    IAdditionOperators<Displacement<TFrame>, Displacement<TFrame>, Displacement<TFrame>>,
    ISubtractionOperators<Displacement<TFrame>, Displacement<TFrame>, Displacement<TFrame>>,
    IUnaryNegationOperators<Displacement<TFrame>, Displacement<TFrame>>,
    ISpanFormattable
    where TFrame : struct, IFrame
{
    private readonly Triple _metres;

    internal Displacement(Triple metres) => _metres = metres;

    /// <summary>No displacement.</summary>
    public static Displacement<TFrame> Zero => default;

    /// <summary>The component along x.</summary>
    [Unit("m")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Displacement)]
    public double XInMetres => _metres.X;

    /// <summary>The component along y.</summary>
    [Unit("m")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Displacement)]
    public double YInMetres => _metres.Y;

    /// <summary>The component along z.</summary>
    [Unit("m")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Displacement)]
    public double ZInMetres => _metres.Z;

    /// <summary>The length; within 2 ulp.</summary>
    [Unit("m")]
    [InFrame(nameof(TFrame))]
    public double LengthInMetres => _metres.Norm;

    internal Triple Metres => _metres;

    /// <summary>A displacement from its components.</summary>
    /// <exception cref="ArgumentOutOfRangeException">A component is not finite.</exception>
    public static Displacement<TFrame> FromMetres(
        [Unit("m"), InFrame(nameof(TFrame))] double x,
        [Unit("m"), InFrame(nameof(TFrame))] double y = 0,
        [Unit("m"), InFrame(nameof(TFrame))] double z = 0)
        => new(new(Require.Finite(x), Require.Finite(y), Require.Finite(z)));

    /// <summary>The sum.</summary>
    public static Displacement<TFrame> operator +(Displacement<TFrame> left, Displacement<TFrame> right) => new(left._metres + right._metres);

    /// <summary>The difference.</summary>
    public static Displacement<TFrame> operator -(Displacement<TFrame> left, Displacement<TFrame> right) => new(left._metres - right._metres);

    /// <summary>The way back.</summary>
    public static Displacement<TFrame> operator -(Displacement<TFrame> value) => new(-value._metres);

    /// <summary>A multiple.</summary>
    public static Displacement<TFrame> operator *(Displacement<TFrame> value, double factor) => new(value._metres * factor);

    /// <summary>A multiple.</summary>
    public static Displacement<TFrame> operator *(double factor, Displacement<TFrame> value) => new(value._metres * factor);

    /// <summary>The same displacement.</summary>
    public static bool operator ==(Displacement<TFrame> left, Displacement<TFrame> right) => left._metres == right._metres;

    /// <summary>Another displacement.</summary>
    public static bool operator !=(Displacement<TFrame> left, Displacement<TFrame> right) => left._metres != right._metres;

    /// <inheritdoc/>
    public bool Equals(Displacement<TFrame> other) => _metres.Equals(other._metres);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is Displacement<TFrame> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _metres.GetHashCode();

    /// <summary>The components in metres and the frame.</summary>
    public override string ToString() => ToString(null, null);

    /// <inheritdoc/>
    public string ToString(string? format, IFormatProvider? formatProvider)
        => QuantityText.Of(_metres, "m", QuantityText.In<TFrame>(), format, formatProvider);

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider)
        => destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);
}
