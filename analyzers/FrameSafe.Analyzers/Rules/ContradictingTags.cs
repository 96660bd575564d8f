using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME602: the tags of a declaration contradict those of what it overrides or implements.</summary>
internal sealed class ContradictingTags : Rule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME602",
        "Tags contradict each other",
        "{0} `{1}` is tagged {2}; what it overrides or implements, `{3}`, is tagged {4}",
        Category.Adoption,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "Callers see the one declaration or the other; both must say the same.",
        helpLinkUri: RulePage.Link("FRAME602"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    /// <summary>The finding of a declaration that departs from its elder.</summary>
    internal Finding? Judge(ISymbol symbol, SymbolTags tags)
        => tags.Contradiction(symbol) is var (own, elder) && symbol.Locations.Length > 0
            ? new Finding(this, symbol.Locations[0], own.Origin.What, own.Origin.Name, own.Tag.ToString(), elder.Origin.Name, elder.Tag.ToString())
                .From(elder.Origin.Location, "`" + elder.Origin.Name + "` is tagged " + elder.Tag)
            : null;
}
