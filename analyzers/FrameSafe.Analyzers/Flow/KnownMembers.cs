using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Flow;

/// <summary>Members of the framework that are numbers of known meaning.</summary>
internal static class KnownMembers
{
    /// <summary>π, τ and e, the zeros and infinities, of every numeric type.</summary>
    internal static Tag? Constant(ISymbol member)
    {
        if (member.ContainingNamespace is not { Name: "System", ContainingNamespace.IsGlobalNamespace: true })
            return null;
        return member.Name switch
        {
            "PI" or "Pi" => Tag.Plain with { Conversion = Scale.Pi },
            "Tau" => Tag.Plain with { Conversion = Scale.Of(2, 1) * Scale.Pi },
            "E" => Tag.Plain,
            "NaN" or "PositiveInfinity" or "NegativeInfinity" or "MaxValue" or "MinValue" or "Epsilon" or "Zero" => Tag.Neutral,
            _ => null,
        };
    }

    internal static bool IsVector(ITypeSymbol? type)
        => type is { Name: "Vector2" or "Vector3" or "Vector4" or "Vector" or "Plane" or "Vector64" or "Vector128" or "Vector256" or "Vector512" }
            && IsNumerics(type);

    internal static bool IsNumerics(ITypeSymbol? type) => type?.ContainingNamespace is
        { Name: "Numerics" or "Intrinsics" } or { Name: "Tensors" };
}
