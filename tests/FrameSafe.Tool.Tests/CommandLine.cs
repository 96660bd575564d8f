using FrameSafe.Tool.Commands;

namespace FrameSafe.Tool.Tests;

/// <summary>What a run of the command left behind.</summary>
internal sealed record Ran(int ExitCode, string Output, string Errors);

/// <summary>Runs the command in this process, as its own entry does. One at a time: the console is one.</summary>
internal static class CommandLine
{
    private static readonly SemaphoreSlim Turn = new(1);

    internal static async Task<Ran> RunAsync(params string[] arguments)
    {
        await Turn.WaitAsync();
        (TextWriter oldOutput, TextWriter oldErrors) = (Console.Out, Console.Error);
        using var output = new StringWriter();
        using var errors = new StringWriter();
        try
        {
            Console.SetOut(output);
            Console.SetError(errors);
            int code = await ToolCommand.Create().Parse(arguments).InvokeAsync();
            return new(code, output.ToString(), errors.ToString());
        }
        finally
        {
            Console.SetOut(oldOutput);
            Console.SetError(oldErrors);
            Turn.Release();
        }
    }
}
