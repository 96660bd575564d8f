using System.CommandLine;

namespace FrameSafe.Tool.Commands;

/// <summary>The whole command line.</summary>
internal static class ToolCommand
{
    internal static RootCommand Create() => new(
        """
        Finds mixed frames, clocks and units and Newtonian arithmetic in C# projects, mends them, and holds the line in CI.

        Exit codes: 0 nothing found or all done, 1 findings, 2 bad input (nothing was written), 3 a project does not compile
        and was surveyed as far as it could be, 130 cancelled. NO_COLOR is obeyed.

        Examples:
          framesafe survey Mission.sln --report findings.html
          framesafe mend Mission.sln --rule FRAME401 --apply
          framesafe gate Mission.sln --ledger framesafe.ledger
          framesafe explain FRAME301
        """)
    {
        SurveyCommand.Create(),
        MendCommand.Create(),
        GateCommand.Create(),
        ChartCommand.Create(),
        ExplainCommand.Create(),
        Running.Quiet,
        Running.Verbose,
    };
}
