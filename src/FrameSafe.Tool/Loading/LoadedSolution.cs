using System.ComponentModel;
using System.Diagnostics;
using FrameSafe.Tool.Surveying;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.MSBuild;

namespace FrameSafe.Tool.Loading;

/// <summary>A project or solution opened through MSBuild, as a build would see it.</summary>
internal sealed class LoadedSolution : IDisposable
{
    private readonly MSBuildWorkspace _workspace;

    private LoadedSolution(MSBuildWorkspace workspace, Solution solution, IReadOnlyList<Project> projects, string root, IReadOnlyList<Trouble> troubles)
    {
        _workspace = workspace;
        Solution = solution;
        Projects = projects;
        Root = root;
        Troubles = troubles;
    }

    internal Solution Solution { get; }

    /// <summary>The C# projects that were asked for, one for each project file, in the order of their paths.</summary>
    internal IReadOnlyList<Project> Projects { get; }

    /// <summary>The folder that paths in reports are relative to: the working folder, where the solution lies in it; else the solution's.</summary>
    internal string Root { get; }

    /// <summary>What went wrong on the way and left something to survey.</summary>
    internal IReadOnlyList<Trouble> Troubles { get; }

    /// <summary>Opens a path; restores it first where it was never restored.</summary>
    /// <exception cref="BadInputException">It cannot be opened.</exception>
    internal static async Task<LoadedSolution> OpenAsync(string path, Action<string> tell, CancellationToken cancellation)
    {
        string file = ProjectPath.Resolve(path);
        string name = Path.GetFileNameWithoutExtension(file);
        var troubles = new List<Trouble>();
        if (await RestoreAsync(file, tell, cancellation) is { } unrestored)
            troubles.Add(new(name, "cannot be restored", unrestored));

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
            // A project that MSBuild cannot read is there all the same, with nothing in it.
            if (projects.Length == 0 || (failures.Count > 0 && projects.All(project => !project.HasDocuments)))
                throw new BadInputException($"{path}: no C# project could be opened{Why(failures)}");
            lock (failures)
                troubles.AddRange(failures.Select(failure => new Trouble(name, "cannot be opened whole", failure)));
            return new(workspace, solution, projects, RootOf(file), troubles);
        }
        catch (Exception exception) when (exception is not OperationCanceledException)
        {
            workspace.Dispose();
            if (exception is BadInputException)
                throw;
            throw new BadInputException($"{path}: cannot be opened: {exception.Message.ReplaceLineEndings(" ")}{Why(failures)}");
        }
    }

    public void Dispose() => _workspace.Dispose();

    private static string RootOf(string file)
    {
        string here = Directory.GetCurrentDirectory();
        return file.StartsWith(here + Path.DirectorySeparatorChar, StringComparison.Ordinal) ? here : Path.GetDirectoryName(file)!;
    }

    private static string Why(List<string> failures) => failures.Count == 0 ? "" : " (" + failures[0] + ")";

    /// <summary>Restores what was never restored; the text of the first error, where that fails.</summary>
    private static async Task<string?> RestoreAsync(string file, Action<string> tell, CancellationToken cancellation)
    {
        if (Path.GetExtension(file) == ".csproj" && File.Exists(Path.Combine(Path.GetDirectoryName(file)!, "obj", "project.assets.json")))
            return null;
        tell($"restoring {Path.GetFileName(file)}");
        try
        {
            using Process restore = Process.Start(new ProcessStartInfo("dotnet", ["restore", file, "--verbosity", "quiet"])
            {
                RedirectStandardOutput = true,
                RedirectStandardError = true,
                WorkingDirectory = Path.GetDirectoryName(file)!,
            })!;
            try
            {
                Task<string> output = restore.StandardOutput.ReadToEndAsync(cancellation);
                Task<string> errors = restore.StandardError.ReadToEndAsync(cancellation);
                await restore.WaitForExitAsync(cancellation);
                if (restore.ExitCode == 0)
                    return null;
                string said = ((await output) + (await errors)).Split('\n')
                    .FirstOrDefault(line => line.Contains("error", StringComparison.Ordinal))?.Trim() ?? $"exit code {restore.ExitCode}";
                return said;
            }
            catch (OperationCanceledException)
            {
                restore.Kill(entireProcessTree: true);
                throw;
            }
        }
        catch (Win32Exception)
        {
            throw new BadInputException("dotnet: not found on the path; a project is opened by the .NET SDK.");
        }
    }
}
