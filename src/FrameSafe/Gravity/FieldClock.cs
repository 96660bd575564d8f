namespace FrameSafe;

/// <summary>The clock that coordinate time is: at rest, far from the field's source.</summary>
public readonly struct FarClock : IClock;

/// <summary>A clock at its place in a gravitational field, at rest or moving: how its proper time runs by the coordinate time.</summary>
/// <typeparam name="TClock">The clock.</typeparam>
/// <remarks>
/// <para>Kept as (dτ/dt)² − 1 in twice the precision of a double, so that two clocks compare to a rounding even where their shifts
/// cancel: a centimetre apart in height, or in an orbit of one and a half times the radius of the ground.</para>
/// <para>Clocks compare only within one field and one coordinate time; the type does not know which. <c>default</c> is a clock at rest far
/// away.</para>
/// <para>Made by <see cref="SchwarzschildField"/>, <see cref="OblateField"/>, <see cref="WeakField"/> and <see cref="Geoid"/>.</para>
/// </remarks>
public readonly struct FieldClock<TClock> where TClock : struct, IClock
{
    private readonly Extended _squareMinusOne;
    private readonly Extended _square;

    // Where the shift is that of a horizon's radius h at a place r, k·h/r, the three stand here too: two of one field then compare exactly.
    private readonly Extended _horizon;
    private readonly double _factor;
    private readonly Extended _place;

    internal FieldClock(Extended squareMinusOne, Extended square, Extended horizon = default, double factor = 0, Extended place = default)
    {
        _squareMinusOne = squareMinusOne;
        _square = square;
        _horizon = horizon;
        _factor = factor;
        _place = place;
    }

    private Extended Square => _square.High == 0 ? 1 : _square;

    /// <summary>The rate by coordinate time; rate and rate − 1 each within 1 ulp.</summary>
    public ClockRate<TClock, FarClock> Rate => Against(default(FieldClock<FarClock>));

    /// <summary>The rate by another clock of the same field; rate and rate − 1 each within 1 ulp.</summary>
    /// <param name="other">The clock to rate by.</param>
    /// <typeparam name="TOther">Its name.</typeparam>
    public ClockRate<TClock, TOther> Against<TOther>(FieldClock<TOther> other) where TOther : struct, IClock
    {
        // With q = (a² − b²)/b²: a/b − 1 = q/(1 + √(1 + q)).
        Extended excess = Excess(other) / other.Square;
        Extended rate = Extended.Sqrt(Square / other.Square);
        Extended minusOne = excess / (rate + 1);
        return ClockRate<TClock, TOther>.From((double)rate, (double)minusOne);
    }

    internal static FieldClock<TClock> FromSquareMinusOne(Extended squareMinusOne) => new(squareMinusOne, squareMinusOne + 1);

    internal static FieldClock<TClock> FromSquare(Extended squareMinusOne, Extended square) => new(squareMinusOne, square);

    /// <summary>(dτ/dt)² = 1 − k·h/r: k is 1 at rest and 3/2 in a circular orbit.</summary>
    internal static FieldClock<TClock> InField(Extended horizon, double factor, Extended place)
    {
        Extended reach = horizon * factor;
        return new(-(reach / place), (place - reach) / place, horizon, factor, place);
    }

    /// <summary>The same clock under another name.</summary>
    internal FieldClock<TOther> Renamed<TOther>()
        where TOther : struct, IClock
        => new FieldClock<TOther>(_squareMinusOne, _square, _horizon, _factor, _place);

    // a² − b²; in one field h(k₂r₁ − k₁r₂)/(r₁r₂), which is exactly zero where an orbit's clock keeps step with the ground's.
    private Extended Excess<TOther>(FieldClock<TOther> other)
        where TOther : struct, IClock
    {
        bool sameField = _factor != 0 && other._factor != 0 && _horizon.High == other._horizon.High && _horizon.Low == other._horizon.Low;
        return sameField
            ? _horizon * ((_place * other._factor) - (other._place * _factor)) / (_place * other._place)
            : _squareMinusOne - other._squareMinusOne;
    }
}
