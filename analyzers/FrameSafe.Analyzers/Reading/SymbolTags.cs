using System;
using System.Collections.Concurrent;
using System.Collections.Generic;
using System.Collections.Immutable;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Diagnostics;

namespace FrameSafe.Analyzers.Reading;

/// <summary>
/// The declared tags of the symbols of one compilation: their own attributes, else those of what they override or implement.
/// </summary>
internal sealed class SymbolTags
{
    private static readonly Declaration Nothing = new(Tag.Unknown, new("", "", null));

    private readonly ConcurrentDictionary<ISymbol, Declaration> _declarations = new(SymbolEqualityComparer.Default);
    private readonly ConcurrentDictionary<IMethodSymbol, Declaration> _returns = new(SymbolEqualityComparer.Default);
    private readonly ConcurrentDictionary<IAssemblySymbol, bool> _tagged = new(SymbolEqualityComparer.Default);
    private readonly ConcurrentDictionary<ISymbol, Lazy<SlotMap?>> _slots = new(SymbolEqualityComparer.Default);
    private readonly ConcurrentDictionary<ISymbol, bool> _concerned = new(SymbolEqualityComparer.Default);
    private readonly IAssemblySymbol _assembly;
    private readonly NameSuffixes _suffixes;

    /// <summary>What contract files say of members that are not this project's to tag.</summary>
    private readonly Func<ISymbol, Declaration?> _contracts;
    private readonly Func<IMethodSymbol, Declaration?> _returnContracts;

    internal SymbolTags(
        Compilation compilation,
        AnalyzerConfigOptionsProvider? options = null,
        Func<ISymbol, Declaration?>? contracts = null,
        Func<IMethodSymbol, Declaration?>? returnContracts = null)
    {
        _contracts = contracts ?? (static _ => null);
        _returnContracts = returnContracts ?? (static _ => null);
        _assembly = compilation.Assembly;
        _suffixes = new(compilation, options);
    }

    /// <summary>Whether anything that is declared in an assembly can carry a tag.</summary>
    internal bool MayCarryTags(IAssemblySymbol? assembly)
        => assembly is not null && (ReferenceEquals(assembly, _assembly) || _tagged.GetOrAdd(assembly, ReferencesAnnotations));

    /// <summary>Whether a member has anything to do with tags: itself, its result or one of its parameters; one look-up for all.</summary>
    internal bool Concerns(ISymbol member) => _concerned.GetOrAdd(member.OriginalDefinition, FindConcern);

    private bool FindConcern(ISymbol member)
    {
        if (Of(member) is not null || (member is IFieldSymbol or IPropertySymbol && SlotsOf(member) is not null))
            return true;
        ImmutableArray<IParameterSymbol> parameters = member switch
        {
            IMethodSymbol method => method.Parameters,
            IPropertySymbol property => property.Parameters,
            _ => [],
        };
        foreach (IParameterSymbol parameter in parameters)
        {
            if (Of(parameter) is not null || SlotsOf(parameter) is not null)
                return true;
        }

        return member is IMethodSymbol returning && OfReturn(returning) is not null;
    }

    /// <summary>The declared tag of a parameter, field or property; null where nothing is declared.</summary>
    internal Declaration? Of(ISymbol symbol)
    {
        if (symbol is not (IParameterSymbol or IFieldSymbol or IPropertySymbol))
            return null;
        if (!MayCarryTags(symbol.ContainingAssembly))
            return _contracts(symbol);
        Declaration found = _declarations.GetOrAdd(symbol, Read);
        return ReferenceEquals(found, Nothing) ? _contracts(symbol) : found;
    }

    /// <summary>The parts that a parameter, field or property describes of its array; null where it describes none.</summary>
    internal SlotMap? SlotsOf(ISymbol symbol)
    {
        if (!MayCarryTags(symbol.ContainingAssembly))
            return null;
        SlotMap? slots = _slots.GetOrAdd(symbol, static known => new Lazy<SlotMap?>(() => SlotMap.Of(known))).Value;
        return slots;
    }

    /// <summary>What the name of a local says of it; null where no suffix is agreed on that it ends with.</summary>
    internal Declaration? OfLocal(ILocalSymbol local)
        => IsNumber(local.Type) && _suffixes.Of(local) is { } type
            ? new(Whose(Tag.Unknown, type), new("local", local.Name, local.Locations[0]))
            : null;

