namespace FrameSafe.EndToEnd;

/// <summary>A project outside the repository that adds the package and nothing else.</summary>
public sealed class FreshProject
{
    public FreshProject(PackedFeed feed, string source, string framework = "net10.0", string properties = "", string items = "")
    {
        Folder = feed.NewFolder("fresh");
        Write("Fresh.csproj", $"""
            <Project Sdk="Microsoft.NET.Sdk">
              <PropertyGroup>
                <TargetFramework>{framework}</TargetFramework>
                <Nullable>enable</Nullable>
                {properties}
              </PropertyGroup>
              <ItemGroup>
                <PackageReference Include="FrameSafe" Version="{feed.Version}" />
                {items}
              </ItemGroup>
            </Project>
            """);
        Write("Code.cs", source);
    }

    public string Folder { get; }

    public string ProjectFile => Path.Combine(Folder, "Fresh.csproj");

    public void Write(string name, string text) => File.WriteAllText(Path.Combine(Folder, name), text);

    public string Read(string name = "Code.cs") => File.ReadAllText(Path.Combine(Folder, name));

    public CommandResult Build(params string[] arguments)
        => Dotnet(["build", "-nr:false", "-p:UseSharedCompilation=false", "--no-incremental", .. arguments]);

    public CommandResult Dotnet(params string[] arguments) => Command.Run(Folder, "dotnet", arguments);
}
