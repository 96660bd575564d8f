using FrameSafe.Tool.Charting;

namespace FrameSafe.Tool.Surveying;

/// <summary>What a survey found.</summary>
/// <param name="Findings">The findings, in the order of path and line.</param>
/// <param name="Coverage">The coverage of tags, a row for each file of each project.</param>
/// <param name="Chart">The frames, how they move against one another, and where numbers cross between them.</param>
/// <param name="Troubles">Why some of it may be missing: projects that do not compile, chiefly.</param>
/// <param name="Lines">How many lines were read.</param>
internal sealed record Survey(
    IReadOnlyList<Finding> Findings,
    IReadOnlyList<FileCoverage> Coverage,
    FrameChart Chart,
    IReadOnlyList<Trouble> Troubles,
    int Lines)
{
    internal static Survey Nothing { get; } = new([], [], FrameChart.Empty, [], 0);

    internal int Tagged => Coverage.Sum(row => row.Tagged);

    internal int Numbers => Coverage.Sum(row => row.Numbers);

    /// <summary>One survey of parts that were surveyed apart. A file that several projects compile is found once.</summary>
    internal static Survey Merge(IReadOnlyCollection<Survey> parts) => new(
        [
            .. parts.SelectMany(part => part.Findings)
                .DistinctBy(finding => (finding.Rule, finding.Place, finding.Message))
                .OrderBy(finding => finding.Place.Path, StringComparer.Ordinal)
                .ThenBy(finding => finding.Place.Line)
                .ThenBy(finding => finding.Place.Column)
                .ThenBy(finding => finding.Rule, StringComparer.Ordinal),
        ],
        [
            .. parts.SelectMany(part => part.Coverage)
                .DistinctBy(row => (row.Project, row.File))
                .OrderBy(row => row.Project, StringComparer.Ordinal)
                .ThenBy(row => row.File, StringComparer.Ordinal),
        ],
        FrameChart.Merge(parts.Select(part => part.Chart)),
        [.. parts.SelectMany(part => part.Troubles).Distinct().OrderBy(trouble => trouble.Project, StringComparer.Ordinal)],
        parts.Sum(part => part.Lines));
}

/// <summary>Why a project could not be surveyed whole.</summary>
/// <param name="Project">The project.</param>
/// <param name="What">What is wrong with it: "does not compile".</param>
/// <param name="Detail">The first message that says so.</param>
internal sealed record Trouble(string Project, string What, string Detail)
{
    public override string ToString() => $"{Project} {What} and was surveyed as far as it could be: {Detail}";
}

/// <summary>How many of the numbers in a file's signatures, fields and properties carry a tag, and which do not.</summary>
internal sealed record FileCoverage(string Project, string File, int Tagged, int Numbers, IReadOnlyList<UntaggedNumber> Untagged)
{
    /// <summary>From 0 to 1; of no numbers, 1.</summary>
    internal double Share => Numbers == 0 ? 1 : (double)Tagged / Numbers;
}

/// <summary>A number without a tag.</summary>
/// <param name="Line">The line of its declaration, from 1.</param>
/// <param name="Name">Its name, with the member it belongs to: <c>Orbit.Period</c>, <c>Orbit.At(time)</c>.</param>
internal sealed record UntaggedNumber(int Line, string Name);
