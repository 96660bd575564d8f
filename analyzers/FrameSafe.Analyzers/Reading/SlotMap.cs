using System.Collections.Generic;
using System.Collections.Immutable;
using System.Globalization;
using System.Linq;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Reading;

/// <summary>The parts of an array that holds several quantities, such as the state vector of an integrator.</summary>
internal sealed class SlotMap
{
    private readonly ImmutableArray<Slot> _slots;
    private readonly int _offset;

    private SlotMap(ImmutableArray<Slot> slots, int offset)
    {
        _slots = slots;
        _offset = offset;
    }

    /// <summary>After how many elements the pattern repeats; 0 if it does not.</summary>
    internal int Stride => _slots.Max(slot => slot.Stride);

    /// <summary>The parts that the attributes of a symbol describe; null where there are none.</summary>
    internal static SlotMap? Of(ISymbol symbol)
    {
        ImmutableArray<Slot>.Builder slots = ImmutableArray.CreateBuilder<Slot>();
        foreach (AttributeData attribute in symbol.GetAttributes())
        {
            if (attribute.AttributeClass is { Name: "SlotAttribute" } type && Vocabulary.IsOurs(type)
                && attribute.ConstructorArguments.Length == 2
                && attribute.ConstructorArguments[0].Value is string range && TryRange(range, out int start, out int end)
                && attribute.ConstructorArguments[1].Value is string text && UnitText.TryRead(text, out Unit? unit, out _))
            {
                slots.Add(Slot.Read(start, end, unit, attribute, symbol));
            }
        }

        return slots.Count == 0 ? null : new(slots.ToImmutable(), 0);
    }

    /// <summary>Reads an index or a range as C# writes it: <c>6</c>, <c>0..3</c>.</summary>
    internal static bool TryRange(string text, out int start, out int end)
    {
        int dots = text.IndexOf("..", System.StringComparison.Ordinal);
        end = 0;
        if (dots < 0)
        {
            bool isIndex = int.TryParse(text.Trim(), NumberStyles.None, CultureInfo.InvariantCulture, out start);
            end = start + 1;
            return isIndex;
        }

        return int.TryParse(text.Substring(0, dots).Trim(), NumberStyles.None, CultureInfo.InvariantCulture, out start)
            && int.TryParse(text.Substring(dots + 2).Trim(), NumberStyles.None, CultureInfo.InvariantCulture, out end)
            && end > start;
    }

    /// <summary>The map of what is left when the first elements are cut off.</summary>
    internal SlotMap From(int start) => start == 0 ? this : new(_slots, _offset + start);

    /// <summary>What is declared of an element; null where nothing is.</summary>
    internal Declaration? At(int index)
    {
        int place = index + _offset;
        foreach (Slot slot in _slots)
        {
            int within = slot.Stride > 0 ? ((place % slot.Stride) + slot.Stride) % slot.Stride : place;
            if (within >= slot.Start && within < slot.End)
                return slot.Declaration;
        }

        return null;
    }

    private sealed record Slot(int Start, int End, int Stride, Declaration Declaration)
    {
        internal static Slot Read(int start, int end, Unit unit, AttributeData attribute, ISymbol symbol)
        {
            FrameTag? frame = null;
            ClockTag? clock = null;
            QuantityKind kind = QuantityKind.Unspecified;
            int stride = 0;
            foreach (KeyValuePair<string, TypedConstant> named in attribute.NamedArguments)
            {
                switch (named.Key)
                {
                    case "Frame" when named.Value.Value is ITypeSymbol type:
                        frame = FrameNames.Frame(type);
                        break;
                    case "Clock" when named.Value.Value is ITypeSymbol type:
                        clock = FrameNames.Clock(type);
                        break;
                    case "Kind" when named.Value.Value is int value:
                        kind = (QuantityKind)value;
                        break;
                    case "Stride" when named.Value.Value is int length and > 0:
                        stride = length;
                        break;
                }
            }

            Origin origin = Origin.Of(symbol);
            string range = end == start + 1 ? start.ToString(CultureInfo.InvariantCulture) : start + ".." + end;
            return new(start, end, stride, new(Tag.Declared(unit, frame, clock, kind), origin with { Name = symbol.Name + "[" + range + "]" }));
        }
    }
}
