using System.CommandLine;
using FrameSafe.Tool.Reports;
using FrameSafe.Tool.Surveying;

namespace FrameSafe.Tool.Commands;

/// <summary><c>framesafe survey</c>: finds, and changes nothing.</summary>
internal static class SurveyCommand
{
    internal static Command Create()
    {
        Argument<string[]> sources = Running.SourcesArgument();
        var reports = new Option<string[]>("--report", "-r")
        {
            Description = "Write the findings to a file, by its ending: .sarif (SARIF 2.1.0) or .html (for people). May be given for both.",
        };
        var command = new Command(
            "survey",
            """
            Find mixed frames, clocks and units and Newtonian arithmetic. Nothing is changed.

            Several sources are surveyed as one; so are the reports of pieces that were surveyed apart.

            Exit codes: 0 no findings, 1 findings, 2 bad input, 3 a project does not compile (it is surveyed as far as it can be).

            Examples:
              framesafe survey src/Orbits.csproj
              framesafe survey Mission.sln --report findings.sarif --report findings.html
              framesafe survey north.sarif south.sarif --report all.sarif
            """)
        { sources, reports };
        command.SetAction((parsed, cancellation) => Running.RunAsync(async () =>
        {
            string[] files = parsed.GetValue(reports) ?? [];
            foreach (string file in files)
                ReportFormat.Check(file);
            Survey survey = await Running.SurveyAsync(parsed, sources, cancellation);
            Screen.For(Console.Out, parsed.GetValue(Running.Quiet)).Show(survey);
            foreach (string file in files)
            {
                ReportFormat.Write(file, survey);
                Console.WriteLine($"Report: {file}");
            }

            return survey.Troubles.Count > 0 ? ExitCode.DoesNotCompile
                : survey.Findings.Count > 0 ? ExitCode.Findings
                : ExitCode.Clean;
        }));
        return command;
    }
}
