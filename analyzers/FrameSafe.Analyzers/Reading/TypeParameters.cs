using System.Collections.Immutable;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Reading;

/// <summary>Finds what a type parameter that an attribute names stands for at a constructed symbol.</summary>
internal static class TypeParameters
{
    /// <summary>The type argument, or the parameter itself where the symbol is its own definition; null if there is none of that name.</summary>
    internal static ITypeSymbol? Resolve(ISymbol symbol, string name)
    {
        for (ISymbol? owner = symbol; owner is not null; owner = owner.ContainingSymbol)
        {
            ITypeSymbol? found = owner switch
            {
                IMethodSymbol method => In(method.TypeParameters, method.TypeArguments, name),
                INamedTypeSymbol type => In(type.TypeParameters, type.TypeArguments, name),
                _ => null,
            };
            if (found is not null)
                return found;
        }

        return null;
    }

    private static ITypeSymbol? In(
        ImmutableArray<ITypeParameterSymbol> parameters, ImmutableArray<ITypeSymbol> arguments, string name)
    {
        for (int i = 0; i < parameters.Length && i < arguments.Length; i++)
        {
            if (parameters[i].Name == name)
                return arguments[i];
        }

        return null;
    }
}
