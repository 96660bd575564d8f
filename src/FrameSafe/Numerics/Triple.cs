namespace FrameSafe;

/// <summary>Three components in one frame.</summary>
internal readonly record struct Triple(double X, double Y, double Z)
{
    // Where squares neither overflow nor vanish.
    private const double Least = 1e-140;
    private const double Most = 1e140;

    /// <summary>The norm; within 2 ulp wherever it is a double.</summary>
    internal double Norm
    {
        get
        {
            double largest = Math.Max(Math.Abs(X), Math.Max(Math.Abs(Y), Math.Abs(Z)));
            if (largest is > Least and < Most)
                return Math.Sqrt(Dot(this));
            if (largest == 0 || !double.IsFinite(largest))
                return largest;
            Triple scaled = this * (1 / largest);
            return double.IsFinite(1 / largest) ? largest * Math.Sqrt(scaled.Dot(scaled)) : new Triple(X * 1e200, Y * 1e200, Z * 1e200).Norm * 1e-200;
        }
    }

    internal bool IsFinite => double.IsFinite(X) && double.IsFinite(Y) && double.IsFinite(Z);

    public static Triple operator +(Triple left, Triple right) => new(left.X + right.X, left.Y + right.Y, left.Z + right.Z);

    public static Triple operator -(Triple left, Triple right) => new(left.X - right.X, left.Y - right.Y, left.Z - right.Z);

    public static Triple operator -(Triple value) => new(-value.X, -value.Y, -value.Z);

    public static Triple operator *(Triple value, double factor) => new(value.X * factor, value.Y * factor, value.Z * factor);

    internal double Dot(Triple other) => Math.FusedMultiplyAdd(X, other.X, Math.FusedMultiplyAdd(Y, other.Y, Z * other.Z));

    internal Triple Cross(Triple other)
        => new((Y * other.Z) - (Z * other.Y), (Z * other.X) - (X * other.Z), (X * other.Y) - (Y * other.X));

    /// <summary>This plus a multiple of another.</summary>
    internal Triple Plus(Triple other, double factor) => new(
        Math.FusedMultiplyAdd(other.X, factor, X),
        Math.FusedMultiplyAdd(other.Y, factor, Y),
        Math.FusedMultiplyAdd(other.Z, factor, Z));
}
