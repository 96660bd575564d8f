using System;

namespace FrameSafe.Analyzers.Tags;

/// <summary>
/// What is known of a number: dimension, unit, frame or clock, kind. Immutable and compared by value; what is not known is
/// null (<see cref="QuantityKind.Unspecified"/> for the kind). Where a tag came from is kept by those who carry it.
/// </summary>
internal sealed record Tag
{
    /// <summary>Nothing is known. Whatever meets it is silent, and unknown.</summary>
    public static Tag Unknown { get; } = new();

    /// <summary>Zero, infinity, NaN, the largest double: a literal that fits every unit and frame.</summary>
    public static Tag Neutral { get; } = new() { IsNeutral = true, IsConstant = true };

    /// <summary>A literal plain number: 2, 0.5, 4/3, π.</summary>
    public static Tag Plain { get; } = new()
    {
        Dimension = Dimension.One,
        Scale = Scale.One,
        Kind = QuantityKind.Number,
        IsConstant = true,
    };

    public Dimension? Dimension { get; init; }

    /// <summary>The factor to the coherent SI unit; in a natural system, to its one representative.</summary>
    public Scale? Scale { get; init; }

    /// <summary>
    /// A factor that the number was multiplied by and that may or may not have been meant as a conversion (1000, π/180, 3600):
    /// the number's unit is <see cref="Scale"/> or <see cref="Scale"/> / Conversion, whichever fits. Null where there is no doubt.
    /// </summary>
    public Scale? Conversion { get; init; }

    public NaturalSystem Natural { get; init; }

    /// <summary>The frame it is measured in. Null: not known, or there is none because it is invariant.</summary>
    public FrameTag? Frame { get; init; }

    /// <summary>The clock or time scale that tells it.</summary>
    public ClockTag? Clock { get; init; }

    public QuantityKind Kind { get; init; }

    /// <summary>The frames that a Lorentz factor or its like relates.</summary>
    public ClockPair? Between { get; init; }

    /// <summary>Bounds of its speed.</summary>
    public SpeedRange? Speed { get; init; }

    /// <summary>The transform (an identity among those of one body) that brought it into its frame; null: declared, or not known.</summary>
    public string? Passage { get; init; }

    /// <summary>A literal, or a constant of nature: the same in every frame.</summary>
    public bool IsConstant { get; init; }

    /// <summary>Fits everything it meets in a sum or comparison.</summary>
    public bool IsNeutral { get; init; }

    /// <summary>A square, or a sum of squares, of a number of a frame: differences of such may be invariants.</summary>
    public bool IsQuadratic { get; init; }

    public Misuse Misuse { get; init; }

    /// <summary>The unit as it was declared, for messages; no part of equality. See <see cref="DescribeUnit"/>.</summary>
    public string? UnitText { get; init; }

    /// <summary>A literal number without dimension: it keeps the frame and the kind of what it multiplies.</summary>
    public bool IsPure => IsConstant && !IsNeutral && Dimension is { IsOne: true } && Scale is { IsOne: true };

    /// <summary>Whether nothing at all is known.</summary>
    public bool IsUnknown => Equals(Unknown);

    /// <summary>
    /// The same in every frame, so that a product keeps the frame of the other factor: constants, rest masses and charges,
    /// proper times and lengths, invariants.
    /// </summary>
    public bool IsInvariant
        => IsConstant || Kind is QuantityKind.Number or QuantityKind.Mass or QuantityKind.InvariantMass or QuantityKind.ProperTime
            or QuantityKind.ProperLength or QuantityKind.ProperAcceleration or QuantityKind.RestEnergy or QuantityKind.Interval
            || (Frame is null && Kind == QuantityKind.Unspecified && Dimension is not null
                && (Dimension == Dimension.Mass || Dimension == Dimension.Charge));

    /// <summary>
    /// The tag that declarations add up to. The kind, where it is not said, is what frame, clock and unit decide together: a
    /// time in a frame is its coordinate time, a time by a clock a proper time, a speed in a frame a velocity.
    /// </summary>
    public static Tag Declared(
        Unit? unit = null,
        FrameTag? frame = null,
        ClockTag? clock = null,
        QuantityKind kind = QuantityKind.Unspecified,
        ClockPair? between = null,
        SpeedRange? speed = null)
    {
        if (kind == QuantityKind.Unspecified && unit is not null)
            kind = unit.ImpliedKind;
        if (kind == QuantityKind.Unspecified)
            kind = ImpliedKind(unit, frame, clock, between);
        if (unit is null && IsNumberByNature(kind))
            unit = Unit.One;
        return new Tag
        {
            Dimension = unit?.Dimension,
            Scale = unit?.Scale,
            Natural = unit?.Natural ?? NaturalSystem.None,
            UnitText = unit?.Text,
            Frame = frame,
            Clock = clock,
            Kind = kind,
            Between = between,
            Speed = speed,
        };
    }

    public bool Equals(Tag? other)
        => ReferenceEquals(this, other)
            || (other is not null
                && Dimension == other.Dimension
                && Scale == other.Scale
                && Conversion == other.Conversion
                && Natural == other.Natural
                && Equals(Frame, other.Frame)
                && Equals(Clock, other.Clock)
                && Kind == other.Kind
                && Equals(Between, other.Between)
                && Equals(Speed, other.Speed)
                && Passage == other.Passage
                && IsConstant == other.IsConstant
                && IsNeutral == other.IsNeutral
                && IsQuadratic == other.IsQuadratic
                && Misuse == other.Misuse);

    public override int GetHashCode()
        => unchecked((((Dimension?.GetHashCode() ?? 0) * 397) ^ (Frame?.GetHashCode() ?? 0) ^ (Clock?.GetHashCode() ?? 0)) * 31)
            + (int)Kind;

    /// <summary>The unit in words for a message: as it was declared, else a usual symbol, else in SI base units; null if not known.</summary>
    public string? DescribeUnit() => UnitText ?? UnitNames.Describe(Dimension, Scale);

    public override string ToString()
        => string.Join(
            " ",
            new object?[] { DescribeUnit() ?? "?", Frame, Clock, Kind == QuantityKind.Unspecified ? null : Kind }.AsNotNull());

    private static QuantityKind ImpliedKind(Unit? unit, FrameTag? frame, ClockTag? clock, ClockPair? between)
    {
        if (unit is null || unit.Natural != NaturalSystem.None)
            return QuantityKind.Unspecified;
        if (unit.Dimension == Dimension.Time)
        {
            return clock is { IsTimeScale: false } ? QuantityKind.ProperTime
                : clock is null && frame is not null ? QuantityKind.CoordinateTime
                : QuantityKind.Unspecified;
        }

        return unit.Dimension == Dimension.Speed && frame is not null && between is null
            ? QuantityKind.Velocity
            : QuantityKind.Unspecified;
    }

    // Kinds that are ratios: without a unit they are plain numbers.
    private static bool IsNumberByNature(QuantityKind kind)
        => kind is QuantityKind.Number or QuantityKind.Direction or QuantityKind.SpeedRatio or QuantityKind.CelerityRatio
            or QuantityKind.Rapidity or QuantityKind.LorentzFactor or QuantityKind.DopplerFactor or QuantityKind.ClockRate;
}
