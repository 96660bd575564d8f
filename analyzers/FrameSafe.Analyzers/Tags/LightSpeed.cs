using System.Globalization;

namespace FrameSafe.Analyzers.Tags;

/// <summary>The speed of light, 299 792 458 m/s exactly (SI Brochure, 9th ed., section 2.2).</summary>
internal static class LightSpeed
{
    internal static Scale Scale { get; } = Tags.Scale.OfDecimal("299792458")!;

    /// <summary>Its number in the unit of a speed.</summary>
    internal static double? ValueIn(Tag speed)
        => speed.Dimension == Dimension.Speed && speed.Scale is not null ? (Scale / speed.Scale)?.ToDouble() : null;

    /// <summary>The same as a C# literal; <c>1</c> where the number is a fraction of c; null where the unit is not known.</summary>
    internal static string? In(Tag speed)
    {
        if (speed.Dimension is { IsOne: true } && speed.Scale is { IsOne: true })
            return "1";
        if (ValueIn(speed) is not { } value)
            return null;
        string text = value.ToString("R", CultureInfo.InvariantCulture);
        return text.IndexOfAny(['.', 'E']) >= 0 || value == 1 ? text : text + ".0";
    }
}
