using System.CommandLine;
using FrameSafe.Tool.Reports;
using FrameSafe.Tool.Surveying;

namespace FrameSafe.Tool.Commands;

/// <summary><c>framesafe chart</c>: the frame chart alone.</summary>
internal static class ChartCommand
{
    internal static Command Create()
    {
        Argument<string[]> sources = Running.SourcesArgument();
        var output = new Option<string?>("--output", "-o") { Description = "The SVG file to write; standard output if not given." };
        var command = new Command(
            "chart",
            """
            Draw the frames of a project, how fast they move in one another, where numbers cross, and the findings of each, as SVG.

            Exit codes: 0 drawn, 2 bad input, 3 a project does not compile (it is drawn as far as it can be).

            Example:
              framesafe chart Mission.sln --output frames.svg
            """)
        { sources, output };
        command.SetAction((parsed, cancellation) => Running.RunAsync(async () =>
        {
            string? file = parsed.GetValue(output);
            if (file is not null)
                ReportFile.CheckWritable(file);
            Survey survey = await Running.SurveyAsync(parsed, sources, cancellation);
            string svg = ChartDrawing.Svg(survey.Chart, survey.Findings);
            if (file is null)
                await Console.Out.WriteAsync(svg);
            else
                ReportFile.Write(file, svg);
            return survey.Troubles.Count > 0 ? ExitCode.DoesNotCompile : ExitCode.Clean;
        }));
        return command;
    }
}
