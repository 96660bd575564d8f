using System.Globalization;
using System.Net;
using System.Text;
using FrameSafe.Tool.Surveying;

namespace FrameSafe.Tool.Reports;

/// <summary>A survey as one HTML file that needs nothing else: findings, coverage, frame chart. Nothing from the code is markup in it.</summary>
internal static class HtmlReport
{
    // Beyond this a browser labours; the SARIF file holds all.
    private const int MostShown = 5000;

    internal const string Extension = ".html";

    internal static string Of(Survey survey)
    {
        int projects = survey.Coverage.Select(row => row.Project).Distinct().Count();
        var html = new StringBuilder();
        html.Append("<!DOCTYPE html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n")
            .Append("<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src 'unsafe-inline'; script-src 'unsafe-inline'\">\n")
            .Append("<title>FrameSafe survey</title>\n<style>\n").Append(Style).Append("</style>\n</head>\n<body>\n")
            .Append("<a class=\"skip\" href=\"#findings\">Skip to the findings</a>\n<header><h1>FrameSafe survey</h1>\n")
            .Append("<p>").Append(Text(Screen.Count(survey.Findings.Count))).Append(" in ").Append(projects).Append(projects == 1 ? " project, " : " projects, ")
            .Append(survey.Lines.ToString("N0", CultureInfo.InvariantCulture)).Append(" lines.</p>\n");
        foreach (Trouble trouble in survey.Troubles)
            html.Append("<p class=\"broken\">").Append(Text(trouble.ToString())).Append("</p>\n");
        html.Append("</header>\n<main>\n");
        Findings(html, survey);
        Coverage(html, survey);
        html.Append("<section aria-labelledby=\"chart-heading\"><h2 id=\"chart-heading\">Frame chart</h2>\n<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-labelledby=\"chart-heading\">\n")
            .Append(ChartDrawing.Svg(survey.Chart, survey.Findings)).Append("</div></section>\n</main>\n<script>\n").Append(Script).Append("</script>\n</body>\n</html>\n");
        return html.ToString();
    }

    private static void Findings(StringBuilder html, Survey survey)
    {
        html.Append("<section aria-labelledby=\"findings\"><h2 id=\"findings\">Findings</h2>\n<form class=\"filter\" role=\"search\" onsubmit=\"return false\">\n")
            .Append("<label>Search <input type=\"search\" id=\"search\" autocomplete=\"off\" accesskey=\"s\"></label>\n<label>Rule <select id=\"rule\"><option value=\"\">all</option>");
        foreach (string rule in survey.Findings.Select(finding => finding.Rule).Distinct().Order(StringComparer.Ordinal))
            html.Append("<option>").Append(Text(rule)).Append("</option>");
        html.Append("</select></label>\n<output id=\"shown\" aria-live=\"polite\"></output>\n</form>\n<ol class=\"findings\">\n");
        foreach (Finding finding in survey.Findings.Take(MostShown))
        {
            html.Append("<li data-rule=\"").Append(Text(finding.Rule)).Append("\"><h3><span class=\"rule\">").Append(Text(finding.Rule)).Append("</span> ")
                .Append(Text(finding.Member)).Append("</h3>\n<p class=\"place\">").Append(Text(finding.Place.Path)).Append(CultureInfo.InvariantCulture, $"({finding.Place.Line},{finding.Place.Column})");
            if (finding.Error is { } error)
                html.Append(" <strong class=\"error\">up to ").Append(Text(Analyzers.Rules.ErrorText.Size(error))).Append("</strong>");
            html.Append("</p>\n<pre><code>").Append(Text(finding.SourceLine)).Append("</code></pre>\n<p>").Append(Text(finding.Message)).Append("</p>\n");
            if (finding.Origins.Count > 0)
            {
                html.Append("<ul class=\"origins\">");
                foreach (OriginPlace origin in finding.Origins)
                    html.Append("<li>").Append(Text(origin.Text)).Append(" <span class=\"place\">").Append(Text(origin.Place.Path)).Append(CultureInfo.InvariantCulture, $"({origin.Place.Line},{origin.Place.Column})").Append("</span></li>");
                html.Append("</ul>\n");
            }

            html.Append("</li>\n");
        }

        html.Append("</ol>\n");
        if (survey.Findings.Count > MostShown)
            html.Append("<p>The first ").Append(MostShown).Append(" are shown; the SARIF file holds all.</p>\n");
        html.Append("</section>\n");
    }

