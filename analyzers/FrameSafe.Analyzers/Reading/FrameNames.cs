using System.Collections.Generic;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Reading;

/// <summary>The identity of the types that stand for frames and clocks.</summary>
internal static class FrameNames
{
    private static readonly KeyValuePair<string, FrameNature>[] Natures =
    [
        new("IBodyFrame", FrameNature.Body),
        new("ILocalFrame", FrameNature.Local),
        new("IRotatingFrame", FrameNature.Rotating),
        new("IRestFrame", FrameNature.Rest),
        new("IInertialFrame", FrameNature.Inertial),
    ];

    internal static FrameTag Frame(ITypeSymbol type) => new(Id(type), type.Name, Nature(type));

    internal static ClockTag Clock(ITypeSymbol type) => new(Id(type), type.Name, Vocabulary.Implements(type, Vocabulary.TimeScale));

    /// <summary>The full metadata name; of a type parameter, its name in what declares it.</summary>
    internal static string Id(ITypeSymbol type)
    {
        if (type is ITypeParameterSymbol parameter)
        {
            string owner = parameter.DeclaringMethod is { } method
                ? Id(method.ContainingType) + "." + method.MetadataName
                : parameter.DeclaringType is { } declaring ? Id(declaring) : "";
            return owner + "<" + parameter.Name + ">";
        }

        if (type.ContainingType is { } container)
            return Id(container) + "+" + type.MetadataName;
        string name = type.MetadataName;
        for (INamespaceSymbol? space = type.ContainingNamespace; space is { IsGlobalNamespace: false }; space = space.ContainingNamespace)
            name = space.Name + "." + name;
        return name;
    }

    private static FrameNature Nature(ITypeSymbol type)
    {
        foreach (KeyValuePair<string, FrameNature> nature in Natures)
        {
            if (Vocabulary.Implements(type, nature.Key))
                return nature.Value;
        }

        return FrameNature.Unknown;
    }
}
