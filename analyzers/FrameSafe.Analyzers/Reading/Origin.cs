using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Reading;

/// <summary>Where a tag came from: the declaration that says it.</summary>
/// <param name="What">What it is, in words: parameter, field, property, return value.</param>
/// <param name="Name">Its name.</param>
/// <param name="Location">Where it stands in source; null in another assembly.</param>
internal sealed record Origin(string What, string Name, Location? Location)
{
    internal const string Result = "result of";

    internal static Origin Of(ISymbol symbol) => new(
        symbol switch
        {
            IParameterSymbol => "parameter",
            IFieldSymbol { IsConst: true } => "constant",
            IFieldSymbol => "field",
            IPropertySymbol { IsIndexer: true } => "indexer",
            IPropertySymbol => "property",
            IMethodSymbol { MethodKind: MethodKind.PropertyGet or MethodKind.PropertySet } => "property",
            IMethodSymbol => Result,
            _ => "value",
        },
        NameOf(symbol),
        symbol.Locations.Length > 0 && symbol.Locations[0].IsInSource ? symbol.Locations[0] : null);

    private static string NameOf(ISymbol symbol) => symbol switch
    {
        IMethodSymbol { AssociatedSymbol: { } member } => member.Name,
        IMethodSymbol { MethodKind: MethodKind.Constructor } => symbol.ContainingType.Name,
        IPropertySymbol { IsIndexer: true } => "this[]",
        _ => symbol.Name,
    };
}
