namespace FrameSafe.Tool.Reports;

/// <summary>Writes files whole or not at all: beside their place first, then in it.</summary>
internal static class FileReport
{
    /// <exception cref="BadInputException">The path is a folder, or cannot be written to.</exception>
    internal static void Write(string path, string text)
    {
        CheckWritable(path);
        try
        {
            string full = Path.GetFullPath(path);
            Directory.CreateDirectory(Path.GetDirectoryName(full)!);
            string beside = full + ".new";
            File.WriteAllText(beside, text);
            File.Move(beside, full, overwrite: true);
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            throw new BadInputException($"{path}: cannot be written: {exception.Message}");
        }
    }

    /// <summary>Refuses a path that cannot become a file, before the work that would be lost.</summary>
    internal static void CheckWritable(string path)
    {
        if (Directory.Exists(path))
            throw new BadInputException($"{path}: is a folder; the name of a file is wanted.");
        for (string? folder = Path.GetDirectoryName(Path.GetFullPath(path)); folder is not null; folder = Path.GetDirectoryName(folder))
        {
            if (File.Exists(folder))
                throw new BadInputException($"{path}: {folder} is a file, not a folder.");
        }
    }
}
