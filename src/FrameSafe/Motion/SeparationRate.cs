using System.Numerics;

namespace FrameSafe;

/// <summary>How fast two bodies draw apart as one frame measures it: the difference of their velocities there, up to 2c.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
/// <remarks>It is the velocity of nothing, and has neither Lorentz factor nor rapidity.</remarks>
[Unit("[c]")]
[InFrame(nameof(TFrame))]
[Kind(QuantityKind.SeparationRate)]
public readonly struct SeparationRate<TFrame> :
    IEquatable<SeparationRate<TFrame>>,
    IEqualityOperators<SeparationRate<TFrame>, SeparationRate<TFrame>, bool>,
    IAdditionOperators<SeparationRate<TFrame>, SeparationRate<TFrame>, SeparationRate<TFrame>>,
    ISubtractionOperators<SeparationRate<TFrame>, SeparationRate<TFrame>, SeparationRate<TFrame>>,
    IUnaryNegationOperators<SeparationRate<TFrame>, SeparationRate<TFrame>>,
    ISpanFormattable
    where TFrame : struct, IFrame
{
    private readonly Triple _ratio;

    internal SeparationRate(Triple ratio) => _ratio = ratio;

    /// <summary>The component along x.</summary>
    [Unit("m/s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.SeparationRate)]
    public double XInMetresPerSecond => _ratio.X * PhysicsOfLight.Speed;

    /// <summary>The component along y.</summary>
    [Unit("m/s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.SeparationRate)]
    public double YInMetresPerSecond => _ratio.Y * PhysicsOfLight.Speed;

    /// <summary>The component along z.</summary>
    [Unit("m/s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.SeparationRate)]
    public double ZInMetresPerSecond => _ratio.Z * PhysicsOfLight.Speed;

    /// <summary>The size.</summary>
    [Unit("m/s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.SeparationRate)]
    public double InMetresPerSecond => _ratio.Norm * PhysicsOfLight.Speed;

    /// <summary>The change of their distance over some coordinate time.</summary>
    public static Displacement<TFrame> operator *(SeparationRate<TFrame> rate, CoordinateTime<TFrame> time)
        => new(rate._ratio * (PhysicsOfLight.Speed * time.InSeconds));

    /// <summary>The sum: of A from B and of B from C, it is that of A from C.</summary>
    public static SeparationRate<TFrame> operator +(SeparationRate<TFrame> left, SeparationRate<TFrame> right) => new(left._ratio + right._ratio);

    /// <summary>The difference.</summary>
    public static SeparationRate<TFrame> operator -(SeparationRate<TFrame> left, SeparationRate<TFrame> right) => new(left._ratio - right._ratio);

    /// <summary>The other one's from this one.</summary>
    public static SeparationRate<TFrame> operator -(SeparationRate<TFrame> value) => new(-value._ratio);

    /// <summary>The same rate.</summary>
    public static bool operator ==(SeparationRate<TFrame> left, SeparationRate<TFrame> right) => left._ratio == right._ratio;

    /// <summary>Another rate.</summary>
    public static bool operator !=(SeparationRate<TFrame> left, SeparationRate<TFrame> right) => left._ratio != right._ratio;

    /// <inheritdoc/>
    public bool Equals(SeparationRate<TFrame> other) => _ratio.Equals(other._ratio);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is SeparationRate<TFrame> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _ratio.GetHashCode();

    /// <summary>The components in metres per second and the frame.</summary>
    public override string ToString() => ToString(null, null);

    /// <inheritdoc/>
    public string ToString(string? format, IFormatProvider? formatProvider)
        => QuantityText.Of(_ratio * PhysicsOfLight.Speed, "m/s", QuantityText.In<TFrame>(), format, formatProvider);

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider)
        => destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);
}
