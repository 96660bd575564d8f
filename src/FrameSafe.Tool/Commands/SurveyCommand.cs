using System.CommandLine;
using FrameSafe.Tool.Reports;
using FrameSafe.Tool.Surveying;

namespace FrameSafe.Tool.Commands;

/// <summary><c>framesafe survey</c>: finds, and changes nothing.</summary>
internal static class SurveyCommand
{
    internal static Command Create()
    {
        Argument<string> path = Running.PathArgument();
        Option<bool> quiet = Running.QuietOption();
        var report = new Option<string[]>("--report", "-r")
        {
            Description = "Write the findings to a file: .sarif (SARIF 2.1.0) or .html (for people). May be given for both.",
        };
        var command = new Command(
            "survey",
            """
            Find mixed frames, clocks and units and Newtonian arithmetic. Nothing is changed.

            Exit codes: 0 no findings, 1 findings, 2 bad input, 3 a project does not compile (it is surveyed as far as it can be).

            Examples:
              framesafe survey src/Orbits.csproj
              framesafe survey Mission.sln --report findings.sarif --report findings.html
            """)
        { path, report, quiet };
        command.SetAction((parsed, cancellation) => Running.RunAsync(async () =>
        {
            string[] files = parsed.GetValue(report) ?? [];
            foreach (string file in files)
                CheckReport(file);
            Survey survey = await Running.WithSolutionAsync(
                parsed.GetValue(path)!, (loaded, tell) => Surveyor.RunAsync(loaded, tell, cancellation), cancellation);
            Running.Screen(parsed.GetValue(quiet)).Show(survey);
            foreach (string file in files)
            {
                FileReport.Write(file, Path.GetExtension(file) == ".html" ? HtmlReport.Of(survey) : SarifReport.Of(survey));
                Console.WriteLine($"Report: {file}");
            }

            return survey.CompileErrors.Count > 0 ? ExitCode.DoesNotCompile
                : survey.Findings.Count > 0 ? ExitCode.Findings
                : ExitCode.Clean;
        }));
        return command;
    }

    private static void CheckReport(string file)
    {
        if (Path.GetExtension(file) is not (".sarif" or ".html"))
            throw new BadInputException($"{file}: what kind of report that is cannot be told; the name ends in .sarif or .html.");
        FileReport.CheckWritable(file);
    }
}
