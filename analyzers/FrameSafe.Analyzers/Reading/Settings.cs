using System.Globalization;
using Microsoft.CodeAnalysis.Diagnostics;

namespace FrameSafe.Analyzers.Reading;

/// <summary>What <c>.editorconfig</c> and global configs say, for one tree.</summary>
internal static class Settings
{
    internal const string ErrorBudget = "framesafe.error_budget";

    /// <summary>The relative error that a project bears where it says nothing.</summary>
    internal const double DefaultErrorBudget = 1e-9;

    /// <summary>The error budget; the default where it is not set or cannot be read, with the text that cannot be.</summary>
    internal static double Budget(AnalyzerConfigOptions options, out string? unreadable)
    {
        unreadable = null;
        if (!options.TryGetValue(ErrorBudget, out string? text))
            return DefaultErrorBudget;
        if (double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out double budget)
            && budget > 0 && !double.IsInfinity(budget))
        {
            return budget;
        }

        unreadable = text;
        return DefaultErrorBudget;
    }
}
