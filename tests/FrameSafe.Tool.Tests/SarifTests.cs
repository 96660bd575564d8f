using System.Text.Json;
using System.Text.Json.Nodes;
using FrameSafe.Tool.Reports;
using FrameSafe.Tool.Surveying;
using Json.Schema;

namespace FrameSafe.Tool.Tests;

/// <summary>The SARIF report against the published schema of SARIF 2.1.0, and read back.</summary>
public sealed class SarifTests
{
    [Fact]
    public async Task The_report_is_valid_by_the_published_schema()
    {
        using var project = new TinyProject();
        project.Write("Broken.cs", "namespace Tiny; public static class Broken { public static Missing Field; }");
        string file = project.At("out.sarif");

        await CommandLine.RunAsync("survey", project.ProjectFile, "--report", file);

        EvaluationResults judged = Schema().Evaluate(JsonDocument.Parse(File.ReadAllText(file)).RootElement, new() { OutputFormat = OutputFormat.List });
        Assert.True(judged.IsValid, string.Join('\n', (judged.Details ?? []).Where(detail => detail.Errors is not null)
            .Select(detail => $"{detail.InstanceLocation}: {string.Join("; ", detail.Errors!.Values)}")));
    }

    [Fact]
    public void The_schema_refuses_a_report_without_a_tool()
        => Assert.False(Schema().Evaluate(JsonDocument.Parse("""{ "version": "2.1.0", "runs": [ {} ] }""").RootElement).IsValid);

    [Fact]
    public async Task A_result_has_both_origins_the_computed_error_and_a_fingerprint()
    {
        using var project = new TinyProject();
        string file = project.At("out.sarif");

        await CommandLine.RunAsync("survey", project.ProjectFile, "--report", file);

        JsonNode result = Results(file).Single(result => (string?)result["ruleId"] == "FRAME301");
        // 1 + 0.4 * 0.4 is what the plain sum lacks.
        Assert.Equal(0.16, (double)result["properties"]!["worstRelativeError"]!, 12);
        Assert.Equal(1e-9, (double)result["properties"]!["errorBudget"]!);
        Assert.Equal(
            ["Tow.cs(18)", "Tow.cs(18)"],
            result["relatedLocations"]!.AsArray().Select(origin =>
                $"{origin!["physicalLocation"]!["artifactLocation"]!["uri"]}({origin["physicalLocation"]!["region"]!["startLine"]})"));
        Assert.Equal(["Tiny.Quay", "Tiny.Barge"], result["properties"]!["frames"]!.AsArray().Select(frame => (string)frame!));
        Assert.Equal(16, ((string)result["partialFingerprints"]![SarifReport.FingerprintName]!).Length);
        Assert.Equal("Tiny.Tow.Speed", (string?)result["locations"]![0]!["logicalLocations"]![0]!["fullyQualifiedName"]);
    }

    [Fact]
    public async Task Fingerprints_stay_when_lines_move_and_a_file_is_renamed()
    {
        using var project = new TinyProject();
        await CommandLine.RunAsync("survey", project.ProjectFile, "--report", project.At("before.sarif"));
        project.Write("Renamed.cs", "// One line more,\n// and another.\n" + project.Read());
        File.Delete(project.At("Tow.cs"));

        await CommandLine.RunAsync("survey", project.ProjectFile, "--report", project.At("after.sarif"));

        Assert.Equal(Fingerprints(project.At("before.sarif")), Fingerprints(project.At("after.sarif")));
        Assert.NotEqual(Line(project.At("before.sarif")), Line(project.At("after.sarif")));
        static int Line(string file) => (int)Results(file)[0]["locations"]![0]!["physicalLocation"]!["region"]!["startLine"]!;
    }

    [Fact]
    public async Task Findings_alike_in_member_and_code_have_fingerprints_of_their_own()
    {
        using var project = new TinyProject("""
            using FrameSafe;

            public static class Twice
            {
                public static void Add([Unit("m")] double near, [Unit("km")] double far, System.Action<double> use)
                {
                    use(near + far);
                    use(near + far);
                }
            }

            """);
        string file = project.At("out.sarif");

        await CommandLine.RunAsync("survey", project.ProjectFile, "--report", file);

        Assert.Equal(2, Fingerprints(file).Distinct().Count());
    }

    [Fact]
    public async Task A_report_reads_back_as_it_was_written()
    {
        using var project = new TinyProject();
        string first = project.At("first.sarif");
        string second = project.At("second.sarif");
        await CommandLine.RunAsync("survey", project.ProjectFile, "--report", first);

        Ran ran = await CommandLine.RunAsync("survey", first, "--report", second);

        Assert.Equal(1, ran.ExitCode);
        Assert.Equal(File.ReadAllText(first), File.ReadAllText(second));
    }

    [Fact]
    public async Task Reports_of_pieces_make_one()
    {
        using var north = new TinyProject(name: "North");
        using var south = new TinyProject(name: "South");
        File.Move(south.At("Tow.cs"), south.At("Haul.cs"));
        await CommandLine.RunAsync("survey", north.ProjectFile, "--report", north.At("north.sarif"));
        await CommandLine.RunAsync("survey", south.ProjectFile, "--report", north.At("south.sarif"));

        Survey all = Survey.Merge([SarifReader.Read(north.At("north.sarif")), SarifReader.Read(north.At("south.sarif"))]);

        Assert.Equal(18, all.Numbers);
        Assert.Equal(16, all.Tagged);
        Assert.Equal(["North", "South"], all.Coverage.Select(row => row.Project));
        Assert.Equal(6, all.Findings.Count);
    }

    // The published text is written in draft 4, whose only difference here is the name of the identifier.
    private static JsonSchema Schema()
    {
        using Stream stream = typeof(SarifTests).Assembly.GetManifestResourceStream("sarif-2.1.0-rtm.5.json")!;
        JsonObject schema = JsonNode.Parse(stream)!.AsObject();
        schema.Remove("id");
        schema["$schema"] = "http://json-schema.org/draft-07/schema#";
        return JsonSchema.FromText(schema.ToJsonString());
    }

    private static JsonNode[] Results(string file) => [.. JsonNode.Parse(File.ReadAllText(file))!["runs"]![0]!["results"]!.AsArray().Select(result => result!)];

    private static string[] Fingerprints(string file)
        => [.. Results(file).Select(result => (string)result["partialFingerprints"]![SarifReport.FingerprintName]!)];
}
