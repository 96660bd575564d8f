using System.CommandLine;
using FrameSafe.Tool.Loading;
using FrameSafe.Tool.Mending;
using FrameSafe.Tool.Reports;
using FrameSafe.Tool.Surveying;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Tool.Commands;

/// <summary><c>framesafe mend</c>: shows the repairs as a diff, and applies them on request.</summary>
internal static class MendCommand
{
    internal static Command Create()
    {
        Argument<string> path = Running.PathArgument();
        var apply = new Option<bool>("--apply") { Description = "Write the repairs; without it they are only shown." };
        var rules = new Option<string[]>("--rule") { Description = "Mend only findings of these rules.", AllowMultipleArgumentsPerToken = true };
        var files = new Option<string[]>("--file") { Description = "Mend only these files.", AllowMultipleArgumentsPerToken = true };
        var dirty = new Option<bool>("--over-uncommitted") { Description = "Write also over files that git has uncommitted changes of." };
        var command = new Command(
            "mend",
            """
            Show what the repairs would change, as a diff; with --apply, change it.

            Exit codes: 0 nothing is left to mend, 1 findings are left (or, without --apply, would be mended), 2 bad input.

            Examples:
              framesafe mend src/Orbits.csproj
              framesafe mend Mission.sln --rule FRAME401 FRAME402 --apply
            """)
        { path, apply, rules, files, dirty };
        command.SetAction((parsed, cancellation) => Running.RunAsync(() =>
        {
            var wish = new Wish(
                parsed.GetValue(path)!, parsed.GetValue(apply), parsed.GetValue(rules) ?? [], parsed.GetValue(files) ?? [], parsed.GetValue(dirty));
            CheckRules(wish.Rules);
            return RunAsync(wish, parsed, cancellation);
        }));
        return command;
    }

    private static async Task<int> RunAsync(Wish wish, ParseResult parsed, CancellationToken cancellation)
    {
        Outcome outcome = await Running.WithProgressAsync(parsed, tell => MendAsync(wish, tell, cancellation));
        if (!parsed.GetValue(Running.Quiet))
        {
            foreach (FileChange change in outcome.Changes)
                Console.Write(change.Diff(outcome.Root));
        }

        string files = outcome.Changes.Count == 1 ? "1 file" : $"{outcome.Changes.Count} files";
        if (wish.Apply)
        {
            await WriteAsync(outcome, wish.OverUncommitted, cancellation);
            Console.WriteLine($"{files} mended; {Screen.Count(outcome.Left)} left.");
            return outcome.Left == 0 ? ExitCode.Clean : ExitCode.Findings;
        }

        Console.WriteLine(outcome.Changes.Count == 0
            ? $"Nothing can be mended; {Screen.Count(outcome.Left)} left."
            : $"{files} would change and {Screen.Count(outcome.Left)} be left; --apply writes them.");
        return outcome.Changes.Count == 0 && outcome.Left == 0 ? ExitCode.Clean : ExitCode.Findings;
    }

    private static async Task<Outcome> MendAsync(Wish wish, Action<string> tell, CancellationToken cancellation)
    {
        using LoadedSolution loaded = await LoadedSolution.OpenAsync(wish.Path, tell, cancellation);
        HashSet<string> files = [.. wish.Files.Select(Path.GetFullPath)];
        CheckFiles(loaded, wish.Files);
        Solution mended = await Mender.RunAsync(
            loaded.Solution,
            [.. loaded.Projects.Select(project => project.Id)],
            finding => (wish.Rules.Length == 0 || wish.Rules.Contains(finding.Id))
                && (files.Count == 0 || files.Contains(finding.Location.SourceTree!.FilePath)),
            tell,
            cancellation);
        int left = 0;
        foreach (Project project in loaded.Projects)
        {
            Project after = mended.GetProject(project.Id)!;
            if (await after.GetCompilationAsync(cancellation) is { } compilation)
                left += (await Surveyor.DiagnosticsAsync(after, compilation, cancellation)).Length;
        }

        return new(loaded.Root, await FileChange.BetweenAsync(loaded.Solution, mended, cancellation), left);
    }

    private static void CheckRules(string[] rules)
    {
        foreach (string rule in rules)
        {
            if (Surveyor.Rules.All(known => known.Id != rule) && !rule.StartsWith("CS", StringComparison.Ordinal))
                throw new BadInputException($"--rule {rule}: there is no such rule; the rules are {string.Join(", ", Surveyor.Rules.Select(known => known.Id))}.");
        }
    }

    private static void CheckFiles(LoadedSolution loaded, string[] files)
    {
        foreach (string file in files)
        {
            if (loaded.Solution.GetDocumentIdsWithFilePath(Path.GetFullPath(file)).IsEmpty)
                throw new BadInputException($"--file {file}: no file of the solution; a source file that one of its projects compiles is wanted.");
        }
    }

    private static async Task WriteAsync(Outcome outcome, bool overUncommitted, CancellationToken cancellation)
    {
        if (outcome.Changes.Count == 0)
            return;
        if (!overUncommitted
            && await GitState.UncommittedAsync(outcome.Root, outcome.Changes.Select(change => change.Path), cancellation) is { Count: > 0 } dirty)
        {
            throw new BadInputException(
                $"{dirty[0]}: has uncommitted changes{(dirty.Count > 1 ? $" (and {dirty.Count - 1} more)" : "")}; commit them, or mend with --over-uncommitted.");
        }

        FileReplacement.Run(outcome.Changes, cancellation);
    }

    private sealed record Wish(string Path, bool Apply, string[] Rules, string[] Files, bool OverUncommitted);

    private sealed record Outcome(string Root, IReadOnlyList<FileChange> Changes, int Left);
}
