using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME603: a contract file cannot be read, or an entry of it matches no member.</summary>
internal sealed class UnreadableContract : Rule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME603",
        "A contract file cannot be read",
        "The contract cannot be read here: {0}",
        Category.Adoption,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "A contract file (*.framesafe.json among the AdditionalFiles) tags members that nobody may edit.",
        helpLinkUri: RulePage.Link("FRAME603"),
        customTags: WellKnownDiagnosticTags.CompilationEnd);

    internal override DiagnosticDescriptor Descriptor => Definition;

    internal Finding Judge(Location place, string message) => new(this, place, message);
}
