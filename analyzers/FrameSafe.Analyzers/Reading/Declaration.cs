using FrameSafe.Analyzers.Tags;

namespace FrameSafe.Analyzers.Reading;

/// <summary>A declared tag and the declaration that says it.</summary>
internal sealed record Declaration(Tag Tag, Origin Origin);
