using System.Globalization;

namespace FrameSafe.Analyzers.Rules;

/// <summary>Computed errors in words.</summary>
internal static class ErrorText
{
    /// <summary>"wrong by up to 2.6 % (speeds up to 0.16 c; budget 1e-9)".</summary>
    internal static string WrongBy(double error, string speeds, double budget)
        => "wrong by up to " + Size(error) + " (" + speeds + "; budget " + Number(budget) + ")";

    internal static string SpeedsUpTo(double most) => "speeds up to " + Speed(most) + " c";

    internal static string Speeds(double one, double other)
        => one == other ? SpeedsUpTo(one) : "speeds up to " + Speed(one) + " c and " + Speed(other) + " c";

    // What distinguishes large speeds is how little they lack.
    private static string Speed(double speed) => speed > 0.99 ? speed.ToString("R", CultureInfo.InvariantCulture) : Number(speed);

    /// <summary>A relative error: in per cent from a thousandth on, else as a power of ten; two digits.</summary>
    internal static string Size(double error) => error >= 1e-3
        ? (error * 100).ToString(error >= 1 ? "0" : error >= 0.1 ? "0.#" : "0.##", CultureInfo.InvariantCulture) + " %"
        : Number(error);

    /// <summary>A number with few digits, in the shorter of the usual spellings.</summary>
    internal static string Number(double value)
        => value is >= 1e-3 and < 1e4
            ? double.Parse(value.ToString("G3", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture).ToString("0.######", CultureInfo.InvariantCulture)
            : value.ToString("0.#e-0", CultureInfo.InvariantCulture);
}
