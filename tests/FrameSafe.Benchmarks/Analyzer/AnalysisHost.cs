using System.Collections.Immutable;
using System.Reflection;
using System.Runtime.InteropServices;
using FrameSafe.Analyzers;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.Diagnostics;

namespace FrameSafe.Benchmarks.Analyzer;

/// <summary>Compiles sources and runs sets of analyzers over them.</summary>
internal static class AnalysisHost
{
    private static readonly ImmutableArray<MetadataReference> References =
    [
        .. ((string)AppContext.GetData("TRUSTED_PLATFORM_ASSEMBLIES")!).Split(Path.PathSeparator)
            .Where(path => Path.GetDirectoryName(path) == Path.GetDirectoryName(typeof(object).Assembly.Location))
            .Select(path => MetadataReference.CreateFromFile(path)),
        MetadataReference.CreateFromFile(typeof(UnitAttribute).Assembly.Location),
    ];

    public static readonly ImmutableArray<DiagnosticAnalyzer> Nothing = [new NoOp()];

    public static readonly ImmutableArray<DiagnosticAnalyzer> Ours = [new FrameSafeAnalyzer()];

    /// <summary>The analyzers that the SDK runs in every project, from the SDK's own folder.</summary>
    public static ImmutableArray<DiagnosticAnalyzer> BuiltIn()
    {
        string dotnet = Path.GetFullPath(Path.Combine(RuntimeEnvironment.GetRuntimeDirectory(), "..", "..", ".."));
        string folder = Directory.GetDirectories(Path.Combine(dotnet, "sdk")).Order(StringComparer.Ordinal)
            .Select(sdk => Path.Combine(sdk, "Sdks", "Microsoft.NET.Sdk", "analyzers")).Last(Directory.Exists);
        return [.. new[] { "Microsoft.CodeAnalysis.NetAnalyzers.dll", "Microsoft.CodeAnalysis.CSharp.NetAnalyzers.dll" }
            .Select(name => Assembly.LoadFrom(Path.Combine(folder, name)))
            .SelectMany(assembly => assembly.GetTypes())
            .Where(type => !type.IsAbstract && typeof(DiagnosticAnalyzer).IsAssignableFrom(type)
                && type.GetCustomAttribute<DiagnosticAnalyzerAttribute>()?.Languages.Contains(LanguageNames.CSharp) == true)
            .Select(type => (DiagnosticAnalyzer)Activator.CreateInstance(type)!)];
    }

    public static CSharpCompilation Compile(IEnumerable<string> sources)
        => CSharpCompilation.Create(
            "Generated",
            sources.Select((source, i) => CSharpSyntaxTree.ParseText(source, path: $"File{i}.cs")),
            References,
            new CSharpCompilationOptions(OutputKind.DynamicallyLinkedLibrary));

    /// <summary>Findings of a fresh copy of the compilation, so that nothing bound before is reused.</summary>
    public static int Analyze(CSharpCompilation compilation, ImmutableArray<DiagnosticAnalyzer> analyzers, bool concurrent = false)
    {
        var options = new CompilationWithAnalyzersOptions(
            new AnalyzerOptions([]), onAnalyzerException: null, concurrentAnalysis: concurrent, logAnalyzerExecutionTime: false);
        return compilation.Clone().WithAnalyzers(analyzers, options).GetAnalyzerDiagnosticsAsync().GetAwaiter().GetResult().Length;
    }

#pragma warning disable RS1001, RS1036, RS2008 // Never loaded by a compiler: it stands for "no analyzer" in the same host.
    private sealed class NoOp : DiagnosticAnalyzer
    {
        private static readonly DiagnosticDescriptor Silent = new("BENCH000", "", "", "", DiagnosticSeverity.Hidden, true);

        public override ImmutableArray<DiagnosticDescriptor> SupportedDiagnostics => [Silent];

        public override void Initialize(AnalysisContext context)
        {
            context.EnableConcurrentExecution();
            context.ConfigureGeneratedCodeAnalysis(GeneratedCodeAnalysisFlags.None);
            context.RegisterOperationBlockAction(static _ => { });
        }
    }
#pragma warning restore RS1001, RS1036, RS2008
}
