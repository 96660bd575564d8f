using System;
using System.Collections.Generic;
using System.Diagnostics.CodeAnalysis;

namespace FrameSafe.Analyzers.Tags;

/// <summary>
/// The unit symbols that can be read. SI units, the units accepted beside them and the prefixes: SI Brochure, 9th ed. (2019,
/// updated 2022), Tables 2, 4, 7 and 8. Symbols in brackets and the CGS ones: UCUM 2.1. Astronomical units: IAU 2012 resolution
/// B2 (au) and IAU 2015 resolution B2 (pc). Measured constants: CODATA 2022. Bare <c>c</c>, <c>ħ</c>, <c>ly</c>, <c>ft</c>, <c>kn</c>, …: the trade's habit.
/// </summary>
internal static class UnitTable
{
    private static readonly KeyValuePair<string, int>[] Prefixes =
    [
        new("da", 1), new("h", 2), new("k", 3), new("M", 6), new("G", 9), new("T", 12), new("P", 15), new("E", 18),
        new("Z", 21), new("Y", 24), new("R", 27), new("Q", 30), new("d", -1), new("c", -2), new("m", -3), new("µ", -6),
        new("u", -6), new("n", -9), new("p", -12), new("f", -15), new("a", -18), new("z", -21), new("y", -24),
        new("r", -27), new("q", -30),
    ];

    // What people write in words or in habits that no standard has: only ever proposed, never read.
    private static readonly Dictionary<string, string> Habits = new(StringComparer.OrdinalIgnoreCase)
    {
        ["meter"] = "m", ["meters"] = "m", ["metre"] = "m", ["metres"] = "m", ["kilometer"] = "km", ["kilometre"] = "km",
        ["kilometers"] = "km", ["kilometres"] = "km", ["mile"] = "[mi_i]", ["miles"] = "[mi_i]", ["foot"] = "[ft_i]",
        ["feet"] = "[ft_i]", ["inch"] = "[in_i]", ["second"] = "s", ["seconds"] = "s", ["sec"] = "s", ["secs"] = "s",
        ["msec"] = "ms", ["usec"] = "µs", ["nsec"] = "ns", ["minute"] = "min", ["minutes"] = "min", ["hour"] = "h",
        ["hours"] = "h", ["hr"] = "h", ["hrs"] = "h", ["day"] = "d", ["days"] = "d", ["year"] = "a", ["years"] = "a",
        ["radian"] = "rad", ["radians"] = "rad", ["degree"] = "deg", ["degrees"] = "deg", ["gram"] = "g", ["grams"] = "g",
        ["kilogram"] = "kg", ["kilograms"] = "kg", ["kgs"] = "kg", ["amu"] = "u", ["newton"] = "N", ["joule"] = "J",
        ["watt"] = "W", ["volt"] = "V", ["tesla"] = "T", ["gauss"] = "G", ["kelvin"] = "K", ["hertz"] = "Hz",
        ["ampere"] = "A", ["amp"] = "A", ["coulomb"] = "C", ["pascal"] = "Pa", ["kph"] = "km/h", ["kmh"] = "km/h",
        ["mph"] = "[mi_i]/h", ["mps"] = "m/s", ["fps"] = "[ft_i]/s", ["knot"] = "[kn_i]", ["knots"] = "[kn_i]", ["lightyear"] = "ly",
        ["parsec"] = "pc", ["electronvolt"] = "eV", ["percent"] = "%", ["rpm"] = "r/min", ["rps"] = "r/s", ["arcs"] = "arcsec",
        ["celsius"] = "°C", ["speedoflight"] = "c",
    };

    private static readonly HashSet<string> Logarithmic = new(StringComparer.Ordinal)
    {
        "dB", "B", "Np", "dBm", "dBW", "dBi", "dBc", "pH", "[pH]", "mag",
    };

    private static readonly Dictionary<string, UnitSymbol> Symbols = Build();

    // Prefixed symbols that were asked for; the table is small and the vocabulary closed, so it is spelled out once.
    private static readonly Lazy<Dictionary<string, UnitSymbol>> WithPrefixes = new(SpellOut);

    internal static IEnumerable<UnitSymbol> All => Symbols.Values;

