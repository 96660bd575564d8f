namespace FrameSafe;

/// <summary>A rotation in space, as a unit quaternion; <c>default</c> is none.</summary>
internal readonly struct Rotation
{
    // The scalar part less one, so that the default is the identity.
    private readonly double _scalarMinusOne;
    private readonly Triple _vector;

    private Rotation(double scalar, Triple vector)
    {
        _scalarMinusOne = scalar - 1;
        _vector = vector;
    }

    /// <summary>The angle, from 0 to π.</summary>
    internal double Angle => 2 * Math.Atan2(_vector.Norm, Math.Abs(Scalar));

    /// <summary>The unit axis of that angle, right-handed; zero for no rotation.</summary>
    internal Triple Axis
    {
        get
        {
            double size = _vector.Norm;
            return size == 0 ? default : _vector * (Math.CopySign(1, Scalar) / size);
        }
    }

    internal Rotation Inverse => new(Scalar, -_vector);

    private double Scalar => _scalarMinusOne + 1;

    /// <summary>The rotation R in L(v)·L(u) = L(v ⊕ u)·R, of celerity ratios: q = (1 + t_v·t_u, −t_v × t_u), t = w/(1 + γ).</summary>
    internal static Rotation OfBoosts(Triple v, Triple u)
    {
        double vLorentz = Celerity.LorentzFactor(v.Norm);
        double uLorentz = Celerity.LorentzFactor(u.Norm);
        Triple one = v * (1 / (1 + vLorentz));
        Triple other = u * (1 / (1 + uLorentz));
        Triple cross = other.Cross(one);
        double scalar = OnePlusDot(one, other, vLorentz, uLorentz, v.Norm, u.Norm);
        double size = Math.Sqrt((scalar * scalar) + cross.Dot(cross));
        return new(scalar / size, cross * (1 / size));
    }

    internal Triple Turn(Triple value)
    {
        // v + 2s(q × v) + 2q × (q × v).
        Triple twice = _vector.Cross(value) * 2;
        return value + (twice * Scalar) + _vector.Cross(twice);
    }

    /// <summary>This rotation followed by another.</summary>
    internal Rotation Then(Rotation next)
        => new(
            (next.Scalar * Scalar) - next._vector.Dot(_vector),
            (_vector * next.Scalar) + (next._vector * Scalar) + next._vector.Cross(_vector));

    // 1 + t₁·t₂ of nearly opposite directions at high speed: 1 − |t₁||t₂| + (|t₁||t₂| + t₁·t₂), both parts without cancellation.
    private static double OnePlusDot(Triple one, Triple other, double g1, double g2, double w1, double w2)
    {
        double dot = one.Dot(other);
        if (dot > -0.5)
            return 1 + dot;
        double t1 = one.Norm;
        double t2 = other.Norm;
        double rest1 = (1 + (1 / (g1 + w1))) / (1 + g1);
        double rest2 = (1 + (1 / (g2 + w2))) / (1 + g2);
        // |a||b| + a·b = |â + b̂|²/2 · |a||b|.
        Triple sum = (one * (1 / t1)) + (other * (1 / t2));
        return rest1 + (t1 * rest2) + (t1 * t2 * sum.Dot(sum) / 2);
    }
}
