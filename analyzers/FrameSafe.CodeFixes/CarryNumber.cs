using System.Collections.Generic;
using System.Collections.Immutable;
using System.Composition;
using System.Threading;
using FrameSafe.Analyzers;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeFixes;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace FrameSafe.CodeFixes;

/// <summary>FRAME101, FRAME102 on plain numbers: carries one side over by a method in scope that says it carries between the frames.</summary>
[ExportCodeFixProvider(LanguageNames.CSharp, Name = nameof(CarryNumber))]
[Shared]
public sealed class CarryNumber : Repair
{
    /// <inheritdoc/>
    public override ImmutableArray<string> FixableDiagnosticIds => ["FRAME101", "FRAME102"];

    internal override IEnumerable<Mending> Mend(SyntaxNode place, Diagnostic diagnostic, SemanticModel model, CancellationToken cancellation)
    {
        diagnostic.Properties.TryGetValue(FindingProperties.From, out string? from);
        diagnostic.Properties.TryGetValue(FindingProperties.To, out string? to);
        if (from is null || to is null || Code.Operand(place, diagnostic) is not { } operand)
            yield break;

        var tags = new SymbolTags(model.Compilation);
        Tag? given = Known(operand, model, tags, cancellation);
        var scope = new Scope(model, operand, cancellation);
        foreach ((string text, IMethodSymbol method) in scope.Methods())
        {
            if (method.Parameters.Length != 1 || !Transforms.Carries(method, from, to))
                continue;
            // The method must take this quantity, and not one of another dimension that the same transform carries.
            if (tags.Of(method.Parameters[0]) is not { } wanted || (given is not null && TagAlgebra.Assign(given, wanted.Tag).Clash is not null))
                continue;
            // A crossing does not mend its own body by calling itself.
            if (SymbolEqualityComparer.Default.Equals(method, model.GetEnclosingSymbol(place.SpanStart, cancellation)))
                continue;
            yield return new(
                "Carry `" + operand + "` over by `" + text + "`",
                nameof(CarryNumber) + ":" + method.Name,
                operand,
                current => Code.Tidy(
                    SyntaxFactory.InvocationExpression(
                        Code.Parse(text),
                        SyntaxFactory.ArgumentList(SyntaxFactory.SingletonSeparatedList(
                            SyntaxFactory.Argument(((ExpressionSyntax)current).WithoutTrivia()))))
                    .WithTriviaFrom(current)));
        }
    }

    private static Tag? Known(ExpressionSyntax operand, SemanticModel model, SymbolTags tags, CancellationToken cancellation)
        => model.GetSymbolInfo(operand, cancellation).Symbol switch
        {
            IMethodSymbol method => tags.OfReturn(method)?.Tag,
            { } symbol => tags.Of(symbol)?.Tag,
            null => null,
        };
}
