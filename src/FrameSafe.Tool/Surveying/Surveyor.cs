using System.Collections.Immutable;
using System.Globalization;
using FrameSafe.Analyzers;
using FrameSafe.Tool.Loading;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp.Syntax;
using Microsoft.CodeAnalysis.Diagnostics;
using Microsoft.CodeAnalysis.Text;

namespace FrameSafe.Tool.Surveying;

/// <summary>Runs the analyzer over projects as they are, whether they reference it or not.</summary>
internal static class Surveyor
{
    internal static ImmutableArray<DiagnosticAnalyzer> Analyzers { get; } = [new FrameSafeAnalyzer()];

    internal static async Task<Survey> RunAsync(LoadedSolution loaded, Action<string> tell, CancellationToken cancellation)
    {
        var findings = new List<Finding>();
        var coverage = new List<ProjectCoverage>();
        var errors = new SortedDictionary<string, string>(StringComparer.Ordinal);
        int lines = 0;
        int done = 0;
        var compilations = new List<Compilation>();
        foreach (Project project in loaded.Projects)
        {
            tell($"surveying {project.Name} ({++done} of {loaded.Projects.Count})");
            Compilation compilation = await project.GetCompilationAsync(cancellation)
                ?? throw new BadInputException($"{project.FilePath}: the project has no compilation.");
            compilations.Add(compilation);
            Diagnostic[] broken = [.. compilation.GetDiagnostics(cancellation).Where(diagnostic => diagnostic.Severity == DiagnosticSeverity.Error)];
            if (broken.Length > 0)
                errors[project.Name] = Describe(broken, loaded.Root);
            foreach (Diagnostic diagnostic in await DiagnosticsAsync(project, compilation, cancellation))
                findings.Add(await ConvertAsync(diagnostic, project, loaded.Root, cancellation));
            coverage.Add(Coverage.Of(project.Name, compilation, cancellation));
            foreach (SyntaxTree tree in compilation.SyntaxTrees)
                lines += (await tree.GetTextAsync(cancellation)).Lines.Count;
        }

        // A file that several projects compile is found once.
        Finding[] ordered =
        [
            .. findings
                .DistinctBy(finding => (finding.Rule, finding.Place, finding.Message))
                .OrderBy(finding => finding.Place.Path, StringComparer.Ordinal)
                .ThenBy(finding => finding.Place.Line)
                .ThenBy(finding => finding.Place.Column)
                .ThenBy(finding => finding.Rule, StringComparer.Ordinal),
        ];
        return new(loaded.Root, ordered, coverage, errors, lines, FrameChart.Of(compilations, cancellation));
    }

    /// <summary>The findings of one project that its own settings let through.</summary>
    internal static async Task<ImmutableArray<Diagnostic>> DiagnosticsAsync(Project project, Compilation compilation, CancellationToken cancellation)
    {
        var options = new CompilationWithAnalyzersOptions(
            project.AnalyzerOptions, onAnalyzerException: null, concurrentAnalysis: true, logAnalyzerExecutionTime: false);
        ImmutableArray<Diagnostic> found = await compilation.WithAnalyzers(Analyzers, options).GetAnalyzerDiagnosticsAsync(cancellation);
        return [.. found.Where(diagnostic => !diagnostic.IsSuppressed && diagnostic.Severity >= DiagnosticSeverity.Info)];
    }