    /// <summary>The unit of a symbol with or without a prefix. A symbol of its own (<c>min</c>, <c>Pa</c>, <c>cd</c>) comes before a prefixed one.</summary>
    internal static bool TryFind(string symbol, [NotNullWhen(true)] out UnitSymbol? unit)
        => Symbols.TryGetValue(symbol, out unit) || WithPrefixes.Value.TryGetValue(symbol, out unit);

    /// <summary>A logarithmic unit, which no factor converts.</summary>
    internal static bool IsLogarithmic(string symbol) => Logarithmic.Contains(symbol);

    /// <summary>
    /// The known symbol nearest to what was written, or null where none is near. Of equally near ones: the same letters in
    /// another case, then one without a prefix, then by the order of the alphabet.
    /// </summary>
    internal static string? Nearest(string symbol)
    {
        if (symbol.Length is 0 or > 24)
            return null;
        if (Habits.TryGetValue(symbol, out string? meant))
            return meant;

        string? best = null;
        int bestScore = int.MaxValue;
        Consider(Symbols.Keys, prefixed: 1);
        Consider(WithPrefixes.Value.Keys, prefixed: 2);
        return best;

        void Consider(IEnumerable<string> candidates, int prefixed)
        {
            foreach (string candidate in candidates)
            {
                bool otherCase = string.Equals(candidate, symbol, StringComparison.OrdinalIgnoreCase);
                int distance = SpellingDistance.Between(symbol, candidate);
                // More than every second letter wrong is no likeness.
                if (!otherCase && 2 * distance > Math.Max(symbol.Length, candidate.Length))
                    continue;
                int score = (otherCase ? 0 : 4 * distance) + prefixed;
                if (score < bestScore || (score == bestScore && string.CompareOrdinal(candidate, best) < 0))
                    (best, bestScore) = (candidate, score);
            }
        }
    }

    private static Dictionary<string, UnitSymbol> SpellOut()
    {
        var prefixed = new Dictionary<string, UnitSymbol>(StringComparer.Ordinal);
        foreach (UnitSymbol unit in Symbols.Values)
        {
            if (!unit.TakesPrefixes)
                continue;
            foreach (KeyValuePair<string, int> prefix in Prefixes)
            {
                string text = prefix.Key + unit.Text;
                if (!Symbols.ContainsKey(text) && !prefixed.ContainsKey(text))
                    prefixed.Add(text, unit with { Text = text, Scale = (unit.Scale * Scale.PowerOfTen(prefix.Value))! });
            }
        }

        return prefixed;
    }

