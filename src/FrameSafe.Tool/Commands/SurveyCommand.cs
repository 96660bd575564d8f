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
        var report = new Option<string?>("--report", "-r") { Description = "Write the findings to a file: .sarif (SARIF 2.1.0)." };
        var command = new Command(
            "survey",
            """
            Find mixed frames, clocks and units and Newtonian arithmetic. Nothing is changed.

            Exit codes: 0 no findings, 1 findings, 2 bad input, 3 a project does not compile (it is surveyed as far as it can be).

            Examples:
              framesafe survey src/Orbits.csproj
              framesafe survey Mission.sln --report findings.sarif
            """)
        { path, report, quiet };
        command.SetAction((parsed, cancellation) => Running.RunAsync(async () =>
        {
            string? file = parsed.GetValue(report);
            CheckReport(file);
            Survey survey = await Running.WithSolutionAsync(
                parsed.GetValue(path)!, (loaded, tell) => Surveyor.RunAsync(loaded, tell, cancellation), cancellation);
            Running.Screen(parsed.GetValue(quiet)).Show(survey);
            if (file is not null)
            {
                FileReport.Write(file, SarifReport.Of(survey));
                Console.WriteLine($"Report: {file}");
            }

            return survey.CompileErrors.Count > 0 ? ExitCode.DoesNotCompile
                : survey.Findings.Count > 0 ? ExitCode.Findings
                : ExitCode.Clean;
        }));
        return command;
    }

    private static void CheckReport(string? file)
    {
        if (file is null)
            return;
        if (Path.GetExtension(file) != ".sarif")
            throw new BadInputException($"{file}: what kind of report that is cannot be told; the name ends in .sarif.");
        FileReport.CheckWritable(file);
    }
}
