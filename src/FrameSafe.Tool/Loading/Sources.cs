using FrameSafe.Tool.Reports;
using FrameSafe.Tool.Surveying;

namespace FrameSafe.Tool.Loading;

/// <summary>
/// What a command works on: projects, solutions and folders, which are surveyed, and earlier reports (<c>.sarif</c>), which are
/// read. So a code base too big for one machine is surveyed in pieces, and the pieces are judged as one.
/// </summary>
internal static class Sources
{
    internal static bool IsReport(string path) => Path.GetExtension(path).Equals(SarifReport.Extension, StringComparison.OrdinalIgnoreCase);

    internal static async Task<Survey> SurveyAsync(IReadOnlyList<string> paths, Action<string> tell, CancellationToken cancellation)
    {
        var parts = new List<Survey>();
        foreach (string path in paths)
        {
            if (IsReport(path))
            {
                tell($"reading {Path.GetFileName(path)}");
                parts.Add(SarifReader.Read(path));
            }
            else
            {
                using LoadedSolution loaded = await LoadedSolution.OpenAsync(path, tell, cancellation);
                parts.Add(await Surveyor.RunAsync(loaded, tell, cancellation));
            }
        }

        return Survey.Merge(parts);
    }
}
