namespace FrameSafe.EndToEnd;

/// <summary>The analyzer while code is being typed, in a language server as an editor runs it.</summary>
[Collection(PackedFeedCollection.Name)]
public sealed class LanguageServerTests(PackedFeed feed)
{
    private const string Right = """
        using FrameSafe;

        public static class Track
        {
            [return: Unit("m")]
            public static double Total([Unit("m")] double near, [Unit("m")] double far) => near + far;
        }
        """;

    [Fact]
    public async Task Findings_appear_change_and_go_while_typing()
    {
        var project = new FreshProject(feed, Right);
        string path = Path.Combine(project.Folder, "Code.cs");
        await using LanguageServer server = await LanguageServer.StartAsync(feed, project);
        await server.OpenAsync(path);

        Assert.DoesNotContain("FRAME401", await server.CodesAsync(path));

        await server.ChangeAsync(path, Right.Replace("[Unit(\"m\")] double far", "[Unit(\"km\")] double far"));
        Assert.Contains("FRAME401", await server.CodesAsync(path, codes => codes.Contains("FRAME401")));

        await server.ChangeAsync(path, Right.Replace("[Unit(\"m\")] double far", "[Unit(\"s\")] double far"));
        IReadOnlyList<string> changed = await server.CodesAsync(path, codes => codes.Contains("FRAME403"));
        Assert.Contains("FRAME403", changed);
        Assert.DoesNotContain("FRAME401", changed);

        // Half a line, as it stands between two keystrokes: no crash is reported, and the compiler's own errors remain.
        await server.ChangeAsync(path, Right.Replace("near + far;", "near + "));
        IReadOnlyList<string> broken = await server.CodesAsync(path, codes => codes.Any(code => code.StartsWith("CS", StringComparison.Ordinal)));
        Assert.DoesNotContain("AD0001", broken);

        await server.ChangeAsync(path, Right);
        Assert.DoesNotContain("FRAME403", await server.CodesAsync(path, codes => !codes.Contains("FRAME403")));
    }
}
