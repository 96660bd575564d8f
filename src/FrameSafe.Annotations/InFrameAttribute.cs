using System;

namespace FrameSafe;

/// <summary>Says in which frame a number is measured.</summary>
/// <typeparam name="TFrame">The frame.</typeparam>
[AttributeUsage(Targets.Number | AttributeTargets.Struct | AttributeTargets.Class)]
public sealed class InFrameAttribute<TFrame> : Attribute
    where TFrame : struct, IFrame;

/// <summary>Says in which frame a number is measured.</summary>
[AttributeUsage(Targets.Number | AttributeTargets.Struct | AttributeTargets.Class)]
public sealed class InFrameAttribute : Attribute
{
    /// <summary>The number is measured in <paramref name="frame"/>, a type that implements <see cref="IFrame"/>.</summary>
    public InFrameAttribute(Type frame) => Frame = frame;

    /// <summary>The number is measured in the frame that the type parameter of this name stands for: <c>nameof(TFrame)</c>.</summary>
    public InFrameAttribute(string typeParameter) => TypeParameter = typeParameter;

    /// <summary>The frame, where it is given as a type.</summary>
    public Type? Frame { get; }

    /// <summary>The type parameter that stands for the frame, where it is given by name.</summary>
    public string? TypeParameter { get; }
}
