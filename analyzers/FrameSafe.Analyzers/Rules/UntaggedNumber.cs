using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME601: a number in a public signature carries no tag. For projects that want to be covered all over.</summary>
internal sealed class UntaggedNumber : Rule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME601",
        "A number in a public signature carries no tag",
        "{0} `{1}` carries no tag",
        Category.Adoption,
        DiagnosticSeverity.Info,
        isEnabledByDefault: false,
        description: "What is not tagged is not checked. Plain numbers are tagged [Unit(\"1\")].",
        helpLinkUri: RulePage.Link("FRAME601"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    /// <summary>The finding of a floating-point number without a tag.</summary>
    internal Finding? Judge(ISymbol symbol, ITypeSymbol type, Declaration? declaration)
    {
        if (declaration is not null || symbol.Locations.Length == 0
            || type.SpecialType is not (SpecialType.System_Double or SpecialType.System_Single or SpecialType.System_Decimal))
        {
            return null;
        }

        Origin origin = Origin.Of(symbol);
        return new(this, symbol.Locations[0], Capital(origin.What), origin.Name);
    }

    private static string Capital(string word) => char.ToUpperInvariant(word[0]) + word.Substring(1);
}
