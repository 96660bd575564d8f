using System;

namespace FrameSafe;

/// <summary>Says that a number is a date on a time scale, and what it counts from.</summary>
/// <remarks>
/// With <see cref="Unit"/> it describes a date kept in one <see cref="double"/>:
/// <code>[TimeScale(typeof(Tt), Origin = "JD", Unit = "d")] double julianDate</code>
/// A date kept in two parts puts the same attribute on both and says which is which by <see cref="Part"/>.
/// </remarks>
[AttributeUsage(Targets.Number)]
public sealed class TimeScaleAttribute : Attribute
{
    /// <summary>The date is told on <paramref name="scale"/>, a type that implements <see cref="ITimeScale"/>.</summary>
    public TimeScaleAttribute(Type scale) => Scale = scale;

    /// <summary>The date is told on the scale that the type parameter of this name stands for: <c>nameof(TScale)</c>.</summary>
    public TimeScaleAttribute(string typeParameter) => TypeParameter = typeParameter;

    /// <summary>The time scale, where it is given as a type.</summary>
    public Type? Scale { get; }

    /// <summary>The type parameter that stands for the time scale, where it is given by name.</summary>
    public string? TypeParameter { get; }

    /// <summary>What it counts from: <c>JD</c>, <c>MJD</c>, <c>J2000</c>, <c>Unix</c>, <c>GPS</c>, or an ISO 8601 date.</summary>
    public string? Origin { get; set; }

    /// <summary>The unit it counts in, as in <see cref="UnitAttribute"/>; seconds if not said.</summary>
    public string? Unit { get; set; }

    /// <summary>The part of a two-part date: 0 for a whole date, 1 for the large part, 2 for the small one.</summary>
    public int Part { get; set; }
}
