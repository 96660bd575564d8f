using System.Text.Json;

namespace FrameSafe.Accuracy;

/// <summary>A file of reference values: inputs as JSON numbers, expected values as decimal texts, the condition beside them.</summary>
internal sealed class ReferenceFile
{
    private ReferenceFile(string name, IReadOnlyList<ReferenceCase> cases)
    {
        Name = name;
        Cases = cases;
    }

    internal string Name { get; }

    internal IReadOnlyList<ReferenceCase> Cases { get; }

    internal static ReferenceFile Read(string path)
    {
        using JsonDocument document = JsonDocument.Parse(File.ReadAllText(path));
        return new(
            Path.GetFileNameWithoutExtension(path),
            [.. document.RootElement.GetProperty("cases").EnumerateArray().Select(element => new ReferenceCase(element.Clone()))]);
    }
}

/// <summary>One case.</summary>
internal sealed class ReferenceCase(JsonElement element)
{
    private readonly JsonElement _inputs = element.GetProperty("inputs");

    internal string Id { get; } = element.GetProperty("id").GetString()!;

    internal string Kind => _inputs.TryGetProperty("kind", out JsonElement kind) ? kind.GetString()! : "";

    internal IEnumerable<JsonProperty> Expected => element.GetProperty("expected").EnumerateObject();

    internal bool Has(string input) => _inputs.TryGetProperty(input, out _);

    internal double Number(string input) => _inputs.GetProperty(input).GetDouble();

    internal double[] Vector(string input) => [.. _inputs.GetProperty(input).EnumerateArray().Select(value => value.GetDouble())];

    internal double[][] Vectors(string input)
        => [.. _inputs.GetProperty(input).EnumerateArray().Select(row => row.EnumerateArray().Select(value => value.GetDouble()).ToArray())];

    /// <summary>The condition of a quantity: of a vector, the largest of its components'.</summary>
    internal double Condition(string quantity)
    {
        if (!element.TryGetProperty("cond", out JsonElement all) || !all.TryGetProperty(quantity, out JsonElement condition))
            return 0;
        return condition.ValueKind switch
        {
            JsonValueKind.Number => condition.GetDouble(),
            JsonValueKind.Array => Flat(condition).Where(value => value.ValueKind == JsonValueKind.Number).Select(value => value.GetDouble()).DefaultIfEmpty(0).Max(),
            _ => 0,
        };
    }

    internal static IEnumerable<JsonElement> Flat(JsonElement element)
        => element.ValueKind == JsonValueKind.Array ? element.EnumerateArray().SelectMany(Flat) : [element];
}
