namespace FrameSafe.Analyzers.Tags;

/// <summary>One symbol of the table of units.</summary>
/// <param name="Text">The symbol.</param>
/// <param name="Dimension">Its dimension.</param>
/// <param name="Scale">The exact factor to the coherent SI unit.</param>
/// <param name="TakesPrefixes">Whether SI prefixes may stand before it.</param>
/// <param name="Kind">The kind of quantity that it is reserved for.</param>
/// <param name="IsAffine">Whether it counts from a zero of its own.</param>
internal sealed record UnitSymbol(
    string Text,
    Dimension Dimension,
    Scale Scale,
    bool TakesPrefixes,
    QuantityKind Kind = QuantityKind.Unspecified,
    bool IsAffine = false);
