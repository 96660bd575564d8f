using System;

namespace FrameSafe;

/// <summary>Says what a number is a measure of, where unit, frame and clock do not decide it.</summary>
[AttributeUsage(Targets.Number | AttributeTargets.Struct | AttributeTargets.Class)]
public sealed class KindAttribute : Attribute
{
    /// <summary>The number is a measure of <paramref name="kind"/>.</summary>
    public KindAttribute(QuantityKind kind) => Kind = kind;

    /// <summary>The kind of quantity.</summary>
    public QuantityKind Kind { get; }
}
