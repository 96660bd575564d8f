using System.Numerics;

namespace FrameSafe;

/// <summary>The time elapsed between two epochs of one scale, in seconds of that scale, kept in two parts.</summary>
/// <typeparam name="TScale">The time scale; elapsed UTC counts leap seconds, so that its second is the SI second.</typeparam>
/// <remarks>
/// Invariant: the first part is the whole rounded to a double, the second what that left out. The difference of two epochs is exact;
/// a sum of elapsed times is within 2⁻¹⁰⁰ of itself. <c>default</c> is no time. Seconds of TCG, TCB and TDB differ from those
/// of TT by up to 1.6 parts in 10⁸; nothing converts between them but the named conversions of <see cref="TimeScaleConversions"/>.
/// </remarks>
[Unit("s")]
[OnClock(nameof(TScale))]
public readonly partial struct ElapsedTime<TScale> :
    IEquatable<ElapsedTime<TScale>>,
    IComparable<ElapsedTime<TScale>>,
    IComparisonOperators<ElapsedTime<TScale>, ElapsedTime<TScale>, bool>,
    IAdditionOperators<ElapsedTime<TScale>, ElapsedTime<TScale>, ElapsedTime<TScale>>,
    ISubtractionOperators<ElapsedTime<TScale>, ElapsedTime<TScale>, ElapsedTime<TScale>>,
    IUnaryNegationOperators<ElapsedTime<TScale>, ElapsedTime<TScale>>
    where TScale : struct, ITimeScale
{
    private readonly double _seconds;
    private readonly double _rest;

    private ElapsedTime(double seconds, double rest)
    {
        _seconds = DayAndSecond.TwoSum(seconds, rest, out _rest);
    }

    /// <summary>No time.</summary>
    public static ElapsedTime<TScale> Zero => default;

    /// <summary>The whole in one double: within half a unit in its last place (0.25 µs at a century).</summary>
    [Unit("s")]
    [OnClock(nameof(TScale))]
    public double InSeconds => _seconds;

    /// <summary>What <see cref="InSeconds"/> left out by rounding; add it to a difference of the large parts.</summary>
    [Unit("s")]
    [OnClock(nameof(TScale))]
    public double RestInSeconds => _rest;

    /// <summary>The whole in days of 86 400 s, rounded to a double.</summary>
    [Unit("d")]
    [OnClock(nameof(TScale))]
    public double InDays => _seconds / DayAndSecond.SecondsInDay;

    /// <summary>An elapsed time from seconds, and from a second part that holds what one double cannot.</summary>
    /// <param name="seconds">Any finite number of seconds of the scale.</param>
    /// <param name="rest">What is to be added to it; need not be small.</param>
    /// <exception cref="ArgumentOutOfRangeException">One of them is not a finite number.</exception>
    public static ElapsedTime<TScale> FromSeconds(
        [Unit("s"), OnClock(nameof(TScale))] double seconds,
        [Unit("s"), OnClock(nameof(TScale))] double rest = 0)
    {
        ThrowIfNotFinite(seconds, nameof(seconds));
        ThrowIfNotFinite(rest, nameof(rest));
        return new ElapsedTime<TScale>(seconds, rest);
    }

    /// <summary>An elapsed time from days of 86 400 s; within 2⁻¹⁰⁶ of the product.</summary>
    /// <param name="days">Any finite number of days.</param>
    /// <exception cref="ArgumentOutOfRangeException">It is not a finite number.</exception>
    public static ElapsedTime<TScale> FromDays([Unit("d"), OnClock(nameof(TScale))] double days)
    {
        ThrowIfNotFinite(days, nameof(days));
        double seconds = days * DayAndSecond.SecondsInDay;
        return new ElapsedTime<TScale>(seconds, Math.FusedMultiplyAdd(days, DayAndSecond.SecondsInDay, -seconds));
    }

    internal static ElapsedTime<TScale> Between(DayAndSecond from, DayAndSecond to)
    {
        double seconds = DayAndSecond.TwoSum(to.Second, -from.Second, out double secondsRest);
        double sum = DayAndSecond.TwoSum((to.Day - from.Day) * DayAndSecond.SecondsInDay, seconds, out double rest);
        return new ElapsedTime<TScale>(sum, rest + secondsRest);
    }

    internal DayAndSecond After(DayAndSecond start)
    {
        double sum = DayAndSecond.TwoSum(start.Second, _seconds, out double rest);
        return DayAndSecond.Normalised(start.Day, sum, rest + _rest);
    }

    /// <summary>The sum.</summary>
    public static ElapsedTime<TScale> operator +(ElapsedTime<TScale> left, ElapsedTime<TScale> right)
    {
        double sum = DayAndSecond.TwoSum(left._seconds, right._seconds, out double rest);
        return new ElapsedTime<TScale>(sum, rest + (left._rest + right._rest));
    }

    /// <summary>The difference.</summary>
    public static ElapsedTime<TScale> operator -(ElapsedTime<TScale> left, ElapsedTime<TScale> right) => left + -right;

    /// <summary>The same time the other way.</summary>
    public static ElapsedTime<TScale> operator -(ElapsedTime<TScale> value) => new(-value._seconds, -value._rest);

    /// <summary>Whether both parts are equal.</summary>
    public static bool operator ==(ElapsedTime<TScale> left, ElapsedTime<TScale> right) =>
        left._seconds == right._seconds && left._rest == right._rest;

    /// <summary>Whether a part differs.</summary>
    public static bool operator !=(ElapsedTime<TScale> left, ElapsedTime<TScale> right) => !(left == right);

    /// <summary>Whether the left one is shorter.</summary>
    public static bool operator <(ElapsedTime<TScale> left, ElapsedTime<TScale> right) => left.CompareTo(right) < 0;

    /// <summary>Whether the left one is longer.</summary>
    public static bool operator >(ElapsedTime<TScale> left, ElapsedTime<TScale> right) => left.CompareTo(right) > 0;

    /// <summary>Whether the left one is not longer.</summary>
    public static bool operator <=(ElapsedTime<TScale> left, ElapsedTime<TScale> right) => left.CompareTo(right) <= 0;

    /// <summary>Whether the left one is not shorter.</summary>
    public static bool operator >=(ElapsedTime<TScale> left, ElapsedTime<TScale> right) => left.CompareTo(right) >= 0;

    /// <inheritdoc/>
    public int CompareTo(ElapsedTime<TScale> other)
    {
        int order = _seconds.CompareTo(other._seconds);
        return order != 0 ? order : _rest.CompareTo(other._rest);
    }

    /// <inheritdoc/>
    public bool Equals(ElapsedTime<TScale> other) => this == other;

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is ElapsedTime<TScale> other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(_seconds, _rest);

    private static void ThrowIfNotFinite(double value, string parameter)
    {
        if (!double.IsFinite(value))
            throw new ArgumentOutOfRangeException(parameter, value, $"An elapsed time is a finite number; {parameter} is {value}.");
    }
}