    private static Dictionary<string, UnitSymbol> Build()
    {
        var table = new Dictionary<string, UnitSymbol>(StringComparer.Ordinal);
        Scale pi = Scale.Pi;

        // Base units and derived units with special names (Tables 2 and 4).
        Metric("m", Dimension.Length, "1");
        Metric("g", Dimension.Mass, "1e-3");
        Metric("s", Dimension.Time, "1");
        Metric("A", Dimension.Current, "1");
        Metric("K", Dimension.Temperature, "1");
        Metric("mol", Dimension.Amount, "1");
        Metric("cd", Dimension.LuminousIntensity, "1");
        Metric("rad", Dimension.One, "1", QuantityKind.Angle);
        Metric("sr", Dimension.One, "1", QuantityKind.SolidAngle);
        Metric("Hz", Dimension.Frequency, "1", QuantityKind.Frequency);
        Metric("N", Dimension.Force, "1", QuantityKind.Force);
        Metric("Pa", Dimension.Pressure, "1");
        Metric("J", Dimension.Energy, "1", QuantityKind.Energy);
        Metric("W", Dimension.Power, "1");
        Metric("C", Dimension.Charge, "1");
        Metric("V", Dimension.ElectricPotential, "1");
        Metric("F", Dimension.Capacitance, "1");
        Metric("Ω", Dimension.Resistance, "1");
        Metric("Ohm", Dimension.Resistance, "1");
        Metric("S", Dimension.Of(time: 3, length: -2, mass: -1, current: 2), "1");
        Metric("Wb", Dimension.MagneticFlux, "1");
        Metric("T", Dimension.MagneticField, "1", QuantityKind.MagneticField);
        Metric("H", Dimension.Inductance, "1");
        Metric("lm", Dimension.LuminousIntensity, "1");
        Metric("lx", Dimension.Of(length: -2, intensity: 1), "1");
        Metric("Bq", Dimension.Frequency, "1", QuantityKind.Activity);
        Metric("Gy", Dimension.SpecificEnergy, "1");
        Metric("Sv", Dimension.SpecificEnergy, "1");
        Metric("kat", Dimension.Of(time: -1, amount: 1), "1");
        foreach (string celsius in new[] { "°C", "Cel", "degC" })
            table.Add(celsius, new(celsius, Dimension.Temperature, Scale.One, TakesPrefixes: false, IsAffine: true));
        foreach (string fahrenheit in new[] { "°F", "[degF]", "degF" })
            table.Add(fahrenheit, new(fahrenheit, Dimension.Temperature, Scale.Of(5, 9)!, TakesPrefixes: false, IsAffine: true));

        // Accepted beside the SI (Table 8).
        Plain("min", Dimension.Time, "60");
        Plain("h", Dimension.Time, "3600");
        Plain("d", Dimension.Time, "86400");
        Plain("au", Dimension.Length, "149597870700");
        Plain("AU", Dimension.Length, "149597870700");
        Plain("ua", Dimension.Length, "149597870700");
        Angle("°", 180);
        Angle("deg", 180);
        Angle("'", 180 * 60);
        Angle("′", 180 * 60);
        Angle("arcmin", 180 * 60);
        Angle("''", 180 * 3600);
        Angle("\"", 180 * 3600);
        Angle("″", 180 * 3600);
        Angle("arcsec", 180 * 3600);
        Angle("mas", 180 * 3600 * 1000L);
        Angle("µas", 180 * 3600 * 1000_000L);
        Angle("uas", 180 * 3600 * 1000_000L);
        Angle("gon", 200);
        Metric("L", Dimension.Volume, "1e-3");
        Metric("l", Dimension.Volume, "1e-3");
        Plain("ha", Dimension.Area, "1e4");
        Metric("t", Dimension.Mass, "1000");
        Metric("u", Dimension.Mass, "1.66053906892e-27");
        Metric("Da", Dimension.Mass, "1.66053906892e-27");
        Metric("eV", Dimension.Energy, "1.602176634e-19", QuantityKind.Energy);

        // Of astronomy and navigation. The year is the Julian one, as in UCUM and at the IAU.
        Metric("a", Dimension.Time, "31557600");
        Metric("a_j", Dimension.Time, "31557600");
        Metric("yr", Dimension.Time, "31557600");
        Plain("wk", Dimension.Time, "604800");
        Plain("cy", Dimension.Time, "3155760000");
        Metric("ly", Dimension.Length, "9460730472580800");
        Metric("[ly]", Dimension.Length, "9460730472580800");
        Add("pc", Dimension.Length, (Scale.OfDecimal("149597870700") * Scale.OfDecimal("648000") / pi)!, prefixes: true);
        Metric("Jy", Dimension.Of(time: -2, mass: 1), "1e-26");
        Plain("[kn_i]", Dimension.Speed, ("1852", "3600"));
        Plain("kn", Dimension.Speed, ("1852", "3600"));
        Plain("[nmi_i]", Dimension.Length, "1852");
        Plain("nmi", Dimension.Length, "1852");
        Plain("[mi_i]", Dimension.Length, "1609.344");
        Plain("mi", Dimension.Length, "1609.344");
        Plain("[yd_i]", Dimension.Length, "0.9144");
        Plain("yd", Dimension.Length, "0.9144");
        Plain("[ft_i]", Dimension.Length, "0.3048");
        Plain("ft", Dimension.Length, "0.3048");
        Plain("[in_i]", Dimension.Length, "0.0254");
        Plain("in", Dimension.Length, "0.0254");
        Plain("[lb_av]", Dimension.Mass, "0.45359237");
        Plain("lb", Dimension.Mass, "0.45359237");
        Plain("[lbf_av]", Dimension.Force, "4.4482216152605", QuantityKind.Force);

        // Of particle physics, CGS and the laboratory (UCUM).
        Metric("b", Dimension.Area, "1e-28");
        Plain("Å", Dimension.Length, "1e-10");
        Plain("Ao", Dimension.Length, "1e-10");
        Metric("G", Dimension.MagneticField, "1e-4", QuantityKind.MagneticField);
        Metric("erg", Dimension.Energy, "1e-7", QuantityKind.Energy);
        Metric("dyn", Dimension.Force, "1e-5", QuantityKind.Force);
        Metric("P", Dimension.Of(time: -1, length: -1, mass: 1), "0.1");
        Metric("St", Dimension.Of(time: -1, length: 2), "1e-4");
        Metric("Mx", Dimension.MagneticFlux, "1e-8");
        Add("Oe", Dimension.Of(length: -1, current: 1), (Scale.OfDecimal("250") / pi)!, prefixes: true);
        Metric("Gal", Dimension.Acceleration, "1e-2");
        Metric("Ci", Dimension.Frequency, "3.7e10", QuantityKind.Activity);
        Metric("bar", Dimension.Pressure, "1e5");
        Plain("atm", Dimension.Pressure, "101325");
        Plain("Torr", Dimension.Pressure, ("101325", "760"));
        Metric("gf", Dimension.Force, "9.80665e-3", QuantityKind.Force);
        Metric("cal_th", Dimension.Energy, "4.184", QuantityKind.Energy);
        Metric("Wh", Dimension.Energy, "3600", QuantityKind.Energy);
        Metric("Ah", Dimension.Charge, "3600");

        // Constants as units (UCUM): the exact ones of the SI, and measured ones as in CODATA 2022.
        foreach (string light in new[] { "[c]", "c" })
            Plain(light, Dimension.Speed, "299792458");
        Plain("[h]", Dimension.Action, "6.62607015e-34");
        foreach (string reduced in new[] { "ħ", "hbar" })
            Add(reduced, Dimension.Action, (Scale.OfDecimal("6.62607015e-34") / (Scale.OfDecimal("2") * pi))!);
        Plain("[k]", Dimension.Of(time: -2, length: 2, mass: 1, temperature: -1), "1.380649e-23");
        Plain("[e]", Dimension.Charge, "1.602176634e-19");
        Plain("e", Dimension.Charge, "1.602176634e-19");
        Plain("[g]", Dimension.Acceleration, "9.80665");
        Plain("[m_e]", Dimension.Mass, "9.1093837139e-31");
        Plain("[m_p]", Dimension.Mass, "1.67262192595e-27");
        Plain("[G]", Dimension.Of(time: -2, length: 3, mass: -1), "6.67430e-11");
        Plain("[eps_0]", Dimension.Of(time: 4, length: -3, mass: -1, current: 2), "8.8541878188e-12");
        Plain("[mu_0]", Dimension.Of(time: -2, length: 1, mass: 1, current: -2), "1.25663706127e-6");

        // Parts and counts.
        Plain("%", Dimension.One, "1e-2");
        Plain("‰", Dimension.One, "1e-3");
        Plain("ppm", Dimension.One, "1e-6");
        Plain("[ppm]", Dimension.One, "1e-6");
        Plain("ppb", Dimension.One, "1e-9");
        Plain("[ppb]", Dimension.One, "1e-9");
        // A revolution as the unit of rotational speed, r/min (ISO 80000-3).
        Add("r", Dimension.One, (Scale.OfDecimal("2") * pi)!, kind: QuantityKind.Angle);
        return table;

        void Metric(string symbol, Dimension dimension, string factor, QuantityKind kind = QuantityKind.Unspecified)
            => Add(symbol, dimension, Scale.OfDecimal(factor)!, prefixes: true, kind);

        void Plain(string symbol, Dimension dimension, Factor factor, QuantityKind kind = QuantityKind.Unspecified)
            => Add(symbol, dimension, factor.Scale, prefixes: false, kind);

        void Angle(string symbol, long halfTurn)
            => Add(symbol, Dimension.One, (pi / Scale.Of(halfTurn, 1))!, prefixes: false, QuantityKind.Angle);

        void Add(
            string symbol, Dimension dimension, Scale scale, bool prefixes = false, QuantityKind kind = QuantityKind.Unspecified)
            => table.Add(symbol, new(symbol, dimension, scale, prefixes, kind));
    }

    // A factor as the standard writes it: a decimal number, or a quotient of two.
    private readonly struct Factor(Scale scale)
    {
        public Scale Scale { get; } = scale;

        public static implicit operator Factor(string text) => new(Scale.OfDecimal(text)!);

        public static implicit operator Factor((string Over, string Under) quotient)
            => new((Scale.OfDecimal(quotient.Over) / Scale.OfDecimal(quotient.Under))!);
    }
}
