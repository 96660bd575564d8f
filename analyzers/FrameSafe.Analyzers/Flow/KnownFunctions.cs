using System.Collections.Generic;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Flow;

/// <summary>What a function of the framework does with the tags of its arguments.</summary>
internal enum KnownFunction
{
    /// <summary>Gives its first argument's: |x|, rounding.</summary>
    Same,

    /// <summary>Chooses among, or joins, numbers of one unit and frame: minimum, hypot.</summary>
    Choice,

    /// <summary>Goes from the first to the second by a plain number.</summary>
    Interpolation,

    /// <summary>The angle of two numbers of one unit.</summary>
    Arctangent2,

    Root,
    CubeRoot,
    Power,
    MultiplyAdd,
    Remainder,

    /// <summary>Wants an angle in radians.</summary>
    OfAngle,

    /// <summary>Wants a plain number.</summary>
    OfNumber,

    /// <summary>Wants a plain number, unless its result is a term of a logarithm of a ratio.</summary>
    Logarithm,

    /// <summary>Gives an angle.</summary>
    InverseAngle,

    DegreesToRadians,
    RadiansToDegrees,
}

/// <summary>The mathematical functions of <c>Math</c>, <c>MathF</c>, the numeric types, the generic-math interfaces and the vectors.</summary>
internal static class KnownFunctions
{
    private static readonly Dictionary<string, KnownFunction> Functions = new()
    {
        ["Abs"] = KnownFunction.Same,
        ["Floor"] = KnownFunction.Same,
        ["Ceiling"] = KnownFunction.Same,
        ["Round"] = KnownFunction.Same,
        ["Truncate"] = KnownFunction.Same,
        ["CopySign"] = KnownFunction.Same,
        ["BitIncrement"] = KnownFunction.Same,
        ["BitDecrement"] = KnownFunction.Same,
        ["ScaleB"] = KnownFunction.Same,
        ["Length"] = KnownFunction.Same,
        ["Negate"] = KnownFunction.Same,
        ["Min"] = KnownFunction.Choice,
        ["Max"] = KnownFunction.Choice,
        ["MinMagnitude"] = KnownFunction.Choice,
        ["MaxMagnitude"] = KnownFunction.Choice,
        ["MinNumber"] = KnownFunction.Choice,
        ["MaxNumber"] = KnownFunction.Choice,
        ["Clamp"] = KnownFunction.Choice,
        ["Hypot"] = KnownFunction.Choice,
        ["Distance"] = KnownFunction.Choice,
        ["Lerp"] = KnownFunction.Interpolation,
        ["Atan2"] = KnownFunction.Arctangent2,
        ["Sqrt"] = KnownFunction.Root,
        ["Cbrt"] = KnownFunction.CubeRoot,
        ["Pow"] = KnownFunction.Power,
        ["FusedMultiplyAdd"] = KnownFunction.MultiplyAdd,
        ["MultiplyAddEstimate"] = KnownFunction.MultiplyAdd,
        ["IEEERemainder"] = KnownFunction.Remainder,
        ["Ieee754Remainder"] = KnownFunction.Remainder,
        ["Sin"] = KnownFunction.OfAngle,
        ["Cos"] = KnownFunction.OfAngle,
        ["Tan"] = KnownFunction.OfAngle,
        ["Exp"] = KnownFunction.OfNumber,
        ["Exp2"] = KnownFunction.OfNumber,
        ["Exp10"] = KnownFunction.OfNumber,
        ["ExpM1"] = KnownFunction.OfNumber,
        ["Sinh"] = KnownFunction.OfNumber,
        ["Cosh"] = KnownFunction.OfNumber,
        ["Tanh"] = KnownFunction.OfNumber,
        ["Asinh"] = KnownFunction.OfNumber,
        ["Acosh"] = KnownFunction.OfNumber,
        ["Atanh"] = KnownFunction.OfNumber,
        ["LogP1"] = KnownFunction.OfNumber,
        ["Log"] = KnownFunction.Logarithm,
        ["Log2"] = KnownFunction.Logarithm,
        ["Log10"] = KnownFunction.Logarithm,
        ["Asin"] = KnownFunction.InverseAngle,
        ["Acos"] = KnownFunction.InverseAngle,
        ["Atan"] = KnownFunction.InverseAngle,
        ["DegreesToRadians"] = KnownFunction.DegreesToRadians,
        ["RadiansToDegrees"] = KnownFunction.RadiansToDegrees,
    };

    internal static KnownFunction? Of(IMethodSymbol method)
        => method is { IsStatic: true, Parameters.Length: > 0 } && Functions.TryGetValue(method.Name, out KnownFunction function) && IsMathematics(method)
            ? function
            : null;

    private static bool IsMathematics(IMethodSymbol method)
    {
        if (method.ContainingNamespace is { Name: "Numerics", ContainingNamespace: { Name: "System", ContainingNamespace.IsGlobalNamespace: true } })
            return true;
        return method.ContainingNamespace is { Name: "System", ContainingNamespace.IsGlobalNamespace: true }
            && (method.ContainingType.Name is "Math" or "MathF" || method.ContainingType.SpecialType is SpecialType.System_Double
                or SpecialType.System_Single or SpecialType.System_Decimal or SpecialType.System_Int32 or SpecialType.System_Int64);
    }
}
