using System.CommandLine;

namespace FrameSafe.Tool.Commands;

/// <summary>The whole command line.</summary>
internal static class ToolCommand
{
    internal static RootCommand Create() => new("Finds mixed frames, clocks and units and Newtonian arithmetic in C# projects, mends them, and holds the line in CI.")
    {
        SurveyCommand.Create(),
        MendCommand.Create(),
        GateCommand.Create(),
        ChartCommand.Create(),
        ExplainCommand.Create(),
    };
}
