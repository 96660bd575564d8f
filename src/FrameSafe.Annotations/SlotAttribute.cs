using System;

namespace FrameSafe;

/// <summary>Describes a part of an array that holds several quantities, such as the state vector of an integrator.</summary>
/// <remarks>
/// One attribute a part:
/// <code>
/// [Slot("0..3", "m", Frame = typeof(Harbour), Kind = QuantityKind.Position)]
/// [Slot("3..6", "m/s", Frame = typeof(Harbour), Kind = QuantityKind.Velocity)]
/// double[] state
/// </code>
/// With <see cref="Stride"/> the pattern repeats: <c>Stride = 6</c> describes as many bodies as the array holds.
/// </remarks>
[AttributeUsage(Targets.Number, AllowMultiple = true)]
public sealed class SlotAttribute : Attribute
{
    /// <summary>The elements <paramref name="range"/> are given in <paramref name="unit"/>.</summary>
    /// <param name="range">An index (<c>"6"</c>) or a range as C# writes it (<c>"0..3"</c>, the end not included).</param>
    /// <param name="unit">The unit, as in <see cref="UnitAttribute"/>.</param>
    public SlotAttribute(string range, string unit)
    {
        Range = range;
        Unit = unit;
    }

    /// <summary>The elements.</summary>
    public string Range { get; }

    /// <summary>Their unit.</summary>
    public string Unit { get; }

    /// <summary>The frame they are measured in.</summary>
    public Type? Frame { get; set; }

    /// <summary>The clock or time scale that tells them.</summary>
    public Type? Clock { get; set; }

    /// <summary>What they measure.</summary>
    public QuantityKind Kind { get; set; }

    /// <summary>After how many elements the pattern repeats; 0 if it does not.</summary>
    public int Stride { get; set; }
}
