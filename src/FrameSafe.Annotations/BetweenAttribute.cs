using System;

namespace FrameSafe;

/// <summary>Says which two frames a Lorentz factor, rapidity, Doppler factor or clock rate relates.</summary>
/// <typeparam name="TFrame">One frame: where the motion is measured.</typeparam>
/// <typeparam name="TOther">The other: what moves.</typeparam>
[AttributeUsage(Targets.Number | AttributeTargets.Struct | AttributeTargets.Class)]
public sealed class BetweenAttribute<TFrame, TOther> : Attribute
    where TFrame : struct, IClock
    where TOther : struct, IClock;

/// <summary>Says which two frames a Lorentz factor, rapidity, Doppler factor or clock rate relates.</summary>
[AttributeUsage(Targets.Number | AttributeTargets.Struct | AttributeTargets.Class)]
public sealed class BetweenAttribute : Attribute
{
    /// <summary>The number relates <paramref name="frame"/> and <paramref name="other"/>.</summary>
    public BetweenAttribute(Type frame, Type other)
    {
        Frame = frame;
        Other = other;
    }

    /// <summary>The number relates the frames that two type parameters stand for: <c>nameof(TFrame), nameof(TOther)</c>.</summary>
    public BetweenAttribute(string typeParameter, string otherTypeParameter)
    {
        TypeParameter = typeParameter;
        OtherTypeParameter = otherTypeParameter;
    }

    /// <summary>One frame, where it is given as a type.</summary>
    public Type? Frame { get; }

    /// <summary>The other frame, where it is given as a type.</summary>
    public Type? Other { get; }

    /// <summary>The type parameter that stands for the one frame.</summary>
    public string? TypeParameter { get; }

    /// <summary>The type parameter that stands for the other frame.</summary>
    public string? OtherTypeParameter { get; }
}
