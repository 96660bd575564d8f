using System;

namespace FrameSafe.Analyzers.Tags;

/// <summary>
/// A unit: a dimension and the exact factor to the coherent SI unit, with what its text implies beyond them. Equality is by
/// meaning: <c>J</c> and <c>kg·m²/s²</c> differ only in the kind that they imply.
/// </summary>
internal sealed class Unit : IEquatable<Unit>
{
    public Unit(
        Dimension dimension,
        Scale scale,
        string text,
        QuantityKind impliedKind = QuantityKind.Unspecified,
        NaturalSystem natural = NaturalSystem.None,
        bool isAffine = false)
    {
        Dimension = dimension;
        Scale = scale;
        Text = text;
        ImpliedKind = impliedKind;
        Natural = natural;
        IsAffine = isAffine;
    }

    /// <summary>The plain number's unit.</summary>
    public static Unit One { get; } = new(Dimension.One, Scale.One, "1");

    public Dimension Dimension { get; }

    /// <summary>The factor to the coherent SI unit.</summary>
    public Scale Scale { get; }

    /// <summary>The text that it was read from, or that describes it.</summary>
    public string Text { get; }

    /// <summary>The kind of quantity that this unit is reserved for: <c>rad</c> an angle, <c>Hz</c> a frequency, <c>Bq</c> an activity.</summary>
    public QuantityKind ImpliedKind { get; }

    public NaturalSystem Natural { get; }

    /// <summary>Counts from a zero of its own (°C): a factor alone does not convert it.</summary>
    public bool IsAffine { get; }

    public bool Equals(Unit? other)
        => other is not null && Dimension == other.Dimension && Scale == other.Scale && Natural == other.Natural
            && IsAffine == other.IsAffine && ImpliedKind == other.ImpliedKind;

    public override bool Equals(object? obj) => Equals(obj as Unit);

    public override int GetHashCode() => unchecked((Dimension.GetHashCode() * 397) ^ Scale.GetHashCode());

    public override string ToString() => Text;
}
