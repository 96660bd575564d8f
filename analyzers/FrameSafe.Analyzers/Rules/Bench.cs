using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;

namespace FrameSafe.Analyzers.Rules;

/// <summary>What a judgement may look up besides the case itself.</summary>
internal sealed class Bench(FrameTable frames, double budget)
{
    /// <summary>The relative error that the project bears.</summary>
    internal double Budget { get; } = budget;

    internal FrameTable Frames { get; } = frames;

    /// <summary>The largest speed that a velocity can have, as a fraction of c; null where nothing bounds it.</summary>
    internal double? MaxSpeed(Tag velocity)
        => velocity.Speed?.Most ?? (velocity.Frame is { } frame ? Frames.MaxSpeedIn(frame.Id) : null);
}
