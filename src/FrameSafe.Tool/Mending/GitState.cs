using System.ComponentModel;
using System.Diagnostics;

namespace FrameSafe.Tool.Mending;

/// <summary>Whether a change could be told from what is already changed.</summary>
internal static class GitState
{
    /// <summary>Of the files, those that git would not give back as they are now; null where git does not look after them.</summary>
    internal static async Task<IReadOnlyList<string>?> UncommittedAsync(string folder, IEnumerable<string> files, CancellationToken cancellation)
    {
        try
        {
            using var git = Process.Start(new ProcessStartInfo("git", ["-C", folder, "status", "--porcelain", "-z", "--", .. files])
            {
                RedirectStandardOutput = true,
                RedirectStandardError = true,
            });
            if (git is null)
                return null;
            string output = await git.StandardOutput.ReadToEndAsync(cancellation);
            await git.WaitForExitAsync(cancellation);
            return git.ExitCode == 0 ? [.. output.Split('\0', StringSplitOptions.RemoveEmptyEntries).Select(line => line[3..])] : null;
        }
        catch (Win32Exception)
        {
            return null;
        }
    }
}
