using System.Numerics;

namespace FrameSafe;

/// <summary>The way in time and place from one event to another, as a frame measures it.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
[InFrame(nameof(TFrame))]
public readonly struct SpacetimeInterval<TFrame> :
    IEquatable<SpacetimeInterval<TFrame>>,
    IEqualityOperators<SpacetimeInterval<TFrame>, SpacetimeInterval<TFrame>, bool>,
    IAdditionOperators<SpacetimeInterval<TFrame>, SpacetimeInterval<TFrame>, SpacetimeInterval<TFrame>>
    where TFrame : struct, IFrame
{
    private readonly double _seconds;
    private readonly Triple _metres;

    internal SpacetimeInterval(double seconds, Triple metres)
    {
        _seconds = seconds;
        _metres = metres;
    }

    /// <summary>The elapsed coordinate time.</summary>
    public CoordinateTime<TFrame> Time => new(_seconds);

    /// <summary>The displacement.</summary>
    public Displacement<TFrame> Displacement => new(_metres);

    /// <summary>s² = c²t² − r², the same in every frame; exact to rounding also near the light cone, where it cancels.</summary>
    /// <remarks>Signature (+, −, −, −): positive where the way is timelike.</remarks>
    [Unit("m2")]
    [Kind(QuantityKind.Interval)]
    public double SquareInSquareMetres => Square.High;

    /// <summary>Which of the three it is, in every frame.</summary>
    public IntervalClass Class => Square.High switch
    {
        > 0 => IntervalClass.Timelike,
        < 0 => IntervalClass.Spacelike,
        _ => IntervalClass.Lightlike,
    };

    internal double Seconds => _seconds;

    internal Triple Metres => _metres;

    // Products in twice the precision: nothing is lost before the difference.
    private Extended Square
    {
        get
        {
            Extended light = Extended.Product(PhysicsOfLight.Speed, _seconds);
            return (light * light) - (Extended.Product(_metres.X, _metres.X) + Extended.Product(_metres.Y, _metres.Y) + Extended.Product(_metres.Z, _metres.Z));
        }
    }

    /// <summary>What a clock shows that goes straight from the one event to the other.</summary>
    /// <exception cref="InvalidOperationException">The interval is spacelike: no clock goes that way.</exception>
    [return: Unit("s")]
    [return: Kind(QuantityKind.ProperTime)]
    public double ProperTimeInSeconds()
    {
        Extended square = Square;
        return square.High >= 0
            ? Math.Sign(_seconds) * (Extended.Sqrt(square) / PhysicsOfLight.Speed).High
            : throw new InvalidOperationException(
                FormattableString.Invariant($"No clock goes from event to event over a spacelike interval; its square is {square.High:R} m²."));
    }

    /// <summary>The distance in the frame in which both events are simultaneous.</summary>
    /// <exception cref="InvalidOperationException">The interval is timelike: there is no such frame.</exception>
    [return: Unit("m")]
    [return: Kind(QuantityKind.ProperLength)]
    public double ProperDistanceInMetres()
    {
        Extended square = Square;
        return square.High <= 0
            ? Extended.Sqrt(-square).High
            : throw new InvalidOperationException(
                FormattableString.Invariant($"In no frame are both events of a timelike interval simultaneous; its square is {square.High:R} m²."));
    }

    /// <summary>The sum.</summary>
    public static SpacetimeInterval<TFrame> operator +(SpacetimeInterval<TFrame> left, SpacetimeInterval<TFrame> right)
        => new(left._seconds + right._seconds, left._metres + right._metres);

    /// <summary>The same.</summary>
    public static bool operator ==(SpacetimeInterval<TFrame> left, SpacetimeInterval<TFrame> right) => left.Equals(right);

    /// <summary>Another.</summary>
    public static bool operator !=(SpacetimeInterval<TFrame> left, SpacetimeInterval<TFrame> right) => !left.Equals(right);

    /// <inheritdoc/>
    public bool Equals(SpacetimeInterval<TFrame> other) => _seconds.Equals(other._seconds) && _metres.Equals(other._metres);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is SpacetimeInterval<TFrame> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(_seconds, _metres);

    /// <summary>Time, displacement and frame.</summary>
    public override string ToString()
        => QuantityText.Of(_seconds, "s", " over ", null, null) + QuantityText.Of(_metres, "m", QuantityText.In<TFrame>(), null, null);
}

/// <summary>How two events lie to each other, in every frame alike.</summary>
public enum IntervalClass
{
    /// <summary>Light can just go from the one to the other.</summary>
    Lightlike = 0,

    /// <summary>A clock can go from the one to the other; their order is the same in every frame.</summary>
    Timelike,

    /// <summary>Nothing can go from the one to the other; their order depends on the frame.</summary>
    Spacelike,
}
