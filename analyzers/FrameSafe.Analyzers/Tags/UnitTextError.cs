namespace FrameSafe.Analyzers.Tags;

/// <summary>Why a unit text cannot be read, and where.</summary>
/// <param name="Reason">What is wrong.</param>
/// <param name="Column">Where in the text, from 0.</param>
/// <param name="Length">How many characters are wrong; 0 where something is missing.</param>
/// <param name="Symbol">The offending characters.</param>
/// <param name="Nearest">The nearest known symbol (or unit text), or null if none is near.</param>
internal sealed record UnitTextError(UnitTextReason Reason, int Column, int Length, string Symbol, string? Nearest = null)
{
    /// <summary>The reason in words, without place or remedy.</summary>
    public string Message => Reason switch
    {
        UnitTextReason.Empty => "no unit is given; a plain number has the unit `1`",
        UnitTextReason.UnknownSymbol => "`" + Symbol + "` is no unit symbol",
        UnitTextReason.UnexpectedCharacter => "`" + Symbol + "` has no meaning here",
        UnitTextReason.MissingUnit => "a unit is missing",
        UnitTextReason.MissingParenthesis => "a closing parenthesis is missing",
        UnitTextReason.BadPower => "`" + Symbol + "` is no power: an integer or a fraction in parentheses is wanted",
        UnitTextReason.AmbiguousProduct => "a product written with a space behind a solidus can be read in two ways; parentheses tell which",
        UnitTextReason.Logarithmic => "`" + Symbol + "` is a logarithmic unit; numbers in it do not add as quantities do",
        UnitTextReason.Affine => "`" + Symbol + "` counts from a zero of its own and cannot be part of a compound; `K` can",
        UnitTextReason.TooLarge => "its factor or power is too large",
        _ => "it is longer than a unit text can be",
    };
}

/// <summary>What can be wrong with a unit text.</summary>
internal enum UnitTextReason
{
    Empty,
    UnknownSymbol,
    UnexpectedCharacter,
    MissingUnit,
    MissingParenthesis,
    BadPower,
    AmbiguousProduct,
    Logarithmic,
    Affine,
    TooLarge,
    TooLong,
}
