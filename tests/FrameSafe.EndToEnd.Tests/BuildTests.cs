namespace FrameSafe.EndToEnd;

/// <summary>The package in a fresh project, through the ordinary compiler.</summary>
[Collection(PackedFeedCollection.Name)]
public sealed class BuildTests(PackedFeed feed)
{
    private const string MixedUnits = """
        using FrameSafe;

        public static class Track
        {
            [return: Unit("m")]
            public static double Total([Unit("m")] double near, [Unit("km")] double far)
            {
                return near + far;
            }
        }
        """;

    [Fact]
    public void A_finding_is_a_warning_by_default()
    {
        CommandResult build = new FreshProject(feed, MixedUnits).Build().MustSucceed();

        Assert.Contains("Code.cs(8,16): warning FRAME401", build.Output);
        Assert.DoesNotContain("AD0001", build.Output);
        Assert.DoesNotContain("CS8032", build.Output);
        Assert.DoesNotContain("CS9057", build.Output);
    }

    [Theory]
    [InlineData("net8.0")]
    [InlineData("netstandard2.0")]
    public void Older_frameworks_are_served(string framework)
    {
        CommandResult build = new FreshProject(feed, MixedUnits, framework, "<LangVersion>latest</LangVersion>").Build();

        Assert.Contains("warning FRAME401", build.MustSucceed().Output);
    }

    [Fact]
    public void Strict_makes_it_an_error()
    {
        CommandResult build = new FreshProject(feed, MixedUnits).Build("-p:FrameSafePreset=strict");

        Assert.Equal(1, build.ExitCode);
        Assert.Contains("error FRAME401", build.Output);
    }

    [Fact]
    public void Off_silences_everything()
    {
        CommandResult build = new FreshProject(feed, MixedUnits).Build("-p:FrameSafePreset=off");

        Assert.DoesNotContain("FRAME", build.MustSucceed().Output);
    }

    [Fact]
    public void An_unknown_preset_is_named_with_what_is_allowed()
    {
        CommandResult build = new FreshProject(feed, MixedUnits).Build("-p:FrameSafePreset=loud");

        Assert.Equal(1, build.ExitCode);
        Assert.Contains("FrameSafePreset is 'loud'; allowed are quiet, default, strict and off", build.Output);
    }

    [Fact]
    public void The_editorconfig_wins_over_a_preset()
    {
        var project = new FreshProject(feed, MixedUnits);
        project.Write(".editorconfig", "root = true\n[*.cs]\ndotnet_diagnostic.FRAME401.severity = none\n");

        CommandResult build = project.Build("-p:FrameSafePreset=strict");

        Assert.DoesNotContain("FRAME401", build.Output);
    }

    [Fact]
    public void A_pragma_and_an_attribute_silence_one_place()
    {
        string pragma = MixedUnits.Replace("        return near", "#pragma warning disable FRAME401\n        return near");
        string attribute = MixedUnits.Replace(
            "    [return:", "    [System.Diagnostics.CodeAnalysis.SuppressMessage(\"FrameSafe.Units\", \"FRAME401\")]\n    [return:");

        foreach (string source in (string[])[pragma, attribute])
        {
            CommandResult build = new FreshProject(feed, source).Build().MustSucceed();
            Assert.DoesNotContain("FRAME401", build.Output);
        }
    }

    [Fact]
    public void One_property_writes_the_findings_as_sarif()
    {
        var project = new FreshProject(feed, MixedUnits);

        project.Build("-p:FrameSafeReport=findings.sarif").MustSucceed();

        string sarif = project.Read("findings.sarif");
        Assert.Contains("\"version\": \"2.1.0\"", sarif);
        Assert.Contains("\"ruleId\": \"FRAME401\"", sarif);
    }

    [Fact]
    public void Code_without_tags_builds_without_a_word_of_ours()
    {
        const string plain = """
            public static class Statistics
            {
                public static double Fisher(double r) => 0.5 * System.Math.Log((1 + r) / (1 - r));
                public static double Slope(double beta, double x) => beta * x / System.Math.Sqrt(1 - x * x);
            }
            """;

        CommandResult build = new FreshProject(feed, plain).Build().MustSucceed();

        Assert.Contains("0 Warning(s)", build.Output);
    }
}
