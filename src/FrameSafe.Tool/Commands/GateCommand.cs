using System.CommandLine;
using System.Globalization;
using FrameSafe.Tool.Gating;
using FrameSafe.Tool.Reports;
using FrameSafe.Tool.Surveying;

namespace FrameSafe.Tool.Commands;

/// <summary><c>framesafe gate</c>: passes where a survey holds nothing that the ledger does not, and the ledger nothing that is gone.</summary>
internal static class GateCommand
{
    internal static Command Create()
    {
        Argument<string> path = Running.PathArgument();
        var ledgerFile = new Option<string>("--ledger", "-l") { Description = "The ledger of accepted findings.", Required = true };
        var start = new Option<bool>("--start") { Description = "Write the first ledger from what is found now; an existing one is not touched." };
        var shrink = new Option<bool>("--shrink") { Description = "Take out of the ledger what is gone; nothing is ever put in." };
        var command = new Command(
            "gate",
            """
            Pass or fail against a ledger of accepted findings, which may only shrink.

            Fails on a finding that the ledger does not hold, on an entry that is gone (until --shrink takes it out), and on
            coverage of tags below the ledger's. New findings are printed as file(line,column): warning ID: message.

            Exit codes: 0 pass, 1 fail, 2 bad input, 3 a project does not compile.

            Examples:
              framesafe gate Mission.sln --ledger framesafe.ledger --start
              framesafe gate Mission.sln --ledger framesafe.ledger
              framesafe gate Mission.sln --ledger framesafe.ledger --shrink
            """)
        { path, ledgerFile, start, shrink };
        command.SetAction((parsed, cancellation) => Running.RunAsync(async () =>
        {
            string file = parsed.GetValue(ledgerFile)!;
            bool starts = parsed.GetValue(start);
            FileReport.CheckWritable(file);
            if (starts && File.Exists(file))
                throw new BadInputException($"{file}: exists already; a ledger is started once, and then only shrinks.");
            Ledger? ledger = starts ? null : Ledger.Read(file);
            Survey survey = await Running.WithSolutionAsync(
                parsed.GetValue(path)!, (loaded, tell) => Surveyor.RunAsync(loaded, tell, cancellation), cancellation);
            if (survey.CompileErrors.Count > 0)
            {
                foreach ((string project, string error) in survey.CompileErrors)
                    Console.WriteLine($"{project} does not compile, so nothing can be said for it: {error}");
                return ExitCode.DoesNotCompile;
            }

            var current = Ledger.Of(survey);
            if (ledger is null)
            {
                FileReport.Write(file, current.ToText());
                Console.WriteLine($"Ledger started with {Screen.Count(survey.Findings.Count)}: {file}");
                return ExitCode.Clean;
            }

            return Judge(ledger, current, survey, file, parsed.GetValue(shrink));
        }));
        return command;
    }

    private static int Judge(Ledger ledger, Ledger current, Survey survey, string file, bool shrinks)
    {
        (IReadOnlyList<LedgerEntry> added, IReadOnlyList<LedgerEntry> gone) = ledger.Compare(current);
        foreach (LedgerEntry entry in added)
        {
            // Of findings alike the later ones count as the new ones.
            foreach (Finding finding in survey.Findings
                .Where(finding => (finding.Rule, finding.Place.Path, finding.Member, finding.SourceLine) == (entry.Rule, entry.File, entry.Member, entry.Code))
                .TakeLast(entry.Count))
            {
                Console.WriteLine($"{finding.Place.Path}({finding.Place.Line},{finding.Place.Column}): warning {finding.Rule}: {finding.Message}");
            }
        }

        bool covered = current.CoveragePerMille >= ledger.CoveragePerMille;
        if (!covered)
            Console.WriteLine($"Coverage of tags fell to {PerCent(current.CoveragePerMille)} from {PerCent(ledger.CoveragePerMille)}.");
        if (gone.Count > 0 && !shrinks)
        {
            foreach (LedgerEntry entry in gone)
                Console.WriteLine($"{entry.File}: {entry.Rule} in {entry.Member} is gone from the code ({entry.Code}); take it out of the ledger with --shrink.");
        }

        if (shrinks && (gone.Count > 0 || current.CoveragePerMille > ledger.CoveragePerMille))
        {
            FileReport.Write(file, ledger.Shrunk(current).ToText());
            Console.WriteLine($"Ledger shrunk by {Screen.Count(gone.Sum(entry => entry.Count))}: {file}");
        }

        bool passes = added.Count == 0 && covered && (gone.Count == 0 || shrinks);
        Console.WriteLine(passes
            ? $"Gate passed: {Screen.Count(survey.Findings.Count)}, all of them in the ledger."
            : $"Gate failed: {added.Sum(entry => entry.Count)} new, {gone.Sum(entry => entry.Count)} gone.");
        return passes ? ExitCode.Clean : ExitCode.Findings;
    }

    private static string PerCent(int perMille) => (perMille / 10.0).ToString("0.0", CultureInfo.InvariantCulture) + " %";
}
