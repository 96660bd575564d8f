using System;

namespace FrameSafe;

/// <summary>Says in which unit a number is given.</summary>
/// <remarks>
/// The text is read in SI Brochure notation (<c>km/s</c>, <c>kg·m²/s</c>, <c>m s⁻²</c>) or in UCUM notation
/// (<c>m/s2</c>, <c>[c]</c>, <c>eV</c>), and in the trade's <c>GeV/c</c> and <c>GeV/c2</c>. <c>"1"</c> is a plain number.
/// On a collection, a vector or a task it speaks of each element.
/// </remarks>
[AttributeUsage(Targets.Number | AttributeTargets.Struct | AttributeTargets.Class)]
public sealed class UnitAttribute : Attribute
{
    /// <summary>The number is given in <paramref name="unit"/>.</summary>
    public UnitAttribute(string unit) => Unit = unit;

    /// <summary>The text of the unit.</summary>
    public string Unit { get; }
}
