using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;
using FrameSafe.Tool.Surveying;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Tool.Reports;

/// <summary>A survey as SARIF 2.1.0 (OASIS Standard, 27 March 2020).</summary>
internal static class SarifReport
{
    internal const string Schema = "https://docs.oasis-open.org/sarif/sarif/v2.1.0/errata01/os/schemas/sarif-schema-2.1.0.json";

    /// <summary>The name under which a finding's identity is kept: member and content, not line numbers.</summary>
    internal const string FingerprintName = "frameSafeMember/v1";

    private static readonly JsonSerializerOptions Layout = new() { WriteIndented = true, Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    internal static string Of(Survey survey)
    {
        DiagnosticDescriptor[] rules = [.. Surveyor.Analyzers[0].SupportedDiagnostics.OrderBy(rule => rule.Id, StringComparer.Ordinal)];
        Dictionary<string, int> indices = rules.Select((rule, i) => (rule.Id, i)).ToDictionary();
        var ordinals = new Dictionary<(string, string, string, string), int>();
        var results = new JsonArray();
        foreach (Finding finding in survey.Findings)
        {
            (string, string, string, string) like = (finding.Rule, finding.Place.Path, finding.Member, finding.SourceLine);
            int ordinal = ordinals.GetValueOrDefault(like);
            ordinals[like] = ordinal + 1;
            results.Add(Result(finding, indices, ordinal));
        }

        var log = new JsonObject
        {
            ["$schema"] = Schema,
            ["version"] = "2.1.0",
            ["runs"] = new JsonArray(new JsonObject
            {
                ["tool"] = new JsonObject
                {
                    ["driver"] = new JsonObject
                    {
                        ["name"] = "FrameSafe",
                        ["semanticVersion"] = typeof(SarifReport).Assembly.GetName().Version!.ToString(3),
                        ["rules"] = new JsonArray([.. rules.Select(Rule)]),
                    },
                },
                ["columnKind"] = "utf16CodeUnits",
                ["originalUriBaseIds"] = new JsonObject { ["SURVEYED"] = new JsonObject { ["description"] = Text("The folder of the surveyed project or solution.") } },
                ["results"] = results,
                ["invocations"] = new JsonArray(new JsonObject
                {
                    ["executionSuccessful"] = survey.CompileErrors.Count == 0,
                    ["toolExecutionNotifications"] = new JsonArray([.. survey.CompileErrors.Select(error => new JsonObject
                    {
                        ["level"] = "warning",
                        ["message"] = Text($"{error.Key} does not compile and was surveyed as far as it could be: {error.Value}"),
                    })]),
                }),
                ["properties"] = new JsonObject
                {
                    ["coverage"] = new JsonArray([.. survey.Coverage.Select(row => new JsonObject
                    {
                        ["project"] = row.Project,
                        ["tagged"] = row.Tagged,
                        ["numbers"] = row.Numbers,
                    })]),
                },
            }),
        };
        return log.ToJsonString(Layout) + "\n";
    }

    private static JsonObject Rule(DiagnosticDescriptor rule) => new()
    {
        ["id"] = rule.Id,
        ["name"] = rule.Id,
        ["shortDescription"] = Text(rule.Title.ToString()),
        ["fullDescription"] = Text(rule.Description.ToString()),
        ["helpUri"] = rule.HelpLinkUri,
        ["defaultConfiguration"] = new JsonObject { ["level"] = Level(rule.DefaultSeverity) },
        ["properties"] = new JsonObject { ["category"] = rule.Category },
    };

    private static JsonObject Result(Finding finding, Dictionary<string, int> rules, int ordinal)
    {
        var result = new JsonObject
        {
            ["ruleId"] = finding.Rule,
            ["ruleIndex"] = rules.GetValueOrDefault(finding.Rule, -1),
            ["level"] = Level(finding.Severity),
            ["message"] = Text(finding.Message),
            ["locations"] = new JsonArray(Location(finding.Place, null, finding.Member)),
            ["partialFingerprints"] = new JsonObject { [FingerprintName] = finding.Fingerprint(ordinal) },
        };
        if (finding.Origins.Count > 0)
            result["relatedLocations"] = new JsonArray([.. finding.Origins.Select(origin => Location(origin.Place, origin.Text, null))]);
        var properties = new JsonObject { ["project"] = finding.Project, ["source"] = finding.SourceLine };
        if (finding.Error is { } error)
            properties["worstRelativeError"] = error;
        if (finding.Budget is { } budget)
            properties["errorBudget"] = budget;
        if (finding.MaxSpeed is { } speed)
            properties["maxSpeed"] = speed;
        if (finding.Frames.Count > 0)
            properties["frames"] = new JsonArray([.. finding.Frames.Select(frame => JsonValue.Create(frame))]);
        result["properties"] = properties;
        return result;
    }

    private static JsonObject Location(Place place, string? message, string? member)
    {
        var location = new JsonObject();
        if (place.Path.Length > 0)
        {
            location["physicalLocation"] = new JsonObject
            {
                ["artifactLocation"] = new JsonObject
                {
                    ["uri"] = string.Join('/', place.Path.Split('/').Select(Uri.EscapeDataString)),
                    ["uriBaseId"] = "SURVEYED",
                },
                ["region"] = new JsonObject
                {
                    ["startLine"] = place.Line,
                    ["startColumn"] = place.Column,
                    ["endLine"] = place.EndLine,
                    ["endColumn"] = place.EndColumn,
                },
            };
        }

        if (!string.IsNullOrEmpty(member))
            location["logicalLocations"] = new JsonArray(new JsonObject { ["fullyQualifiedName"] = member, ["kind"] = "member" });
        if (!string.IsNullOrEmpty(message))
            location["message"] = Text(message);
        return location;
    }

    private static JsonObject Text(string text) => new() { ["text"] = text };

    private static string Level(DiagnosticSeverity severity) => severity switch
    {
        DiagnosticSeverity.Error => "error",
        DiagnosticSeverity.Warning => "warning",
        _ => "note",
    };
}
