using System.Globalization;
using System.Text.Json;
using FrameSafe.Tool.Charting;
using FrameSafe.Tool.Surveying;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Tool.Reports;

/// <summary>Reads back what <see cref="SarifReport"/> wrote.</summary>
internal static class SarifReader
{
    /// <exception cref="BadInputException">There is no such file, or it is no report of this tool.</exception>
    internal static Survey Read(string path)
    {
        if (!File.Exists(path))
            throw new BadInputException($"{path}: there is no such report.");
        try
        {
            using FileStream stream = File.OpenRead(path);
            using var document = JsonDocument.Parse(stream);
            JsonElement root = document.RootElement;
            if (root.GetProperty("version").GetString() != "2.1.0")
                throw new BadInputException($"{path}: a report of SARIF version {root.GetProperty("version")}; version 2.1.0 is read.");
            return Survey.Merge([.. root.GetProperty("runs").EnumerateArray().Select(run => ReadRun(path, run))]);
        }
        catch (JsonException exception)
        {
            throw new BadInputException(
                $"{path}: not a report, at line {exception.LineNumber + 1}, column {exception.BytePositionInLine + 1}: JSON of SARIF 2.1.0 is wanted.");
        }
        catch (Exception exception) when (exception is KeyNotFoundException or InvalidOperationException or FormatException)
        {
            throw new BadInputException($"{path}: not a report that framesafe survey wrote: a property is missing or of another kind.");
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            throw new BadInputException($"{path}: cannot be read: {exception.Message}");
        }
    }

    private static Survey ReadRun(string path, JsonElement run)
    {
        string? tool = run.GetProperty("tool").GetProperty("driver").GetProperty("name").GetString();
        if (tool != SarifReport.ToolName)
            throw new BadInputException($"{path}: a report of {tool}; reports of framesafe survey are read.");
        JsonElement properties = run.GetProperty("properties");
        return new(
            [.. run.GetProperty("results").EnumerateArray().Select(ReadFinding)],
            [
                .. properties.GetProperty("coverage").EnumerateArray().Select(row => new FileCoverage(
                    Text(row, "project"),
                    Text(row, "file"),
                    row.GetProperty("tagged").GetInt32(),
                    row.GetProperty("numbers").GetInt32(),
                    [.. row.GetProperty("untagged").EnumerateArray().Select(number => ReadUntagged(number.GetString()!))])),
            ],
            ReadChart(properties.GetProperty("chart")),
            [
                .. run.GetProperty("invocations").EnumerateArray()
                    .SelectMany(invocation => invocation.GetProperty("toolExecutionNotifications").EnumerateArray())
                    .Select(notice => notice.GetProperty("properties"))
                    .Select(notice => new Trouble(Text(notice, "project"), Text(notice, "what"), Text(notice, "detail"))),
            ],
            properties.GetProperty("lines").GetInt32());
    }

    private static Finding ReadFinding(JsonElement result)
    {
        JsonElement location = result.GetProperty("locations")[0];
        JsonElement properties = result.GetProperty("properties");
        return new(
            Text(result, "ruleId"),
            Text(result, "level") switch
            {
                "error" => DiagnosticSeverity.Error,
                "warning" => DiagnosticSeverity.Warning,
                _ => DiagnosticSeverity.Info,
            },
            Text(result.GetProperty("message"), "text"),
            ReadPlace(location),
            Text(properties, "project"),
            location.TryGetProperty("logicalLocations", out JsonElement logical) ? Text(logical[0], "fullyQualifiedName") : "",
            ReadExcerpt(location),
            result.TryGetProperty("relatedLocations", out JsonElement related)
                ? [.. related.EnumerateArray().Select(origin => new OriginPlace(
                    ReadPlace(origin), origin.TryGetProperty("message", out JsonElement message) ? Text(message, "text") : ""))]
                : [],
            Number(properties, "worstRelativeError"),
            Number(properties, "errorBudget"),
            Number(properties, "maxSpeed"),
            Number(properties, "digitsLost"),
            properties.TryGetProperty("frames", out JsonElement frames) ? [.. frames.EnumerateArray().Select(frame => frame.GetString()!)] : []);
    }

    private static Place ReadPlace(JsonElement location)
    {
        if (!location.TryGetProperty("physicalLocation", out JsonElement physical))
            return Place.Nowhere;
        JsonElement region = physical.GetProperty("region");
        return new(
            Uri.UnescapeDataString(Text(physical.GetProperty("artifactLocation"), "uri")),
            region.GetProperty("startLine").GetInt32(),
            region.GetProperty("startColumn").GetInt32(),
            region.GetProperty("endLine").GetInt32(),
            region.GetProperty("endColumn").GetInt32());
    }

    private static Excerpt ReadExcerpt(JsonElement location)
        => location.TryGetProperty("physicalLocation", out JsonElement physical) && physical.TryGetProperty("contextRegion", out JsonElement region)
            ? new(region.GetProperty("startLine").GetInt32(), Text(region.GetProperty("snippet"), "text"))
            : Excerpt.None;

    private static UntaggedNumber ReadUntagged(string text)
    {
        string[] parts = text.Split(": ", 2);
        return parts.Length == 2
            ? new(int.Parse(parts[0], NumberStyles.None, CultureInfo.InvariantCulture), parts[1])
            : throw new FormatException();
    }

    private static FrameChart ReadChart(JsonElement chart) => new(
        [.. chart.GetProperty("frames").EnumerateArray().Select(frame => new ChartFrame(Text(frame, "id"), Text(frame, "name"), Text(frame, "nature")))],
        [.. chart.GetProperty("motions").EnumerateArray().Select(motion => new ChartMotion(Text(motion, "frame"), Text(motion, "in"), Number(motion, "maxSpeed")))],
        [.. chart.GetProperty("crossings").EnumerateArray().Select(crossing => new ChartCrossing(Text(crossing, "from"), Text(crossing, "to"), crossing.GetProperty("count").GetInt32()))]);

    private static string Text(JsonElement element, string name) => element.GetProperty(name).GetString() ?? throw new FormatException();

    private static double? Number(JsonElement element, string name) => element.TryGetProperty(name, out JsonElement number) ? number.GetDouble() : null;
}
