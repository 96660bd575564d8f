using System.Globalization;
using System.Text;
using FrameSafe;

namespace TripDiagram;

/// <summary>A spacetime diagram as SVG: distance to the right in light years, time of the port upward in years; light at 45 degrees.</summary>
internal sealed class Diagram(double years)
{
    private const double Scale = 60;
    private const double Margin = 50;
    private readonly StringBuilder _marks = new();

    internal static double Year => 365.25 * 86400;

    internal static double LightYear => Year * 299_792_458.0;

    public void Path(IEnumerable<SpacetimeEvent<Port>> events, string style)
        => _marks.Append(CultureInfo.InvariantCulture, $"<polyline class=\"{style}\" points=\"{string.Join(' ', events.Select(Point))}\"/>\n");

    public void Tick(SpacetimeEvent<Port> at, string text, string style)
        => _marks.Append(CultureInfo.InvariantCulture, $"<circle class=\"{style}\" cx=\"{X(at):F1}\" cy=\"{Y(at):F1}\" r=\"3\"/><text x=\"{X(at) + 6:F1}\" y=\"{Y(at) + 4:F1}\">{text}</text>\n");

    public string Svg(double lightYears)
    {
        double width = (2 * Margin) + (lightYears * Scale) + 40;
        double height = (2 * Margin) + (years * Scale);
        return string.Create(CultureInfo.InvariantCulture, $$"""
            <svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 {{width:F0}} {{height:F0}}" width="{{width:F0}}" role="img" aria-label="Spacetime diagram of the trip">
            <style>text{font:11px system-ui,sans-serif}polyline{fill:none;stroke-width:1.5}.port{stroke:#1f4e79;fill:#1f4e79}.ship{stroke:#b3261e;fill:#b3261e}polyline.port,polyline.ship{fill:none}.up{stroke:#1f4e79;stroke-dasharray:4 3;opacity:.6}.down{stroke:#b3261e;stroke-dasharray:4 3;opacity:.6}</style>
            <text x="{{Margin:F0}}" y="16">time of the port in years, upward;</text>
            <text x="{{Margin:F0}}" y="32">distance in light years, to the right; light at 45°</text>
            {{_marks}}</svg>

            """);
    }

    private static double X(SpacetimeEvent<Port> at) => Margin + (at.Place.XInMetres / LightYear * Scale);

    private double Y(SpacetimeEvent<Port> at) => Margin + ((years - (at.Time.InSeconds / Year)) * Scale);

    private string Point(SpacetimeEvent<Port> at) => string.Create(CultureInfo.InvariantCulture, $"{X(at):F1},{Y(at):F1}");
}
