using System.Runtime.CompilerServices;

namespace FrameSafe;

/// <summary>Refuses an argument outside its range, and names it, its value and the range.</summary>
internal static class Require
{
    internal static double Positive(double value, [CallerArgumentExpression(nameof(value))] string parameter = "") =>
        value > 0 && double.IsFinite(value) ? value : throw Outside(value, parameter, "above 0 and finite");

    internal static double NotNegative(double value, [CallerArgumentExpression(nameof(value))] string parameter = "") =>
        value >= 0 && double.IsFinite(value) ? value : throw Outside(value, parameter, "from 0 on and finite");

    internal static double Finite(double value, [CallerArgumentExpression(nameof(value))] string parameter = "") =>
        double.IsFinite(value) ? value : throw Outside(value, parameter, "finite");

    internal static double Within(double value, double lowest, double highest, [CallerArgumentExpression(nameof(value))] string parameter = "") =>
        value >= lowest && value <= highest
            ? value
            : throw Outside(value, parameter, FormattableString.Invariant($"from {lowest:R} to {highest:R}"));

    internal static double Above(double value, double bound, string boundName, [CallerArgumentExpression(nameof(value))] string parameter = "") =>
        value > bound && double.IsFinite(value)
            ? value
            : throw Outside(value, parameter, FormattableString.Invariant($"above {boundName} ({bound:R}) and finite"));

    internal static ArgumentOutOfRangeException Outside(double value, string parameter, string range) =>
        new(parameter, value, FormattableString.Invariant($"{parameter} must be {range}; it is {value:R}."));
}
