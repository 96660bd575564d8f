using BenchmarkDotNet.Attributes;
using Microsoft.CodeAnalysis.CSharp;

namespace FrameSafe.Benchmarks.Analyzer;

/// <summary>One method of 5,000 lines beside one of 10,000: the time has to grow no faster than the method.</summary>
public class LongMethodCost
{
    private readonly CSharpCompilation _five = AnalysisHost.Compile([GeneratedCode.LongMethod(5_000)]);
    private readonly CSharpCompilation _ten = AnalysisHost.Compile([GeneratedCode.LongMethod(10_000)]);

    [Benchmark(Baseline = true)]
    public int FiveThousandLines() => AnalysisHost.Analyze(_five, AnalysisHost.Ours);

    [Benchmark]
    public int TenThousandLines() => AnalysisHost.Analyze(_ten, AnalysisHost.Ours);
}
