using System.Collections.Immutable;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.Diagnostics;

namespace FrameSafe.Analyzers.Tests.Verify;

/// <summary>Compiles a source text with the library beside it and runs the analyzer over it.</summary>
internal static class Source
{
    /// <summary>The frames that the cases speak of, and the usings that they need.</summary>
    internal const string Preamble = """
        using System;
        using System.Collections.Generic;
        using System.Linq;
        using System.Numerics;
        using System.Threading.Tasks;
        using FrameSafe;

        public readonly struct Harbour : IInertialFrame;
        [RelativeTo<Harbour>(MaxSpeed = 0.5)] public readonly struct Tug : IInertialFrame;
        [RelativeTo<Tug>(MaxSpeed = 0.2)] public readonly struct Drone : IInertialFrame;
        [RelativeTo<Harbour>(MaxSpeed = 1e-6)] public readonly struct Barge : IInertialFrame;
        public readonly struct Buoy : IInertialFrame;

        """;

    /// <summary>The runtime's assemblies and ours, read once for all tests.</summary>
    internal static readonly ImmutableArray<MetadataReference> References =
    [
        .. ((string)AppContext.GetData("TRUSTED_PLATFORM_ASSEMBLIES")!)
            .Split(Path.PathSeparator)
            .Where(path => Path.GetDirectoryName(path) == Path.GetDirectoryName(typeof(object).Assembly.Location))
            .Append(typeof(UnitAttribute).Assembly.Location)
            .Append(Path.Combine(AppContext.BaseDirectory, "FrameSafe.dll"))
            .Select(path => (MetadataReference)MetadataReference.CreateFromFile(path)),
    ];

    internal static CSharpCompilation Compile(params string[] sources)
        => CSharpCompilation.Create(
            "Case",
            sources.Select((source, i) => CSharpSyntaxTree.ParseText(source, new CSharpParseOptions(LanguageVersion.Preview), $"Case{i}.cs")),
            References,
            new CSharpCompilationOptions(OutputKind.DynamicallyLinkedLibrary, allowUnsafe: true, nullableContextOptions: NullableContextOptions.Enable));

    /// <summary>The findings in the order of the code; it fails if the analyzer threw.</summary>
    internal static ImmutableArray<Diagnostic> Findings(Compilation compilation, IReadOnlyDictionary<string, string>? settings = null, bool concurrent = true, string? contract = null)
    {
        var options = new CompilationWithAnalyzersOptions(
            new AnalyzerOptions(contract is null ? [] : [new ContractFile(contract)], new FixedSettings(settings ?? ImmutableDictionary<string, string>.Empty)),
            onAnalyzerException: null,
            concurrentAnalysis: concurrent,
            logAnalyzerExecutionTime: false);
        ImmutableArray<Diagnostic> found = compilation.WithAnalyzers([new FrameSafeAnalyzer()], options)
            .GetAnalyzerDiagnosticsAsync().GetAwaiter().GetResult();
        Assert.True(found.All(diagnostic => diagnostic.Id != "AD0001"), found.FirstOrDefault(diagnostic => diagnostic.Id == "AD0001")?.ToString());
        return [.. found.OrderBy(diagnostic => diagnostic.Location.SourceTree?.FilePath).ThenBy(diagnostic => diagnostic.Location.SourceSpan.Start)];
    }

    private sealed class ContractFile(string text) : AdditionalText
    {
        public override string Path => "orbits.framesafe.json";

        public override Microsoft.CodeAnalysis.Text.SourceText GetText(CancellationToken cancellationToken = default)
            => Microsoft.CodeAnalysis.Text.SourceText.From(text);
    }

    private sealed class FixedSettings(IReadOnlyDictionary<string, string> settings) : AnalyzerConfigOptionsProvider
    {
        public override AnalyzerConfigOptions GlobalOptions { get; } = new Options(settings);

        public override AnalyzerConfigOptions GetOptions(SyntaxTree tree) => GlobalOptions;

        public override AnalyzerConfigOptions GetOptions(AdditionalText textFile) => GlobalOptions;

        private sealed class Options(IReadOnlyDictionary<string, string> settings) : AnalyzerConfigOptions
        {
            public override IEnumerable<string> Keys => settings.Keys;

            public override bool TryGetValue(string key, [System.Diagnostics.CodeAnalysis.MaybeNullWhen(false)] out string value)
                => settings.TryGetValue(key, out value);
        }
    }
}
