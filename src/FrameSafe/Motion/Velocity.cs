using System.Numerics;

namespace FrameSafe;

/// <summary>The velocity of something with a rest frame, measured in a frame.</summary>
/// <typeparam name="TFrame">The frame it is measured in.</typeparam>
/// <remarks>
/// Kept as the celerity ratio γβ, so that 1 − β, γ − 1 and the rapidity are right to rounding from 1e-150 c to γ = 1e150.
/// <c>default</c> is rest. Two velocities have no sum; their difference is a <see cref="SeparationRate{TFrame}"/>, and the velocity of
/// the one in the rest frame of the other comes of a <see cref="Boost{TFrom, TTo}"/>.
/// </remarks>
[Unit("[c]")]
[InFrame(nameof(TFrame))]
[Kind(QuantityKind.Velocity)]
public readonly struct Velocity<TFrame> :
    IEquatable<Velocity<TFrame>>,
    IEqualityOperators<Velocity<TFrame>, Velocity<TFrame>, bool>,
    IUnaryNegationOperators<Velocity<TFrame>, Velocity<TFrame>>,
    ISubtractionOperators<Velocity<TFrame>, Velocity<TFrame>, SeparationRate<TFrame>>,
    ISpanFormattable
    where TFrame : struct, IFrame
{
    private readonly Triple _ratio;

    internal Velocity(Triple celerityRatio) => _ratio = celerityRatio;

    /// <summary>At rest in the frame.</summary>
    public static Velocity<TFrame> Zero => default;

    /// <summary>The component along x.</summary>
    [Unit("m/s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Velocity)]
    public double XInMetresPerSecond => _ratio.X / LorentzFactor * PhysicsOfLight.Speed;

    /// <summary>The component along y.</summary>
    [Unit("m/s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Velocity)]
    public double YInMetresPerSecond => _ratio.Y / LorentzFactor * PhysicsOfLight.Speed;

    /// <summary>The component along z.</summary>
    [Unit("m/s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Velocity)]
    public double ZInMetresPerSecond => _ratio.Z / LorentzFactor * PhysicsOfLight.Speed;

    /// <summary>The size.</summary>
    [Unit("m/s")]
    [InFrame(nameof(TFrame))]
    [Kind(QuantityKind.Velocity)]
    public double SpeedInMetresPerSecond => SpeedRatio * PhysicsOfLight.Speed;

    /// <summary>The component of β along x.</summary>
    [Kind(QuantityKind.SpeedRatio)]
    [InFrame(nameof(TFrame))]
    public double XRatio => _ratio.X / LorentzFactor;

    /// <summary>The component of β along y.</summary>
    [Kind(QuantityKind.SpeedRatio)]
    [InFrame(nameof(TFrame))]
    public double YRatio => _ratio.Y / LorentzFactor;

    /// <summary>The component of β along z.</summary>
    [Kind(QuantityKind.SpeedRatio)]
    [InFrame(nameof(TFrame))]
    public double ZRatio => _ratio.Z / LorentzFactor;

    /// <summary>β, the size as a fraction of c; within 4 ulp.</summary>
    [Kind(QuantityKind.SpeedRatio)]
    [InFrame(nameof(TFrame))]
    public double SpeedRatio => Celerity.SpeedRatio(_ratio.Norm);

    /// <summary>1 − β; within 4 ulp at every speed.</summary>
    [Unit("1")]
    public double OneMinusSpeedRatio => Celerity.OneMinusSpeedRatio(_ratio.Norm);

    /// <summary>The component of γβ along x.</summary>
    [Kind(QuantityKind.CelerityRatio)]
    [InFrame(nameof(TFrame))]
    public double XCelerityRatio => _ratio.X;

    /// <summary>The component of γβ along y.</summary>
    [Kind(QuantityKind.CelerityRatio)]
    [InFrame(nameof(TFrame))]
    public double YCelerityRatio => _ratio.Y;

    /// <summary>The component of γβ along z.</summary>
    [Kind(QuantityKind.CelerityRatio)]
    [InFrame(nameof(TFrame))]
    public double ZCelerityRatio => _ratio.Z;

    /// <summary>γβ, the size of the celerity as a multiple of c; within 2 ulp.</summary>
    [Kind(QuantityKind.CelerityRatio)]
    [InFrame(nameof(TFrame))]
    public double CelerityRatio => _ratio.Norm;

    /// <summary>γ; within 2 ulp.</summary>
    [Kind(QuantityKind.LorentzFactor)]
    public double LorentzFactor => Celerity.LorentzFactor(_ratio.Norm);

    /// <summary>γ − 1; within 4 ulp at every speed.</summary>
    [Unit("1")]
    public double LorentzFactorMinusOne => Celerity.LorentzFactorMinusOne(_ratio.Norm);

    /// <summary>The rapidity, without its direction; within 2 ulp.</summary>
    [Kind(QuantityKind.Rapidity)]
    public double Rapidity => Celerity.Rapidity(_ratio.Norm);

    internal Triple Ratio => _ratio;

    /// <summary>A velocity from its components; exact in c − v.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Its size is not below c, or a component is not a number.</exception>
    public static Velocity<TFrame> FromMetresPerSecond(
        [Unit("m/s"), InFrame(nameof(TFrame)), Kind(QuantityKind.Velocity)] double x,
        [Unit("m/s"), InFrame(nameof(TFrame)), Kind(QuantityKind.Velocity)] double y = 0,
        [Unit("m/s"), InFrame(nameof(TFrame)), Kind(QuantityKind.Velocity)] double z = 0)
        => new(Door.MetresPerSecond(new(x, y, z), y == 0 && z == 0 ? nameof(x) : "velocity"));

    /// <summary>A velocity from the components of β.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Its size is not below 1, or a component is not a number.</exception>
    public static Velocity<TFrame> FromSpeedRatio(
        [Kind(QuantityKind.SpeedRatio), InFrame(nameof(TFrame))] double x,
        [Kind(QuantityKind.SpeedRatio), InFrame(nameof(TFrame))] double y = 0,
        [Kind(QuantityKind.SpeedRatio), InFrame(nameof(TFrame))] double z = 0)
        => new(Door.SpeedRatio(new(x, y, z), y == 0 && z == 0 ? nameof(x) : "speed ratio"));

    /// <summary>A velocity from the components of γβ.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Its size is above 1e150, or a component is not a number.</exception>
    public static Velocity<TFrame> FromCelerityRatio(
        [Kind(QuantityKind.CelerityRatio), InFrame(nameof(TFrame))] double x,
        [Kind(QuantityKind.CelerityRatio), InFrame(nameof(TFrame))] double y = 0,
        [Kind(QuantityKind.CelerityRatio), InFrame(nameof(TFrame))] double z = 0)
        => new(Door.Celerity(new(x, y, z), y == 0 && z == 0 ? nameof(x) : "celerity ratio"));

    /// <summary>A velocity along x from γ − 1.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is negative, above 1e150 or not a number.</exception>
    public static Velocity<TFrame> FromLorentzFactorMinusOne([Unit("1")] double excess)
        => new(new(Celerity.FromLorentzFactorMinusOne(Require.Within(excess, 0, Celerity.Largest)), 0, 0));

    /// <summary>A velocity along x from its rapidity.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Its size is above 346, where γ passes 1e150.</exception>
    public static Velocity<TFrame> FromRapidity([Kind(QuantityKind.Rapidity)] double rapidity)
        => new(new(Math.Sinh(Require.Within(rapidity, -346, 346)), 0, 0));

    /// <summary>Backwards.</summary>
    public static Velocity<TFrame> operator -(Velocity<TFrame> value) => new(-value._ratio);

    /// <summary>How fast the two draw apart in this frame: up to 2c, and the velocity of nothing.</summary>
    public static SeparationRate<TFrame> operator -(Velocity<TFrame> left, Velocity<TFrame> right)
    {
        // β₁ − β₂ of nearly equal celerities: the difference is taken before the division rounds.
        double one = left.LorentzFactor;
        double other = right.LorentzFactor;
        return new(new(
            Difference(left._ratio.X, one, right._ratio.X, other),
            Difference(left._ratio.Y, one, right._ratio.Y, other),
            Difference(left._ratio.Z, one, right._ratio.Z, other)));
    }

    /// <summary>The same velocity.</summary>
    public static bool operator ==(Velocity<TFrame> left, Velocity<TFrame> right) => left._ratio == right._ratio;

    /// <summary>Another velocity.</summary>
    public static bool operator !=(Velocity<TFrame> left, Velocity<TFrame> right) => left._ratio != right._ratio;

    /// <inheritdoc/>
    public bool Equals(Velocity<TFrame> other) => _ratio.Equals(other._ratio);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is Velocity<TFrame> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _ratio.GetHashCode();

    /// <summary>The components in metres per second and the frame.</summary>
    public override string ToString() => ToString(null, null);

    /// <inheritdoc/>
    public string ToString(string? format, IFormatProvider? formatProvider)
        => QuantityText.Of(
            new Triple(XInMetresPerSecond, YInMetresPerSecond, ZInMetresPerSecond), "m/s", QuantityText.In<TFrame>(), format, formatProvider);

    /// <inheritdoc/>
    public bool TryFormat(Span<char> destination, out int charsWritten, ReadOnlySpan<char> format, IFormatProvider? provider)
        => destination.TryWrite($"{ToString(format.ToString(), provider)}", out charsWritten);

    private static double Difference(double left, double leftLorentz, double right, double rightLorentz)
    {
        double first = left / leftLorentz;
        double second = right / rightLorentz;
        // What the two divisions rounded away, each exact to first order.
        double firstRest = -Math.FusedMultiplyAdd(first, leftLorentz, -left) / leftLorentz;
        double secondRest = -Math.FusedMultiplyAdd(second, rightLorentz, -right) / rightLorentz;
        return (first - second) + (firstRest - secondRest);
    }
}
