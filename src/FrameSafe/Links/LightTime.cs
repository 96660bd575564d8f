namespace FrameSafe;

/// <summary>How long light takes between ends that move, and where things are seen against where they are.</summary>
/// <remarks>
/// The light-time equation c·(t − t′) = |r(t) − s(t′)|, solved until the last digit stands still; it converges for whatever moves slower than
/// light (P. K. Seidelmann, ed., Explanatory Supplement to the Astronomical Almanac, 1992, section 3.314).
/// </remarks>
public static class LightTime
{
    // At 0.9999 c each step gains a ten-thousandth of what is left; more steps than this are no motion below c.
    private const int MostSteps = 2_000_000;

    // Of what is slower than light each step is shorter than the one before it; rounding aside.
    private const int Patience = 16;
    private const double LastDigits = 1e-15;

    /// <summary>When a signal that leaves at an event reaches a body.</summary>
    /// <param name="sent">The event of sending.</param>
    /// <param name="receiver">Where the body is at a time; slower than light throughout.</param>
    /// <returns>The event of reception; its time within 1e-15/(1 − β) of itself, β the speed of recession.</returns>
    /// <exception cref="ArgumentException">The signal never reaches the body: it is not slower than light.</exception>
    public static SpacetimeEvent<TFrame> Reception<TFrame>(
        SpacetimeEvent<TFrame> sent, Func<CoordinateTime<TFrame>, Displacement<TFrame>> receiver)
        where TFrame : struct, IFrame
        => Meet(sent, receiver, +1);

    /// <summary>When a signal that arrives at an event left a body: where the body is seen from there.</summary>
    /// <param name="received">The event of reception.</param>
    /// <param name="sender">Where the body is at a time; slower than light throughout.</param>
    /// <returns>The event of sending, whose place is where the body is seen; where it is by then, <paramref name="sender"/> tells.</returns>
    /// <exception cref="ArgumentException">No signal of the body arrives: it is not slower than light.</exception>
    public static SpacetimeEvent<TFrame> Emission<TFrame>(
        SpacetimeEvent<TFrame> received, Func<CoordinateTime<TFrame>, Displacement<TFrame>> sender)
        where TFrame : struct, IFrame
        => Meet(received, sender, -1);

    private static SpacetimeEvent<TFrame> Meet<TFrame>(
        SpacetimeEvent<TFrame> end, Func<CoordinateTime<TFrame>, Displacement<TFrame>> body, int sign)
        where TFrame : struct, IFrame
    {
        ArgumentNullException.ThrowIfNull(body);
        double light = 0;
        double change = double.PositiveInfinity;
        int growing = 0;
        for (int step = 0; step < MostSteps && growing < Patience; step++)
        {
            double next = (body(new(end.Seconds + (sign * light))).Metres - end.Metres).Norm / PhysicsOfLight.Speed;
            double difference = Math.Abs(next - light);
            light = next;
            // Done where nothing changes any more, or only the last digit to and fro.
            if (difference == 0 || (difference >= change && difference <= LastDigits * light))
                return SpacetimeEvent<TFrame>.At(new(end.Seconds + (sign * light)), body(new(end.Seconds + (sign * light))));
            growing = difference > change ? growing + 1 : 0;
            change = difference;
        }

        throw new ArgumentException(FormattableString.Invariant(
            $"Light does not meet the body: it has to be slower than light throughout (the last step of the search was {change:R} s)."));
    }
}