    private static void Coverage(StringBuilder html, Survey survey)
    {
        html.Append("<section aria-labelledby=\"coverage\"><h2 id=\"coverage\">Coverage of tags</h2>\n<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-labelledby=\"coverage\">\n<table><thead><tr><th scope=\"col\">Project</th><th scope=\"col\">File</th><th scope=\"col\">Tagged</th><th scope=\"col\">Numbers</th><th scope=\"col\">Share</th><th scope=\"col\">Untagged</th></tr></thead><tbody>\n");
        foreach (FileCoverage row in survey.Coverage)
        {
            html.Append("<tr><th scope=\"row\">").Append(Text(row.Project)).Append("</th><td>").Append(Text(row.File)).Append("</td><td>").Append(row.Tagged).Append("</td><td>").Append(row.Numbers)
                .Append(CultureInfo.InvariantCulture, $"</td><td><meter min=\"0\" max=\"1\" value=\"{row.Share:0.###}\"></meter> {row.Share * 100:0.#} %</td><td>");
            if (row.Untagged.Count > 0)
            {
                html.Append("<details><summary>").Append(row.Untagged.Count).Append(" untagged</summary><ul>");
                foreach (UntaggedNumber number in row.Untagged)
                    html.Append(CultureInfo.InvariantCulture, $"<li>{Text(number.Name)} <span class=\"place\">line {number.Line}</span></li>");
                html.Append("</ul></details>");
            }

            html.Append("</td></tr>\n");
        }

        html.Append("</tbody></table></div></section>\n");
    }

    private static string Text(string text) => WebUtility.HtmlEncode(text);

    private const string Style = """
        :root { color-scheme: light dark; --line: #8886; --red: light-dark(#b3261e, #f2b8b5); }
        body { font: 16px/1.5 system-ui, sans-serif; max-width: 70rem; margin: 0 auto; padding: 1rem; }
        .skip { position: absolute; left: -100rem; }
        .skip:focus { left: 1rem; }
        .filter { display: flex; flex-wrap: wrap; gap: 1rem; align-items: center; margin: 1rem 0; }
        .findings { list-style: none; padding: 0; }
        .findings > li { border: 1px solid var(--line); border-radius: .5rem; padding: .5rem 1rem; margin: 0 0 1rem; }
        .findings h3 { margin: 0; font-size: 1rem; }
        .rule, .error, .broken { color: var(--red); }
        .place { font-size: .875rem; opacity: .8; margin: 0; }
        pre, .scroll { overflow-x: auto; }
        pre { background: #8882; padding: .5rem; border-radius: .25rem; margin: .5rem 0; }
        table { border-collapse: collapse; }
        th, td { border-bottom: 1px solid var(--line); padding: .25rem .75rem; text-align: left; }
        [hidden] { display: none !important; }
        @media print { .filter, .skip { display: none; } .findings > li { break-inside: avoid; } }

        """;

    private const string Script = """
        const search = document.getElementById("search");
        const rule = document.getElementById("rule");
        const shown = document.getElementById("shown");
        const items = [...document.querySelectorAll(".findings > li")];
        function filter() {
          const words = search.value.toLowerCase().split(/\s+/).filter(Boolean);
          let count = 0;
          for (const item of items) {
            const text = item.textContent.toLowerCase();
            const fits = (!rule.value || item.dataset.rule === rule.value) && words.every(word => text.includes(word));
            item.hidden = !fits;
            count += fits;
          }
          shown.textContent = count + " of " + items.length + " shown";
        }
        search.addEventListener("input", filter);
        rule.addEventListener("change", filter);
        document.addEventListener("keydown", event => {
          if (event.key === "/" && document.activeElement !== search) { event.preventDefault(); search.focus(); }
          if (event.key === "Escape" && document.activeElement === search) { search.value = ""; filter(); }
        });
        filter();

        """;
}
