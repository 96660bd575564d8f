using System;

namespace FrameSafe;

/// <summary>Says how large a speed can become, as a fraction of c.</summary>
[AttributeUsage(Targets.Number)]
public sealed class MaxSpeedAttribute : Attribute
{
    /// <summary>The speed stays at or below <paramref name="fractionOfC"/>, from 0 up to but not including 1.</summary>
    public MaxSpeedAttribute(double fractionOfC) => FractionOfC = fractionOfC;

    /// <summary>The largest speed as a fraction of c.</summary>
    public double FractionOfC { get; }
}
