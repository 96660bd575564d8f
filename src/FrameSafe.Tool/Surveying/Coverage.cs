using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Tool.Surveying;

/// <summary>Counts the numbers in declarations, and those that carry a tag.</summary>
internal static class Coverage
{
    /// <summary>The coverage of a compilation's own source, file by file. Generated files are left out: nobody tags those.</summary>
    internal static IReadOnlyList<FileCoverage> Of(string project, Compilation compilation, Func<string, string> relative, CancellationToken cancellation)
    {
        var tags = new SymbolTags(compilation);
        var files = new Dictionary<SyntaxTree, Tally?>();
        Visit(compilation.Assembly.GlobalNamespace);
        return
        [
            .. files.Where(file => file.Value is { Numbers: > 0 })
                .Select(file => new FileCoverage(
                    project,
                    relative(file.Key.FilePath),
                    file.Value!.Tagged,
                    file.Value.Numbers,
                    [.. file.Value.Untagged.OrderBy(number => number.Line).ThenBy(number => number.Name, StringComparer.Ordinal)])),
        ];

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
                        Count(field, field.Type, tags.Of(field), "");
                        break;
                    case IPropertySymbol { IsImplicitlyDeclared: false } property:
                        Count(property, property.Type, tags.Of(property), "");
                        break;
                    case IMethodSymbol { IsImplicitlyDeclared: false, MethodKind: MethodKind.Ordinary or MethodKind.Constructor or MethodKind.UserDefinedOperator } method:
                        Count(method, method.ReturnType, tags.OfReturn(method), "()");
                        foreach (IParameterSymbol parameter in method.Parameters)
                            Count(parameter, parameter.Type, tags.Of(parameter), $"({parameter.Name})");
                        break;
                }
            }
        }

        void Count(ISymbol symbol, ITypeSymbol type, Declaration? declaration, string part)
        {
            if (!HoldsNumbers(type) || symbol.Locations.FirstOrDefault() is not { SourceTree: { } tree } location)
                return;
            if (!files.TryGetValue(tree, out Tally? tally))
                files.Add(tree, tally = GeneratedSource.Is(tree, cancellation) ? null : new());
            if (tally is null)
                return;
            tally.Numbers++;
            if (declaration is not null)
                tally.Tagged++;
            else
                tally.Untagged.Add(new(location.GetLineSpan().StartLinePosition.Line + 1, NameOf(symbol) + part));
        }
    }

    private static string NameOf(ISymbol symbol)
    {
        ISymbol member = symbol is IParameterSymbol ? symbol.ContainingSymbol : symbol;
        string name = member is IMethodSymbol { MethodKind: MethodKind.Constructor } ? "new" : member.Name;
        return $"{member.ContainingType.Name}.{name}";
    }

    // Counts and indices are integers; what is measured is floating.
    private static bool HoldsNumbers(ITypeSymbol type) => type switch
    {
        { SpecialType: SpecialType.System_Double or SpecialType.System_Single or SpecialType.System_Decimal } => true,
        IArrayTypeSymbol array => HoldsNumbers(array.ElementType),
        INamedTypeSymbol { Name: "Nullable" or "Span" or "ReadOnlySpan" or "Memory" or "ReadOnlyMemory" or "List" or "IReadOnlyList" or "IList"
            or "IEnumerable" or "Task" or "ValueTask" or "ImmutableArray" or "Vector" or "Vector128" or "Vector256" or "Vector512", TypeArguments.Length: 1 } generic
            => HoldsNumbers(generic.TypeArguments[0]),
        { Name: "Vector2" or "Vector3" or "Vector4" or "Complex", ContainingNamespace.Name: "Numerics" } => true,
        _ => false,
    };

    private sealed class Tally
    {
        internal int Tagged { get; set; }

        internal int Numbers { get; set; }

        internal List<UntaggedNumber> Untagged { get; } = [];
    }
}
