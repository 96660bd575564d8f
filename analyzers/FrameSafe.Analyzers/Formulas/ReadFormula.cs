using System.Collections.Generic;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Formulas;

/// <summary>A formula with what it was read from.</summary>
internal sealed class ReadFormula(Formula formula, IReadOnlyList<IOperation> variables, IReadOnlyCollection<SyntaxNode> places)
{
    internal Formula Formula { get; } = formula;

    /// <summary>One reference in the code for each variable, in the order of the variables.</summary>
    internal IReadOnlyList<IOperation> Variables { get; } = variables;

    /// <summary>All expressions that the formula was read from, those of inlined locals among them.</summary>
    internal IReadOnlyCollection<SyntaxNode> Places { get; } = places;
}
