namespace FrameSafe.EndToEnd;

/// <summary>
/// The packages and the tool as a user gets them: packed once for the whole run, under a version of their own so that no
/// cache of an earlier run serves an older one.
/// </summary>
public sealed class PackedFeed : IDisposable
{
    private static readonly string[] Packages = ["src/FrameSafe", "src/FrameSafe.UnitsNet", "src/FrameSafe.Tool"];

    private readonly string _root = Directory.CreateTempSubdirectory("framesafe-e2e-").FullName;
    private readonly Lazy<string> _tool;

    public PackedFeed()
    {
        _tool = new Lazy<string>(InstallTool);
        Repository = FindRepository();
        Version = $"0.1.0-e2e.{DateTime.UtcNow:yyyyMMddHHmmss}.{Environment.ProcessId}";
        Folder = Path.Combine(_root, "feed");
        foreach (string project in Packages)
        {
            Command.Run(Repository, "dotnet", "pack", project, "-c", "Release", "-o", Folder, $"-p:Version={Version}", "-nr:false")
                .MustSucceed();
        }
    }

    /// <summary>The folder that holds FrameSafe.sln.</summary>
    public string Repository { get; }

    public string Version { get; }

    /// <summary>The folder of the packages.</summary>
    public string Folder { get; }

    /// <summary>The installed <c>framesafe</c> command.</summary>
    public string Tool => _tool.Value;

    /// <summary>A new empty folder outside the repository, which the packed packages reach too.</summary>
    public string NewFolder(string name)
    {
        string folder = Path.Combine(_root, $"{name}-{Guid.NewGuid():N}");
        Directory.CreateDirectory(folder);
        File.WriteAllText(Path.Combine(folder, "nuget.config"), $"""
            <configuration>
              <packageSources>
                <add key="packed" value="{Folder}" />
              </packageSources>
            </configuration>
            """);
        return folder;
    }

    public void Dispose()
    {
        try
        {
            Directory.Delete(_root, recursive: true);
        }
        catch (IOException)
        {
            // A process that still holds a file is no failure of the run; the folder is temporary anyway.
        }
    }

    private string InstallTool()
    {
        string folder = Path.Combine(_root, "tool");
        Command.Run(NewFolder("install"), "dotnet", "tool", "install", "FrameSafe.Tool", "--tool-path", folder, "--version", Version)
            .MustSucceed();
        return Path.Combine(folder, "framesafe");
    }

    private static string FindRepository()
    {
        string? folder = AppContext.BaseDirectory;
        while (folder is not null && !File.Exists(Path.Combine(folder, "FrameSafe.sln")))
            folder = Path.GetDirectoryName(folder);
        return folder ?? throw new InvalidOperationException("FrameSafe.sln was not found above the tests' folder.");
    }
}

/// <summary>One packed feed serves all tests of the run.</summary>
[CollectionDefinition(Name)]
public sealed class PackedFeedCollection : ICollectionFixture<PackedFeed>
{
    public const string Name = "packed feed";
}
