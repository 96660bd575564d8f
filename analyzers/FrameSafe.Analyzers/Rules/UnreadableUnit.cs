using System.Globalization;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME405: a unit text cannot be read.</summary>
internal sealed class UnreadableUnit : Rule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME405",
        "A unit text cannot be read",
        "The unit `{0}` cannot be read at column {1}: {2}{3}",
        Category.Units,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "Units are read in the notation of the SI Brochure, of UCUM, and the trade's GeV/c.",
        helpLinkUri: RulePage.Link("FRAME405"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    internal Finding? Judge(string text, Location place)
    {
        if (UnitText.TryRead(text, out _, out UnitTextError? error))
            return null;
        string remedy = error.Nearest is { } nearest ? "; the nearest is `" + nearest + "`" : "";
        return new Finding(
                this,
                place,
                text,
                (error.Column + 1).ToString(CultureInfo.InvariantCulture),
                error.Message,
                remedy)
            .With(FindingProperties.Repair, error.Nearest is null ? null : "unit-text")
            .With(FindingProperties.Unit, error.Nearest is { } symbol ? Replaced(text, error, symbol) : null);
    }

    private static string Replaced(string text, UnitTextError error, string symbol)
        => error.Column + error.Length <= text.Length
            ? text.Substring(0, error.Column) + symbol + text.Substring(error.Column + error.Length)
            : symbol;
}
