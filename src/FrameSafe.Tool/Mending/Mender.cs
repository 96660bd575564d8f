using System.Collections.Immutable;
using System.Reflection;
using FrameSafe.CodeFixes;
using FrameSafe.Tool.Surveying;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeActions;
using Microsoft.CodeAnalysis.CodeFixes;

namespace FrameSafe.Tool.Mending;

/// <summary>Applies the repairs, the first choice of each finding, until none is left that changes anything.</summary>
internal static class Mender
{
    // One repair may bring another to light; a chain longer than this is none that anybody wants applied unseen.
    private const int MaxRounds = 20;

    private static readonly ImmutableArray<CodeFixProvider> Repairs =
    [
        .. typeof(Repair).Assembly.GetTypes()
            .Where(type => !type.IsAbstract && type.IsSubclassOf(typeof(Repair)))
            .OrderBy(type => type.Name, StringComparer.Ordinal)
            .Select(type => (CodeFixProvider)Activator.CreateInstance(type)!),
    ];

    /// <summary>The solution with its findings mended; those that <paramref name="wanted"/> lets through.</summary>
    internal static async Task<Solution> RunAsync(
        Solution solution, IReadOnlyList<ProjectId> projects, Func<Diagnostic, bool> wanted, Action<string> tell, CancellationToken cancellation)
    {
        foreach (ProjectId id in projects)
        {
            for (int round = 1; round <= MaxRounds; round++)
            {
                Project project = solution.GetProject(id)!;
                tell($"mending {project.Name}, round {round}");
                Solution mended = await RoundAsync(project, wanted, cancellation);
                if (mended == solution)
                    break;
                solution = await AlikeAsync(solution, mended, cancellation);
            }
        }

        return solution;
    }

    /// <summary>A file that several projects compile is mended in one of them; the others get the same text.</summary>
    private static async Task<Solution> AlikeAsync(Solution before, Solution after, CancellationToken cancellation)
    {
        Solution alike = after;
        foreach (DocumentId id in after.GetChanges(before).GetProjectChanges().SelectMany(project => project.GetChangedDocuments()))
        {
            Document changed = after.GetDocument(id)!;
            foreach (DocumentId other in changed.GetLinkedDocumentIds())
                alike = alike.WithDocumentText(other, await changed.GetTextAsync(cancellation));
        }

        return alike;
    }

    private static async Task<Solution> RoundAsync(Project project, Func<Diagnostic, bool> wanted, CancellationToken cancellation)
    {
        Compilation? compilation = await project.GetCompilationAsync(cancellation);
        if (compilation is null)
            return project.Solution;
        // The compiler's own errors between frames have repairs too.
        HashSet<string> fixable = [.. Repairs.SelectMany(repair => repair.FixableDiagnosticIds)];
        IEnumerable<Diagnostic> errors = compilation.GetDiagnostics(cancellation)
            .Where(diagnostic => diagnostic.Severity == DiagnosticSeverity.Error && fixable.Contains(diagnostic.Id));
        Diagnostic[] findings =
        [
            .. (await Surveyor.DiagnosticsAsync(project, compilation, cancellation)).Concat(errors)
                .Where(diagnostic => diagnostic.Location.IsInSource && wanted(diagnostic))
                .OrderBy(diagnostic => diagnostic.Location.SourceTree!.FilePath, StringComparer.Ordinal)
                .ThenBy(diagnostic => diagnostic.Location.SourceSpan.Start),
        ];
        Solution solution = project.Solution;
        foreach (CodeFixProvider repair in Repairs)
        {
            foreach (IGrouping<string, Diagnostic> rule in findings.Where(finding => repair.FixableDiagnosticIds.Contains(finding.Id)).GroupBy(finding => finding.Id))
            {
                if (await FirstChangeAsync(repair, rule, solution, project.Id, cancellation) is { } changed && changed != solution)
                    return changed;
            }
        }

        return solution;
    }

    /// <summary>Applies the first choice of the first finding that has one, to all findings that it fits.</summary>
    private static async Task<Solution?> FirstChangeAsync(
        CodeFixProvider repair, IEnumerable<Diagnostic> findings, Solution solution, ProjectId project, CancellationToken cancellation)
    {
        Diagnostic[] all = [.. findings];
        foreach (Diagnostic finding in all)
        {
            if (solution.GetDocument(finding.Location.SourceTree) is not { } document)
                continue;
            CodeAction? first = null;
            await repair.RegisterCodeFixesAsync(new CodeFixContext(document, finding, (action, _) => first ??= action, cancellation));
            if (first is null)
                continue;
            ImmutableArray<CodeActionOperation> operations = await (await RepairAllAsync(repair, first, all, document, project, cancellation) ?? first)
                .GetOperationsAsync(cancellation);
            return operations.OfType<ApplyChangesOperation>().FirstOrDefault()?.ChangedSolution;
        }

        return null;
    }

    private static Task<CodeAction?> RepairAllAsync(
        CodeFixProvider repair, CodeAction action, Diagnostic[] findings, Document document, ProjectId project, CancellationToken cancellation)
        => repair.GetFixAllProvider()!.GetFixAsync(new FixAllContext(
            document.Project.Solution.GetProject(project)!,
            repair,
            FixAllScope.Project,
            action.EquivalenceKey,
            [.. findings.Select(finding => finding.Id).Distinct()],
            new Known(findings),
            cancellation));

    private sealed class Known(Diagnostic[] findings) : FixAllContext.DiagnosticProvider
    {
        public override Task<IEnumerable<Diagnostic>> GetAllDiagnosticsAsync(Project project, CancellationToken cancellationToken)
            => Task.FromResult<IEnumerable<Diagnostic>>(findings);

        public override async Task<IEnumerable<Diagnostic>> GetDocumentDiagnosticsAsync(Document document, CancellationToken cancellationToken)
        {
            SyntaxTree? tree = await document.GetSyntaxTreeAsync(cancellationToken);
            return findings.Where(finding => finding.Location.SourceTree == tree);
        }

        public override Task<IEnumerable<Diagnostic>> GetProjectDiagnosticsAsync(Project project, CancellationToken cancellationToken)
            => Task.FromResult(Enumerable.Empty<Diagnostic>());
    }
}
