using System.Diagnostics;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.MSBuild;

namespace FrameSafe.Tool.Loading;

/// <summary>A project or solution opened through MSBuild, as a build would see it.</summary>
internal sealed class LoadedSolution : IDisposable
{
    private readonly MSBuildWorkspace _workspace;

    private LoadedSolution(MSBuildWorkspace workspace, Solution solution, IReadOnlyList<Project> projects, string root)
    {
        _workspace = workspace;
        Solution = solution;
        Projects = projects;
        Root = root;
    }

    internal Solution Solution { get; }

    /// <summary>The C# projects that were asked for, one for each project file, in the order of their paths.</summary>
    internal IReadOnlyList<Project> Projects { get; }

    /// <summary>The folder that paths in reports are relative to.</summary>
    internal string Root { get; }

    /// <summary>Opens a path; restores it first where it was never restored.</summary>
    /// <exception cref="BadInputException">It cannot be opened.</exception>
    internal static async Task<LoadedSolution> OpenAsync(string path, Action<string> tell, CancellationToken cancellation)
    {
        string file = ProjectPath.Resolve(path);
        await RestoreAsync(file, tell, cancellation);

        var failures = new List<string>();
        MSBuildWorkspace workspace = MSBuildWorkspace.Create();
        workspace.RegisterWorkspaceFailedHandler(failure =>
        {
            if (failure.Diagnostic.Kind == WorkspaceDiagnosticKind.Failure)
            {
                lock (failures)
                    failures.Add(failure.Diagnostic.Message.ReplaceLineEndings(" "));
            }
        });
        try
        {
            bool isProject = Path.GetExtension(file) == ".csproj";
            tell($"opening {Path.GetFileName(file)}");
            Solution solution = isProject
                ? (await workspace.OpenProjectAsync(file, cancellationToken: cancellation)).Solution
                : await workspace.OpenSolutionAsync(file, cancellationToken: cancellation);
            // A project for several frameworks is there once for each; its newest one stands for it.
            Project[] projects =
            [
                .. solution.Projects
                    .Where(project => project.Language == LanguageNames.CSharp && (!isProject || project.FilePath == file))
                    .GroupBy(project => project.FilePath ?? project.Name)
                    .OrderBy(group => group.Key, StringComparer.Ordinal)
                    .Select(group => group.OrderBy(project => project.Name, StringComparer.Ordinal).Last()),
            ];
            if (projects.Length == 0)
                throw new BadInputException($"{path}: no C# project could be opened{Why(failures)}.");
            return new(workspace, solution, projects, Path.GetDirectoryName(file)!);
        }
        catch (Exception exception) when (exception is not (OperationCanceledException or BadInputException))
        {
            workspace.Dispose();
            throw new BadInputException($"{path}: cannot be opened: {exception.Message.ReplaceLineEndings(" ")}{Why(failures)}");
        }
    }

    public void Dispose() => _workspace.Dispose();

    private static string Why(List<string> failures) => failures.Count == 0 ? "" : " (" + failures[0] + ")";

    private static async Task RestoreAsync(string file, Action<string> tell, CancellationToken cancellation)
    {
        if (Path.GetExtension(file) == ".csproj" && File.Exists(Path.Combine(Path.GetDirectoryName(file)!, "obj", "project.assets.json")))
            return;
        tell($"restoring {Path.GetFileName(file)}");
        using var restore = Process.Start(new ProcessStartInfo("dotnet", ["restore", file, "--verbosity", "quiet"])
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        }) ?? throw new BadInputException("dotnet: the .NET SDK is not on the path.");
        Task<string> output = restore.StandardOutput.ReadToEndAsync(cancellation);
        Task<string> errors = restore.StandardError.ReadToEndAsync(cancellation);
        await restore.WaitForExitAsync(cancellation);
        if (restore.ExitCode != 0)
        {
            string first = ((await output) + (await errors)).Split('\n').FirstOrDefault(line => line.Contains("error", StringComparison.Ordinal))?.Trim() ?? "";
            throw new BadInputException($"{file}: cannot be restored: {first}");
        }
    }
}
