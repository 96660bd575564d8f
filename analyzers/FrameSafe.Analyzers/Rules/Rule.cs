using FrameSafe.Analyzers.Flow;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>A rule: a descriptor, and for those that stand on the walk a judgement over what it found.</summary>
internal abstract class Rule
{
    internal abstract DiagnosticDescriptor Descriptor { get; }

    /// <summary>The finding that an observation is; null where this rule does not speak of it, or bears it.</summary>
    internal virtual Finding? Judge(Observation observation, Bench bench) => null;
}
