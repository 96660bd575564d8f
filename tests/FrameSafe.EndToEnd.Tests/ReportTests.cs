using Microsoft.Playwright;

namespace FrameSafe.EndToEnd;

/// <summary>The HTML report in a real browser: nothing from the code is markup, the filter filters, the keyboard reaches it.</summary>
[Collection(PackedFeedCollection.Name)]
public sealed class ReportTests(PackedFeed feed)
{
    private const string Hostile = """
        using FrameSafe;

        public readonly struct Yard : IInertialFrame;
        [RelativeTo<Yard>(MaxSpeed = 0.6)] public readonly struct Skiff : IInertialFrame;

        public static class Track
        {
            // <script>document.title = "run"</script>
            public static double Total([Unit("m")] double near, [Unit("km")] double far) => near + far /* <img src=x onerror="document.title='run'"> */;
            public static double Mixed([Unit("m"), InFrame<Yard>] double x, [Unit("m"), InFrame<Skiff>] double y) => x + y;
        }
        """;

    [Fact]
    public async Task The_report_is_read_filtered_and_harmless()
    {
        var project = new FreshProject(feed, Hostile);
        string report = Path.Combine(project.Folder, "findings.html");
        Assert.Equal(1, Command.Run(project.Folder, feed.Tool, "survey", ".", "--report", report).ExitCode);

        using IPlaywright playwright = await Playwright.CreateAsync();
        await using IBrowser browser = await playwright.Chromium.LaunchAsync(new()
        {
            ExecutablePath = "/usr/bin/chromium",
            Args = ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync"],
        });
        IPage page = await browser.NewPageAsync();
        var errors = new List<string>();
        page.PageError += (_, error) => errors.Add(error);
        await page.GotoAsync(new Uri(report).AbsoluteUri);

        Assert.Equal("FrameSafe survey", await page.TitleAsync());
        ILocator items = page.Locator(".findings > li");
        Assert.Equal(2, await items.CountAsync());
        Assert.Equal(0, await page.Locator(".findings img, .findings script").CountAsync());
        Assert.Contains("<img src=x", await items.First.InnerTextAsync());

        await page.Keyboard.PressAsync("/");
        await page.Keyboard.TypeAsync("mixed");
        Assert.Equal("1 of 2 shown", await page.Locator("#shown").InnerTextAsync());
        Assert.False(await items.First.IsVisibleAsync());
        await page.Keyboard.PressAsync("Escape");
        Assert.Equal("2 of 2 shown", await page.Locator("#shown").InnerTextAsync());
        await page.Locator("#rule").SelectOptionAsync("FRAME401");
        Assert.Equal("1 of 2 shown", await page.Locator("#shown").InnerTextAsync());

        ILocator chart = page.GetByRole(AriaRole.Img);
        Assert.Contains("Skiff moves in Yard at up to 0.6 c.", await chart.Locator("desc").TextContentAsync());
        Assert.Contains("γ ≤ 1.25", await chart.TextContentAsync());
        // Nothing is wider than the window, and nothing in the drawing is cut off.
        Assert.True(await page.EvaluateAsync<bool>("document.documentElement.scrollWidth <= window.innerWidth"));
        Assert.True(await page.EvaluateAsync<bool>(
            "[...document.querySelectorAll('.chart text')].every(text => { const b = text.getBBox(), v = text.ownerSVGElement.viewBox.baseVal; return b.x >= 0 && b.x + b.width <= v.width; })"));
        Assert.Empty(errors);
    }

    [Fact]
    public void The_chart_alone_is_svg()
    {
        var project = new FreshProject(feed, Hostile);

        CommandResult chart = Command.Run(project.Folder, feed.Tool, "chart", ".").MustSucceed();

        Assert.StartsWith("<svg xmlns=\"http://www.w3.org/2000/svg\"", chart.Output);
        System.Xml.Linq.XDocument.Parse(chart.Output);
    }

    [Theory]
    [InlineData("report.txt", "the name ends in .sarif or .html")]
    [InlineData("obj", "is a folder")]
    public void A_report_that_cannot_be_is_refused_before_the_work(string report, string message)
    {
        var project = new FreshProject(feed, Hostile);
        Directory.CreateDirectory(Path.Combine(project.Folder, "obj"));
        if (report == "obj")
            Directory.CreateDirectory(Path.Combine(project.Folder, "obj.html"));

        CommandResult survey = Command.Run(project.Folder, feed.Tool, "survey", ".", "--report", report == "obj" ? "obj.html" : report);

        Assert.Equal(2, survey.ExitCode);
        Assert.Contains(message, survey.All);
    }

    [Fact]
    public void Explain_prints_a_rules_page_and_names_the_rules_where_there_is_none()
    {
        Assert.Contains("# FRAME301 — ", Command.Run(feed.NewFolder("explain"), feed.Tool, "explain", "frame301").MustSucceed().Output);

        CommandResult unknown = Command.Run(feed.NewFolder("explain"), feed.Tool, "explain", "FRAME999");
        Assert.Equal(2, unknown.ExitCode);
        Assert.Contains("FRAME999: there is no such rule; the rules are FRAME101", unknown.All);
    }
}
