using System.Numerics;

namespace FrameSafe;

/// <summary>How fast one clock runs by another: the proper time of the one by the elapsed time of the other.</summary>
/// <typeparam name="TClock">The clock that is rated.</typeparam>
/// <typeparam name="TReference">The clock it is rated by.</typeparam>
/// <remarks>
/// Kept as rate − 1, which a rate near 1 cannot hold, and as the rate, which rate − 1 cannot hold near a horizon. <c>default</c> is equal
/// rates. A rate is above 0.
/// </remarks>
[Unit("1")]
[Kind(QuantityKind.ClockRate)]
[Between(nameof(TReference), nameof(TClock))]
public readonly struct ClockRate<TClock, TReference> :
    IEquatable<ClockRate<TClock, TReference>>,
    IEqualityOperators<ClockRate<TClock, TReference>, ClockRate<TClock, TReference>, bool>
    where TClock : struct, IClock
    where TReference : struct, IClock
{
    private const double MicrosecondsInDay = 86400e6;

    private readonly double _rate;
    private readonly double _minusOne;

    private ClockRate(double rate, double minusOne)
    {
        _rate = rate;
        _minusOne = minusOne;
    }

    /// <summary>The rate less one: what the clock gains by each unit of the reference.</summary>
    [Unit("1")]
    public double MinusOne => _minusOne;

    /// <summary>The rate.</summary>
    [Unit("1")]
    [Kind(QuantityKind.ClockRate)]
    [Between(nameof(TReference), nameof(TClock))]
    public double Rate => _rate == 0 ? 1 : _rate;

    /// <summary>What the clock gains in a day (86 400 s) of the reference.</summary>
    [Unit("us/d")]
    public double GainInMicrosecondsPerDay => _minusOne * MicrosecondsInDay;

    /// <summary>The redshift z = 1/rate − 1 of a wave that the clock times and the reference counts.</summary>
    /// <remarks>Positive for a clock that runs slow. Without the Doppler shift of a clock that approaches or recedes.</remarks>
    [Unit("1")]
    public double Redshift => -_minusOne / Rate;

    /// <summary>The same two clocks the other way round: rate 1/rate.</summary>
    public ClockRate<TReference, TClock> Inverse => ClockRate<TReference, TClock>.From(1 / Rate, -_minusOne / Rate);

    /// <summary>A rate from what it exceeds one by.</summary>
    /// <param name="minusOne">Above −1 and finite.</param>
    /// <exception cref="ArgumentOutOfRangeException">It is not.</exception>
    public static ClockRate<TClock, TReference> FromMinusOne([Unit("1")] double minusOne)
    {
        if (!(minusOne > -1 && double.IsFinite(minusOne)))
        {
            throw new ArgumentOutOfRangeException(
                nameof(minusOne), minusOne, FormattableString.Invariant($"A clock rate less one is above −1 and finite; it is {minusOne:R}."));
        }

        return new ClockRate<TClock, TReference>(1 + minusOne, minusOne);
    }

    internal static ClockRate<TClock, TReference> From(double rate, double minusOne) => new(rate, minusOne);

    /// <summary>What the clock gains on the reference while the reference counts some seconds.</summary>
    /// <param name="elapsed">Any finite number of seconds.</param>
    /// <returns>The clock's reading less the reference's, in seconds.</returns>
    [return: Unit("s")]
    [return: Kind(QuantityKind.ClockOffset)]
    public double GainInSeconds([Unit("s"), OnClock(nameof(TReference))] double elapsed) => _minusOne * elapsed;

    /// <summary>The clock by a third one, from the reference by that one.</summary>
    /// <param name="reference">How fast the reference runs by the third clock.</param>
    /// <typeparam name="TOther">The third clock.</typeparam>
    /// <remarks>Where two nearly equal shifts cancel, take both from one field instead: <see cref="FieldClock{TClock}.Against{TOther}"/>.</remarks>
    public ClockRate<TClock, TOther> Then<TOther>(ClockRate<TReference, TOther> reference) where TOther : struct, IClock =>
        ClockRate<TClock, TOther>.From(
            Rate * reference.Rate, Math.FusedMultiplyAdd(_minusOne, reference.MinusOne, _minusOne + reference.MinusOne));

    /// <summary>Whether both rates are equal.</summary>
    public static bool operator ==(ClockRate<TClock, TReference> left, ClockRate<TClock, TReference> right) =>
        left._minusOne == right._minusOne && left.Rate == right.Rate;

    /// <summary>Whether the rates differ.</summary>
    public static bool operator !=(ClockRate<TClock, TReference> left, ClockRate<TClock, TReference> right) => !(left == right);

    /// <inheritdoc/>
    public bool Equals(ClockRate<TClock, TReference> other) => this == other;

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is ClockRate<TClock, TReference> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(_minusOne, Rate);

    /// <summary>The clocks and the rate less one: <c>Sat/Tt − 1 = 4.46e-10</c>.</summary>
    public override string ToString() =>
        FormattableString.Invariant($"{typeof(TClock).Name}/{typeof(TReference).Name} − 1 = {_minusOne:R}");
}
