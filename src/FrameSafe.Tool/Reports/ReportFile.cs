namespace FrameSafe.Tool.Reports;

/// <summary>Writes files whole or not at all: beside their place first, then in it.</summary>
internal static class ReportFile
{
    /// <summary>Writes a text as UTF-8 without a byte order mark.</summary>
    internal static void Write(string path, string text)
        => Write(path, stream =>
        {
            using var writer = new StreamWriter(stream, leaveOpen: true);
            writer.Write(text);
        });

    /// <exception cref="BadInputException">The path is a folder, or cannot be written to.</exception>
    internal static void Write(string path, Action<Stream> write)
    {
        CheckWritable(path);
        string full = Path.GetFullPath(path);
        string beside = $"{full}.{Environment.ProcessId}.new";
        try
        {
            Directory.CreateDirectory(Path.GetDirectoryName(full)!);
            using (FileStream stream = File.Create(beside))
                write(stream);
            File.Move(beside, full, overwrite: true);
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            throw new BadInputException($"{path}: cannot be written: {exception.Message}");
        }
        finally
        {
            if (File.Exists(beside))
                File.Delete(beside);
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