    /// <summary>The declared tag of what a method returns (of the element of a task or collection); null where nothing is declared.</summary>
    internal Declaration? OfReturn(IMethodSymbol method)
    {
        if (method.ReturnsVoid)
            return null;
        if (!MayCarryTags(method.ContainingAssembly))
            return _returnContracts(method);
        Declaration found = _returns.GetOrAdd(method, ReadReturn);
        return ReferenceEquals(found, Nothing) ? _returnContracts(method) : found;
    }

    /// <summary>The suffix settings of a tree that name no frame or clock.</summary>
    internal IEnumerable<KeyValuePair<string, string>> UnreadableSuffixes(SyntaxTree tree) => _suffixes.Unreadable(tree);

    /// <summary>What the tags of a declaration contradict: the member that it overrides or implements; null where nothing is.</summary>
    internal (Declaration Own, Declaration Elder)? Contradiction(ISymbol symbol)
    {
        Declaration? own = symbol is IMethodSymbol method
            ? TagAttributes.Read(method.GetReturnTypeAttributes(), method) is { } result ? new(result.ToTag(), Origin.Of(method)) : null
            : TagAttributes.Read(symbol.GetAttributes(), symbol) is { } tags ? new(tags.ToTag(), Origin.Of(symbol)) : null;
        if (own is null)
            return null;
        Declaration? elder = symbol switch
        {
            IMethodSymbol returning => ElderMethod(returning) is { } overridden ? OfReturn(overridden) : null,
            IParameterSymbol parameter => ElderParameter(parameter) is { } overridden ? Of(overridden) : null,
            IPropertySymbol property => ElderProperty(property) is { } overridden ? Of(overridden) : null,
            _ => null,
        };
        return elder is not null && TagAlgebra.Assign(own.Tag, elder.Tag).Clash is not null ? (own, elder) : null;
    }

    /// <summary>Whether a member is itself a crossing, or carries numbers between frames, which is the same.</summary>
    internal bool IsBoundary(ISymbol? member)
    {
        for (; member is IMethodSymbol or IPropertySymbol; member = member.ContainingSymbol)
        {
            if (IsMarked(member) || (member is IMethodSymbol { AssociatedSymbol: { } property } && IsMarked(property)))
                return true;
        }

        return false;

        static bool IsMarked(ISymbol symbol) => HasAttribute(symbol, "FrameBoundaryAttribute") || HasAttribute(symbol, "CarriesAttribute");
    }

    /// <summary>Whether a method, or the type that it applies, says that it carries numbers from one frame to another.</summary>
    internal bool IsTransform(IMethodSymbol method)
        => MayCarryTags(method.ContainingAssembly)
            && (HasAttribute(method, "CarriesAttribute") || HasAttribute(method.ContainingType, "CarriesAttribute"));

    private static bool HasAttribute(ISymbol symbol, string name)
    {
        foreach (AttributeData attribute in symbol.GetAttributes())
        {
            if (attribute.AttributeClass is { } type && type.Name == name && Vocabulary.IsOurs(type))
                return true;
        }

        return false;
    }

    private static bool ReferencesAnnotations(IAssemblySymbol assembly)
    {
        if (assembly.Name == Vocabulary.Assembly)
            return true;
        foreach (IModuleSymbol module in assembly.Modules)
        {
            foreach (AssemblyIdentity reference in module.ReferencedAssemblies)
            {
                if (reference.Name == Vocabulary.Assembly)
                    return true;
            }
        }

        return false;
    }

    private Declaration Read(ISymbol symbol)
    {
        if (TagAttributes.Read(symbol.GetAttributes(), symbol) is { } own)
            return new(Known(Suffixed(own, symbol), symbol), Origin.Of(symbol));
        ISymbol? elder = symbol switch
        {
            IParameterSymbol parameter => ElderParameter(parameter),
            IPropertySymbol property => (ISymbol?)PositionalParameter(property) ?? ElderProperty(property),
            _ => null,
        };
        if (elder is not null && Of(elder) is { } inherited)
            return inherited;
        return TypeOf(symbol) is { } number && IsNumber(number) && _suffixes.Of(symbol) is { } type
            ? new(Whose(Tag.Unknown, type), Origin.Of(symbol))
            : Nothing;
    }

    // An attribute says it before a name does.
    private Tag Suffixed(TagAttributes own, ISymbol symbol)
    {
        if (own.Frame is not null || own.Clock is not null || own.Between is not null || _suffixes.Of(symbol) is not { } type)
            return own.ToTag();
        return Vocabulary.Implements(type, Vocabulary.Frame)
            ? Tag.Declared(own.Unit, FrameNames.Frame(type), null, own.Kind, null, own.Speed)
            : Tag.Declared(own.Unit, null, FrameNames.Clock(type), own.Kind, null, own.Speed);
    }

