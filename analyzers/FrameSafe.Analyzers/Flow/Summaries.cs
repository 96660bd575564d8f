using System;
using System.Collections.Concurrent;
using System.Collections.Immutable;
using System.Text;
using System.Threading;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp.Syntax;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Flow;

/// <summary>
/// What an untagged private or internal member gives for what it gets: its body walked once for each set of argument tags, so
/// that one helper may serve times here and lengths there. Nothing is reported from such a walk.
/// </summary>
internal sealed class Summaries
{
    // Helpers that call helpers: deeper chains are let go, and so are bodies that are no helpers.
    private const int MaxDepth = 4;
    private const int MaxBodyLength = 4000;

    private readonly Knowledge _knowledge;
    private readonly ConcurrentDictionary<(ISymbol Member, int Depth, string Arguments), Value> _results = new();
    private readonly ConcurrentDictionary<IMethodSymbol, Lazy<IOperation?>> _bodies = new(SymbolEqualityComparer.Default);
    private readonly ConcurrentDictionary<SyntaxTree, SemanticModel> _models = new();

    internal Summaries(Knowledge knowledge) => _knowledge = knowledge;

    internal Value OfProperty(IPropertySymbol property, int depth, CancellationToken cancellation)
        => property.GetMethod is { } getter && IsOpen(property) ? Of(getter, [], [], depth, cancellation) : Value.Unknown;

    internal Value OfCall(
        IMethodSymbol method, ImmutableArray<IArgumentOperation> arguments, Value[] values, int depth, CancellationToken cancellation)
        => IsOpen(method) ? Of(method, arguments, values, depth, cancellation) : Value.Unknown;

    // What a derived class may replace says nothing; what is public is taken at its tags.
    private bool IsOpen(ISymbol member)
        => SymbolEqualityComparer.Default.Equals(member.ContainingAssembly, _knowledge.Compilation.Assembly)
            && !member.IsVirtual && !member.IsAbstract && !member.IsOverride && !member.IsExtern
            && (member.DeclaredAccessibility is Accessibility.Private or Accessibility.Internal or Accessibility.NotApplicable
                || !IsVisibleOutside(member.ContainingType));

    private static bool IsVisibleOutside(INamedTypeSymbol? type)
    {
        for (; type is not null; type = type.ContainingType)
        {
            if (type.DeclaredAccessibility is Accessibility.Private or Accessibility.Internal)
                return false;
        }

        return true;
    }

    private Value Of(
        IMethodSymbol method, ImmutableArray<IArgumentOperation> arguments, Value[] values, int depth, CancellationToken cancellation)
    {
        if (depth >= MaxDepth || method.ReturnsVoid || method.DeclaringSyntaxReferences.Length != 1)
            return Value.Unknown;
        // What a chain gives depends on how much of the depth is left to it, whichever thread comes first.
        (ISymbol, int, string) key = (method, depth, Key(arguments, values));
        if (_results.TryGetValue(key, out Value? known))
            return known;
        return _results.GetOrAdd(key, Compute(method, arguments, values, depth, cancellation));
    }

    private Value Compute(
        IMethodSymbol method, ImmutableArray<IArgumentOperation> arguments, Value[] values, int depth, CancellationToken cancellation)
    {
        IMethodSymbol definition = method.OriginalDefinition;
        if (_bodies.GetOrAdd(definition, known => new Lazy<IOperation?>(() => Body(known))).Value is not { } operation)
            return Value.Unknown;

        var walk = new Walk(_knowledge, method, cancellation, depth + 1);
        for (int i = 0; i < arguments.Length; i++)
        {
            // A generic method's call names the parameters of its construction; the body, those of its definition.
            if (arguments[i].Parameter is { Ordinal: var ordinal } && ordinal < method.OriginalDefinition.Parameters.Length
                && method.OriginalDefinition.Parameters[ordinal] is { RefKind: RefKind.None or RefKind.In } parameter
                && _knowledge.Tags.Of(parameter) is null)
            {
                walk.Bind(parameter, values[i]);
            }
        }

        walk.Run(operation);
        return walk.Result;
    }

    private IOperation? Body(IMethodSymbol method)
    {
        SyntaxNode syntax = method.DeclaringSyntaxReferences[0].GetSyntax();
        SyntaxNode? body = syntax switch
        {
            BaseMethodDeclarationSyntax declaration => (SyntaxNode?)declaration.ExpressionBody ?? declaration.Body,
            AccessorDeclarationSyntax accessor => (SyntaxNode?)accessor.ExpressionBody ?? accessor.Body,
            ArrowExpressionClauseSyntax arrow => arrow,
            LocalFunctionStatementSyntax local => (SyntaxNode?)local.ExpressionBody ?? local.Body,
            PropertyDeclarationSyntax property => property.ExpressionBody,
            _ => null,
        };
        if (body is null || body.Span.Length > MaxBodyLength)
            return null;

        // The one place that asks for a model: bodies of other members are not handed to an operation action.
#pragma warning disable RS1030
        SemanticModel model = _models.GetOrAdd(body.SyntaxTree, tree => _knowledge.Compilation.GetSemanticModel(tree));
#pragma warning restore RS1030
        return model.GetOperation(body);
    }

    private static string Key(ImmutableArray<IArgumentOperation> arguments, Value[] values)
    {
        var key = new StringBuilder();
        for (int i = 0; i < arguments.Length; i++)
        {
            Tag tag = values[i].Tag;
            key.Append(arguments[i].Parameter?.Ordinal).Append(':').Append(tag.Dimension).Append(',').Append(tag.Scale).Append(',')
                .Append(tag.Conversion).Append(',').Append(tag.Frame?.Id).Append(',').Append(tag.Clock?.Id).Append(',').Append(tag.Kind)
                .Append(',').Append(tag.Between?.Frame.Id).Append('>').Append(tag.Between?.Other.Id).Append(',').Append(tag.Natural)
                .Append(',').Append(tag.IsConstant).Append(tag.IsNeutral).Append(tag.IsQuadratic).Append(tag.Misuse).Append(';');
        }

        return key.ToString();
    }
}
