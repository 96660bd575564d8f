namespace FrameSafe;

/// <summary>A plane wave of light in vacuum: its frequency and the direction that it goes, in a frame.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
public readonly struct PlaneWave<TFrame> : IEquatable<PlaneWave<TFrame>>
    where TFrame : struct, IFrame
{
    private readonly double _hertz;

    internal PlaneWave(double hertz, Direction<TFrame> direction)
    {
        _hertz = hertz;
        Direction = direction;
    }

    /// <summary>The frequency.</summary>
    [Unit("Hz")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Frequency)]
    public double FrequencyInHertz => _hertz;

    /// <summary>Where it goes; it is looked for the other way.</summary>
    public Direction<TFrame> Direction { get; }

    /// <summary>A wave of a frequency.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The frequency is negative or not finite.</exception>
    public static PlaneWave<TFrame> FromHertz([Unit("Hz"), InFrame(nameof(TFrame)), Kind(QuantityKind.Frequency)] double frequency, Direction<TFrame> direction)
        => new(Require.NotNegative(frequency), direction);

    /// <inheritdoc/>
    public bool Equals(PlaneWave<TFrame> other) => _hertz.Equals(other._hertz) && Direction.Equals(other.Direction);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is PlaneWave<TFrame> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(_hertz, Direction);

    /// <summary>The same wave.</summary>
    public static bool operator ==(PlaneWave<TFrame> left, PlaneWave<TFrame> right) => left.Equals(right);

    /// <summary>Another wave.</summary>
    public static bool operator !=(PlaneWave<TFrame> left, PlaneWave<TFrame> right) => !left.Equals(right);

    /// <summary>Frequency, direction and frame.</summary>
    public override string ToString() => QuantityText.Of(_hertz, "Hz", " along ", null, null) + Direction;
}
