using System.Collections.Immutable;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;

namespace FrameSafe.Analyzers.Flow;

/// <summary>
/// What is known of a value where it stands: the tag of a number or, of a collection or vector, of each element; the
/// declaration that it came from; and of a tuple, its elements.
/// </summary>
internal sealed class Value
{
    private Value(Tag tag, Origin? origin, ImmutableArray<Value> parts)
    {
        Tag = tag;
        Origin = origin;
        Parts = parts;
    }

    internal static Value Unknown { get; } = new(Tag.Unknown, null, []);

    /// <summary>A plain number that is no literal.</summary>
    internal static Value Number { get; } = Of(Tag.Declared(Unit.One, kind: QuantityKind.Number));

    internal static Value Angle { get; } = Of(Tag.Declared(Unit.One, kind: QuantityKind.Angle));

    internal Tag Tag { get; }

    internal Origin? Origin { get; }

    internal ImmutableArray<Value> Parts { get; }

    /// <summary>The Lorentz factor of which this number is the reciprocal, √(1 − v²/c²); null for any other number.</summary>
    internal Tag? ReciprocalOf { get; private set; }

    internal static Value Of(Tag tag, Origin? origin = null) => new(tag, origin, []);

    internal static Value Of(Declaration? declaration)
        => declaration is null ? Unknown : new(declaration.Tag, declaration.Origin, []);

    internal static Value Tuple(ImmutableArray<Value> parts) => new(Tag.Unknown, null, parts);

    /// <summary>The parts of an array that holds several quantities; null for any other value.</summary>
    internal SlotMap? Slots { get; private set; }

    internal Value WithSlots(SlotMap? slots) => slots is null ? this : new(Tag, Origin, Parts) { Slots = slots };

    internal static Value Reciprocal(Tag lorentzFactor, Origin? origin)
        => new(Number.Tag, origin, []) { ReciprocalOf = lorentzFactor };

    internal Value With(Tag tag) => tag.Equals(Tag) && tag.UnitText == Tag.UnitText ? this : new(tag, Origin, []);

    /// <summary>What two paths agree on.</summary>
    internal static Value Merge(Value left, Value right)
    {
        if (ReferenceEquals(left, right))
            return left;
        if (left.Parts.Length > 0 && left.Parts.Length == right.Parts.Length)
        {
            ImmutableArray<Value>.Builder parts = ImmutableArray.CreateBuilder<Value>(left.Parts.Length);
            for (int i = 0; i < left.Parts.Length; i++)
                parts.Add(Merge(left.Parts[i], right.Parts[i]));
            return Tuple(parts.MoveToImmutable());
        }

        if (left.Slots is not null && ReferenceEquals(left.Slots, right.Slots))
            return left;
        return new(TagAlgebra.Merge(left.Tag, right.Tag), left.Tag.IsNeutral ? right.Origin : left.Origin ?? right.Origin, []);
    }

    /// <summary>Whether both know the same; where they know it from is no matter.</summary>
    internal bool Agrees(Value other)
    {
        if (ReferenceEquals(this, other))
            return true;
        if (!Tag.Equals(other.Tag) || !Equals(ReciprocalOf, other.ReciprocalOf) || Parts.Length != other.Parts.Length || !ReferenceEquals(Slots, other.Slots))
            return false;
        for (int i = 0; i < Parts.Length; i++)
        {
            if (!Parts[i].Agrees(other.Parts[i]))
                return false;
        }

        return true;
    }
}
