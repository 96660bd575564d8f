using System.Collections.Immutable;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Reading;

/// <summary>What the attributes on one declaration say, read leniently: a part that cannot be read is as if it were not there.</summary>
internal sealed class TagAttributes
{
    private TagAttributes()
    {
    }

    internal Unit? Unit { get; private set; }

    internal FrameTag? Frame { get; private set; }

    internal ClockTag? Clock { get; private set; }

    internal QuantityKind Kind { get; private set; }

    internal ClockPair? Between { get; private set; }

    internal SpeedRange? Speed { get; private set; }

    internal bool IsEmpty
        => Unit is null && Frame is null && Clock is null && Kind == QuantityKind.Unspecified && Between is null && Speed is null;

    internal Tag ToTag() => Tag.Declared(Unit, Frame, Clock, Kind, Between, Speed);

    /// <summary>Reads the attributes of <paramref name="symbol"/> in whose context type parameters are resolved.</summary>
    internal static TagAttributes? Read(ImmutableArray<AttributeData> attributes, ISymbol symbol)
    {
        TagAttributes? read = null;
        foreach (AttributeData attribute in attributes)
        {
            if (attribute.AttributeClass is { } type && Vocabulary.IsOurs(type))
            {
                read ??= new();
                read.Take(type, attribute, symbol);
            }
        }

        return read is null || read.IsEmpty ? null : read;
    }

    private void Take(INamedTypeSymbol type, AttributeData attribute, ISymbol symbol)
    {
        switch (type.Name)
        {
            case "UnitAttribute":
                if (Text(attribute, 0) is { } unit && UnitText.TryRead(unit, out Unit? readUnit, out _))
                    Unit = readUnit;
                break;
            case "InFrameAttribute":
                if (Named(type, attribute, 0, symbol) is { } frame)
                    Frame = FrameNames.Frame(frame);
                break;
            case "OnClockAttribute":
                if (Named(type, attribute, 0, symbol) is { } clock)
                    Clock = FrameNames.Clock(clock);
                break;
            case "KindAttribute":
                if (Argument(attribute, 0) is { Kind: TypedConstantKind.Enum, Value: int kind })
                    Kind = (QuantityKind)kind;
                break;
            case "BetweenAttribute":
                if (Named(type, attribute, 0, symbol) is { } one && Named(type, attribute, 1, symbol) is { } other)
                    Between = new(FrameNames.Clock(one), FrameNames.Clock(other));
                break;
            case "MaxSpeedAttribute":
                if (Argument(attribute, 0)?.Value is double most && most is >= 0 and < 1)
                    Speed = SpeedRange.UpTo(most);
                break;
            case "TimeScaleAttribute":
                if (Named(type, attribute, 0, symbol) is { } scale)
                    TakeDate(FrameNames.Clock(scale), attribute);
                break;
        }
    }

    // A date in one double; its unit is seconds if not said.
    private void TakeDate(ClockTag scale, AttributeData attribute)
    {
        Clock = scale;
        Kind = QuantityKind.Epoch;
        string unit = "s";
        foreach (System.Collections.Generic.KeyValuePair<string, TypedConstant> named in attribute.NamedArguments)
        {
            if (named is { Key: "Unit", Value.Value: string text })
                unit = text;
        }

        if (UnitText.TryRead(unit, out Unit? read, out _))
            Unit = read;
    }

    /// <summary>The type that an attribute names: as its own type argument, by <c>typeof</c>, or by the name of a type parameter.</summary>
    internal static ITypeSymbol? Named(INamedTypeSymbol type, AttributeData attribute, int index, ISymbol symbol)
    {
        ITypeSymbol? named = type.TypeArguments.Length > index
            ? type.TypeArguments[index]
            : Argument(attribute, index) switch
            {
                { Kind: TypedConstantKind.Type, Value: ITypeSymbol given } => given,
                { Value: string name } => TypeParameters.Resolve(symbol, name),
                _ => null,
            };
        return named is null || named.TypeKind == TypeKind.Error ? null : named;
    }

    private static string? Text(AttributeData attribute, int index) => Argument(attribute, index)?.Value as string;

    private static TypedConstant? Argument(AttributeData attribute, int index)
        => attribute.ConstructorArguments.Length > index && attribute.ConstructorArguments[index].Kind != TypedConstantKind.Error
            ? attribute.ConstructorArguments[index]
            : null;
}
