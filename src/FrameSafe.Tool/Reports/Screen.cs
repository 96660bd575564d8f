using System.Globalization;
using FrameSafe.Tool.Surveying;
using Spectre.Console;

namespace FrameSafe.Tool.Reports;

/// <summary>What people see: findings with their source lines, a summary by rule, the coverage.</summary>
internal sealed class Screen(IAnsiConsole console, bool quiet)
{
    // More is for the report file; a terminal drowns.
    private const int MostShown = 200;

    internal IAnsiConsole Console { get; } = console;

    internal static Screen For(TextWriter writer, bool quiet)
    {
        IAnsiConsole console = AnsiConsole.Create(new AnsiConsoleSettings { Out = new AnsiConsoleOutput(writer) });
        // A pipe or a file has no width of its own; lines are then left as long as they are.
        if (!console.Profile.Capabilities.Interactive && (writer != System.Console.Out || System.Console.IsOutputRedirected))
            console.Profile.Width = 160;
        return new(console, quiet);
    }

    internal void Show(Survey survey)
    {
        if (!quiet)
        {
            foreach (Finding finding in survey.Findings.Take(MostShown))
            {
                Console.MarkupLineInterpolated($"[bold]{finding.Place.Path}({finding.Place.Line},{finding.Place.Column})[/] [yellow]{finding.Rule}[/]{(finding.Member.Length > 0 ? " in " + finding.Member : "")}");
                Console.WriteLine("    " + finding.SourceLine);
                Console.WriteLine("    " + finding.Message);
                Console.WriteLine();
            }

            if (survey.Findings.Count > MostShown)
                Console.WriteLine($"… and {survey.Findings.Count - MostShown} more; a report file holds them all.");
        }

        if (survey.Findings.Count > 0)
            Console.Write(Summary(survey));
        foreach (Trouble trouble in survey.Troubles)
            Console.MarkupLineInterpolated($"[red]{trouble.ToString()}[/]");
        ShowCoverage(survey);
        Console.WriteLine(survey.Findings.Count == 0 ? "No findings." : Count(survey.Findings.Count) + ".");
    }

    internal static string Count(int findings) => findings == 1 ? "1 finding" : findings.ToString("N0", CultureInfo.InvariantCulture) + " findings";

    internal static string Percent(double share) => (share * 100).ToString("0.#", CultureInfo.InvariantCulture) + " %";

    private static Table Summary(Survey survey)
    {
        Dictionary<string, string> titles = Surveyor.Rules.ToDictionary(rule => rule.Id, rule => rule.Title.ToString());
        Table table = new Table().Border(TableBorder.Simple)
            .AddColumn("rule").AddColumn("what").AddColumn(new TableColumn("findings").RightAligned()).AddColumn(new TableColumn("worst error").RightAligned());
        foreach (IGrouping<string, Finding> rule in survey.Findings.GroupBy(finding => finding.Rule).OrderBy(group => group.Key, StringComparer.Ordinal))
        {
            double? worst = rule.Max(finding => finding.Error);
            table.AddRow(
                new Text(rule.Key),
                new Text(titles.GetValueOrDefault(rule.Key, "")),
                new Text(rule.Count().ToString("N0", CultureInfo.InvariantCulture)),
                new Text(worst is { } error ? Analyzers.Rules.ErrorText.Size(error) : ""));
        }

        return table;
    }

    private void ShowCoverage(Survey survey)
    {
        (string Project, int Tagged, int Numbers)[] projects =
        [
            .. survey.Coverage.GroupBy(row => row.Project).Select(group => (group.Key, group.Sum(row => row.Tagged), group.Sum(row => row.Numbers))),
        ];
        if (projects.Length > 1 && !quiet)
        {
            foreach ((string project, int tagged, int numbers) in projects)
                Console.WriteLine($"  coverage of {project}: {tagged} of {numbers} numbers tagged ({Percent((double)tagged / numbers)})");
        }

        double share = survey.Numbers == 0 ? 1 : (double)survey.Tagged / survey.Numbers;
        Console.WriteLine($"Coverage: {survey.Tagged} of {survey.Numbers} numbers in signatures, fields and properties carry a tag ({Percent(share)}).");
    }
}
