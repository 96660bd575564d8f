using System.Numerics;

namespace FrameSafe;

/// <summary>A direction in a frame: where light goes, or where it is looked for.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
/// <remarks><c>default</c> is along x.</remarks>
[InFrame(nameof(TFrame))]
[Kind(QuantityKind.Direction)]
public readonly struct Direction<TFrame> : IEquatable<Direction<TFrame>>, IEqualityOperators<Direction<TFrame>, Direction<TFrame>, bool>
    where TFrame : struct, IFrame
{
    // x less one, so that the default is a direction.
    private readonly Triple _components;

    internal Direction(Triple unit) => _components = new(unit.X - 1, unit.Y, unit.Z);

    /// <summary>The component along x.</summary>
    [Kind(QuantityKind.Direction)]
    [InFrame(nameof(TFrame))]
    public double X => _components.X + 1;

    /// <summary>The component along y.</summary>
    [Kind(QuantityKind.Direction)]
    [InFrame(nameof(TFrame))]
    public double Y => _components.Y;

    /// <summary>The component along z.</summary>
    [Kind(QuantityKind.Direction)]
    [InFrame(nameof(TFrame))]
    public double Z => _components.Z;

    internal Triple Components => new(X, Y, Z);

    /// <summary>The direction of components of any length.</summary>
    /// <exception cref="ArgumentOutOfRangeException">They are all zero, or not finite.</exception>
    public static Direction<TFrame> Along(double x, double y, double z)
    {
        Triple given = Door.Finite(new(x, y, z), "components");
        double size = given.Norm;
        return size > 0 ? new(given * (1 / size)) : throw Require.Outside(0, "components", "not all 0");
    }

    /// <summary>The direction in the plane of x and y at an angle from x.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The angle is not finite.</exception>
    public static Direction<TFrame> AtAngle([Unit("rad")] double angle) => new(new(Math.Cos(Require.Finite(angle)), Math.Sin(angle), 0));

    /// <summary>The other way.</summary>
    public static Direction<TFrame> operator -(Direction<TFrame> value) => new(-value.Components);

    /// <summary>The same direction.</summary>
    public static bool operator ==(Direction<TFrame> left, Direction<TFrame> right) => left._components == right._components;

    /// <summary>Another direction.</summary>
    public static bool operator !=(Direction<TFrame> left, Direction<TFrame> right) => left._components != right._components;

    /// <inheritdoc/>
    public bool Equals(Direction<TFrame> other) => _components.Equals(other._components);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is Direction<TFrame> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _components.GetHashCode();

    /// <summary>The components and the frame.</summary>
    public override string ToString() => QuantityText.Of(Components, "", QuantityText.In<TFrame>(), null, null);
}
