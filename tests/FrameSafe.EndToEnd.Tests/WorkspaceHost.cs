using System.Collections.Immutable;
using System.Reflection;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeActions;
using Microsoft.CodeAnalysis.CodeFixes;
using Microsoft.CodeAnalysis.Diagnostics;
using Microsoft.CodeAnalysis.MSBuild;

namespace FrameSafe.EndToEnd;

/// <summary>
/// A host as an IDE is one: opens a project, loads the analyzers and repairs that its packages bring, asks for the actions
/// at a place and applies them.
/// </summary>
internal sealed class WorkspaceHost : IDisposable
{
    private readonly MSBuildWorkspace _workspace;
    private readonly ImmutableArray<DiagnosticAnalyzer> _analyzers;
    private readonly ImmutableArray<CodeFixProvider> _repairs;
    private Project _project;

    private WorkspaceHost(MSBuildWorkspace workspace, Project project)
    {
        _workspace = workspace;
        _project = project;
        AnalyzerFileReference[] ours = [.. project.AnalyzerReferences.OfType<AnalyzerFileReference>()
            .Where(reference => Path.GetFileName(reference.FullPath).StartsWith("FrameSafe.", StringComparison.Ordinal))];
        _analyzers = [.. ours.SelectMany(reference => reference.GetAnalyzers(LanguageNames.CSharp))];
        _repairs = [.. ours.SelectMany(reference => Types(reference.GetAssembly()))
            .Where(type => !type.IsAbstract && typeof(CodeFixProvider).IsAssignableFrom(type))
            .Select(type => (CodeFixProvider)Activator.CreateInstance(type)!)];
    }

    public static async Task<WorkspaceHost> OpenAsync(FreshProject fresh)
    {
        fresh.Dotnet("restore").MustSucceed();
        var workspace = MSBuildWorkspace.Create();
        return new WorkspaceHost(workspace, await workspace.OpenProjectAsync(fresh.ProjectFile));
    }

    public async Task<string> TextAsync(string name = "Code.cs") => (await Document(name).GetTextAsync()).ToString();

    public async Task<ImmutableArray<Diagnostic>> FindingsAsync()
    {
        Compilation compilation = (await _project.GetCompilationAsync())!;
        var options = new CompilationWithAnalyzersOptions(
            _project.AnalyzerOptions, onAnalyzerException: null, concurrentAnalysis: true, logAnalyzerExecutionTime: false);
        ImmutableArray<Diagnostic> ours = await compilation.WithAnalyzers(_analyzers, options).GetAnalyzerDiagnosticsAsync();
        return [.. ours.Concat(compilation.GetDiagnostics().Where(d => d.Severity == DiagnosticSeverity.Error))
            .OrderBy(d => d.Location.SourceSpan.Start)];
    }

    /// <summary>The titles of the actions offered on the first finding of a rule, in order.</summary>
    public async Task<IReadOnlyList<CodeAction>> ActionsAsync(string id)
    {
        Diagnostic finding = (await FindingsAsync()).First(d => d.Id == id);
        var actions = new List<CodeAction>();
        foreach (CodeFixProvider repair in _repairs.Where(r => r.FixableDiagnosticIds.Contains(id)))
        {
            var context = new CodeFixContext(Document("Code.cs"), finding, (action, _) => actions.Add(action), CancellationToken.None);
            await repair.RegisterCodeFixesAsync(context);
        }
        return actions;
    }

    public async Task ApplyAsync(CodeAction action)
    {
        ImmutableArray<CodeActionOperation> operations = await action.GetOperationsAsync(CancellationToken.None);
        Solution changed = operations.OfType<ApplyChangesOperation>().Single().ChangedSolution;
        _project = changed.GetProject(_project.Id)!;
    }

    public async Task FixAllAsync(string id, FixAllScope scope)
    {
        IReadOnlyList<CodeAction> actions = await ActionsAsync(id);
        CodeFixProvider repair = _repairs.First(r => r.FixableDiagnosticIds.Contains(id));
        FixAllProvider all = repair.GetFixAllProvider()!;
        Assert.Contains(scope, all.GetSupportedFixAllScopes());
        var context = new FixAllContext(
            Document("Code.cs"), repair, scope, actions[0].EquivalenceKey!, [id], new Findings(this, id), CancellationToken.None);
        await ApplyAsync((await all.GetFixAsync(context))!);
    }

    public void Dispose() => _workspace.Dispose();

    private Document Document(string name) => _project.Documents.First(document => document.Name == name);

    private static IEnumerable<Type> Types(Assembly assembly)
    {
        try
        {
            return assembly.GetTypes();
        }
        catch (ReflectionTypeLoadException partly)
        {
            return partly.Types.OfType<Type>();
        }
    }

    private sealed class Findings(WorkspaceHost host, string id) : FixAllContext.DiagnosticProvider
    {
        public override async Task<IEnumerable<Diagnostic>> GetAllDiagnosticsAsync(Project project, CancellationToken cancellationToken)
            => (await host.FindingsAsync()).Where(d => d.Id == id);

        public override async Task<IEnumerable<Diagnostic>> GetDocumentDiagnosticsAsync(Document document, CancellationToken cancellationToken)
        {
            SyntaxTree? tree = await document.GetSyntaxTreeAsync(cancellationToken);
            return (await host.FindingsAsync()).Where(d => d.Id == id && d.Location.SourceTree?.FilePath == tree?.FilePath);
        }

        public override Task<IEnumerable<Diagnostic>> GetProjectDiagnosticsAsync(Project project, CancellationToken cancellationToken)
            => Task.FromResult(Enumerable.Empty<Diagnostic>());
    }
}