    private static Tag Whose(Tag tag, ITypeSymbol type)
        => Vocabulary.Implements(type, Vocabulary.Frame)
            ? tag with { Frame = FrameNames.Frame(type) }
            : tag with { Clock = FrameNames.Clock(type) };

    private static ITypeSymbol? TypeOf(ISymbol symbol) => symbol switch
    {
        IParameterSymbol parameter => parameter.Type,
        IFieldSymbol field => field.Type,
        IPropertySymbol property => property.Type,
        _ => null,
    };

    private static bool IsNumber(ITypeSymbol type)
        => type.SpecialType is SpecialType.System_Double or SpecialType.System_Single or SpecialType.System_Decimal
            || (type is IArrayTypeSymbol array && IsNumber(array.ElementType))
            || (type is { Name: "Vector2" or "Vector3" or "Vector4", ContainingNamespace.Name: "Numerics" });

    private Declaration ReadReturn(IMethodSymbol method)
    {
        if (method.AssociatedSymbol is IPropertySymbol property)
            return method.MethodKind == MethodKind.PropertyGet ? Of(property) ?? Nothing : Nothing;
        if (TagAttributes.Read(method.GetReturnTypeAttributes(), method) is { } own)
            return new(own.ToTag(), Origin.Of(method));
        return ElderMethod(method) is { } elder ? OfReturn(elder) ?? Nothing : Nothing;
    }

    // A constant that is the speed of light in its unit is the same in every frame.
    private static Tag Known(Tag tag, ISymbol symbol)
        => symbol is IFieldSymbol { HasConstantValue: true, ConstantValue: double value } && tag.Frame is null && value == LightSpeed.ValueIn(tag)
            ? tag with { IsConstant = true, Kind = QuantityKind.SignalSpeed }
            : tag;

    private IParameterSymbol? ElderParameter(IParameterSymbol parameter)
    {
        switch (parameter.ContainingSymbol)
        {
            case IMethodSymbol { AssociatedSymbol: IPropertySymbol property } accessor:
                // The value of a setter is tagged as the property; an indexer's other parameters are the property's own.
                return parameter.Ordinal < property.Parameters.Length
                    ? property.Parameters[parameter.Ordinal]
                    : ElderMethod(accessor)?.Parameters[parameter.Ordinal];
            case IMethodSymbol method:
                return ElderMethod(method) is { } elder && elder.Parameters.Length > parameter.Ordinal
                    ? elder.Parameters[parameter.Ordinal]
                    : null;
            case IPropertySymbol property:
                return ElderProperty(property) is { } elderProperty && elderProperty.Parameters.Length > parameter.Ordinal
                    ? elderProperty.Parameters[parameter.Ordinal]
                    : null;
            default:
                return null;
        }
    }

    private static IParameterSymbol? PositionalParameter(IPropertySymbol property)
    {
        if (!property.ContainingType.IsRecord)
            return null;
        foreach (IMethodSymbol constructor in property.ContainingType.InstanceConstructors)
        {
            foreach (IParameterSymbol parameter in constructor.Parameters)
            {
                if (parameter.Name == property.Name && SymbolEqualityComparer.Default.Equals(parameter.Type, property.Type))
                    return parameter;
            }
        }

        return null;
    }

    private IMethodSymbol? ElderMethod(IMethodSymbol method)
        => method.OverriddenMethod
            ?? method.PartialDefinitionPart
            ?? (method.ExplicitInterfaceImplementations.Length > 0
                ? method.ExplicitInterfaceImplementations[0]
                : Implemented(method) as IMethodSymbol);

    private IPropertySymbol? ElderProperty(IPropertySymbol property)
        => property.OverriddenProperty
            ?? (property.ExplicitInterfaceImplementations.Length > 0
                ? property.ExplicitInterfaceImplementations[0]
                : Implemented(property) as IPropertySymbol);

    // The interface member that a public member implements, among interfaces that can carry tags.
    private ISymbol? Implemented(ISymbol member)
    {
        if (member.DeclaredAccessibility != Accessibility.Public || member.IsStatic || member.ContainingType is not { TypeKind: not TypeKind.Interface } type)
            return null;
        foreach (INamedTypeSymbol @interface in type.AllInterfaces)
        {
            if (!MayCarryTags(@interface.ContainingAssembly))
                continue;
            foreach (ISymbol candidate in (ImmutableArray<ISymbol>)@interface.GetMembers(member.Name))
            {
                if (SymbolEqualityComparer.Default.Equals(type.FindImplementationForInterfaceMember(candidate), member))
                    return candidate;
            }
        }

        return null;
    }
}
