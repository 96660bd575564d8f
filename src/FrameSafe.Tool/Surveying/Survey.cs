namespace FrameSafe.Tool.Surveying;

/// <summary>What a survey found.</summary>
/// <param name="Root">The folder that paths are relative to.</param>
/// <param name="Findings">The findings, in the order of path and line.</param>
/// <param name="Coverage">The coverage of tags, a row for each project.</param>
/// <param name="CompileErrors">The compiler's errors by project, for the projects that do not compile.</param>
/// <param name="Lines">How many lines were read.</param>
/// <param name="Chart">The frames, how they move, and where numbers cross.</param>
internal sealed record Survey(
    string Root,
    IReadOnlyList<Finding> Findings,
    IReadOnlyList<ProjectCoverage> Coverage,
    IReadOnlyDictionary<string, string> CompileErrors,
    int Lines,
    FrameChart Chart);

/// <summary>How many of the numbers in a project's signatures, fields and properties carry a tag.</summary>
internal sealed record ProjectCoverage(string Project, int Tagged, int Numbers)
{
    /// <summary>From 0 to 1; of no numbers, 1.</summary>
    internal double Share => Numbers == 0 ? 1 : (double)Tagged / Numbers;
}
