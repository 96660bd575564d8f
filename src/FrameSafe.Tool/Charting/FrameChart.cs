namespace FrameSafe.Tool.Charting;

/// <summary>The frames of some code, how they move against one another, and where numbers cross between them.</summary>
internal sealed record FrameChart(
    IReadOnlyList<ChartFrame> Frames, IReadOnlyList<ChartMotion> Motions, IReadOnlyList<ChartCrossing> Crossings)
{
    internal static FrameChart Empty { get; } = new([], [], []);

    internal static FrameChart Merge(IEnumerable<FrameChart> charts)
    {
        FrameChart[] all = [.. charts];
        return new(
            [.. all.SelectMany(chart => chart.Frames).DistinctBy(frame => frame.Id).OrderBy(frame => frame.Id, StringComparer.Ordinal)],
            [
                .. all.SelectMany(chart => chart.Motions)
                    .GroupBy(motion => (motion.Frame, motion.In))
                    .Select(group => group.MaxBy(motion => motion.MaxSpeed ?? 0)!)
                    .OrderBy(motion => motion.Frame, StringComparer.Ordinal)
                    .ThenBy(motion => motion.In, StringComparer.Ordinal),
            ],
            [
                .. all.SelectMany(chart => chart.Crossings)
                    .GroupBy(crossing => (crossing.From, crossing.To))
                    .Select(group => new ChartCrossing(group.Key.From, group.Key.To, group.Sum(crossing => crossing.Count)))
                    .OrderBy(crossing => crossing.From, StringComparer.Ordinal)
                    .ThenBy(crossing => crossing.To, StringComparer.Ordinal),
            ]);
    }
}

/// <param name="Id">The full metadata name.</param>
/// <param name="Name">The name that people read.</param>
/// <param name="Nature">How it moves: inertial, rotating, the rest frame of a body; or that it is a time scale.</param>
internal sealed record ChartFrame(string Id, string Name, string Nature);

/// <summary>A frame's declared motion.</summary>
/// <param name="Frame">Which frame moves.</param>
/// <param name="In">In which.</param>
/// <param name="MaxSpeed">How fast at most, as a fraction of c; null where it is not said.</param>
internal sealed record ChartMotion(string Frame, string In, double? MaxSpeed)
{
    /// <summary>The Lorentz factor at the largest speed.</summary>
    internal double? MaxLorentzFactor => MaxSpeed is { } speed ? 1 / Math.Sqrt((1 - speed) * (1 + speed)) : null;
}

/// <summary>How many places of the code carry a number from one frame to another.</summary>
internal sealed record ChartCrossing(string From, string To, int Count);
