namespace FrameSafe;

/// <summary>Light that goes at an angle to the motion of a frame: its frequency and angle there (Doppler effect and aberration).</summary>
/// <typeparam name="TFrame">The frame in which the angle is given.</typeparam>
/// <typeparam name="TOther">The frame that moves.</typeparam>
/// <remarks>
/// The angle is between the propagation and the velocity of the moving frame, from 0 to π; towards a source it is π less that. Forms
/// in which nothing cancels, near the direction of motion and near the speed of light (A. Einstein, Ann. Phys. 17 (1905) 891, section 7;
/// W. Rindler, Relativity, 2nd ed., sections 4.3 and 4.4).
/// </remarks>
public readonly struct LightAtAngle<TFrame, TOther>
    where TFrame : struct, IFrame
    where TOther : struct, IFrame
{
    private readonly double _ratio;
    private readonly double _angle;

    private LightAtAngle(double celerityRatio, double angle)
    {
        _ratio = celerityRatio;
        _angle = angle;
    }

    /// <summary>The received by the sent frequency: f′/f = γ(1 − β cos θ).</summary>
    [Kind(QuantityKind.DopplerFactor)]
    [Between(nameof(TFrame), nameof(TOther))]
    public double FrequencyRatio => Ratio.High;

    /// <summary>f′/f − 1, which a ratio near one cannot hold.</summary>
    [Unit("1")]
    public double FrequencyRatioMinusOne
    {
        get
        {
            // (γ − 1) − w cos θ; ahead 1/(γ+w) − 1 = −w(1 + w/(1+γ))/(γ+w)… keeps what the two terms share.
            double lorentz = Celerity.LorentzFactor(_ratio);
            double half = Math.Sin(_angle / 2);
            double ahead = -_ratio * (1 + (_ratio / (1 + lorentz))) / (lorentz + _ratio);
            return Math.Cos(_angle) > 0.5
                ? ahead + (2 * _ratio * half * half)
                : Celerity.LorentzFactorMinusOne(_ratio) - (_ratio * Math.Cos(_angle));
        }
    }

    /// <summary>The angle in the moving frame: tan(θ′/2) = √((1 + β)/(1 − β)) tan(θ/2).</summary>
    [Unit("rad")]
    [InFrame(nameof(TOther))]
    public double AngleInOther => 2 * Math.Atan2(Stretch * Math.Sin(_angle / 2), Math.Cos(_angle / 2));

    /// <summary>cos θ′ = (cos θ − β)/(1 − β cos θ).</summary>
    [Unit("1")]
    public double CosineInOther
    {
        get
        {
            // With u = tan(θ′/2): (1 − u²)/(1 + u²).
            double u = Stretch * Math.Tan(_angle / 2);
            return Math.Abs(u) < 1e100 ? (1 - u) * (1 + u) / (1 + (u * u)) : -1;
        }
    }

    /// <summary>θ′ − θ, the aberration, also where it is a tiny part of the angle.</summary>
    [Unit("rad")]
    public double Aberration
    {
        get
        {
            // 2 atan(k sin θ/(1 − k cos θ)) with k = w/(1 + γ), and 1 − k cos θ counted from the pole where it is small.
            double size = Math.Abs(_ratio);
            double lorentz = Celerity.LorentzFactor(_ratio);
            double k = size / (1 + lorentz);
            double half = _ratio > 0 ? Math.Sin(_angle / 2) : Math.Cos(_angle / 2);
            double oneMinus = (1 + (1 / (lorentz + size))) / (1 + lorentz);
            return Math.CopySign(2 * Math.Atan2(k * Math.Sin(_angle), oneMinus + (2 * k * half * half)), _ratio);
        }
    }

    /// <summary>dΩ′/dΩ = (f/f′)².</summary>
    [Unit("1")]
    public double SolidAngleRatio
    {
        get
        {
            Extended ratio = Ratio;
            return ((Extended)1 / (ratio * ratio)).High;
        }
    }

    /// <summary>Light at an angle to the motion of the other frame.</summary>
    /// <param name="velocityOfOther">The velocity of the moving frame.</param>
    /// <param name="angle">Between the propagation and that velocity.</param>
    /// <exception cref="ArgumentOutOfRangeException">The angle is not from 0 to π.</exception>
    public static LightAtAngle<TFrame, TOther> At(Velocity<TFrame> velocityOfOther, [Unit("rad"), InFrame(nameof(TFrame))] double angle)
        => new(velocityOfOther.CelerityRatio, Require.Within(angle, 0, Math.PI));

    /// <summary>The same light where the angle is the one in the moving frame.</summary>
    /// <param name="velocityOfOther">The velocity of the moving frame.</param>
    /// <param name="angle">Between the propagation and that velocity, in the moving frame.</param>
    /// <exception cref="ArgumentOutOfRangeException">The angle is not from 0 to π.</exception>
    public static LightAtAngle<TOther, TFrame> AtAngleInOther(Velocity<TFrame> velocityOfOther, [Unit("rad"), InFrame(nameof(TOther))] double angle)
        => LightAtAngle<TOther, TFrame>.From(-velocityOfOther.CelerityRatio, Require.Within(angle, 0, Math.PI));

    internal static LightAtAngle<TFrame, TOther> From(double celerityRatio, double angle) => new(celerityRatio, angle);

    // √((1 + β)/(1 − β)) = γ + w.
    private double Stretch => _ratio >= 0 ? Celerity.LorentzFactor(_ratio) + _ratio : 1 / (Celerity.LorentzFactor(_ratio) - _ratio);

    // Only the trigonometric functions round.
    private Extended Ratio
    {
        get
        {
            Extended size = Math.Abs(_ratio);
            Extended lorentz = Math.Abs(_ratio) < 1e100 ? Extended.Sqrt((size * size) + 1) : size;
            double cosine = Math.Cos(_angle);
            if (_ratio * cosine <= 0)
                return lorentz + Extended.Product(Math.Abs(_ratio), Math.Abs(cosine));
            // Ahead of the motion: 1/(γ + |w|) + 2|w| sin²(θ/2), the angle counted from the nearer pole.
            double half = _ratio > 0 ? Math.Sin(_angle / 2) : Math.Cos(_angle / 2);
            return ((Extended)1 / (lorentz + size)) + (size * Extended.Product(half, half) * 2);
        }
    }
}
