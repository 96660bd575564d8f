using System.Text.Encodings.Web;
using System.Text.Json;
using FrameSafe.Tool.Charting;
using FrameSafe.Tool.Surveying;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Tool.Reports;

/// <summary>
/// Writes a survey as SARIF 2.1.0 (OASIS Standard, 27 March 2020), one result after the other, so that millions of findings need
/// no more memory than one. What SARIF has no place for (coverage, the frame chart) is in property bags; <see cref="SarifReader"/>
/// reads it all back.
/// </summary>
internal static class SarifReport
{
    internal const string Extension = ".sarif";

    internal const string ToolName = "FrameSafe";

    internal const string Schema = "https://docs.oasis-open.org/sarif/sarif/v2.1.0/errata01/os/schemas/sarif-schema-2.1.0.json";

    /// <summary>The name under which a finding's identity is kept: member and content, not line numbers.</summary>
    internal const string FingerprintName = "frameSafeMember/v1";

    private const string RootName = "SURVEYED";

    internal static void Write(Survey survey, Stream stream)
    {
        var options = new JsonWriterOptions { Indented = true, Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping, NewLine = "\n" };
        using var json = new Utf8JsonWriter(stream, options);
        json.WriteStartObject();
        json.WriteString("$schema", Schema);
        json.WriteString("version", "2.1.0");
        json.WriteStartArray("runs");
        json.WriteStartObject();
        WriteTool(json);
        json.WriteString("columnKind", "utf16CodeUnits");
        json.WriteStartObject("originalUriBaseIds");
        json.WriteStartObject(RootName);
        WriteText(json, "description", "The folder that the survey ran in.");
        json.WriteEndObject();
        json.WriteEndObject();
        WriteInvocation(json, survey);
        WriteResults(json, survey);
        WriteProperties(json, survey);
        json.WriteEndObject();
        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void WriteTool(Utf8JsonWriter json)
    {
        json.WriteStartObject("tool");
        json.WriteStartObject("driver");
        json.WriteString("name", ToolName);
        json.WriteString("semanticVersion", typeof(SarifReport).Assembly.GetName().Version!.ToString(3));
        json.WriteStartArray("rules");
        foreach (DiagnosticDescriptor rule in Surveyor.Rules)
        {
            json.WriteStartObject();
            json.WriteString("id", rule.Id);
            WriteText(json, "shortDescription", rule.Title.ToString());
            WriteText(json, "fullDescription", rule.Description.ToString());
            json.WriteString("helpUri", rule.HelpLinkUri);
            json.WriteStartObject("defaultConfiguration");
            json.WriteString("level", Level(rule.DefaultSeverity));
            json.WriteEndObject();
            json.WriteStartObject("properties");
            json.WriteString("category", rule.Category);
            json.WriteEndObject();
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
        json.WriteEndObject();
    }

    private static void WriteInvocation(Utf8JsonWriter json, Survey survey)
    {
        json.WriteStartArray("invocations");
        json.WriteStartObject();
        json.WriteBoolean("executionSuccessful", survey.Troubles.Count == 0);
        json.WriteStartArray("toolExecutionNotifications");
        foreach (Trouble trouble in survey.Troubles)
        {
            json.WriteStartObject();
            json.WriteString("level", "warning");
            WriteText(json, "message", trouble.ToString());
            json.WriteStartObject("properties");
            json.WriteString("project", trouble.Project);
            json.WriteString("what", trouble.What);
            json.WriteString("detail", trouble.Detail);
            json.WriteEndObject();
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
        json.WriteEndArray();
    }

    private static void WriteResults(Utf8JsonWriter json, Survey survey)
    {
        Dictionary<string, int> indices = Surveyor.Rules.Select((rule, i) => (rule.Id, i)).ToDictionary();
        var ordinals = new Dictionary<FindingIdentity, int>();
        json.WriteStartArray("results");
        foreach (Finding finding in survey.Findings)
        {
            int ordinal = ordinals.GetValueOrDefault(finding.Identity);
            ordinals[finding.Identity] = ordinal + 1;
            json.WriteStartObject();
            json.WriteString("ruleId", finding.Rule);
            if (indices.TryGetValue(finding.Rule, out int index))
                json.WriteNumber("ruleIndex", index);
            json.WriteString("level", Level(finding.Severity));
            WriteText(json, "message", finding.Message);
            json.WriteStartArray("locations");
            WriteLocation(json, finding.Place, finding.Excerpt, null, finding.Member);
            json.WriteEndArray();
            if (finding.Origins.Count > 0)
            {
                json.WriteStartArray("relatedLocations");
                foreach (OriginPlace origin in finding.Origins)
                    WriteLocation(json, origin.Place, Excerpt.None, origin.Text, "");
                json.WriteEndArray();
            }

            json.WriteStartObject("partialFingerprints");
            json.WriteString(FingerprintName, finding.Identity.Fingerprint(ordinal));
            json.WriteEndObject();
            WriteProperties(json, finding);
            json.WriteEndObject();
            // What is written so far goes to the file, so that the writer's buffer stays small.
            if (json.BytesPending > 1 << 20)
                json.Flush();
        }

        json.WriteEndArray();
    }

    private static void WriteProperties(Utf8JsonWriter json, Finding finding)
    {
        json.WriteStartObject("properties");
        json.WriteString("project", finding.Project);
        if (finding.Error is { } error)
            json.WriteNumber("worstRelativeError", error);
        if (finding.Budget is { } budget)
            json.WriteNumber("errorBudget", budget);
        if (finding.MaxSpeed is { } speed)
            json.WriteNumber("maxSpeed", speed);
        if (finding.DigitsLost is { } digits)
            json.WriteNumber("digitsLost", digits);
        if (finding.Frames.Count > 0)
        {
            json.WriteStartArray("frames");
            foreach (string frame in finding.Frames)
                json.WriteStringValue(frame);
            json.WriteEndArray();
        }

        json.WriteEndObject();
    }

    private static void WriteLocation(Utf8JsonWriter json, Place place, Excerpt excerpt, string? message, string member)
    {
        json.WriteStartObject();
        if (place.Path.Length > 0)
        {
            json.WriteStartObject("physicalLocation");
            json.WriteStartObject("artifactLocation");
            json.WriteString("uri", string.Join('/', place.Path.Split('/').Select(Uri.EscapeDataString)));
            json.WriteString("uriBaseId", RootName);
            json.WriteEndObject();
            json.WriteStartObject("region");
            json.WriteNumber("startLine", place.Line);
            json.WriteNumber("startColumn", place.Column);
            json.WriteNumber("endLine", place.EndLine);
            json.WriteNumber("endColumn", place.EndColumn);
            json.WriteEndObject();
            if (excerpt.Text.Length > 0)
            {
                json.WriteStartObject("contextRegion");
                json.WriteNumber("startLine", excerpt.FirstLine);
                json.WriteNumber("endLine", excerpt.FirstLine + excerpt.Text.Count(character => character == '\n'));
                WriteText(json, "snippet", excerpt.Text);
                json.WriteEndObject();
            }

            json.WriteEndObject();
        }

        if (member.Length > 0)
        {
            json.WriteStartArray("logicalLocations");
            json.WriteStartObject();
            json.WriteString("fullyQualifiedName", member);
            json.WriteString("kind", "member");
            json.WriteEndObject();
            json.WriteEndArray();
        }

        if (!string.IsNullOrEmpty(message))
            WriteText(json, "message", message);
        json.WriteEndObject();
    }

    private static void WriteProperties(Utf8JsonWriter json, Survey survey)
    {
        json.WriteStartObject("properties");
        json.WriteNumber("lines", survey.Lines);
        json.WriteStartArray("coverage");
        foreach (FileCoverage row in survey.Coverage)
        {
            json.WriteStartObject();
            json.WriteString("project", row.Project);
            json.WriteString("file", row.File);
            json.WriteNumber("tagged", row.Tagged);
            json.WriteNumber("numbers", row.Numbers);
            json.WriteStartArray("untagged");
            foreach (UntaggedNumber number in row.Untagged)
                json.WriteStringValue($"{number.Line}: {number.Name}");
            json.WriteEndArray();
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartObject("chart");
        json.WriteStartArray("frames");
        foreach (ChartFrame frame in survey.Chart.Frames)
        {
            json.WriteStartObject();
            json.WriteString("id", frame.Id);
            json.WriteString("name", frame.Name);
            json.WriteString("nature", frame.Nature);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("motions");
        foreach (ChartMotion motion in survey.Chart.Motions)
        {
            json.WriteStartObject();
            json.WriteString("frame", motion.Frame);
            json.WriteString("in", motion.In);
            if (motion.MaxSpeed is { } speed)
                json.WriteNumber("maxSpeed", speed);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("crossings");
        foreach (ChartCrossing crossing in survey.Chart.Crossings)
        {
            json.WriteStartObject();
            json.WriteString("from", crossing.From);
            json.WriteString("to", crossing.To);
            json.WriteNumber("count", crossing.Count);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
        json.WriteEndObject();
    }

    private static void WriteText(Utf8JsonWriter json, string name, string text)
    {
        json.WriteStartObject(name);
        json.WriteString("text", text);
        json.WriteEndObject();
    }

    private static string Level(DiagnosticSeverity severity) => severity switch
    {
        DiagnosticSeverity.Error => "error",
        DiagnosticSeverity.Warning => "warning",
        _ => "note",
    };
}
