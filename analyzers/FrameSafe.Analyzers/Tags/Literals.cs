using System;
using System.Collections.Generic;

namespace FrameSafe.Analyzers.Tags;

/// <summary>What a number that stands in the code by itself is taken for.</summary>
internal static class Literals
{
    private static readonly Dictionary<double, Scale> ConversionFactors = Build();

    private static readonly Tag SpeedOfLight = new()
    {
        Dimension = Dimension.Speed,
        Scale = Scale.One,
        Kind = QuantityKind.SignalSpeed,
        IsConstant = true,
    };

    /// <summary>
    /// Zero and the infinities fit everything. Powers of ten and exact conversion factors are plain numbers that may convert.
    /// Small fractions are plain numbers. Any other literal may hide a unit of its own (an empirical fit): it is unknown.
    /// </summary>
    internal static Tag TagOf(double value)
    {
        if (value == 0 || double.IsNaN(value) || double.IsInfinity(value) || Math.Abs(value) is double.MaxValue or double.Epsilon)
            return Tag.Neutral;
        double size = Math.Abs(value);
        // The speed of light in metres per second is too odd a number to be anything else. In other units its digits are also a
        // handbook's (0.299792458·B·r), and unknown.
        if (size == 299_792_458)
            return SpeedOfLight;
        if (ConversionFactors.TryGetValue(size, out Scale? factor))
            return Tag.Plain with { Conversion = factor };
        return IsSmallFraction(size) ? Tag.Plain : Tag.Unknown;
    }

    private static bool IsSmallFraction(double size)
    {
        for (int denominator = 1; denominator <= 16; denominator++)
        {
            double numerator = Math.Round(size * denominator);
            if (numerator is >= 1 and <= 100 && numerator / denominator == size)
                return true;
        }

        return false;
    }

    private static Dictionary<double, Scale> Build()
    {
        var factors = new Dictionary<double, Scale>();
        for (int exponent = -30; exponent <= 30; exponent++)
        {
            if (exponent != 0)
                Add(Scale.PowerOfTen(exponent));
        }

        // Of time and angle, of length and speed, exact by definition.
        foreach (string factor in new[]
        {
            "60", "3600", "86400", "24", "1440", "7", "365.25", "31557600", "360", "180", "90", "3.6", "0.3048", "0.0254", "0.9144",
            "1609.344", "1852", "1000000000000000", "149597870700",
            "149597870.7", "1.602176634e-19", "1.602176634e-13", "1.602176634e-10", "4.184", "101325",
        })
        {
            Add(Scale.OfDecimal(factor)!);
            Add(Scale.OfDecimal(factor)!.Reciprocal!);
        }

        foreach ((long over, long under) in new[] { (1L, 1L), (2, 1), (4, 1), (1, 2), (1, 180), (1, 648000), (1, 10800), (1, 43200), (1, 12) })
        {
            Scale turn = (Scale.Pi * Scale.Of(over, under))!;
            Add(turn);
            Add(turn.Reciprocal!);
        }

        return factors;

        void Add(Scale scale) => factors[scale.ToDouble()] = scale;
    }
}
