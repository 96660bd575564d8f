using System.Collections.Generic;
using System.Collections.Immutable;
using System.Composition;
using System.Threading;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeFixes;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace FrameSafe.CodeFixes;

/// <summary>FRAME202: applies the Lorentz factor the other way round.</summary>
[ExportCodeFixProvider(LanguageNames.CSharp, Name = nameof(SwapLorentzFactor))]
[Shared]
public sealed class SwapLorentzFactor : Repair
{
    /// <inheritdoc/>
    public override ImmutableArray<string> FixableDiagnosticIds => ["FRAME202"];

    internal override IEnumerable<Mending> Mend(SyntaxNode place, Diagnostic diagnostic, SemanticModel model, CancellationToken cancellation)
    {
        if (Code.Operand(place, diagnostic) is not { } operand || Code.Bare(operand) is not BinaryExpressionSyntax product)
            yield break;
        bool divides = product.IsKind(SyntaxKind.DivideExpression);
        if (!divides && !product.IsKind(SyntaxKind.MultiplyExpression))
            yield break;
        var tags = new SymbolTags(model.Compilation);
        bool onRight = IsLorentzFactor(product.Right);
        if (!onRight && (divides || !IsLorentzFactor(product.Left)))
            yield break;

        yield return new(
            divides ? "Multiply by the Lorentz factor instead" : "Divide by the Lorentz factor instead",
            nameof(SwapLorentzFactor),
            product,
            current =>
            {
                var now = (BinaryExpressionSyntax)current;
                (ExpressionSyntax quantity, ExpressionSyntax factor) = onRight ? (now.Left, now.Right) : (now.Right, now.Left);
                SyntaxKind kind = divides ? SyntaxKind.MultiplyExpression : SyntaxKind.DivideExpression;
                SyntaxToken sign = SyntaxFactory.Token(divides ? SyntaxKind.AsteriskToken : SyntaxKind.SlashToken)
                    .WithTriviaFrom(now.OperatorToken);
                // Either operand keeps the trivia of the place that it moves to.
                return SyntaxFactory.BinaryExpression(kind, quantity.WithTriviaFrom(now.Left), sign, Divisor(factor.WithTriviaFrom(now.Right), divides));
            });

        bool IsLorentzFactor(ExpressionSyntax expression)
            => model.GetSymbolInfo(Code.Bare(expression), cancellation).Symbol switch
            {
                IMethodSymbol method => tags.OfReturn(method),
                { } symbol => tags.Of(symbol),
                null => null,
            } is { Tag.Kind: QuantityKind.LorentzFactor };
    }

    private static ExpressionSyntax Divisor(ExpressionSyntax factor, bool divided)
        => divided || factor is not BinaryExpressionSyntax
            ? factor
            : SyntaxFactory.ParenthesizedExpression(factor.WithoutTrivia()).WithTriviaFrom(factor);
}
