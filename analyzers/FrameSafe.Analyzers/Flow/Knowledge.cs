using System.Threading;
using FrameSafe.Analyzers.Contracts;
using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Diagnostics;

namespace FrameSafe.Analyzers.Flow;

/// <summary>What is known for a whole compilation, made once and shared by the walks of its bodies.</summary>
internal sealed class Knowledge
{
    internal Knowledge(Compilation compilation, AnalyzerOptions? options = null, CancellationToken cancellation = default)
    {
        Compilation = compilation;
        Contracts = ContractTable.Read(compilation, options?.AdditionalFiles ?? [], cancellation);
        Tags = new(compilation, options?.AnalyzerConfigOptionsProvider, Contracts.Of, Contracts.OfReturn);
        Frames = new(compilation, Tags);
        Summaries = new(this);
    }

    internal Compilation Compilation { get; }

    internal ContractTable Contracts { get; }

    internal SymbolTags Tags { get; }

    internal FrameTable Frames { get; }

    internal Summaries Summaries { get; }
}
