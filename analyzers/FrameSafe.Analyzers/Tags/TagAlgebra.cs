using System;

namespace FrameSafe.Analyzers.Tags;

/// <summary>
/// What the tag of a sum, difference, comparison or choice of two numbers is, and whether they may meet at all. What is not
/// known on either side is silent. Products, quotients and powers stand in <see cref="TagProducts"/>.
/// </summary>
internal static class TagAlgebra
{
    public static Outcome Sum(Tag left, Tag right) => Meet(left, right, Meeting.Sum);

    /// <summary>
    /// A coordinate time less a proper time clashes, and yet gives a <see cref="QuantityKind.ClockOffset"/>: where the target
    /// is declared as one, that is what was meant.
    /// </summary>
    public static Outcome Difference(Tag left, Tag right) => Meet(left, right, Meeting.Difference);

    public static Clash? Compare(Tag left, Tag right) => Meet(left, right, Meeting.Comparison).Clash;

    /// <summary>Minimum, maximum, conditional, elements side by side, components of one vector.</summary>
    public static Outcome Choose(Tag left, Tag right) => Meet(left, right, Meeting.Choice);

    /// <summary>A value goes where a declared target is wanted; the result is the target, filled with what the value knows beyond it.</summary>
    public static Outcome Assign(Tag value, Tag target) => Meet(value, target, Meeting.Target);

    /// <summary>The remainder of a division is of the dividend's kind; both must be in one unit.</summary>
    public static Outcome Remainder(Tag dividend, Tag divisor)
        => new(dividend, Meet(dividend, divisor, Meeting.Comparison).Clash);

    public static Outcome Meet(Tag left, Tag right, Meeting meeting)
    {
        bool target = meeting == Meeting.Target;
        if (left.IsNeutral)
            return new(right);
        if (right.IsNeutral)
            return new(left);
        if (left.IsUnknown || right.IsUnknown)
            return new(!target ? Tag.Unknown : left.IsUnknown ? right : left);
        if (left.IsPure || right.IsPure)
        {
            if (WithLiteral(left, right, meeting) is { } outcome)
                return outcome;
        }

        Tag a = left;
        Tag b = right;
        if (a.Natural != b.Natural)
            (a, b) = InCommonSystem(a, b);

        ClashKind? clash = null;
        if (a.Dimension is not null && b.Dimension is not null && a.Dimension != b.Dimension)
            clash = ClashKind.Dimension;
        bool scalesFit = ScaleFit.Try(a, b, out Scale? scale);
        if (!scalesFit && left.Natural != right.Natural)
            clash ??= ClashKind.NaturalUnits;
        else if (!scalesFit)
            clash ??= ClashKind.Unit;

        ClashKind? kindClash = KindClash(a, b, meeting);
        if (kindClash == ClashKind.Quantity)
            clash ??= kindClash;
        clash ??= FrameClash(a, b, meeting);
        clash ??= ClockClash(a, b, meeting);
        clash ??= MisuseClash(a, b);
        clash ??= kindClash;
        clash ??= PairClash(a, b, meeting);
        clash ??= PassageClash(a, b, meeting);

        Tag result = Joined(a, b, meeting, scale, kindClash is not null);
        // A difference across frames is no separation rate, and one mistake is one finding.
        if (clash == ClashKind.VelocityFrames)
            result = result with { Kind = QuantityKind.Unspecified };
        return new(result, clash is { } kind ? new Clash(kind, left, right, meeting) : null);
    }

    /// <summary>What both branches of the control flow agree on: no judgement, and never more than either knew.</summary>
    public static Tag Merge(Tag left, Tag right)
    {
        if (left.Equals(right))
            return left.UnitText == right.UnitText ? left : left with { UnitText = null };
        if (left.IsNeutral)
            return right;
        if (right.IsNeutral)
            return left;
        bool sameDimension = left.Dimension == right.Dimension && left.Natural == right.Natural;
        bool sameScale = sameDimension && left.Scale == right.Scale && left.Conversion == right.Conversion;
        return new Tag
        {
            Dimension = sameDimension ? left.Dimension : null,
            Natural = sameDimension ? left.Natural : NaturalSystem.None,
            Scale = sameScale ? left.Scale : null,
            Conversion = sameScale ? left.Conversion : null,
            UnitText = sameScale && left.UnitText == right.UnitText ? left.UnitText : null,
            Frame = Same(left.Frame, right.Frame),
            Clock = Same(left.Clock, right.Clock),
            Kind = left.Kind == right.Kind ? left.Kind : QuantityKind.Unspecified,
            Between = Same(left.Between, right.Between),
            Speed = Same(left.Speed, right.Speed),
            Passage = left.Passage == right.Passage ? left.Passage : null,
            IsConstant = left.IsConstant && right.IsConstant,
            IsQuadratic = left.IsQuadratic && right.IsQuadratic,
            Misuse = left.Misuse == right.Misuse ? left.Misuse : Misuse.None,
        };
    }

