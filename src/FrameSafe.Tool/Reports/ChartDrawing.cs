using System.Globalization;
using System.Net;
using System.Text;
using FrameSafe.Tool.Charting;
using FrameSafe.Tool.Surveying;

namespace FrameSafe.Tool.Reports;

/// <summary>
/// Draws the frame chart as SVG: a frame below the one in which its motion is declared, with the largest β and γ on the line between
/// them; crossings dashed; the findings of each frame counted.
/// </summary>
internal static class ChartDrawing
{
    private const int Column = 220;
    private const int Row = 130;
    private const int Width = 150;
    private const int Height = 46;
    private const int Margin = 40;

    internal static string Svg(FrameChart chart, IReadOnlyList<Finding> findings)
    {
        if (chart.Frames.Count == 0)
            return """<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 320 40" role="img" aria-label="Frame chart: no frames are declared"><text x="10" y="25">No frames are declared.</text></svg>""" + "\n";
        Dictionary<string, (int X, int Y)> places = Places(chart);
        // The labels of lines and crossings stand to the right of them.
        int width = places.Values.Max(place => place.X) + Width + Margin + (chart.Motions.Count + chart.Crossings.Count > 0 ? Column : 0);
        int height = places.Values.Max(place => place.Y) + Height + Margin;
        Dictionary<string, string> names = chart.Frames.ToDictionary(frame => frame.Id, frame => frame.Name);

        var svg = new StringBuilder();
        svg.Append(CultureInfo.InvariantCulture, $"<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 {width} {height}\" width=\"{width}\" role=\"img\" aria-labelledby=\"chart-title chart-description\" class=\"chart\">\n");
        svg.Append("<title id=\"chart-title\">Frame chart</title>\n");
        svg.Append("<desc id=\"chart-description\">").Append(Escape(Describe(chart, names))).Append("</desc>\n");
        svg.Append("<style>.chart text{font:14px system-ui,sans-serif;fill:currentColor}.chart .label{font-size:12px}.chart rect{fill:none;stroke:currentColor;stroke-width:1.5}.chart line,.chart path{stroke:currentColor;stroke-width:1.5;fill:none}.chart .crossing{stroke-dasharray:5 4}.chart .found{fill:#b3261e;font-weight:600}</style>\n");
        foreach (ChartMotion motion in chart.Motions)
        {
            (int x1, int y1) = places[motion.In];
            (int x2, int y2) = places[motion.Frame];
            Line(svg, x1 + (Width / 2), y1 + Height, x2 + (Width / 2), y2);
            string label = motion.MaxSpeed > 0
                ? string.Create(CultureInfo.InvariantCulture, $"β ≤ {motion.MaxSpeed:G4}, γ ≤ {motion.MaxLorentzFactor:G4}")
                : "β not declared";
            Label(svg, ((x1 + x2 + Width) / 2) + 8, (y1 + Height + y2) / 2, label);
        }

        foreach (ChartCrossing crossing in chart.Crossings)
        {
            (int x1, int y1) = places[crossing.From];
            (int x2, int y2) = places[crossing.To];
            int bend = Math.Max(x1, x2) + Width + 34;
            svg.Append(CultureInfo.InvariantCulture, $"<path class=\"crossing\" d=\"M {x1 + Width} {y1 + (Height / 2)} C {bend} {y1 + (Height / 2)} {bend} {y2 + (Height / 2)} {x2 + Width} {y2 + (Height / 2)}\"/>\n");
            Label(svg, bend - 2, ((y1 + y2 + Height) / 2) - 14, crossing.Count.ToString(CultureInfo.InvariantCulture) + (crossing.Count == 1 ? " crossing" : " crossings"));
        }

        foreach (ChartFrame frame in chart.Frames)
        {
            (int x, int y) = places[frame.Id];
            int found = findings.Count(finding => finding.Frames.Contains(frame.Id));
            svg.Append(CultureInfo.InvariantCulture, $"<g><rect x=\"{x}\" y=\"{y}\" width=\"{Width}\" height=\"{Height}\" rx=\"6\"/><text x=\"{x + (Width / 2)}\" y=\"{y + (found > 0 ? 19 : 28)}\" text-anchor=\"middle\">{Escape(frame.Name)}</text>");
            if (found > 0)
                svg.Append(CultureInfo.InvariantCulture, $"<text class=\"label found\" x=\"{x + (Width / 2)}\" y=\"{y + 37}\" text-anchor=\"middle\">{Screen.Count(found)}</text>");
            svg.Append("</g>\n");
        }

        return svg.Append("</svg>\n").ToString();
    }

    // Roots above, each frame a row below the lowest of its parents; within a row by name.
    private static Dictionary<string, (int X, int Y)> Places(FrameChart chart)
    {
        var depths = chart.Frames.ToDictionary(frame => frame.Id, _ => 0);
        // As often as there are frames: a circle, which is an error reported elsewhere, ends too.
        for (int i = 0; i < chart.Frames.Count; i++)
        {
            foreach (ChartMotion motion in chart.Motions)
                depths[motion.Frame] = Math.Min(chart.Frames.Count, Math.Max(depths[motion.Frame], depths[motion.In] + 1));
        }

        var places = new Dictionary<string, (int, int)>();
        foreach (IGrouping<int, ChartFrame> row in chart.Frames.GroupBy(frame => depths[frame.Id]))
        {
            int column = 0;
            foreach (ChartFrame frame in row.OrderBy(frame => frame.Name, StringComparer.Ordinal).ThenBy(frame => frame.Id, StringComparer.Ordinal))
                places[frame.Id] = (Margin + (column++ * Column), Margin + (row.Key * Row));
        }

        return places;
    }

    private static string Describe(FrameChart chart, Dictionary<string, string> names)
        => string.Join(" ", chart.Motions.Select(motion => string.Create(
                CultureInfo.InvariantCulture,
                $"{names[motion.Frame]} moves in {names[motion.In]}{(motion.MaxSpeed > 0 ? $" at up to {motion.MaxSpeed:G4} c" : "")}."))
            .Concat(chart.Crossings.Select(crossing => string.Create(
                CultureInfo.InvariantCulture, $"{crossing.Count} member(s) carry numbers from {names[crossing.From]} to {names[crossing.To]}."))));

    private static void Line(StringBuilder svg, int x1, int y1, int x2, int y2)
        => svg.Append(CultureInfo.InvariantCulture, $"<line x1=\"{x1}\" y1=\"{y1}\" x2=\"{x2}\" y2=\"{y2}\"/>\n");

    private static void Label(StringBuilder svg, int x, int y, string text)
        => svg.Append(CultureInfo.InvariantCulture, $"<text class=\"label\" x=\"{x}\" y=\"{y}\">{Escape(text)}</text>\n");

    private static string Escape(string text) => WebUtility.HtmlEncode(text);
}
