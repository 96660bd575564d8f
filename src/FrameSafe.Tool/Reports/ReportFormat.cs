using System.Text;
using FrameSafe.Tool.Surveying;

namespace FrameSafe.Tool.Reports;

/// <summary>The kinds of report file, by the endings of their names.</summary>
internal static class ReportFormat
{
    private static readonly Dictionary<string, Action<Survey, Stream>> Writers = new(StringComparer.OrdinalIgnoreCase)
    {
        [SarifReport.Extension] = SarifReport.Write,
        [HtmlReport.Extension] = static (survey, stream) => stream.Write(Encoding.UTF8.GetBytes(HtmlReport.Of(survey))),
    };

    /// <exception cref="BadInputException">The ending is none of them, or the place cannot become a file.</exception>
    internal static void Check(string path)
    {
        if (!Writers.ContainsKey(Path.GetExtension(path)))
            throw new BadInputException($"{path}: what kind of report that is cannot be told; the name ends in {string.Join(" or ", Writers.Keys)}.");
        ReportFile.CheckWritable(path);
    }

    internal static void Write(string path, Survey survey) => ReportFile.Write(path, stream => Writers[Path.GetExtension(path)](survey, stream));
}
