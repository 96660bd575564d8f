using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Tool.Surveying;

/// <summary>Counts the numbers in declarations, and those that carry a tag.</summary>
internal static class Coverage
{
    internal static ProjectCoverage Of(string project, Compilation compilation, CancellationToken cancellation)
    {
        var tags = new SymbolTags(compilation);
        int tagged = 0;
        int numbers = 0;
        Visit(compilation.Assembly.GlobalNamespace);
        return new(project, tagged, numbers);

        void Visit(INamespaceOrTypeSymbol container)
        {
            cancellation.ThrowIfCancellationRequested();
            foreach (ISymbol member in container.GetMembers())
            {
                switch (member)
                {
                    case INamespaceOrTypeSymbol inner when inner is not INamedTypeSymbol { TypeKind: TypeKind.Enum }:
                        Visit(inner);
                        break;
                    case IFieldSymbol { IsImplicitlyDeclared: false } field:
                        Count(field.Type, tags.Of(field));
                        break;
                    case IPropertySymbol { IsImplicitlyDeclared: false } property:
                        Count(property.Type, tags.Of(property));
                        break;
                    case IMethodSymbol { IsImplicitlyDeclared: false, MethodKind: MethodKind.Ordinary or MethodKind.Constructor or MethodKind.UserDefinedOperator } method:
                        Count(method.ReturnType, tags.OfReturn(method));
                        foreach (IParameterSymbol parameter in method.Parameters)
                            Count(parameter.Type, tags.Of(parameter));
                        break;
                }
            }
        }

        void Count(ITypeSymbol type, Declaration? declaration)
        {
            if (!HoldsNumbers(type))
                return;
            numbers++;
            tagged += declaration is null ? 0 : 1;
        }
    }

    // Counts and indices are integers; what is measured is floating.
    private static bool HoldsNumbers(ITypeSymbol type) => type switch
    {
        { SpecialType: SpecialType.System_Double or SpecialType.System_Single or SpecialType.System_Decimal } => true,
        IArrayTypeSymbol array => HoldsNumbers(array.ElementType),
        INamedTypeSymbol { Name: "Nullable" or "Span" or "ReadOnlySpan" or "Memory" or "ReadOnlyMemory" or "List" or "IReadOnlyList" or "IList"
            or "IEnumerable" or "Task" or "ValueTask" or "ImmutableArray", TypeArguments.Length: 1 } generic => HoldsNumbers(generic.TypeArguments[0]),
        { Name: "Vector2" or "Vector3" or "Vector4" or "Complex", ContainingNamespace.Name: "Numerics" } => true,
        _ => false,
    };
}
