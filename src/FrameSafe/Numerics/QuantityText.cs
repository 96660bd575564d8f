using System.Globalization;

namespace FrameSafe;

/// <summary>How quantities are written: the number, a space, the unit (SI Brochure, section 5.4.3), and whose it is.</summary>
internal static class QuantityText
{
    internal static string Of(double value, string unit, string whose, string? format, IFormatProvider? provider)
        => Number(value, format, provider) + (unit.Length == 0 ? "" : " " + unit) + whose;

    internal static string Of(Triple value, string unit, string whose, string? format, IFormatProvider? provider)
    {
        CultureInfo culture = provider as CultureInfo ?? CultureInfo.InvariantCulture;
        string separator = culture.NumberFormat.NumberDecimalSeparator == "," ? "; " : ", ";
        return "(" + Number(value.X, format, provider) + separator + Number(value.Y, format, provider) + separator
            + Number(value.Z, format, provider) + ")" + (unit.Length == 0 ? "" : " " + unit) + whose;
    }

    internal static string In<TFrame>() => " in " + typeof(TFrame).Name;

    internal static string By<TClock>() => " by " + typeof(TClock).Name;

    internal static string Between<TFrame, TOther>() => " of " + typeof(TOther).Name + " in " + typeof(TFrame).Name;

    private static string Number(double value, string? format, IFormatProvider? provider)
        => value.ToString(format, provider ?? CultureInfo.InvariantCulture);
}
