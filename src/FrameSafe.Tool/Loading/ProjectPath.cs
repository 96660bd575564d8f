namespace FrameSafe.Tool.Loading;

/// <summary>The project or solution that a path stands for.</summary>
internal static class ProjectPath
{
    private static readonly string[] Solutions = [".sln", ".slnx"];

    /// <summary>A file as it is given; of a folder, the one solution in it, else the one C# project.</summary>
    /// <exception cref="BadInputException">There is no such file, or a folder holds none or several.</exception>
    internal static string Resolve(string path)
    {
        if (File.Exists(path))
        {
            string extension = Path.GetExtension(path);
            return extension == ".csproj" || Solutions.Contains(extension)
                ? Path.GetFullPath(path)
                : throw new BadInputException($"{path}: not a project; a .csproj, .sln or .slnx file, or a folder that holds one, is wanted.");
        }

        if (!Directory.Exists(path))
            throw new BadInputException($"{path}: there is no such file or folder.");
        return Only(path, Solutions, "solutions") ?? Only(path, [".csproj"], "projects")
            ?? throw new BadInputException($"{path}: the folder holds no .sln, .slnx or .csproj file.");
    }

    private static string? Only(string folder, string[] extensions, string what)
    {
        string[] found = [.. Directory.EnumerateFiles(folder).Where(file => extensions.Contains(Path.GetExtension(file))).Order(StringComparer.Ordinal)];
        return found.Length switch
        {
            0 => null,
            1 => Path.GetFullPath(found[0]),
            _ => throw new BadInputException(
                $"{folder}: the folder holds {found.Length} {what} ({string.Join(", ", found.Select(Path.GetFileName))}); name one of them."),
        };
    }
}
