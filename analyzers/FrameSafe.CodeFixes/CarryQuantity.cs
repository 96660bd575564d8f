using System.Collections.Generic;
using System.Collections.Immutable;
using System.Composition;
using System.Linq;
using System.Threading;
using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeFixes;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace FrameSafe.CodeFixes;

/// <summary>
/// The compiler's own errors where quantities of two frames meet: carries one side over by a transform in scope, by its inverse,
/// or by two transforms in a row. Each way is bound before it is offered.
/// </summary>
[ExportCodeFixProvider(LanguageNames.CSharp, Name = nameof(CarryQuantity))]
[Shared]
public sealed class CarryQuantity : Repair
{
    /// <inheritdoc/>
    public override ImmutableArray<string> FixableDiagnosticIds => ["CS0019", "CS0029", "CS0266", "CS0034", "CS1503"];

    internal override IEnumerable<Mending> Mend(SyntaxNode place, Diagnostic diagnostic, SemanticModel model, CancellationToken cancellation)
    {
        if (model.Compilation.GetTypeByMetadataName(Vocabulary.UnitAttribute) is null)
            yield break;
        // The first choice is the best everywhere, whichever transform it is there: Fix All takes it.
        int choice = 0;
        foreach ((ExpressionSyntax operand, INamedTypeSymbol from, INamedTypeSymbol to) in Mismatches(place, model, cancellation))
        {
            var scope = new Scope(model, operand, cancellation);
            ITypeSymbol source = from.TypeArguments[0];
            ITypeSymbol target = to.TypeArguments[0];
            int offered = 0;
            foreach (Way way in Ways(scope, source, target))
            {
                ExpressionSyntax carried = Code.Parse(way.Applied(operand.WithoutTrivia().ToString()));
                ITypeSymbol? bound = model.GetSpeculativeTypeInfo(operand.SpanStart, carried, SpeculativeBindingOption.BindAsExpression).Type;
                if (!SymbolEqualityComparer.Default.Equals(bound, to))
                    continue;
                if (++offered > 6)
                    break;
                yield return new(
                    "Express `" + operand + "` in " + target.Name + " through " + way.Description,
                    nameof(CarryQuantity) + ":" + (++choice).ToString(System.Globalization.CultureInfo.InvariantCulture),
                    operand,
                    current => Code.Parse(way.Applied(current.WithoutTrivia().ToString())).WithTriviaFrom(current));
            }
        }
    }

    /// <summary>The operands that are of the right quantity but of another frame than the place wants, with both types.</summary>
    private static IEnumerable<(ExpressionSyntax Operand, INamedTypeSymbol From, INamedTypeSymbol To)> Mismatches(
        SyntaxNode place, SemanticModel model, CancellationToken cancellation)
    {
        SyntaxNode bare = Code.Bare(place);
        if (bare is ArgumentSyntax argument)
            bare = argument.Expression;
        if (bare is BinaryExpressionSyntax binary)
        {
            if (Quantity(binary.Left, model, cancellation) is { } left && Quantity(binary.Right, model, cancellation) is { } right
                && !SymbolEqualityComparer.Default.Equals(left.TypeArguments[0], right.TypeArguments[0]))
            {
                // Into the frame of the left operand first, as the sentence is read.
                if (InFrameOf(right, left) is { } rightWanted)
                    yield return (binary.Right, right, rightWanted);
                if (InFrameOf(left, right) is { } leftWanted)
                    yield return (binary.Left, left, leftWanted);
            }
        }
        else if (bare is AssignmentExpressionSyntax assignment)
        {
            if (Quantity(assignment.Left, model, cancellation) is { } left && Quantity(assignment.Right, model, cancellation) is { } right
                && InFrameOf(right, left) is { } wanted && !SymbolEqualityComparer.Default.Equals(wanted, right))
            {
                yield return (assignment.Right, right, wanted);
            }
        }
        else if (bare is ExpressionSyntax expression && Quantity(expression, model, cancellation) is { } given
            && Wanted(expression, model, cancellation) is { TypeArguments.Length: 1 } target
            && SymbolEqualityComparer.Default.Equals(target.OriginalDefinition, given.OriginalDefinition)
            && !SymbolEqualityComparer.Default.Equals(target, given))
        {
            yield return (expression, given, target);
        }
    }

