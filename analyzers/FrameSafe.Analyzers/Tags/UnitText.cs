using System.Diagnostics.CodeAnalysis;

namespace FrameSafe.Analyzers.Tags;

/// <summary>
/// Reads unit texts in the notation of the SI Brochure (9th ed., chapter 5: <c>km/s</c>, <c>kg·m²·s⁻¹</c>, <c>m s⁻²</c>), in UCUM
/// notation (<c>m/s2</c>, <c>10*-3.m</c>, <c>[kn_i]</c>, <c>{turns}/s</c>) and in the trade's (<c>GeV/c2</c>, <c>V/sqrt(Hz)</c>).
/// Numbers in natural units name their system at the end: <c>GeV [c=1]</c>, see <see cref="NaturalSystem"/>.
/// </summary>
internal static class UnitText
{
    /// <summary>The longest text that is read.</summary>
    internal const int MaxLength = 120;

    /// <summary>The unit of the text; or what is wrong with it. It never throws and takes bounded time.</summary>
    internal static bool TryRead(
        string? text,
        [NotNullWhen(true)] out Unit? unit,
        [NotNullWhen(false)] out UnitTextError? error)
    {
        unit = null;
        error = null;
        text ??= "";
        if (text.Length > MaxLength)
        {
            error = new(UnitTextReason.TooLong, MaxLength, text.Length - MaxLength, text.Substring(MaxLength, 1));
            return false;
        }

        return new UnitTextReader(text).TryRead(out unit, out error);
    }
}
