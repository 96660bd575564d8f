using System.CommandLine;
using FrameSafe.Tool.Loading;
using FrameSafe.Tool.Reports;
using Spectre.Console;

namespace FrameSafe.Tool.Commands;

/// <summary>What every command shares: its options, its way of telling progress, its way of failing.</summary>
internal static class Running
{
    internal static Argument<string> PathArgument() => new("path")
    {
        Description = "A project (.csproj), a solution (.sln, .slnx), or a folder that holds one. Opening it runs its MSBuild logic.",
        DefaultValueFactory = static _ => ".",
    };

    internal static Option<bool> QuietOption() => new("--quiet", "-q") { Description = "Only the summary." };

    /// <summary>Runs a command; what cannot be done is one line on standard error.</summary>
    internal static async Task<int> RunAsync(Func<Task<int>> command)
    {
        try
        {
            return await command();
        }
        catch (BadInputException exception)
        {
            await Console.Error.WriteLineAsync(exception.Message);
            return ExitCode.BadInput;
        }
        catch (OperationCanceledException)
        {
            await Console.Error.WriteLineAsync("Cancelled; nothing was written.");
            return ExitCode.Cancelled;
        }
    }

    /// <summary>Opens a path and works on it, with progress on standard error.</summary>
    internal static async Task<T> WithSolutionAsync<T>(string path, Func<LoadedSolution, Action<string>, Task<T>> work, CancellationToken cancellation)
    {
        IAnsiConsole progress = AnsiConsole.Create(new AnsiConsoleSettings { Out = new AnsiConsoleOutput(Console.Error) });
        if (!progress.Profile.Capabilities.Interactive || Console.IsErrorRedirected)
        {
            using LoadedSolution loaded = await LoadedSolution.OpenAsync(path, static _ => { }, cancellation);
            return await work(loaded, static _ => { });
        }

        return await progress.Status().StartAsync("opening", async status =>
        {
            void Tell(string what) => status.Status(Markup.Escape(what));
            using LoadedSolution loaded = await LoadedSolution.OpenAsync(path, Tell, cancellation);
            return await work(loaded, Tell);
        });
    }

    internal static Screen Screen(bool quiet) => Reports.Screen.For(Console.Out, quiet);
}
