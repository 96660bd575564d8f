using System.CommandLine;
using FrameSafe.Tool.Loading;
using FrameSafe.Tool.Surveying;
using Spectre.Console;

namespace FrameSafe.Tool.Commands;

/// <summary>What every command shares: its options, its way of telling progress, its way of failing.</summary>
internal static class Running
{
    internal static Option<bool> Quiet { get; } = new("--quiet", "-q") { Description = "Say only what it comes to.", Recursive = true };

    internal static Option<bool> Verbose { get; } = new("--verbose", "-v") { Description = "Say each step, on standard error.", Recursive = true };

    internal static Argument<string> PathArgument() => new("path")
    {
        Description = "A project (.csproj), a solution (.sln, .slnx), or a folder that holds one. Opening it runs its MSBuild logic.",
        DefaultValueFactory = static _ => ".",
    };

    internal static Argument<string[]> SourcesArgument() => new("path")
    {
        Description = "Projects (.csproj), solutions (.sln, .slnx), folders that hold one, or earlier reports (.sarif). Opening a project runs its MSBuild logic.",
        DefaultValueFactory = static _ => ["."],
        Arity = ArgumentArity.ZeroOrMore,
    };

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

    internal static Task<Survey> SurveyAsync(ParseResult parsed, Argument<string[]> sources, CancellationToken cancellation)
        => WithProgressAsync(parsed, tell => Sources.SurveyAsync(parsed.GetValue(sources)!, tell, cancellation));

    /// <summary>Does long work with progress on standard error: a line that changes on a terminal, lines where they are asked for.</summary>
    internal static async Task<T> WithProgressAsync<T>(ParseResult parsed, Func<Action<string>, Task<T>> work)
    {
        if (parsed.GetValue(Verbose))
            return await work(what => Console.Error.WriteLine(what));
        if (parsed.GetValue(Quiet) || Console.IsErrorRedirected)
            return await work(static _ => { });
        IAnsiConsole progress = AnsiConsole.Create(new AnsiConsoleSettings { Out = new AnsiConsoleOutput(Console.Error) });
        return progress.Profile.Capabilities.Interactive
            ? await progress.Status().StartAsync("opening", status => work(what => status.Status(Markup.Escape(what))))
            : await work(static _ => { });
    }
}
