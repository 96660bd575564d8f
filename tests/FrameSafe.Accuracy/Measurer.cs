using System.Text.Json;

namespace FrameSafe.Accuracy;

/// <summary>Measures the library against files of reference values, whichever values they hold.</summary>
public static class Measurer
{
    private static readonly Dictionary<string, Func<ReferenceCase, Quantities>> Files = new()
    {
        ["lorentz_factor"] = MotionQuantities.LorentzFactor,
        ["velocity_composition_collinear"] = MotionQuantities.Collinear,
        ["velocity_composition_3d"] = MotionQuantities.Composition,
        ["boost_event"] = MotionQuantities.BoostEvent,
        ["wigner_rotation"] = MotionQuantities.Wigner,
        ["boost_fourmomentum"] = ParticleQuantities.BoostFourMomentum,
        ["relativistic_energy"] = ParticleQuantities.Energy,
        ["centre_of_momentum"] = ParticleQuantities.CentreOfMomentum,
        ["two_body_decay"] = ParticleQuantities.Decay,
        ["doppler_aberration"] = ParticleQuantities.Light,
        ["em_field_boost"] = ParticleQuantities.Field,
        ["thomas_bmt"] = ParticleQuantities.Spin,
        ["clock_gravity"] = ClockQuantities.Gravity,
        ["hyperbolic_motion"] = ClockQuantities.Acceleration,
        ["proper_time_path"] = ClockQuantities.Path,
    };

    /// <summary>Measures all files of a folder; gives the rows of the table and what is not covered.</summary>
    public static (IReadOnlyList<Row> Rows, IReadOnlyList<string> Uncovered) Measure(string folder)
    {
        var rows = new List<Row>();
        var uncovered = new SortedDictionary<string, int>(StringComparer.Ordinal);
        foreach (string path in Directory.GetFiles(folder, "*.json").Order(StringComparer.Ordinal))
        {
            ReferenceFile file = ReferenceFile.Read(path);
            var measurements = new List<Measurement>();
            foreach (ReferenceCase given in file.Cases)
            {
                Quantities? quantities = null;
                string? refused = null;
                try
                {
                    quantities = Files.TryGetValue(file.Name, out Func<ReferenceCase, Quantities>? of) ? of(given) : null;
                }
                catch (Exception exception) when (exception is ArgumentException or InvalidOperationException)
                {
                    refused = exception.Message;
                }

                Compare(file.Name, given, quantities, refused, measurements, uncovered);
            }

            rows.AddRange(measurements
                .GroupBy(measurement => measurement.Quantity)
                .OrderBy(group => group.Key, StringComparer.Ordinal)
                .Select(group => Row.Of(file.Name, [.. group])));
        }

        return (rows, [.. uncovered.Select(entry => $"{entry.Key} ({entry.Value} cases)")]);
    }

    private static void Compare(
        string file,
        ReferenceCase given,
        Quantities? quantities,
        string? refused,
        List<Measurement> measurements,
        SortedDictionary<string, int> uncovered)
    {
        foreach (JsonProperty expected in Grouped(given))
        {
            // A value that the reference leaves open, such as the axis of no rotation.
            if (expected.Value.ValueKind == JsonValueKind.Null || (expected.Value.ValueKind == JsonValueKind.String && expected.Value.GetString() == "undefined"))
                continue;
            string name = expected.Name;
            double allowed = 4 + (2 * (name == "r" ? new[] { "x", "y", "z" }.Max(given.Condition) : given.Condition(name)));
            if (quantities?.Words.TryGetValue(name, out Func<string>? word) == true)
            {
                measurements.Add(new(name, given.Id, word() == expected.Value.GetString() ? 0 : double.PositiveInfinity, allowed));
            }
            else if (quantities?.Values.TryGetValue(name, out Func<double[]>? value) == true)
            {
                double error;
                try
                {
                    error = Measurement.ErrorInUlp(value(), [.. ReferenceCase.Flat(expected.Value).Select(element => element.GetString()!)]);
                }
                catch (Exception exception) when (exception is ArgumentException or InvalidOperationException)
                {
                    error = double.PositiveInfinity;
                }

                measurements.Add(new(name, given.Id, error, allowed));
            }
            else
            {
                string kind = given.Kind.Length == 0 ? "" : " " + given.Kind;
                string key = $"{file}{kind}: {name}{(refused is null ? "" : " (refused: " + refused + ")")}";
                uncovered[key] = uncovered.GetValueOrDefault(key) + 1;
            }
        }
    }

    // The place of an event stands in three numbers; it is one vector.
    private static IEnumerable<JsonProperty> Grouped(ReferenceCase given)
    {
        JsonProperty[] all = [.. given.Expected];
        if (!all.Any(property => property.Name == "y") || !all.Any(property => property.Name == "z"))
            return all;
        string vector = "{\"r\":[" + string.Join(',', new[] { "x", "y", "z" }.Select(name => all.Single(property => property.Name == name).Value.GetRawText())) + "]}";
        using JsonDocument document = JsonDocument.Parse(vector);
        return [.. all.Where(property => property.Name is not ("x" or "y" or "z")), document.RootElement.Clone().EnumerateObject().Single()];
    }
}

/// <summary>One row of the table: a quantity of a file.</summary>
/// <param name="File">The file.</param>
/// <param name="Quantity">The quantity.</param>
/// <param name="Cases">How many cases have it.</param>
/// <param name="WorstUlp">The error of the case that comes nearest to what is allowed, or exceeds it the most.</param>
/// <param name="Allowed">What is allowed in that case.</param>
/// <param name="WorstCase">That case.</param>
public sealed record Row(string File, string Quantity, int Cases, double WorstUlp, double Allowed, string WorstCase)
{
    /// <summary>Whether all cases are within what is allowed.</summary>
    public bool IsWithin => WorstUlp <= Allowed;

    internal static Row Of(string file, Measurement[] measurements)
    {
        Measurement worst = measurements.MaxBy(measurement => measurement.Ulp / measurement.Allowed)!;
        return new(file, worst.Quantity, measurements.Length, worst.Ulp, worst.Allowed, worst.Case);
    }
}
