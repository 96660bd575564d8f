using FrameSafe.Analyzers.Tests.Verify;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Tests.Rules;

/// <summary>What an <c>.editorconfig</c> says: the error budget, the suffixes of names, and what of it cannot be read.</summary>
public sealed class SettingTests
{
    private const string Suffixes = """
        static class Case
        {
            static double Sum(double xLab, double x_ship) => xLab + x_ship;
            static double Same(double xLab, double yLab) => xLab + yLab;
            static double None(double slab, double x_ship) => slab + x_ship;
            static double Local(double xLab) { double yShip = xLab; return yShip; }
            static double Attribute([InFrame<Tug>] double xLab, double x_ship) => xLab + x_ship;
        }
        """;

    [Fact]
    public void A_suffix_says_the_frame_and_an_attribute_overrules_it()
    {
        string[] found = Findings(Suffixes, ("framesafe.name_suffix.lab", "Harbour"), ("framesafe.name_suffix.ship", "Tug"));

        Assert.Equal(["FRAME101: xLab + x_ship", "FRAME102: xLab"], found);
    }

    [Fact]
    public void Without_the_setting_names_say_nothing() => Assert.Empty(Findings(Suffixes));

    [Theory]
    [InlineData("framesafe.name_suffix.lab", "NoSuchFrame", "The setting framesafe.name_suffix.lab is `NoSuchFrame`, which is no frame or clock")]
    [InlineData("framesafe.name_suffix.lab", "System.String", "which is no frame or clock")]
    [InlineData("framesafe.error_budget", "small", "The setting framesafe.error_budget is `small`; a positive number is wanted")]
    [InlineData("framesafe.error_budget", "-1", "a positive number is wanted")]
    [InlineData("framesafe.error_budget", "0", "a positive number is wanted")]
    public void A_setting_that_cannot_be_read_is_reported_once(string key, string value, string message)
    {
        Diagnostic finding = Assert.Single(Source.Findings(Source.Compile(Source.Preamble, "class Other;"), new Dictionary<string, string> { [key] = value }));

        Assert.Equal("FRAME604", finding.Id);
        Assert.Contains(message, finding.GetMessage());
    }

    [Theory]
    [InlineData("1e-9", true)]
    [InlineData("0.3", false)]
    public void The_error_budget_decides_what_is_borne(string budget, bool reported)
    {
        const string code = """
            static class Case
            {
                static double Sum([Unit("m/s"), InFrame<Harbour>] double tug, [Unit("m/s"), InFrame<Tug>] double drone) => tug + drone;
            }
            """;

        Assert.Equal(reported, Findings(code, ("framesafe.error_budget", budget)).Length == 1);
    }

    private static string[] Findings(string code, params (string Key, string Value)[] settings)
        => [.. Source.Findings(Source.Compile(Source.Preamble + code), settings.ToDictionary(setting => setting.Key, setting => setting.Value))
            .Select(finding => finding.Id + ": " + finding.Location.SourceTree!.GetText().ToString(finding.Location.SourceSpan))];
}
