using System;

namespace FrameSafe;

/// <summary>Says that a type or a method carries numbers from one frame to another: it is a transform.</summary>
/// <typeparam name="TFrom">The frame of what goes in.</typeparam>
/// <typeparam name="TTo">The frame of what comes out.</typeparam>
[AttributeUsage(AttributeTargets.Struct | AttributeTargets.Class | AttributeTargets.Method)]
public sealed class CarriesAttribute<TFrom, TTo> : Attribute
    where TFrom : struct, IFrame
    where TTo : struct, IFrame
{
    /// <summary>On a type: the instance method that applies the transform.</summary>
    public string? Map { get; set; }

    /// <summary>On a type: the property or method that gives the inverse transform.</summary>
    public string? Inverse { get; set; }

    /// <summary>On a type: the method that gives this transform followed by another.</summary>
    public string? Then { get; set; }
}

/// <summary>Says that a type or a method carries numbers from one frame to another: it is a transform.</summary>
[AttributeUsage(AttributeTargets.Struct | AttributeTargets.Class | AttributeTargets.Method)]
public sealed class CarriesAttribute : Attribute
{
    /// <summary>Carries from <paramref name="from"/> to <paramref name="to"/>.</summary>
    public CarriesAttribute(Type from, Type to)
    {
        From = from;
        To = to;
    }

    /// <summary>Carries between the frames that two type parameters stand for: <c>nameof(TFrom), nameof(TTo)</c>.</summary>
    public CarriesAttribute(string fromTypeParameter, string toTypeParameter)
    {
        FromTypeParameter = fromTypeParameter;
        ToTypeParameter = toTypeParameter;
    }

    /// <summary>The frame of what goes in.</summary>
    public Type? From { get; }

    /// <summary>The frame of what comes out.</summary>
    public Type? To { get; }

    /// <summary>The type parameter that stands for the frame of what goes in.</summary>
    public string? FromTypeParameter { get; }

    /// <summary>The type parameter that stands for the frame of what comes out.</summary>
    public string? ToTypeParameter { get; }

    /// <summary>On a type: the instance method that applies the transform.</summary>
    public string? Map { get; set; }

    /// <summary>On a type: the property or method that gives the inverse transform.</summary>
    public string? Inverse { get; set; }

    /// <summary>On a type: the method that gives this transform followed by another.</summary>
    public string? Then { get; set; }
}
