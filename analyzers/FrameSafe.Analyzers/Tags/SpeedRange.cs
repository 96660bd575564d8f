using System;

namespace FrameSafe.Analyzers.Tags;

/// <summary>The range of a speed as a fraction of c.</summary>
/// <param name="Least">The lower bound, from 0.</param>
/// <param name="Most">The upper bound, not below the lower one.</param>
internal sealed record SpeedRange(double Least, double Most)
{
    /// <summary>From rest up to a largest speed.</summary>
    public static SpeedRange UpTo(double most) => new(0, most);

    /// <summary>The smallest range that holds both.</summary>
    public static SpeedRange? Hull(SpeedRange? left, SpeedRange? right)
        => left is null || right is null ? null : new(Math.Min(left.Least, right.Least), Math.Max(left.Most, right.Most));
}
