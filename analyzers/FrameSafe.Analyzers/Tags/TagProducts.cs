namespace FrameSafe.Analyzers.Tags;

/// <summary>
/// The tags of products, quotients, powers and roots. These never clash: what is wrong about them shows where their result is
/// taken for something that it is not.
/// </summary>
internal static class TagProducts
{
    public static Tag Product(Tag left, Tag right) => Combine(left, right, divides: false);

    public static Tag Quotient(Tag left, Tag right) => Combine(left, right, divides: true);

    public static Tag Reciprocal(Tag tag) => Combine(Tag.Plain, tag, divides: true);

    public static Tag Square(Tag tag) => Power(tag, 2);

    public static Tag Root(Tag tag) => Power(tag, Rational.Half);

    /// <summary>To a rational power that the code states; an unknown exponent leaves only plain numbers known.</summary>
    public static Tag Power(Tag tag, Rational exponent)
    {
        if (tag.IsNeutral || !exponent.IsKnown)
            return tag.IsPure ? Tag.Plain : Tag.Unknown;
        if (tag.IsPure)
            return tag with { Conversion = tag.Conversion?.Pow(exponent) };
        if (exponent == Rational.One)
            return tag;
        if (exponent.IsZero)
            return Tag.Plain;
        return new Tag
        {
            Dimension = tag.Dimension?.Pow(exponent),
            Scale = tag.Scale?.Pow(exponent),
            Conversion = tag.Conversion?.Pow(exponent),
            Natural = tag.Natural,
            Frame = tag.Frame,
            Passage = tag.Passage,
            IsConstant = tag.IsConstant,
            IsQuadratic = tag.Frame is not null && !IsHalf(exponent) && (tag.IsQuadratic || IsEven(exponent)),
        };
    }

    private static bool IsEven(Rational exponent) => exponent.IsInteger && exponent.Numerator % 2 == 0;

    private static bool IsHalf(Rational exponent) => exponent.Denominator % 2 == 0;

    private static Tag Combine(Tag left, Tag right, bool divides)
    {
        // Zero times anything fits everything no more than the thing did; what comes of infinity is anybody's guess.
        if (left.IsNeutral || right.IsNeutral)
            return Tag.Unknown;
        if (right.IsPure)
            return Scaled(left, right.Conversion, divides);
        if (left.IsPure && !divides)
            return Scaled(right, left.Conversion, divides: false);
        if (left.IsUnknown || right.IsUnknown)
            return Tag.Unknown;

        if (left.Natural != right.Natural)
            (left, right) = TagAlgebra.InCommonSystem(left, right);
        QuantityKind kind = divides ? KindAlgebra.Quotient(left.Kind, right.Kind) : KindAlgebra.Product(left.Kind, right.Kind);
        Misuse misuse = divides
            ? KindAlgebra.QuotientMisuse(left.Kind, right.Kind)
            : KindAlgebra.ProductMisuse(left.Kind, right.Kind);
        FrameTag? frame = FrameOf(left, right, divides);
        var result = new Tag
        {
            Dimension = divides ? left.Dimension / right.Dimension : left.Dimension * right.Dimension,
            Scale = divides ? left.Scale / right.Scale : left.Scale * right.Scale,
            Conversion = Composed(left.Conversion, right.Conversion, divides),
            Natural = left.Natural,
            Frame = frame,
            Kind = kind,
            Passage = left.Passage == right.Passage || right.Frame is null ? left.Passage
                : left.Frame is null ? right.Passage
                : null,
            IsConstant = left.IsConstant && right.IsConstant,
            IsQuadratic = frame is not null && IsQuadratic(left, right, divides),
            Misuse = misuse,
        };
        return WithPair(result, left, right);
    }

    // Kinds that a plain factor turns into something else: a mean of Lorentz factors is not one, and 2πf is no frequency.
    private static Tag Scaled(Tag tag, Scale? factor, bool divides)
    {
        bool turns = tag.Kind is QuantityKind.LorentzFactor or QuantityKind.DopplerFactor or QuantityKind.ClockRate
            || (tag.Kind is QuantityKind.Frequency or QuantityKind.AngularVelocity && factor is { PiExponent.IsZero: false });
        return tag with
        {
            Conversion = Composed(tag.Conversion, factor, divides),
            UnitText = factor is null ? tag.UnitText : null,
            Kind = turns ? QuantityKind.Unspecified : tag.Kind,
            Between = turns ? null : tag.Between,
            Speed = null,
        };
    }

    private static Scale? Composed(Scale? left, Scale? right, bool divides)
    {
        if (right is null)
            return left;
        Scale? composed = divides ? (left ?? Scale.One) / right : (left ?? Scale.One) * right;
        return composed is { IsOne: true } ? null : composed;
    }

    /// <summary>
    /// Invariant factors keep the frame. Two numbers of one frame keep it in a quotient, in a square, and by a time (v·t); other
    /// products of theirs may be invariants (E·B, p·x) and lose it.
    /// </summary>
    private static FrameTag? FrameOf(Tag left, Tag right, bool divides)
    {
        if (left.Frame is null)
            return left.IsInvariant ? right.Frame : null;
        if (right.Frame is null)
            return right.IsInvariant ? left.Frame : KeptByLorentz(left, right);
        if (!left.Frame.Equals(right.Frame))
            return null;
        return divides || left.Dimension == right.Dimension || IsTime(left) || IsTime(right) ? left.Frame : null;
    }

    // γ of a motion in a frame belongs to that frame: γv and γβ are measured where v is.
    private static FrameTag? KeptByLorentz(Tag left, Tag right)
        => right.Kind == QuantityKind.LorentzFactor
            && left.Kind is QuantityKind.Velocity or QuantityKind.SpeedRatio or QuantityKind.Celerity or QuantityKind.CelerityRatio
            ? left.Frame
            : null;

    private static bool IsTime(Tag tag) => tag.Dimension is { } dimension && dimension == Dimension.Time;

    private static bool IsQuadratic(Tag left, Tag right, bool divides)
    {
        if (left.Frame is null)
            return right.IsQuadratic;
        if (right.Frame is null)
            return left.IsQuadratic;
        return divides ? left.IsQuadratic && right.IsQuadratic : left.Dimension == right.Dimension;
    }

    // What the Lorentz factor between two frames makes of a time or length of one of them belongs to the other.
    private static Tag WithPair(Tag result, Tag left, Tag right)
    {
        ClockPair? pair = left.Between ?? right.Between;
        Tag moved = left.Between is null ? left : right;
        if (pair is null || result.Kind is not (QuantityKind.CoordinateTime or QuantityKind.ProperTime
            or QuantityKind.MeasuredLength))
        {
            return result;
        }

        string? own = moved.Clock?.Id ?? moved.Frame?.Id;
        ClockTag? other = own is null ? null : own == pair.Other.Id ? pair.Frame : own == pair.Frame.Id ? pair.Other : null;
        if (other is null)
            return result with { Frame = null };
        return result.Kind == QuantityKind.ProperTime
            ? result with { Frame = null, Clock = other }
            : result with { Frame = new(other.Id, other.DisplayName) };
    }
}
