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
        foreach ((string project, string error) in survey.CompileErrors)
            Console.MarkupLineInterpolated($"[red]{project} does not compile[/] and was surveyed as far as it could be: {error}");
        ShowCoverage(survey);
        Console.WriteLine(survey.Findings.Count == 0 ? "No findings." : Count(survey.Findings.Count) + ".");
    }

    internal static string Count(int findings) => findings == 1 ? "1 finding" : findings.ToString("N0", CultureInfo.InvariantCulture) + " findings";

    private static Table Summary(Survey survey)
    {
        Dictionary<string, string> titles = Surveyor.Analyzers[0].SupportedDiagnostics.ToDictionary(rule => rule.Id, rule => rule.Title.ToString());
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
        int tagged = survey.Coverage.Sum(row => row.Tagged);
        int numbers = survey.Coverage.Sum(row => row.Numbers);
        if (survey.Coverage.Count > 1 && !quiet)
        {
            foreach (ProjectCoverage row in survey.Coverage.Where(row => row.Numbers > 0))
                Console.WriteLine($"  coverage of {row.Project}: {row.Tagged} of {row.Numbers} numbers tagged ({Percent(row.Share)})");
        }

        Console.WriteLine($"Coverage: {tagged} of {numbers} numbers in signatures, fields and properties carry a tag ({Percent(numbers == 0 ? 1 : (double)tagged / numbers)}).");
    }

    private static string Percent(double share) => (share * 100).ToString("0.#", CultureInfo.InvariantCulture) + " %";
}