    /// <summary>
    /// The argument of a function of a plain number (exp, log) or of an angle (sin): it must have no dimension and be counted
    /// in ones or radians.
    /// </summary>
    public static Clash? Argument(Tag argument, bool isAngle)
    {
        if (argument.Dimension is null || argument.IsNeutral || argument.IsPure)
            return null;
        Tag wanted = Tag.Plain with { IsConstant = false, Kind = isAngle ? QuantityKind.Angle : QuantityKind.Unspecified };
        if (argument.Natural != NaturalSystem.None)
            (_, wanted) = InCommonSystem(argument, wanted);
        if (argument.Dimension != wanted.Dimension)
            return new(ClashKind.Dimension, argument, wanted, Meeting.Target);
        return ScaleFit.Try(argument, wanted, out _) ? null : new(ClashKind.Unit, argument, wanted, Meeting.Target);
    }

    /// <summary>Both tags in the coarser of their systems of units.</summary>
    internal static (Tag Left, Tag Right) InCommonSystem(Tag left, Tag right)
    {
        NaturalSystem system = NaturalSystems.Common(left.Natural, right.Natural);
        return (In(left), In(right));

        Tag In(Tag tag)
        {
            (Dimension? dimension, Scale? scale) = NaturalSystems.Reduce(system, tag.Dimension, tag.Scale);
            return tag with { Dimension = dimension, Scale = scale, Natural = system };
        }
    }

    // A bare number in a sum or comparison takes the unit of its neighbour (t + 1.0, v < 3); one that stands beside a ratio of
    // unlike units (v in km/s by c in m/s) does not, for there the ratio was meant to be a plain number.
    private static Outcome? WithLiteral(Tag left, Tag right, Meeting meeting)
    {
        if (left.IsPure && right.IsPure)
            return new Outcome(Tag.Plain);
        Tag other = left.IsPure ? right : left;
        if (other.Dimension is { IsOne: true } && other.UnitText is null && other.Kind != QuantityKind.Angle
            && other.Scale is not null && !ScaleFit.Try(other, Tag.Plain, out _))
        {
            return null;
        }

        if (meeting == Meeting.Target)
            return left.IsPure ? new Outcome(right) : null;
        bool moves = meeting is Meeting.Sum or Meeting.Difference && other.Dimension is null or { IsOne: true };
        if (!moves || other.Kind == QuantityKind.Angle)
            return new Outcome(other with { IsConstant = false, Speed = null });
        return new Outcome(
            other with { Kind = QuantityKind.Unspecified, Between = null, IsConstant = false, Speed = null, Conversion = null });
    }

    private static ClashKind? KindClash(Tag a, Tag b, Meeting meeting)
    {
        ClashKind? clash = KindAlgebra.Clash(a.Kind, b.Kind, meeting);
        // The coordinate time of a rest frame is the proper time of its own clock.
        if (clash == ClashKind.ProperAndCoordinateTime
            && ((a.Clock ?? b.Clock)?.Id is { } clock && (a.Frame ?? b.Frame)?.Id == clock))
        {
            return null;
        }

        return clash;
    }

    private static ClashKind? FrameClash(Tag a, Tag b, Meeting meeting)
    {
        if (a.Frame is null || b.Frame is null || a.Frame.Equals(b.Frame) || (a.IsInvariant && b.IsInvariant))
            return null;
        if (meeting == Meeting.Difference && a.IsQuadratic && b.IsQuadratic)
            return null;
        if (meeting is Meeting.Sum or Meeting.Difference && IsVelocity(a) && IsVelocity(b))
            return ClashKind.VelocityFrames;
        return meeting == Meeting.Comparison && a.Kind == QuantityKind.CoordinateTime && b.Kind == QuantityKind.CoordinateTime
            ? ClashKind.Simultaneity
            : ClashKind.Frame;
    }

    private static bool IsVelocity(Tag tag)
        => tag.Kind is QuantityKind.Velocity or QuantityKind.SpeedRatio
            || (tag.Kind == QuantityKind.Unspecified && tag.Dimension == Dimension.Speed);

    private static ClashKind? ClockClash(Tag a, Tag b, Meeting meeting)
    {
        if (a.Clock is null || b.Clock is null || a.Clock.Equals(b.Clock))
            return null;
        bool step = meeting is Meeting.Sum or Meeting.Difference;
        if (a.Clock.IsTimeScale && b.Clock.IsTimeScale)
        {
            // A duration may be laid off from a date on another scale: seconds are seconds.
            bool fromDate = step && (a.Kind == QuantityKind.Epoch) != (b.Kind == QuantityKind.Epoch);
            return fromDate || IsOffset(a) || IsOffset(b) ? null : ClashKind.TimeScale;
        }

        // Reading less reading is a clock offset: what time transfer measures.
        if (meeting == Meeting.Difference || IsOffset(a) || IsOffset(b))
            return null;
        return a.Clock.IsTimeScale || b.Clock.IsTimeScale ? ClashKind.ProperAndCoordinateTime : ClashKind.Clock;
    }

    private static bool IsOffset(Tag tag) => tag.Kind == QuantityKind.ClockOffset;

