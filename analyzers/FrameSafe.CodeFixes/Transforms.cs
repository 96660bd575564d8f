using System.Collections.Generic;
using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;

namespace FrameSafe.CodeFixes;

/// <summary>A transform as it is declared: from where to where, and the names of the members that apply, invert and chain it.</summary>
internal sealed record Transform(ITypeSymbol From, ITypeSymbol To, string? Map, string? Inverse, string? Then);

/// <summary>Reads the declarations of transforms.</summary>
internal static class Transforms
{
    /// <summary>Whether a method says that it carries between two frames, known by their full metadata names.</summary>
    internal static bool Carries(IMethodSymbol method, string from, string to)
        => Of(method) is { } transform && FrameNames.Id(transform.From) == from && FrameNames.Id(transform.To) == to;

    /// <summary>The transform that a method or type is declared to be; null if it is none.</summary>
    internal static Transform? Of(ISymbol symbol)
    {
        foreach (AttributeData attribute in symbol.GetAttributes())
        {
            if (attribute.AttributeClass is not { Name: "CarriesAttribute" } type || !Vocabulary.IsOurs(type))
                continue;
            if (TagAttributes.Named(type, attribute, 0, symbol) is not { } from || TagAttributes.Named(type, attribute, 1, symbol) is not { } to)
                continue;
            var names = new Dictionary<string, string?>();
            foreach (KeyValuePair<string, TypedConstant> named in attribute.NamedArguments)
                names[named.Key] = named.Value.Value as string;
            names.TryGetValue("Map", out string? map);
            names.TryGetValue("Inverse", out string? inverse);
            names.TryGetValue("Then", out string? then);
            return new(from, to, map, inverse, then);
        }

        return null;
    }
}