    private static async Task<Finding> ConvertAsync(Diagnostic diagnostic, Project project, string root, CancellationToken cancellation)
    {
        string[] texts = Property(diagnostic, FindingProperties.Origins)?.Split('\n') ?? [];
        OriginPlace[] origins =
        [
            .. diagnostic.AdditionalLocations.Select((location, i) => new OriginPlace(PlaceOf(location, root), i < texts.Length ? texts[i] : "")),
        ];
        string line = "";
        string member = "";
        Place place = PlaceOf(diagnostic.Location, root);
        if (diagnostic.Location == Location.None)
            (place, line) = await SettingAsync(diagnostic.GetMessage(CultureInfo.InvariantCulture), project, root, cancellation) ?? (place, line);
        if (diagnostic.Location.SourceTree is { } tree)
        {
            SourceText text = await tree.GetTextAsync(cancellation);
            line = text.Lines[text.Lines.GetLinePosition(diagnostic.Location.SourceSpan.Start).Line].ToString().Trim();
            member = MemberOf((await tree.GetRootAsync(cancellation)).FindNode(diagnostic.Location.SourceSpan));
        }

        return new(
            diagnostic.Id,
            diagnostic.Severity,
            diagnostic.GetMessage(CultureInfo.InvariantCulture),
            place,
            project.Name,
            member,
            line,
            origins,
            Number(diagnostic, FindingProperties.Error),
            Number(diagnostic, FindingProperties.Budget),
            Number(diagnostic, FindingProperties.MaxSpeed),
            Property(diagnostic, FindingProperties.Frames)?.Split(';') ?? []);
    }

    // A finding about a setting has no place for the compiler; the file that sets it is among the project's.
    private static async Task<(Place Place, string Line)?> SettingAsync(string message, Project project, string root, CancellationToken cancellation)
    {
        foreach (AnalyzerConfigDocument file in project.AnalyzerConfigDocuments.OrderBy(file => file.FilePath, StringComparer.Ordinal))
        {
            SourceText text = await file.GetTextAsync(cancellation);
            foreach (TextLine line in text.Lines)
            {
                string setting = line.ToString().Trim();
                string key = setting.Split('=')[0].Trim();
                if (key.StartsWith("framesafe.", StringComparison.OrdinalIgnoreCase) && message.Contains(key + " ", StringComparison.OrdinalIgnoreCase))
                    return (new(Path.GetRelativePath(root, file.FilePath!).Replace('\\', '/'), line.LineNumber + 1, 1, line.LineNumber + 1, line.ToString().Length + 1), setting);
            }
        }

        return null;
    }

    // Types and member by name, as they are nested: "CourierShip.ClockAt".
    private static string MemberOf(SyntaxNode node)
        => string.Join('.', node.AncestorsAndSelf().Select(ancestor => ancestor switch
        {
            BaseTypeDeclarationSyntax type => type.Identifier.ValueText,
            MethodDeclarationSyntax method => method.Identifier.ValueText,
            PropertyDeclarationSyntax property => property.Identifier.ValueText,
            ConstructorDeclarationSyntax => "new",
            VariableDeclaratorSyntax { Parent.Parent: FieldDeclarationSyntax } field => field.Identifier.ValueText,
            LocalFunctionStatementSyntax local => local.Identifier.ValueText,
            IndexerDeclarationSyntax => "this[]",
            OperatorDeclarationSyntax op => "operator " + op.OperatorToken.ValueText,
            _ => null,
        }).Where(name => name is not null).Reverse());

    private static Place PlaceOf(Location location, string root)
    {
        FileLinePositionSpan span = location.GetLineSpan();
        if (!span.IsValid)
            return new("", 0, 0, 0, 0);
        return new(
            Path.GetRelativePath(root, span.Path).Replace('\\', '/'),
            span.StartLinePosition.Line + 1,
            span.StartLinePosition.Character + 1,
            span.EndLinePosition.Line + 1,
            span.EndLinePosition.Character + 1);
    }

    private static string Describe(Diagnostic[] errors, string root)
    {
        Place place = PlaceOf(errors[0].Location, root);
        string where = place.Path.Length == 0 ? "" : $" at {place.Path}({place.Line},{place.Column})";
        return $"{errors.Length} compiler error{(errors.Length == 1 ? "" : "s")}, the first {errors[0].Id}{where}: {errors[0].GetMessage(CultureInfo.InvariantCulture)}";
    }

    private static string? Property(Diagnostic diagnostic, string key) => diagnostic.Properties.TryGetValue(key, out string? value) ? value : null;

    private static double? Number(Diagnostic diagnostic, string key)
        => double.TryParse(Property(diagnostic, key), NumberStyles.Float, CultureInfo.InvariantCulture, out double number) ? number : null;
}
