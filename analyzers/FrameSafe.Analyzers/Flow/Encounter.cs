using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Flow;

/// <summary>A place where two numbers met that do not go together.</summary>
/// <param name="Place">The expression that is reported.</param>
/// <param name="Clash">What disagrees.</param>
/// <param name="Left">The left operand, or the value.</param>
/// <param name="Right">The right operand, or the target.</param>
/// <param name="Verb">What is done with them, for a message: added, subtracted, compared, passed, …</param>
internal sealed record Encounter(SyntaxNode Place, Clash Clash, Side Left, Side Right, string Verb)
{
    /// <summary>The tag that is wanted of the result, where it goes straight to a declared target.</summary>
    internal Tag? Wanted { get; init; }
}

/// <summary>One side of an encounter.</summary>
/// <param name="Value">What is known of it.</param>
/// <param name="Syntax">The expression in the code; null for a declared target.</param>
/// <param name="Description">A declared target in words: "parameter `stretch` of `TimeOver`"; null for an expression.</param>
/// <param name="Operation">The operand as the compiler understands it; null for a declared target.</param>
internal sealed record Side(Value Value, SyntaxNode? Syntax, string? Description = null, IOperation? Operation = null);
