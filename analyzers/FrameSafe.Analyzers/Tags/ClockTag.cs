using System;

namespace FrameSafe.Analyzers.Tags;

/// <summary>A clock or a time scale, known by its identity.</summary>
internal sealed class ClockTag : IEquatable<ClockTag>
{
    public ClockTag(string id, string displayName, bool isTimeScale = false)
    {
        Id = id;
        DisplayName = displayName;
        IsTimeScale = isTimeScale;
    }

    /// <summary>The full metadata name of the type that stands for it; unique also where it is a type parameter.</summary>
    public string Id { get; }

    /// <summary>The name that a message shows.</summary>
    public string DisplayName { get; }

    /// <summary>A coordinate time agreed by convention (TAI, UTC, …) rather than the reading of one clock.</summary>
    public bool IsTimeScale { get; }

    public bool Equals(ClockTag? other) => other is not null && Id == other.Id;

    public override bool Equals(object? obj) => Equals(obj as ClockTag);

    public override int GetHashCode() => Id.GetHashCode();

    public override string ToString() => DisplayName;
}
