using System.Text.Json;

namespace FrameSafe.Tests.TimeScales;

/// <summary>The dates converted by ERFA that stand in <c>erfa-dates.json</c>, with their origin.</summary>
internal static class ErfaDates
{
    private static readonly JsonDocument Document =
        JsonDocument.Parse(File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "TimeScales", "erfa-dates.json")));

    internal static TheoryData<double[]> Rows(string table)
    {
        TheoryData<double[]> rows = [];
        foreach (JsonElement row in Document.RootElement.GetProperty(table).EnumerateArray())
            rows.Add(row.EnumerateArray().Select(cell => cell.GetDouble()).ToArray());
        return rows;
    }

    /// <summary>How far an epoch is from a two-part Julian Date, in seconds; without the rounding of a whole date.</summary>
    internal static double SecondsFrom<TScale>(Epoch<TScale> epoch, double part1, double part2) where TScale : struct, ITimeScale =>
        ((epoch.JulianDateOfMidnight - part1) + (epoch.DayFraction - part2)) * 86400;
}
