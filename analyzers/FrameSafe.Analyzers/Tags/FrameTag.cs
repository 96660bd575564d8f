using System;

namespace FrameSafe.Analyzers.Tags;

/// <summary>A reference frame, known by its identity.</summary>
internal sealed class FrameTag : IEquatable<FrameTag>
{
    public FrameTag(string id, string displayName, FrameNature nature = FrameNature.Unknown)
    {
        Id = id;
        DisplayName = displayName;
        Nature = nature;
    }

    /// <summary>The full metadata name of the type that stands for it; unique also where it is a type parameter.</summary>
    public string Id { get; }

    /// <summary>The name that a message shows.</summary>
    public string DisplayName { get; }

    /// <summary>How the frame moves; no part of its identity.</summary>
    public FrameNature Nature { get; }

    /// <summary>The clocks at rest in the frame: its coordinate time is their proper time.</summary>
    public ClockTag Clock => new(Id, DisplayName);

    public bool Equals(FrameTag? other) => other is not null && Id == other.Id;

    public override bool Equals(object? obj) => Equals(obj as FrameTag);

    public override int GetHashCode() => Id.GetHashCode();

    public override string ToString() => DisplayName;
}

/// <summary>How a frame moves, by the interface that declares it.</summary>
internal enum FrameNature
{
    /// <summary>Not said.</summary>
    Unknown,

    /// <summary>A free body moves uniformly in it.</summary>
    Inertial,

    /// <summary>The instantaneous rest frame of a body.</summary>
    Rest,

    /// <summary>It turns.</summary>
    Rotating,

    /// <summary>It turns with a body.</summary>
    Body,

    /// <summary>Local directions at a point.</summary>
    Local,
}
