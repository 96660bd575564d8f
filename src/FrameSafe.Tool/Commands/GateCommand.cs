using System.CommandLine;
using FrameSafe.Tool.Gating;
using FrameSafe.Tool.Reports;
using FrameSafe.Tool.Surveying;

namespace FrameSafe.Tool.Commands;

/// <summary><c>framesafe gate</c>: passes where a survey holds nothing that the ledger does not, and the ledger nothing that is gone.</summary>
internal static class GateCommand
{
    internal static Command Create()
    {
        Argument<string[]> sources = Running.SourcesArgument();
        var ledgerFile = new Option<string>("--ledger", "-l") { Description = "The ledger of accepted findings.", Required = true };
        var start = new Option<bool>("--start") { Description = "Write the first ledger from what is found now; an existing one is not touched." };
        var shrink = new Option<bool>("--shrink") { Description = "Take out of the ledger what is gone; nothing is ever put in." };
        var report = new Option<string?>("--report", "-r") { Description = "Write all findings to a file as well, as survey does." };
        var command = new Command(
            "gate",
            """
            Pass or fail against a ledger of accepted findings, which may only shrink.

            Fails on a finding that the ledger does not hold, on an entry that is gone (until --shrink takes it out), and on
            coverage of tags below the ledger's. New findings are printed as file(line,column): warning ID: message, which CI
            systems show at the line. A finding is known by its rule, its member and its code: lines may move, files be renamed.

            Exit codes: 0 pass, 1 fail, 2 bad input, 3 a project does not compile.

            Examples:
              framesafe gate Mission.sln --ledger framesafe.ledger --start
              framesafe gate Mission.sln --ledger framesafe.ledger
              framesafe gate Mission.sln --ledger framesafe.ledger --shrink
              framesafe gate north.sarif south.sarif --ledger framesafe.ledger
            """)
        { sources, ledgerFile, start, shrink, report };
        command.SetAction((parsed, cancellation) => Running.RunAsync(async () =>
        {
            string file = parsed.GetValue(ledgerFile)!;
            bool starts = parsed.GetValue(start);
            string? reportFile = parsed.GetValue(report);
            ReportFile.CheckWritable(file);
            if (reportFile is not null)
                ReportFormat.Check(reportFile);
            if (starts && File.Exists(file))
                throw new BadInputException($"{file}: exists already; a ledger is started once, and then only shrinks.");
            if (starts && parsed.GetValue(shrink))
                throw new BadInputException("--start and --shrink: one of them at a time.");
            Ledger? ledger = starts ? null : Ledger.Read(file);

            Survey survey = await Running.SurveyAsync(parsed, sources, cancellation);
            if (reportFile is not null)
                ReportFormat.Write(reportFile, survey);
            if (survey.Troubles.Count > 0)
            {
                foreach (Trouble trouble in survey.Troubles)
                    Console.WriteLine($"{trouble.Project} {trouble.What}, so nothing can be said for it: {trouble.Detail}");
                return ExitCode.DoesNotCompile;
            }

            var current = Ledger.Of(survey);
            if (ledger is null)
            {
                ReportFile.Write(file, current.ToText());
                Console.WriteLine($"Ledger started with {Screen.Count(survey.Findings.Count)}: {file}");
                return ExitCode.Clean;
            }

            var judgement = Judgement.Of(ledger, current, survey);
            bool shrinks = parsed.GetValue(shrink);
            foreach (string line in judgement.Lines(shrinks))
                Console.WriteLine(line);
            if (shrinks && judgement.CanShrink)
            {
                ReportFile.Write(file, ledger.Shrunk(current).ToText());
                Console.WriteLine($"Ledger shrunk by {Screen.Count(judgement.GoneCount)}: {file}");
            }

            return judgement.Passes(shrinks) ? ExitCode.Clean : ExitCode.Findings;
        }));
        return command;
    }
}
