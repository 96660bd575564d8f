namespace FrameSafe;

/// <summary>The electric field strength and magnetic flux density at an event, measured in a frame: two parts of one thing.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
/// <remarks>
/// They go between frames together: E′ = γ(E + v × B) − γ²/(γ + 1) (v·E)v/c², B′ = γ(B − v × E/c²) − γ²/(γ + 1) (v·B)v/c²
/// (J. D. Jackson, Classical Electrodynamics, 3rd ed., eq. 11.149).
/// </remarks>
public readonly struct ElectromagneticField<TFrame> : IEquatable<ElectromagneticField<TFrame>>
    where TFrame : struct, IFrame
{
    internal ElectromagneticField(Triple electric, Triple magnetic)
    {
        Electric = electric;
        Magnetic = magnetic;
    }

    /// <summary>The components of E.</summary>
    [Unit("V/m")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.ElectricField)]
    public (double X, double Y, double Z) ElectricInVoltsPerMetre => (Electric.X, Electric.Y, Electric.Z);

    /// <summary>The components of B.</summary>
    [Unit("T")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.MagneticField)]
    public (double X, double Y, double Z) MagneticInTeslas => (Magnetic.X, Magnetic.Y, Magnetic.Z);

    /// <summary>E·B, the same in every frame; exact to rounding.</summary>
    [Unit("V.T/m")]
    [Kind(QuantityKind.Interval)]
    public double ElectricDotMagnetic => ExtendedTriple.Of(Electric).Dot(ExtendedTriple.Of(Magnetic)).High;

    /// <summary>E² − c²B², the same in every frame; exact to rounding also for fields of light, where it cancels.</summary>
    [Unit("V2/m2")]
    [Kind(QuantityKind.Interval)]
    public double SquareDifference
        => (ExtendedTriple.Of(Electric).Square - (Extended.SpeedOfLightSquared * ExtendedTriple.Of(Magnetic).Square)).High;

    internal Triple Electric { get; }

    internal Triple Magnetic { get; }

    /// <summary>A field from its components in volts per metre and teslas.</summary>
    /// <exception cref="ArgumentOutOfRangeException">A component is not finite.</exception>
    public static ElectromagneticField<TFrame> From(
        [Unit("V/m"), InFrame(nameof(TFrame)), Kind(QuantityKind.ElectricField)] (double X, double Y, double Z) electric,
        [Unit("T"), InFrame(nameof(TFrame)), Kind(QuantityKind.MagneticField)] (double X, double Y, double Z) magnetic)
        => new(
            Door.Finite(new(electric.X, electric.Y, electric.Z), nameof(electric)),
            Door.Finite(new(magnetic.X, magnetic.Y, magnetic.Z), nameof(magnetic)));

    /// <summary>Two fields at one place together.</summary>
    public static ElectromagneticField<TFrame> operator +(ElectromagneticField<TFrame> left, ElectromagneticField<TFrame> right)
        => new(left.Electric + right.Electric, left.Magnetic + right.Magnetic);

    /// <inheritdoc/>
    public bool Equals(ElectromagneticField<TFrame> other) => Electric.Equals(other.Electric) && Magnetic.Equals(other.Magnetic);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is ElectromagneticField<TFrame> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Electric, Magnetic);

    /// <summary>The same field.</summary>
    public static bool operator ==(ElectromagneticField<TFrame> left, ElectromagneticField<TFrame> right) => left.Equals(right);

    /// <summary>Another field.</summary>
    public static bool operator !=(ElectromagneticField<TFrame> left, ElectromagneticField<TFrame> right) => !left.Equals(right);

    /// <summary>Both fields and the frame.</summary>
    public override string ToString()
        => QuantityText.Of(Electric, "V/m", ", ", null, null) + QuantityText.Of(Magnetic, "T", QuantityText.In<TFrame>(), null, null);
}
