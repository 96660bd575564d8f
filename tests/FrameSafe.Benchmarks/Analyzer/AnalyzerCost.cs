using BenchmarkDotNet.Attributes;
using Microsoft.CodeAnalysis.CSharp;

namespace FrameSafe.Benchmarks.Analyzer;

/// <summary>
/// What the analyzer adds to a host that binds every body anyway, beside what the SDK's own analyzers add. The base line runs
/// an analyzer that does nothing in every body, so the ratio is the price of the rules alone.
/// </summary>
[MemoryDiagnoser]
public class AnalyzerCost
{
    private CSharpCompilation _compilation = null!;

    /// <summary>Tagged or plain code; 100,000 lines of each.</summary>
    [Params("tagged", "plain")]
    public string Code { get; set; } = "tagged";

    [GlobalSetup]
    public void Compile()
        => _compilation = AnalysisHost.Compile(Code == "tagged" ? GeneratedCode.Tagged(100_000) : GeneratedCode.Plain(100_000));

    [Benchmark(Baseline = true)]
    public int NoAnalyzer() => AnalysisHost.Analyze(_compilation, AnalysisHost.Nothing);

    [Benchmark]
    public int FrameSafe() => AnalysisHost.Analyze(_compilation, AnalysisHost.Ours);

    [Benchmark]
    public int BuiltIn() => AnalysisHost.Analyze(_compilation, AnalysisHost.BuiltIn());
}
