namespace FrameSafe;

/// <summary>A clock on a circle at a constant angular velocity.</summary>
/// <typeparam name="TFrame">The inertial frame in which the circle rests.</typeparam>
/// <typeparam name="TClock">The clock.</typeparam>
/// <remarks>W. Rindler, Relativity, 2nd ed., sections 3.5 and 3.7; measured on stored muons (J. Bailey et al., Nature 268 (1977) 301).</remarks>
public readonly struct CircularMotion<TFrame, TClock>
    where TFrame : struct, IFrame
    where TClock : struct, IClock
{
    private readonly Extended _ratio;
    private readonly double _radius;

    private CircularMotion(Extended ratio, double radius)
    {
        _ratio = ratio;
        _radius = radius;
    }

    /// <summary>The speed along the circle.</summary>
    [Unit("m/s")]
    [InFrame(nameof(TFrame))]
    public double SpeedInMetresPerSecond => (_ratio * PhysicsOfLight.Speed).High;

    /// <summary>The speed as a fraction of c.</summary>
    [Kind(QuantityKind.SpeedRatio)]
    [InFrame(nameof(TFrame))]
    public double SpeedRatio => _ratio.High;

    /// <summary>γ.</summary>
    [Kind(QuantityKind.LorentzFactor)]
    public double LorentzFactor => ((Extended)1 / Reciprocal).High;

    /// <summary>γ − 1.</summary>
    [Unit("1")]
    public double LorentzFactorMinusOne => (_ratio * _ratio / (Reciprocal * (Reciprocal + 1))).High;

    /// <summary>The rate of the clock less one, −β²/(1 + 1/γ).</summary>
    [Unit("1")]
    public double RateMinusOne => (_ratio * _ratio / (Reciprocal + 1) * -1).High;

    /// <summary>What an accelerometer at the clock reads: γ²v²/r.</summary>
    [Unit("m/s2")]
    [Kind(QuantityKind.ProperAcceleration)]
    public double ProperAccelerationInMetresPerSquareSecond
        => _radius == 0 ? 0 : (_ratio * _ratio * Extended.SpeedOfLightSquared / (Reciprocal * Reciprocal) / _radius).High;

    // 1/γ = √((1 − β)(1 + β)).
    private Extended Reciprocal => Extended.Sqrt(((Extended)1 - _ratio) * ((Extended)1 + _ratio));

    /// <summary>A circle of a radius, run through at an angular velocity of the frame's time.</summary>
    /// <exception cref="ArgumentOutOfRangeException">A number is negative or not finite, or the speed is that of light or more.</exception>
    public static CircularMotion<TFrame, TClock> Of(
        [Unit("m"), InFrame(nameof(TFrame))] double radius, [Unit("rad/s"), InFrame(nameof(TFrame))] double angularVelocity)
    {
        Extended ratio = Extended.Product(Require.NotNegative(radius), Require.NotNegative(angularVelocity)) / PhysicsOfLight.Speed;
        return ratio.High < 1
            ? new(ratio, radius)
            : throw Require.Outside(angularVelocity, nameof(angularVelocity), FormattableString.Invariant($"below {PhysicsOfLight.Speed / radius:R} rad/s, where the circle's speed is that of light"));
    }

    /// <summary>What the clock shows of a time.</summary>
    public ProperTime<TClock> ProperTimeOf(CoordinateTime<TFrame> time) => new((Reciprocal * time.InSeconds).High);

    /// <summary>What the clock falls behind by in a time.</summary>
    [return: Unit("s")]
    [return: Kind(QuantityKind.ClockOffset)]
    public double BehindInSeconds(CoordinateTime<TFrame> time) => (_ratio * _ratio / (Reciprocal + 1) * time.InSeconds).High;
}
