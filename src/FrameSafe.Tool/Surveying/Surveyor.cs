using System.Collections.Concurrent;
using System.Collections.Immutable;
using System.Globalization;
using FrameSafe.Analyzers;
using FrameSafe.Tool.Charting;
using FrameSafe.Tool.Loading;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Diagnostics;
using Microsoft.CodeAnalysis.Text;

namespace FrameSafe.Tool.Surveying;

/// <summary>Runs the analyzer over projects as they are, whether they reference it or not.</summary>
internal sealed class Surveyor(string root)
{
    // Lines of source kept before and after a finding.
    private const int LinesAround = 2;

    internal static ImmutableArray<DiagnosticAnalyzer> Analyzers { get; } = [new FrameSafeAnalyzer()];

    internal static ImmutableArray<DiagnosticDescriptor> Rules { get; } =
        [.. Analyzers.SelectMany(analyzer => analyzer.SupportedDiagnostics).OrderBy(rule => rule.Id, StringComparer.Ordinal)];

    /// <summary>Surveys the projects of a solution, as many at once as there are processors.</summary>
    internal static async Task<Survey> RunAsync(LoadedSolution loaded, Action<string> tell, CancellationToken cancellation)
    {
        var surveyor = new Surveyor(loaded.Root);
        var parts = new ConcurrentBag<Survey>();
        int done = 0;
        await Parallel.ForEachAsync(loaded.Projects, cancellation, async (project, stop) =>
        {
            parts.Add(await surveyor.SurveyAsync(project, stop));
            tell($"surveyed {project.Name} ({Interlocked.Increment(ref done)} of {loaded.Projects.Count})");
        });
        return Survey.Merge([.. parts, Survey.Nothing with { Troubles = loaded.Troubles }]);
    }

    /// <summary>The findings of one project that its own settings let through.</summary>
    internal static async Task<ImmutableArray<Diagnostic>> DiagnosticsAsync(Project project, Compilation compilation, CancellationToken cancellation)
    {
        var options = new CompilationWithAnalyzersOptions(
            project.AnalyzerOptions, onAnalyzerException: null, concurrentAnalysis: true, logAnalyzerExecutionTime: false);
        ImmutableArray<Diagnostic> found = await compilation.WithAnalyzers(Analyzers, options).GetAnalyzerDiagnosticsAsync(cancellation);
        return [.. found.Where(diagnostic => !diagnostic.IsSuppressed && diagnostic.Severity >= DiagnosticSeverity.Info)];
    }

    private async Task<Survey> SurveyAsync(Project project, CancellationToken cancellation)
    {
        Compilation compilation = await project.GetCompilationAsync(cancellation)
            ?? throw new BadInputException($"{project.FilePath}: the project has no compilation.");
        var troubles = new List<Trouble>();
        Diagnostic[] broken = [.. compilation.GetDiagnostics(cancellation).Where(diagnostic => diagnostic.Severity == DiagnosticSeverity.Error)];
        if (broken.Length > 0)
            troubles.Add(new(project.Name, "does not compile", Describe(broken)));

        var findings = new List<Finding>();
        foreach (Diagnostic diagnostic in await DiagnosticsAsync(project, compilation, cancellation))
        {
            if (Rules.Any(rule => rule.Id == diagnostic.Id))
                findings.Add(await ConvertAsync(diagnostic, project, cancellation));
            else
                troubles.Add(new(project.Name, "breaks the analyzer", $"{diagnostic.Id}: {FirstLine(diagnostic.GetMessage(CultureInfo.InvariantCulture))}"));
        }

        int lines = 0;
        foreach (SyntaxTree tree in compilation.SyntaxTrees)
            lines += (await tree.GetTextAsync(cancellation)).Lines.Count;
        return new(
            findings,
            Coverage.Of(project.Name, compilation, Relative, cancellation),
            ChartReader.Read(compilation, findings.SelectMany(finding => finding.Frames).Distinct(), cancellation),
            troubles,
            lines);
    }

