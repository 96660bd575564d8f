using System.Diagnostics;
using System.Text;

namespace FrameSafe.EndToEnd;

/// <summary>What a finished process left behind.</summary>
public sealed record CommandResult(int ExitCode, string Output, string Errors)
{
    public string All => Output + Errors;

    public CommandResult MustSucceed()
    {
        Assert.True(ExitCode == 0, $"exit code {ExitCode}\n{All}");
        return this;
    }
}

/// <summary>Runs a program to its end, as a user would from a shell.</summary>
public static class Command
{
    private static readonly TimeSpan Patience = TimeSpan.FromMinutes(8);

    public static CommandResult Run(string folder, string program, params string[] arguments)
        => Run(folder, new Dictionary<string, string>(), program, arguments);

    public static CommandResult Run(
        string folder, IReadOnlyDictionary<string, string> environment, string program, params string[] arguments)
    {
        var start = new ProcessStartInfo(program)
        {
            WorkingDirectory = folder,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            RedirectStandardInput = true,
        };
        foreach (string argument in arguments)
            start.ArgumentList.Add(argument);
        // The test host's own MSBuild variables must not reach the projects under test.
        foreach (string name in start.Environment.Keys.Where(k => k.StartsWith("MSBuild", StringComparison.Ordinal)).ToList())
            start.Environment.Remove(name);
        start.Environment["DOTNET_CLI_TELEMETRY_OPTOUT"] = "1";
        start.Environment["DOTNET_NOLOGO"] = "1";
        start.Environment["DOTNET_CLI_UI_LANGUAGE"] = "en";
        // A build node that lives on would keep the packed assemblies loaded.
        start.Environment["MSBUILDDISABLENODEREUSE"] = "1";
        foreach ((string name, string value) in environment)
            start.Environment[name] = value;

        using Process process = Process.Start(start) ?? throw new InvalidOperationException($"{program} did not start.");
        process.StandardInput.Close();
        var output = new StringBuilder();
        var errors = new StringBuilder();
        process.OutputDataReceived += (_, line) => { if (line.Data is not null) output.AppendLine(line.Data); };
        process.ErrorDataReceived += (_, line) => { if (line.Data is not null) errors.AppendLine(line.Data); };
        process.BeginOutputReadLine();
        process.BeginErrorReadLine();
        if (!process.WaitForExit(Patience))
        {
            process.Kill(entireProcessTree: true);
            throw new TimeoutException($"{program} {string.Join(' ', arguments)} ran longer than {Patience}.\n{output}{errors}");
        }
        process.WaitForExit();
        return new CommandResult(process.ExitCode, output.ToString(), errors.ToString());
    }
}
