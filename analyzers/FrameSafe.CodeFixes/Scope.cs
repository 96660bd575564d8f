using System.Collections.Generic;
using System.Linq;
using System.Threading;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;

namespace FrameSafe.CodeFixes;

/// <summary>What can be named at a place: variables and members, and the members of these one level down.</summary>
internal sealed class Scope
{
    private readonly SemanticModel _model;
    private readonly int _position;

    internal Scope(SemanticModel model, SyntaxNode place, CancellationToken cancellation)
    {
        _model = model;
        _position = place.SpanStart;
        Home = model.GetEnclosingSymbol(_position, cancellation)?.ContainingType;
        Values = [.. Direct(cancellation)];
    }

    /// <summary>The type that the place is in.</summary>
    internal INamedTypeSymbol? Home { get; }

    /// <summary>Locals, parameters, fields and properties, nearest first and then by name.</summary>
    internal IReadOnlyList<NamedValue> Values { get; }

    /// <summary>The fields and properties of the values in scope.</summary>
    internal IEnumerable<NamedValue> MembersOfValues()
        => from value in Values
           where value.Type is INamedTypeSymbol { SpecialType: SpecialType.None } && !SymbolEqualityComparer.Default.Equals(value.Type, Home)
           from member in AllMembers(value.Type)
           let type = TypeOf(member)
           where type is not null && !member.IsStatic && member.CanBeReferencedByName && _model.IsAccessible(_position, member)
           select new NamedValue(value.Text + "." + member.Name, member, type);

    /// <summary>The methods that can be called at the place, with the text that calls them.</summary>
    internal IEnumerable<(string Text, IMethodSymbol Method)> Methods()
    {
        bool isStatic = IsStaticContext();
        foreach (IMethodSymbol method in _model.LookupSymbols(_position).OfType<IMethodSymbol>())
        {
            if (method.MethodKind == MethodKind.LocalFunction || method.IsStatic || !isStatic)
                yield return (method.Name, method);
        }

        foreach (NamedValue value in Values)
        {
            if (value.Type is not INamedTypeSymbol { SpecialType: SpecialType.None } || SymbolEqualityComparer.Default.Equals(value.Type, Home))
                continue;
            foreach (IMethodSymbol method in AllMembers(value.Type).OfType<IMethodSymbol>())
            {
                if (method is { IsStatic: false, MethodKind: MethodKind.Ordinary } && _model.IsAccessible(_position, method))
                    yield return (value.Text + "." + method.Name, method);
            }
        }
    }

    private static ITypeSymbol? TypeOf(ISymbol symbol) => symbol switch
    {
        ILocalSymbol local => local.Type,
        IParameterSymbol parameter => parameter.Type,
        IFieldSymbol field => field.Type,
        IPropertySymbol { IsIndexer: false, GetMethod: not null } property => property.Type,
        _ => null,
    };

    private static IEnumerable<ISymbol> AllMembers(ITypeSymbol type)
    {
        for (ITypeSymbol? current = type; current is { SpecialType: SpecialType.None }; current = current.BaseType)
        {
            foreach (ISymbol member in current.GetMembers())
                yield return member;
        }
    }

    private bool IsStaticContext()
    {
        ISymbol? enclosing = _model.GetEnclosingSymbol(_position);
        while (enclosing is IMethodSymbol { MethodKind: MethodKind.LocalFunction or MethodKind.AnonymousFunction })
        {
            if (enclosing.IsStatic)
                return true;
            enclosing = enclosing.ContainingSymbol;
        }

        return enclosing is null or { IsStatic: true } or IFieldSymbol;
    }

    private IEnumerable<NamedValue> Direct(CancellationToken cancellation)
    {
        bool isStatic = IsStaticContext();
        return
            from symbol in _model.LookupSymbols(_position)
            let type = TypeOf(symbol)
            where type is not null && symbol.CanBeReferencedByName
            let rank = Rank(symbol)
            where rank < 2 ? IsDeclaredBefore(symbol) : symbol.IsStatic || !isStatic
            where symbol is not IFieldSymbol { ContainingType.TypeKind: TypeKind.Enum }
            orderby rank, symbol.Name
            select new NamedValue(SyntaxFacts.GetKeywordKind(symbol.Name) == SyntaxKind.None ? symbol.Name : "@" + symbol.Name, symbol, type);
    }

    private static int Rank(ISymbol symbol) => symbol switch
    {
        ILocalSymbol => 0,
        IParameterSymbol => 1,
        _ => 2,
    };

    // A local is usable once its declaration has ended: not in its own initialiser.
    private bool IsDeclaredBefore(ISymbol symbol)
        => symbol is not ILocalSymbol local
            || (local.DeclaringSyntaxReferences.Length > 0 && local.DeclaringSyntaxReferences[0].Span.End <= _position);
}

/// <summary>A value that can be named at a place.</summary>
internal sealed record NamedValue(string Text, ISymbol Symbol, ITypeSymbol Type);
