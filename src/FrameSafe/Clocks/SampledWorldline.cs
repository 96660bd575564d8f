namespace FrameSafe;

/// <summary>What a clock shows along a way that is given by samples or as a function of time, with the error that was reached.</summary>
public static class SampledWorldline
{
    // Halving further than this resolves nothing that a double holds.
    private const int MostHalvings = 48;

    /// <summary>What a clock falls behind by between samples of its velocity.</summary>
    /// <param name="times">The times of the samples, in order.</param>
    /// <param name="velocities">The velocities at these times.</param>
    /// <returns>
    /// The integral of 1 − 1/γ by the trapezoidal rule (straight lines between the samples, order 2), and an estimate of its error: the
    /// difference to the same with every second sample left out, by a third (L. F. Richardson's estimate).
    /// </returns>
    /// <exception cref="ArgumentException">There are fewer than two samples, or not as many velocities as times.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A time is not after the one before it.</exception>
    public static (double BehindInSeconds, double ErrorInSeconds) Behind<TFrame>(
        ReadOnlySpan<CoordinateTime<TFrame>> times, ReadOnlySpan<Velocity<TFrame>> velocities)
        where TFrame : struct, IFrame
    {
        if (times.Length < 2 || times.Length != velocities.Length)
            throw new ArgumentException($"{times.Length} times and {velocities.Length} velocities; two or more of either, and as many, are wanted.", nameof(times));
        for (int i = 1; i < times.Length; i++)
        {
            if (!(times[i] > times[i - 1]))
                throw Require.Outside(times[i].InSeconds, $"{nameof(times)}[{i}]", FormattableString.Invariant($"after the one before it ({times[i - 1].InSeconds:R} s)"));
        }

        Extended fine = Trapezia(times, velocities, 1);
        Extended coarse = Trapezia(times, velocities, 2);
        return (fine.High, Math.Abs((fine - coarse).High) / 3);
    }

    /// <summary>What a clock falls behind by while its velocity is a function of time.</summary>
    /// <param name="start">The time at the start.</param>
    /// <param name="end">The time at the end; after the start.</param>
    /// <param name="velocity">The velocity at a time between them.</param>
    /// <param name="relativeError">The relative error to reach; from 1e-15 to 1.</param>
    /// <returns>The integral of 1 − 1/γ by adaptive quadrature (Gauss and Kronrod, 7 and 15 points), and the error that was reached by their difference.</returns>
    /// <remarks>A. S. Kronrod, Nodes and Weights of Quadrature Formulas (1965); nodes from QUADPACK (R. Piessens et al., 1983).</remarks>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    public static (double BehindInSeconds, double ErrorInSeconds) Behind<TFrame>(
        CoordinateTime<TFrame> start, CoordinateTime<TFrame> end, Func<CoordinateTime<TFrame>, Velocity<TFrame>> velocity, double relativeError = 1e-13)
        where TFrame : struct, IFrame
    {
        ArgumentNullException.ThrowIfNull(velocity);
        Require.Within(relativeError, 1e-15, 1);
        if (!(end > start))
            throw Require.Outside(end.InSeconds, nameof(end), FormattableString.Invariant($"after the start ({start.InSeconds:R} s)"));
        (double whole, double firstError) = GaussKronrod.Integrate(Rate, start.InSeconds, end.InSeconds);
        if (firstError <= relativeError * Math.Abs(whole))
            return (whole, firstError);
        (Extended sum, double error) = Halve(start.InSeconds, end.InSeconds, Math.Abs(whole) * relativeError / (end - start).InSeconds, MostHalvings);
        return (sum.High, error);

        double Rate(double seconds) => OneMinusRate(velocity(new(seconds)));

        (Extended Sum, double Error) Halve(double from, double to, double errorPerSecond, int left)
        {
            (double value, double reached) = GaussKronrod.Integrate(Rate, from, to);
            if (reached <= errorPerSecond * (to - from) || left == 0 || reached <= 1e-15 * Math.Abs(value))
                return (value, reached);
            double middle = from + ((to - from) / 2);
            (Extended first, double firstPart) = Halve(from, middle, errorPerSecond, left - 1);
            (Extended second, double secondPart) = Halve(middle, to, errorPerSecond, left - 1);
            return (first + second, firstPart + secondPart);
        }
    }

    private static Extended Trapezia<TFrame>(ReadOnlySpan<CoordinateTime<TFrame>> times, ReadOnlySpan<Velocity<TFrame>> velocities, int step)
        where TFrame : struct, IFrame
    {
        Extended sum = 0;
        int last = 0;
        while (last < times.Length - 1)
        {
            int next = Math.Min(last + step, times.Length - 1);
            sum += (Extended)((times[next] - times[last]).InSeconds / 2) * (OneMinusRate(velocities[last]) + OneMinusRate(velocities[next]));
            last = next;
        }

        return sum;
    }

    // 1 − 1/γ = (γ − 1)/γ.
    private static double OneMinusRate<TFrame>(Velocity<TFrame> velocity)
        where TFrame : struct, IFrame
        => velocity.LorentzFactorMinusOne / velocity.LorentzFactor;
}
