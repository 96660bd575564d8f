using System.Collections.Generic;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Flow;

/// <summary>What a sequence operator makes of the tags of the elements.</summary>
internal enum SequenceMethod
{
    /// <summary>Nothing that is followed.</summary>
    Other,

    /// <summary>The elements, or some or one of them.</summary>
    Same,

    /// <summary>What its function gives.</summary>
    Map,

    /// <summary>What its function gives of two sequences.</summary>
    Pairwise,

    /// <summary>What its function gives of an accumulated value and an element.</summary>
    Fold,

    Sum,

    /// <summary>A mean, a least or a largest one, of the elements or of what its function gives.</summary>
    Reduce,

    /// <summary>The elements of both sequences.</summary>
    Joined,
}

/// <summary>The sequence operators of the framework.</summary>
internal static class SequenceMethods
{
    private static readonly Dictionary<string, SequenceMethod> Methods = Build();

    internal static bool IsSequence(IMethodSymbol method)
        => method.ContainingType is { Name: "Enumerable" or "ParallelEnumerable" or "ImmutableArrayExtensions", ContainingNamespace.Name: "Linq" }
            && method.IsStatic;

    internal static SequenceMethod Of(string name) => Methods.TryGetValue(name, out SequenceMethod method) ? method : SequenceMethod.Other;

    private static Dictionary<string, SequenceMethod> Build()
    {
        var methods = new Dictionary<string, SequenceMethod>
        {
            ["Select"] = SequenceMethod.Map,
            ["SelectMany"] = SequenceMethod.Map,
            ["Zip"] = SequenceMethod.Pairwise,
            ["Aggregate"] = SequenceMethod.Fold,
            ["Sum"] = SequenceMethod.Sum,
            ["Average"] = SequenceMethod.Reduce,
            ["Min"] = SequenceMethod.Reduce,
            ["Max"] = SequenceMethod.Reduce,
            ["Concat"] = SequenceMethod.Joined,
            ["Append"] = SequenceMethod.Joined,
            ["Prepend"] = SequenceMethod.Joined,
            ["Union"] = SequenceMethod.Joined,
        };
        foreach (string name in new[]
        {
            "Where", "First", "FirstOrDefault", "Last", "LastOrDefault", "Single", "SingleOrDefault", "ElementAt", "ElementAtOrDefault",
            "ToArray", "ToList", "ToHashSet", "Skip", "SkipLast", "SkipWhile", "Take", "TakeLast", "TakeWhile", "OrderBy",
            "OrderByDescending", "Order", "OrderDescending", "Reverse", "Distinct", "AsEnumerable", "AsParallel", "DefaultIfEmpty",
            "Cast", "MinBy", "MaxBy", "ThenBy", "ThenByDescending",
        })
        {
            methods.Add(name, SequenceMethod.Same);
        }

        return methods;
    }
}
