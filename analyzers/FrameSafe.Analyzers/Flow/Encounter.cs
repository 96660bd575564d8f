using System.Collections.Immutable;
using FrameSafe.Analyzers.Formulas;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Flow;

/// <summary>Something about a body that a rule may have to speak of.</summary>
/// <param name="Place">The expression that is reported.</param>
internal abstract record Observation(SyntaxNode Place);

/// <summary>A place where two numbers met that do not go together.</summary>
/// <param name="Place">The expression that is reported.</param>
/// <param name="Clash">What disagrees.</param>
/// <param name="Left">The left operand, or the value.</param>
/// <param name="Right">The right operand, or the target.</param>
/// <param name="Verb">What is done with them, for a message: added, subtracted, compared, passed, …</param>
internal sealed record Encounter(SyntaxNode Place, Clash Clash, Side Left, Side Right, string Verb)
    : Observation(Place)
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

/// <summary>A Newtonian formula of a velocity.</summary>
/// <param name="Place">The expression.</param>
/// <param name="Quantity">What it stands for: a kinetic energy or a momentum.</param>
/// <param name="Velocities">The velocity, or its components.</param>
/// <param name="Mass">The mass.</param>
internal sealed record NewtonianForm(
    SyntaxNode Place, QuantityKind Quantity, ImmutableArray<Side> Velocities, Side Mass) : Observation(Place);

/// <summary>A constant at or above the speed of light goes where a velocity is wanted.</summary>
/// <param name="Place">The constant.</param>
/// <param name="Ratio">It, as a multiple of c.</param>
/// <param name="Target">Where it goes.</param>
internal sealed record FasterThanLight(SyntaxNode Place, double Ratio, Side Target) : Observation(Place);

/// <summary>A formula that is almost a known one.</summary>
/// <param name="Place">The expression.</param>
/// <param name="Form">The known one, in words.</param>
/// <param name="Flaw">What is wrong.</param>
/// <param name="Right">The known one, as it is written.</param>
/// <param name="Velocities">The velocities in it.</param>
internal sealed record FlawedForm(SyntaxNode Place, string Form, string Flaw, string Right, ImmutableArray<Side> Velocities) : Observation(Place);

/// <summary>γ − 1 of a velocity, by a subtraction that loses what it is to give.</summary>
/// <param name="Place">The subtraction.</param>
/// <param name="Formula">It as mathematics.</param>
/// <param name="Velocities">The velocity, or its components.</param>
internal sealed record LostDigits(SyntaxNode Place, Formula Formula, ImmutableArray<Side> Velocities) : Observation(Place);

/// <summary>A rounded value of the speed of light.</summary>
/// <param name="Place">The number.</param>
/// <param name="Error">Its relative error.</param>
/// <param name="Exact">The exact value in its unit.</param>
internal sealed record RoundedConstant(SyntaxNode Place, double Error, double Exact) : Observation(Place);