    private static ClashKind? MisuseClash(Tag a, Tag b)
        => TakenWrongly(a.Misuse, b.Kind) || TakenWrongly(b.Misuse, a.Kind) ? ClashKind.LorentzDirection : null;

    private static bool TakenWrongly(Misuse misuse, QuantityKind wanted) => (misuse, wanted) is
        (Misuse.CoordinateTimeByLorentz, QuantityKind.ProperTime)
        or (Misuse.ProperTimeOverLorentz, QuantityKind.CoordinateTime)
        or (Misuse.ProperLengthByLorentz, QuantityKind.MeasuredLength)
        or (Misuse.MeasuredLengthOverLorentz, QuantityKind.ProperLength);

    private static ClashKind? PairClash(Tag a, Tag b, Meeting meeting)
    {
        if (meeting != Meeting.Target || a.Between is null || b.Between is null)
            return null;
        bool symmetric = a.Kind is QuantityKind.LorentzFactor or QuantityKind.Rapidity or QuantityKind.Unspecified;
        return (symmetric ? a.Between.RelatesSame(b.Between) : a.Between.Equals(b.Between)) ? null : ClashKind.FramePair;
    }

    private static ClashKind? PassageClash(Tag a, Tag b, Meeting meeting)
        => meeting is Meeting.Sum or Meeting.Difference or Meeting.Comparison
            && a.Passage is not null && b.Passage is not null && a.Passage != b.Passage
            ? ClashKind.Passage
            : null;

    private static Tag Joined(Tag a, Tag b, Meeting meeting, Scale? scale, bool kindsClash)
    {
        bool target = meeting == Meeting.Target;
        bool invariantDifference = meeting == Meeting.Difference && a.IsQuadratic && b.IsQuadratic;
        QuantityKind kind = KindAlgebra.Joined(a.Kind, b.Kind, meeting);
        ClockTag? clock = target ? b.Clock ?? a.Clock : JoinedClock(a, b);
        if (meeting == Meeting.Difference && a.Clock is not null && b.Clock is not null && !a.Clock.Equals(b.Clock)
            && a.Kind != QuantityKind.Epoch)
        {
            kind = QuantityKind.ClockOffset;
        }
        else if (kindsClash && !target && meeting != Meeting.Difference)
        {
            kind = QuantityKind.Unspecified;
        }

        return new Tag
        {
            Dimension = target ? b.Dimension ?? a.Dimension : a.Dimension == b.Dimension ? a.Dimension : null,
            Scale = target ? b.Scale ?? scale : a.Dimension == b.Dimension ? scale : null,
            Natural = a.Natural,
            UnitText = target ? b.UnitText ?? a.UnitText : a.Scale == b.Scale ? a.UnitText ?? b.UnitText : null,
            Frame = target ? b.Frame ?? a.Frame : invariantDifference ? null : JoinedFrame(a, b),
            Clock = clock,
            Kind = kind,
            Between = target ? b.Between ?? a.Between : JoinedPair(a, b, meeting),
            Speed = target ? a.Speed ?? b.Speed : meeting == Meeting.Choice ? SpeedRange.Hull(a.Speed, b.Speed) : null,
            Passage = target ? a.Passage : a.Passage == b.Passage ? a.Passage : null,
            IsConstant = !target && a.IsConstant && b.IsConstant,
            IsQuadratic = !target && a.IsQuadratic && b.IsQuadratic && !invariantDifference,
            Misuse = target ? Misuse.None : a.Misuse == b.Misuse ? a.Misuse : Misuse.None,
        };
    }

    private static FrameTag? JoinedFrame(Tag a, Tag b)
    {
        if (a.Frame is null)
            return a.IsInvariant ? b.Frame : null;
        if (b.Frame is null)
            return b.IsInvariant ? a.Frame : null;
        return Same(a.Frame, b.Frame);
    }

    // A date and a duration: the date's scale stays. A reading corrected by an offset is another clock's reading.
    private static ClockTag? JoinedClock(Tag a, Tag b)
    {
        if (IsOffset(a) || IsOffset(b))
            return IsOffset(a) && IsOffset(b) ? Same(a.Clock, b.Clock) : null;
        if ((a.Kind == QuantityKind.Epoch) != (b.Kind == QuantityKind.Epoch))
            return a.Kind == QuantityKind.Epoch ? a.Clock : b.Clock;
        return Same(a.Clock, b.Clock);
    }

    // Collinear rapidities chain: from A to B and from B to C.
    private static ClockPair? JoinedPair(Tag a, Tag b, Meeting meeting)
    {
        if (meeting == Meeting.Sum && a is { Kind: QuantityKind.Rapidity, Between: { } first }
            && b is { Kind: QuantityKind.Rapidity, Between: { } second } && first.Other.Equals(second.Frame))
        {
            return new(first.Frame, second.Other);
        }

        return Same(a.Between, b.Between);
    }

    private static T? Same<T>(T? left, T? right)
        where T : class, IEquatable<T>
        => left is not null && right is not null && left.Equals(right) ? left : null;
}
