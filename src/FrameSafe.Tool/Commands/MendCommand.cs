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
        command.SetAction((parsed, cancellation) => Running.RunAsync(() => Running.WithSolutionAsync(
            parsed.GetValue(path)!,
            (loaded, tell) => RunAsync(
                loaded,
                new(parsed.GetValue(apply), parsed.GetValue(rules) ?? [], parsed.GetValue(files) ?? [], parsed.GetValue(dirty)),
                tell,
                cancellation),
            cancellation)));
        return command;
    }

    private static async Task<int> RunAsync(LoadedSolution loaded, Wish wish, Action<string> tell, CancellationToken cancellation)
    {
        HashSet<string> wantedFiles = [.. wish.Files.Select(Path.GetFullPath)];
        CheckRules(wish.Rules);
        Solution mended = await Mender.RunAsync(
            loaded.Solution,
            [.. loaded.Projects.Select(project => project.Id)],
            finding => (wish.Rules.Length == 0 || wish.Rules.Contains(finding.Id))
                && (wantedFiles.Count == 0 || wantedFiles.Contains(finding.Location.SourceTree!.FilePath)),
            tell,
            cancellation);
        IReadOnlyList<FileChange> changes = await FileChange.BetweenAsync(loaded.Solution, mended, cancellation);
        foreach (FileChange change in changes)
            Console.Write(change.Diff(loaded.Root));

        int left = 0;
        foreach (Project project in loaded.Projects)
        {
            Project after = mended.GetProject(project.Id)!;
            if (await after.GetCompilationAsync(cancellation) is { } compilation)
                left += (await Surveyor.DiagnosticsAsync(after, compilation, cancellation)).Length;
        }

        if (!wish.Apply)
        {
            Console.WriteLine(changes.Count == 0
                ? $"Nothing can be mended; {Screen.Count(left)}."
                : $"{changes.Count} file(s) would change, {Screen.Count(left)} would be left; --apply writes them.");
            return changes.Count == 0 && left == 0 ? ExitCode.Clean : ExitCode.Findings;
        }

        await WriteAsync(loaded.Root, changes, wish.OverUncommitted, cancellation);
        Console.WriteLine($"{changes.Count} file(s) mended, {Screen.Count(left)} left.");
        return left == 0 ? ExitCode.Clean : ExitCode.Findings;
    }

    private static void CheckRules(string[] rules)
    {
        HashSet<string> known = [.. Surveyor.Analyzers[0].SupportedDiagnostics.Select(rule => rule.Id)];
        foreach (string rule in rules)
        {
            if (!known.Contains(rule) && !rule.StartsWith("CS", StringComparison.Ordinal))
                throw new BadInputException($"--rule {rule}: there is no such rule; the rules are {string.Join(", ", known.Order(StringComparer.Ordinal))}.");
        }
    }

    // All new texts are beside their files before the first is put in its place.
    private static async Task WriteAsync(string root, IReadOnlyList<FileChange> changes, bool overUncommitted, CancellationToken cancellation)
    {
        if (changes.Count == 0)
            return;
        if (!overUncommitted && await GitState.UncommittedAsync(root, changes.Select(change => change.Path), cancellation) is { Count: > 0 } dirty)
        {
            throw new BadInputException(
                $"{dirty[0]}: has uncommitted changes{(dirty.Count > 1 ? $" (and {dirty.Count - 1} more)" : "")}; commit them, or mend with --over-uncommitted.");
        }

        var written = new List<(string Beside, string Path)>();
        try
        {
            foreach (FileChange change in changes)
            {
                cancellation.ThrowIfCancellationRequested();
                written.Add((change.WriteBeside(), change.Path));
            }

            foreach ((string beside, string path) in written)
                File.Move(beside, path, overwrite: true);
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            throw new BadInputException($"{root}: cannot be written: {exception.Message}");
        }
        finally
        {
            foreach ((string beside, _) in written)
            {
                if (File.Exists(beside))
                    File.Delete(beside);
            }
        }
    }

    private sealed record Wish(bool Apply, string[] Rules, string[] Files, bool OverUncommitted);
}