    private async Task<Finding> ConvertAsync(Diagnostic diagnostic, Project project, CancellationToken cancellation)
    {
        string[] texts = Property(diagnostic, FindingProperties.Origins)?.Split('\n') ?? [];
        OriginPlace[] origins =
        [
            .. diagnostic.AdditionalLocations.Select((location, i) => new OriginPlace(PlaceOf(location), i < texts.Length ? texts[i] : "")),
        ];
        Excerpt excerpt = Excerpt.None;
        string member = "";
        Place place = PlaceOf(diagnostic.Location);
        if (diagnostic.Location == Location.None)
            (place, excerpt) = await SettingAsync(diagnostic.GetMessage(CultureInfo.InvariantCulture), project, cancellation) ?? (place, excerpt);
        if (diagnostic.Location.SourceTree is { } tree)
        {
            SourceText text = await tree.GetTextAsync(cancellation);
            LinePositionSpan span = text.Lines.GetLinePositionSpan(diagnostic.Location.SourceSpan);
            int first = Math.Max(0, span.Start.Line - LinesAround);
            int last = Math.Min(text.Lines.Count - 1, span.End.Line + LinesAround);
            excerpt = new(first + 1, string.Join('\n', Enumerable.Range(first, last - first + 1).Select(line => text.Lines[line].ToString())));
            member = MemberName.Of((await tree.GetRootAsync(cancellation)).FindNode(diagnostic.Location.SourceSpan));
        }

        return new(
            diagnostic.Id,
            diagnostic.Severity,
            diagnostic.GetMessage(CultureInfo.InvariantCulture),
            place,
            project.Name,
            member,
            excerpt,
            origins,
            Number(diagnostic, FindingProperties.Error),
            Number(diagnostic, FindingProperties.Budget),
            Number(diagnostic, FindingProperties.MaxSpeed),
            Number(diagnostic, FindingProperties.DigitsLost),
            Property(diagnostic, FindingProperties.Frames)?.Split(';', StringSplitOptions.RemoveEmptyEntries) ?? []);
    }

    // A finding about a setting has no place for the compiler; the file that sets it is among the project's.
    private async Task<(Place Place, Excerpt Excerpt)?> SettingAsync(string message, Project project, CancellationToken cancellation)
    {
        foreach (AnalyzerConfigDocument file in project.AnalyzerConfigDocuments.OrderBy(file => file.FilePath, StringComparer.Ordinal))
        {
            SourceText text = await file.GetTextAsync(cancellation);
            foreach (TextLine line in text.Lines)
            {
                string setting = line.ToString().Trim();
                string key = setting.Split('=')[0].Trim();
                if (key.StartsWith("framesafe.", StringComparison.OrdinalIgnoreCase) && message.Contains(key + " ", StringComparison.OrdinalIgnoreCase))
                {
                    int number = line.LineNumber + 1;
                    return (new(Relative(file.FilePath!), number, 1, number, line.ToString().Length + 1), new(number, setting));
                }
            }
        }

        return null;
    }

    private string Relative(string path) => Path.GetRelativePath(root, path).Replace('\\', '/');

    private Place PlaceOf(Location location)
    {
        FileLinePositionSpan span = location.GetLineSpan();
        if (!span.IsValid)
            return Place.Nowhere;
        return new(
            Relative(span.Path),
            span.StartLinePosition.Line + 1,
            span.StartLinePosition.Character + 1,
            span.EndLinePosition.Line + 1,
            span.EndLinePosition.Character + 1);
    }

    private string Describe(Diagnostic[] errors)
    {
        Place place = PlaceOf(errors[0].Location);
        string where = place.Path.Length == 0 ? "" : $" at {place.Path}({place.Line},{place.Column})";
        return $"{errors.Length} compiler error{(errors.Length == 1 ? "" : "s")}, the first {errors[0].Id}{where}: "
            + FirstLine(errors[0].GetMessage(CultureInfo.InvariantCulture));
    }

    private static string FirstLine(string text) => text.Split('\n')[0].TrimEnd('\r');

    private static string? Property(Diagnostic diagnostic, string key) => diagnostic.Properties.TryGetValue(key, out string? value) ? value : null;

    private static double? Number(Diagnostic diagnostic, string key)
        => double.TryParse(Property(diagnostic, key), NumberStyles.Float, CultureInfo.InvariantCulture, out double number) ? number : null;
}
