using System;

namespace FrameSafe;

/// <summary>Says by which clock or time scale a time is told: its proper time, or the scale's time.</summary>
/// <typeparam name="TClock">The clock: a frame, a clock of its own, or a time scale such as <see cref="Tai"/>.</typeparam>
[AttributeUsage(Targets.Number | AttributeTargets.Struct | AttributeTargets.Class)]
public sealed class OnClockAttribute<TClock> : Attribute
    where TClock : struct, IClock;

/// <summary>Says by which clock or time scale a time is told: its proper time, or the scale's time.</summary>
[AttributeUsage(Targets.Number | AttributeTargets.Struct | AttributeTargets.Class)]
public sealed class OnClockAttribute : Attribute
{
    /// <summary>The time is told by <paramref name="clock"/>, a type that implements <see cref="IClock"/>.</summary>
    public OnClockAttribute(Type clock) => Clock = clock;

    /// <summary>The time is told by the clock that the type parameter of this name stands for: <c>nameof(TClock)</c>.</summary>
    public OnClockAttribute(string typeParameter) => TypeParameter = typeParameter;

    /// <summary>The clock, where it is given as a type.</summary>
    public Type? Clock { get; }

    /// <summary>The type parameter that stands for the clock, where it is given by name.</summary>
    public string? TypeParameter { get; }
}
