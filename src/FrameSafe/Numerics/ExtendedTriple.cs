namespace FrameSafe;

/// <summary>Three components, each in twice the precision of a double.</summary>
internal readonly record struct ExtendedTriple(Extended X, Extended Y, Extended Z)
{
    internal Triple High => new(X.High, Y.High, Z.High);

    internal Extended Square => (X * X) + (Y * Y) + (Z * Z);

    public static ExtendedTriple operator +(ExtendedTriple left, ExtendedTriple right) => new(left.X + right.X, left.Y + right.Y, left.Z + right.Z);

    public static ExtendedTriple operator *(ExtendedTriple value, Extended factor) => new(value.X * factor, value.Y * factor, value.Z * factor);

    internal static ExtendedTriple Of(Triple value) => new(value.X, value.Y, value.Z);

    internal Extended Dot(ExtendedTriple other) => (X * other.X) + (Y * other.Y) + (Z * other.Z);

    internal ExtendedTriple Cross(ExtendedTriple other)
        => new((Y * other.Z) - (Z * other.Y), (Z * other.X) - (X * other.Z), (X * other.Y) - (Y * other.X));
}
