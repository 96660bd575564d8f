using System.Text;

namespace FrameSafe.Analyzers.Tags;

/// <summary>Exponents in raised figures, as they stand behind a unit.</summary>
internal static class Superscript
{
    private const string Digits = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    /// <summary><c>²</c>, <c>⁻¹</c>; nothing for one; fractions in the plain form <c>^(1/2)</c>, which has no raised sign.</summary>
    internal static string Of(Rational exponent)
    {
        if (exponent == Rational.One)
            return "";
        if (!exponent.IsInteger)
            return "^(" + exponent + ")";

        var text = new StringBuilder();
        foreach (char c in exponent.ToString())
            text.Append(c == '-' ? '⁻' : Digits[c - '0']);
        return text.ToString();
    }

    /// <summary>The plain character of a raised one (<c>²</c> → <c>2</c>, <c>⁻</c> → <c>-</c>), or null.</summary>
    internal static char? ToPlain(char raised)
    {
        int digit = Digits.IndexOf(raised);
        return digit >= 0 ? (char)('0' + digit) : raised switch { '⁻' => '-', '⁺' => '+', _ => null };
    }
}
