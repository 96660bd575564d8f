namespace FrameSafe.Tool.Tests;

/// <summary>A project in a temporary folder that references the annotations and nothing else, least of all the analyzer.</summary>
internal sealed class TinyProject : IDisposable
{
    /// <summary>One finding each of FRAME101, FRAME301 (speeds up to 0.4 c, so an error) and FRAME401; eight numbers, seven tagged.</summary>
    internal const string Faulty = """
        using FrameSafe;

        namespace Tiny;

        public readonly struct Quay : IInertialFrame;

        [RelativeTo<Quay>(MaxSpeed = 0.4)]
        public readonly struct Barge : IInertialFrame;

        public static class Tow
        {
            public static double Ratio = 2;

            [return: Unit("m")]
            public static double Length([Unit("m")] double near, [Unit("km")] double far) => near + far;

            [return: Unit("m/s")]
            public static double Speed([Unit("m/s")] [InFrame<Quay>] double barge, [Unit("m/s")] [InFrame<Barge>] double winch) => barge + winch;

            public static bool IsAhead([Unit("m")] [InFrame<Quay>] double place, [Unit("m")] [InFrame<Barge>] double mark) => place > mark;
        }

        """;

    internal const string Faultless = """
        using FrameSafe;

        namespace Tiny;

        public static class Tow
        {
            [return: Unit("m")]
            public static double Length([Unit("m")] double near, [Unit("km")] double far) => near + far * 1000;
        }

        """;

    internal TinyProject(string source = Faulty, string name = "Tiny")
    {
        Name = name;
        Folder = Directory.CreateTempSubdirectory("framesafe-tool-").FullName;
        string annotations = Path.Combine(AppContext.BaseDirectory, "FrameSafe.Annotations.dll");
        Write($"{name}.csproj", $"""
            <Project Sdk="Microsoft.NET.Sdk">
              <PropertyGroup>
                <TargetFramework>net10.0</TargetFramework>
                <ImplicitUsings>enable</ImplicitUsings>
              </PropertyGroup>
              <ItemGroup>
                <Reference Include="FrameSafe.Annotations" HintPath="{annotations}" />
              </ItemGroup>
            </Project>
            """);
        Write("Tow.cs", source);
    }

    internal string Name { get; }

    internal string Folder { get; }

    internal string ProjectFile => At($"{Name}.csproj");

    internal string At(string name) => Path.Combine(Folder, name);

    internal string Read(string name = "Tow.cs") => File.ReadAllText(At(name));

    internal void Write(string name, string text) => File.WriteAllText(At(name), text);

    public void Dispose() => Directory.Delete(Folder, recursive: true);
}
