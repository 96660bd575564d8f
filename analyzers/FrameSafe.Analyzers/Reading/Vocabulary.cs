using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Reading;

/// <summary>The names of the annotations, which are all that the analyzer knows of any library.</summary>
internal static class Vocabulary
{
    internal const string Namespace = "FrameSafe";

    /// <summary>The assembly of the annotations; what does not reference it carries no tags.</summary>
    internal const string Assembly = "FrameSafe.Annotations";

    /// <summary>The attribute whose presence in a compilation says that there is anything to do.</summary>
    internal const string UnitAttribute = "FrameSafe.UnitAttribute";

    internal const string Frame = "IFrame";
    internal const string Clock = "IClock";
    internal const string TimeScale = "ITimeScale";

    /// <summary>Whether a type is one of the annotations, by namespace; its name then says which.</summary>
    internal static bool IsOurs(INamedTypeSymbol? type)
        => type is { ContainingType: null, ContainingNamespace: { Name: Namespace, ContainingNamespace.IsGlobalNamespace: true } };

    internal static bool Implements(ITypeSymbol type, string @interface)
    {
        foreach (INamedTypeSymbol candidate in type.AllInterfaces)
        {
            if (candidate.Name == @interface && IsOurs(candidate))
                return true;
        }

        if (type is ITypeParameterSymbol parameter)
        {
            foreach (ITypeSymbol constraint in parameter.ConstraintTypes)
            {
                if ((constraint.Name == @interface && constraint is INamedTypeSymbol named && IsOurs(named)) || Implements(constraint, @interface))
                    return true;
            }
        }

        return false;
    }
}
