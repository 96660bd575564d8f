using System.Collections.Generic;

namespace FrameSafe.Analyzers.Tags;

/// <summary>Texts for units that nobody declared: results of products and quotients.</summary>
internal static class UnitNames
{
    private static readonly string[] Usual =
    [
        "1", "m", "km", "mm", "µm", "nm", "s", "ms", "µs", "ns", "min", "h", "d", "m/s", "km/s", "km/h", "m/ns", "mm/ns", "c", "kg", "g",
        "m/s²", "Hz", "kHz", "MHz", "GHz", "N", "Pa", "J", "eV", "keV", "MeV", "GeV", "TeV", "MeV/c", "GeV/c", "MeV/c²", "GeV/c²",
        "W", "C", "V", "V/m", "T", "T·m", "F", "H", "Ω", "Wb", "A", "K", "m²", "m³", "J·s", "kg·m/s", "deg", "%",
    ];

    private static readonly Dictionary<(Dimension Dimension, Scale Scale), string> Names = Build();

    /// <summary>A usual symbol where there is one, else SI base units with their factor; null where the unit is not known.</summary>
    internal static string? Describe(Dimension? dimension, Scale? scale)
    {
        if (dimension is null || scale is null)
            return null;
        if (Names.TryGetValue((dimension, scale), out string? name))
            return name;
        string number = scale.ToDouble().ToString("R", System.Globalization.CultureInfo.InvariantCulture);
        return scale.IsOne ? dimension.ToString() : dimension.IsOne ? number : number + " " + dimension;
    }

    private static Dictionary<(Dimension Dimension, Scale Scale), string> Build()
    {
        var names = new Dictionary<(Dimension Dimension, Scale Scale), string>();
        foreach (string text in Usual)
        {
            if (UnitText.TryRead(text, out Unit? unit, out _) && !names.ContainsKey((unit.Dimension, unit.Scale)))
                names.Add((unit.Dimension, unit.Scale), text);
        }

        return names;
    }
}
