namespace FrameSafe.Tool;

/// <summary>What the command tells a script that runs it.</summary>
internal static class ExitCode
{
    /// <summary>Nothing was found, or everything asked for was done.</summary>
    internal const int Clean = 0;

    /// <summary>Findings; for the gate, ones that the ledger does not hold, or entries that are gone.</summary>
    internal const int Findings = 1;

    /// <summary>What was asked for cannot be done: a path, a setting, a file. Nothing was written.</summary>
    internal const int BadInput = 2;

    /// <summary>A project does not compile; it was surveyed as far as it could be.</summary>
    internal const int DoesNotCompile = 3;

    /// <summary>Interrupted.</summary>
    internal const int Cancelled = 130;
}