    private static INamedTypeSymbol? Quantity(ExpressionSyntax expression, SemanticModel model, CancellationToken cancellation)
        => model.GetTypeInfo(expression, cancellation).Type is INamedTypeSymbol { TypeArguments.Length: 1 } type
            && Vocabulary.Implements(type.TypeArguments[0], Vocabulary.Frame)
            ? type
            : null;

    // The same quantity in the other's frame.
    private static INamedTypeSymbol? InFrameOf(INamedTypeSymbol quantity, INamedTypeSymbol other)
        => quantity.OriginalDefinition.TypeParameters.Length == 1 ? quantity.OriginalDefinition.Construct(other.TypeArguments[0]) : null;

    private static INamedTypeSymbol? Wanted(ExpressionSyntax expression, SemanticModel model, CancellationToken cancellation)
    {
        if (model.GetTypeInfo(expression, cancellation).ConvertedType is INamedTypeSymbol converted
            && !SymbolEqualityComparer.Default.Equals(converted, model.GetTypeInfo(expression, cancellation).Type))
        {
            return converted;
        }

        if (expression.Parent is ArgumentSyntax { Parent: ArgumentListSyntax { Parent: { } call } list } argument)
        {
            int index = list.Arguments.IndexOf(argument);
            SymbolInfo info = model.GetSymbolInfo(call, cancellation);
            IMethodSymbol? method = (info.Symbol ?? info.CandidateSymbols.FirstOrDefault()) as IMethodSymbol;
            IParameterSymbol? parameter = argument.NameColon is { } named
                ? method?.Parameters.FirstOrDefault(candidate => candidate.Name == named.Name.Identifier.ValueText)
                : method is not null && index < method.Parameters.Length ? method.Parameters[index] : null;
            return parameter?.Type as INamedTypeSymbol;
        }

        return null;
    }

    /// <summary>The texts that apply a transform from one frame to the other: directly, inverted, and by two in a row.</summary>
    private static IEnumerable<Way> Ways(Scope scope, ITypeSymbol from, ITypeSymbol to)
    {
        List<(string Text, Transform Transform)> known =
        [
            .. from value in scope.Values.Concat(scope.MembersOfValues())
               let transform = value.Type is INamedTypeSymbol type ? Transforms.Of(type) : null
               where transform is { Map: not null }
               select (value.Text, transform),
        ];

        foreach ((string text, Transform transform) in known)
        {
            if (Same(transform.From, from) && Same(transform.To, to))
                yield return new(text + "." + transform.Map, "`" + text + "`");
        }

        foreach ((string text, Transform transform) in known)
        {
            if (transform.Inverse is { } inverse && Same(transform.From, to) && Same(transform.To, from))
                yield return new(text + "." + inverse + "." + transform.Map, "the inverse of `" + text + "`");
        }

        foreach ((string first, Transform firstStep) in known)
        {
            foreach ((string second, Transform secondStep) in known)
            {
                foreach ((string text, string description, ITypeSymbol between) in Steps(first, firstStep, from))
                {
                    foreach ((string next, string nextDescription, ITypeSymbol end) in Steps(second, secondStep, between))
                    {
                        if (first != second && Same(end, to) && !Same(between, from) && !Same(between, to))
                        {
                            // The maps nest: the later one is applied to what the first gives.
                            yield return new(next + "(" + text, description + " then " + nextDescription, Nested: true);
                        }
                    }
                }
            }
        }
    }

    private static IEnumerable<(string Text, string Description, ITypeSymbol To)> Steps(string text, Transform transform, ITypeSymbol from)
    {
        if (Same(transform.From, from))
            yield return (text + "." + transform.Map, "`" + text + "`", transform.To);
        if (transform.Inverse is { } inverse && Same(transform.To, from))
            yield return (text + "." + inverse + "." + transform.Map, "the inverse of `" + text + "`", transform.From);
    }

    private static bool Same(ITypeSymbol one, ITypeSymbol other) => SymbolEqualityComparer.Default.Equals(one, other);

    private sealed record Way(string Text, string Description, bool Nested = false)
    {
        internal string Applied(string operand) => Text + "(" + operand + (Nested ? "))" : ")");
    }
}
