namespace FrameSafe.Analyzers.Tests.Verify;

/// <summary>Where the project's own files are.</summary>
internal static class Repository
{
    internal static string Root { get; } = Find();

    private static string Find()
    {
        string? folder = AppContext.BaseDirectory;
        while (folder is not null && !File.Exists(Path.Combine(folder, "FrameSafe.sln")))
            folder = Path.GetDirectoryName(folder);
        return folder ?? throw new InvalidOperationException("FrameSafe.sln was not found above the tests' folder.");
    }
}
