using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using System.Threading;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.CodeFixes;

/// <summary>Finds the name that a project has for the speed of light.</summary>
internal static class SpeedOfLight
{
    /// <summary>
    /// The constant of the project that is c in the unit wanted, as it is written at a place: one of the same type before one of
    /// another, and then by name. Null if there is none.
    /// </summary>
    internal static string? NameAt(SyntaxNode place, string value, SemanticModel model, CancellationToken cancellation)
    {
        if (!double.TryParse(value, NumberStyles.Float, CultureInfo.InvariantCulture, out double wanted))
            return null;
        var tags = new SymbolTags(model.Compilation);
        ITypeSymbol? home = model.GetEnclosingSymbol(place.SpanStart, cancellation)?.ContainingType;
        var found = new List<IFieldSymbol>();
        Collect(model.Compilation.Assembly.GlobalNamespace);
        IFieldSymbol? best = found
            .OrderBy(field => !SymbolEqualityComparer.Default.Equals(field.ContainingType, home))
            .ThenBy(field => field.ToDisplayString(), System.StringComparer.Ordinal)
            .FirstOrDefault();
        // Its own type's members are called by their name alone.
        return best is null ? null
            : SymbolEqualityComparer.Default.Equals(best.ContainingType, home) ? best.Name
            : best.ToMinimalDisplayString(model, place.SpanStart, Format);

        void Collect(INamespaceOrTypeSymbol container)
        {
            cancellation.ThrowIfCancellationRequested();
            foreach (ISymbol member in container.GetMembers())
            {
                if (member is INamespaceOrTypeSymbol inner)
                {
                    Collect(inner);
                }
                else if (member is IFieldSymbol { HasConstantValue: true, ConstantValue: double number } field && number == wanted
                    && tags.Of(field) is { Tag.Kind: QuantityKind.SignalSpeed } && model.IsAccessible(place.SpanStart, field))
                {
                    found.Add(field);
                }
            }
        }
    }

    private static SymbolDisplayFormat Format { get; } = new(
        typeQualificationStyle: SymbolDisplayTypeQualificationStyle.NameAndContainingTypesAndNamespaces,
        memberOptions: SymbolDisplayMemberOptions.IncludeContainingType);
}
