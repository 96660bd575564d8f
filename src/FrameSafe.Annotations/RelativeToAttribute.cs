using System;

namespace FrameSafe;

/// <summary>Says of a frame which other frame it moves in, and how fast it can.</summary>
/// <typeparam name="TFrame">The frame in which its motion is described.</typeparam>
[AttributeUsage(AttributeTargets.Struct, AllowMultiple = true)]
public sealed class RelativeToAttribute<TFrame> : Attribute
    where TFrame : struct, IFrame
{
    /// <summary>The largest speed in that frame as a fraction of c, from 0 up to but not including 1.</summary>
    public double MaxSpeed { get; set; }
}

/// <summary>Says of a frame which other frame it moves in, and how fast it can.</summary>
[AttributeUsage(AttributeTargets.Struct, AllowMultiple = true)]
public sealed class RelativeToAttribute : Attribute
{
    /// <summary>The frame moves in <paramref name="frame"/>.</summary>
    public RelativeToAttribute(Type frame) => Frame = frame;

    /// <summary>The frame in which its motion is described.</summary>
    public Type Frame { get; }

    /// <summary>The largest speed in that frame as a fraction of c, from 0 up to but not including 1.</summary>
    public double MaxSpeed { get; set; }
}
