using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Flow;

/// <summary>What is known for a whole compilation, made once and shared by the walks of its bodies.</summary>
internal sealed class Knowledge
{
    internal Knowledge(Compilation compilation)
    {
        Compilation = compilation;
        Tags = new(compilation);
        Frames = new(compilation, Tags);
        Summaries = new(this);
    }

    internal Compilation Compilation { get; }

    internal SymbolTags Tags { get; }

    internal FrameTable Frames { get; }

    internal Summaries Summaries { get; }
}
