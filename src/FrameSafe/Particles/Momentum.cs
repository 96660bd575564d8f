using System.Numerics;

namespace FrameSafe;

/// <summary>The momentum γmv of a body, measured in a frame.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
[Unit("kg.m/s")]
[InFrame(nameof(TFrame))]
[Kind(QuantityKind.Momentum)]
public readonly struct Momentum<TFrame> :
    IEquatable<Momentum<TFrame>>,
    IEqualityOperators<Momentum<TFrame>, Momentum<TFrame>, bool>,
    IAdditionOperators<Momentum<TFrame>, Momentum<TFrame>, Momentum<TFrame>>,
    ISubtractionOperators<Momentum<TFrame>, Momentum<TFrame>, Momentum<TFrame>>,
    IUnaryNegationOperators<Momentum<TFrame>, Momentum<TFrame>>,
    ISpanFormattable
    where TFrame : struct, IFrame
{
    internal Momentum(Triple newtonSeconds) => NewtonSeconds = newtonSeconds;

    /// <summary>The component along x.</summary>
    [Unit("kg.m/s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Momentum)]
    public double XInNewtonSeconds => NewtonSeconds.X;

    /// <summary>The component along y.</summary>
    [Unit("kg.m/s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Momentum)]
    public double YInNewtonSeconds => NewtonSeconds.Y;

    /// <summary>The component along z.</summary>
    [Unit("kg.m/s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Momentum)]
    public double ZInNewtonSeconds => NewtonSeconds.Z;

    /// <summary>The size; within 2 ulp.</summary>
    [Unit("kg.m/s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Momentum)]
    public double InNewtonSeconds => NewtonSeconds.Norm;

    /// <summary>The size in MeV/c.</summary>
    [Unit("MeV/c")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Momentum)]
    public double InMegaelectronvoltsPerLightSpeed => PhysicsOfLight.FromNewtonSeconds(NewtonSeconds.Norm);

    /// <summary>The components in MeV/c.</summary>
    [Unit("MeV/c")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Momentum)]
    public (double X, double Y, double Z) InMegaelectronvoltsPerLightSpeedComponents => (
        PhysicsOfLight.FromNewtonSeconds(NewtonSeconds.X),
        PhysicsOfLight.FromNewtonSeconds(NewtonSeconds.Y),
        PhysicsOfLight.FromNewtonSeconds(NewtonSeconds.Z));

    internal Triple NewtonSeconds { get; }

    /// <summary>γmv of a mass and a velocity.</summary>
    /// <remarks>W. Rindler, Relativity, 2nd ed., section 6.2.</remarks>
    public static Momentum<TFrame> Of(Mass mass, Velocity<TFrame> velocity)
        => new(velocity.Ratio * (mass.InKilograms * PhysicsOfLight.Speed));

    /// <summary>The momentum along x of a mass with a kinetic energy: √(T(T + 2mc²))/c.</summary>
    public static Momentum<TFrame> Of(Mass mass, KineticEnergy<TFrame> energy)
    {
        double kinetic = energy.InJoules;
        return new(new(Math.Sqrt(kinetic) * Math.Sqrt(kinetic + (2 * mass.RestEnergyInJoules)) / PhysicsOfLight.Speed, 0, 0));
    }

    /// <summary>A momentum from its components.</summary>
    /// <exception cref="ArgumentOutOfRangeException">A component is not finite.</exception>
    public static Momentum<TFrame> FromNewtonSeconds(
        [Unit("kg.m/s"), InFrame(nameof(TFrame)), Kind(QuantityKind.Momentum)] double x,
        [Unit("kg.m/s"), InFrame(nameof(TFrame)), Kind(QuantityKind.Momentum)] double y = 0,
        [Unit("kg.m/s"), InFrame(nameof(TFrame)), Kind(QuantityKind.Momentum)] double z = 0)
        => new(new(Require.Finite(x), Require.Finite(y), Require.Finite(z)));

    /// <summary>A momentum from its components in MeV/c.</summary>
    /// <exception cref="ArgumentOutOfRangeException">A component is not finite.</exception>
    public static Momentum<TFrame> FromMegaelectronvoltsPerLightSpeed(
        [Unit("MeV/c"), InFrame(nameof(TFrame)), Kind(QuantityKind.Momentum)] double x,
        [Unit("MeV/c"), InFrame(nameof(TFrame)), Kind(QuantityKind.Momentum)] double y = 0,
        [Unit("MeV/c"), InFrame(nameof(TFrame)), Kind(QuantityKind.Momentum)] double z = 0)
        => new(new(
            PhysicsOfLight.ToNewtonSeconds(Require.Finite(x)),
            PhysicsOfLight.ToNewtonSeconds(Require.Finite(y)),
            PhysicsOfLight.ToNewtonSeconds(Require.Finite(z))));

    /// <summary>The velocity of a mass with this momentum.</summary>
    /// <exception cref="ArgumentException">The mass is zero: it moves with the speed of light and has no rest frame.</exception>
    public Velocity<TFrame> VelocityOf(Mass mass)
        => mass.InKilograms > 0
            ? new(Door.Celerity(NewtonSeconds * (1 / (mass.InKilograms * PhysicsOfLight.Speed)), "momentum per mass"))
            : throw new ArgumentException("Nothing without mass has a velocity below that of light.", nameof(mass));

    /// <summary>The kinetic energy of a mass with this momentum, without cancellation: p²c²/(√(p²c² + m²c⁴) + mc²).</summary>
    public KineticEnergy<TFrame> KineticEnergyOf(Mass mass)
    {
        double pc = NewtonSeconds.Norm * PhysicsOfLight.Speed;
        double rest = mass.RestEnergyInJoules;
        return pc == 0 ? default : new(pc / ((new Triple(pc, rest, 0).Norm + rest) / pc));
    }

    /// <summary>The momentum that a charge bends with: p/q, in tesla metres.</summary>
    /// <param name="elementaryCharges">The charge; not zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">It is zero or not finite.</exception>
    [return: Unit("T.m")]
    [return: Kind(QuantityKind.Rigidity)]
    public double RigidityInTeslaMetres([Unit("1")] double elementaryCharges)
        => elementaryCharges != 0
            ? NewtonSeconds.Norm / (Math.Abs(Require.Finite(elementaryCharges)) * PhysicsOfLight.ElementaryCharge)
            : throw Require.Outside(elementaryCharges, nameof(elementaryCharges), "a number other than 0");

    /// <summary>The sum.</summary>
    public static Momentum<TFrame> operator +(Momentum<TFrame> left, Momentum<TFrame> right) => new(left.NewtonSeconds + right.NewtonSeconds);

    /// <summary>The difference.</summary>
    public static Momentum<TFrame> operator -(Momentum<TFrame> left, Momentum<TFrame> right) => new(left.NewtonSeconds - right.NewtonSeconds);

    /// <summary>Backwards.</summary>
    public static Momentum<TFrame> operator -(Momentum<TFrame> value) => new(-value.NewtonSeconds);

    /// <summary>The same momentum.</summary>
    public static bool operator ==(Momentum<TFrame> left, Momentum<TFrame> right) => left.NewtonSeconds == right.NewtonSeconds;

    /// <summary>Another momentum.</summary>
    public static bool operator !=(Momentum<TFrame> left, Momentum<TFrame> right) => left.NewtonSeconds != right.NewtonSeconds;

    /// <inheritdoc/>
    public bool Equals(Momentum<TFrame> other) => NewtonSeconds.Equals(other.NewtonSeconds);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is Momentum<TFrame> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => NewtonSeconds.GetHashCode();

    /// <summary>The components and the frame.</summary>
    public override string ToString() => ToString(null, null);

    /// <inheritdoc/>
    public string ToString(string? format, IFormatProvider? formatProvider)
        => QuantityText.Of(NewtonSeconds, "kg·m/s", QuantityText.In<TFrame>(), format, formatProvider);

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider)
        => destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);
}
