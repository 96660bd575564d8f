namespace FrameSafe.Tool.Mending;

/// <summary>Puts several new texts in the place of files: all of them, or none.</summary>
internal static class FileReplacement
{
    /// <summary>Writes every text beside its file, then puts one after the other in place; where one fails, those before it are put back.</summary>
    /// <exception cref="BadInputException">A file cannot be written; all are as they were.</exception>
    internal static void Run(IReadOnlyList<FileChange> changes, CancellationToken cancellation)
    {
        string mark = $".{Environment.ProcessId}";
        string Beside(FileChange change) => change.Path + mark + ".mended";
        string Old(FileChange change) => change.Path + mark + ".before";
        string current = "";
        try
        {
            foreach (FileChange change in changes)
            {
                cancellation.ThrowIfCancellationRequested();
                current = change.Path;
                change.Write(Beside(change));
                if (!OperatingSystem.IsWindows())
                    File.SetUnixFileMode(Beside(change), File.GetUnixFileMode(change.Path));
            }

            // From here on nothing is asked of the user's patience: a cancellation would leave half of the files.
            foreach (FileChange change in changes)
            {
                current = change.Path;
                File.Replace(Beside(change), change.Path, Old(change));
            }
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            foreach (FileChange change in changes.Where(change => File.Exists(Old(change))))
                File.Move(Old(change), change.Path, overwrite: true);
            throw new BadInputException($"{current}: cannot be written, so nothing was mended: {exception.Message}");
        }
        finally
        {
            foreach (string left in changes.SelectMany(change => new[] { Beside(change), Old(change) }).Where(File.Exists))
                File.Delete(left);
        }
    }
}
