using System.Globalization;
using System.Text.Json;
using System.Text.RegularExpressions;

namespace FrameSafe.EndToEnd;

/// <summary>The installed tool on copies of the old-style simulation: survey, mend, gate.</summary>
[Collection(PackedFeedCollection.Name)]
public sealed partial class ToolTests(PackedFeed feed)
{
    [Fact]
    public void A_survey_prints_the_findings_with_their_errors_and_writes_them()
    {
        string sample = CopySample();
        string report = Path.Combine(sample, "out", "findings.sarif");

        CommandResult survey = Command.Run(sample, feed.Tool, "survey", ".", "--report", report);

        Assert.Equal(1, survey.ExitCode);
        foreach (string rule in (string[])["FRAME101", "FRAME201", "FRAME202", "FRAME301", "FRAME401"])
            Assert.Contains(rule, survey.Output);
        Assert.Contains("wrong by up to 25 %", survey.Output.ReplaceLineEndings(" "));
        using JsonDocument sarif = JsonDocument.Parse(File.ReadAllText(report));
        JsonElement run = sarif.RootElement.GetProperty("runs")[0];
        Assert.Equal("2.1.0", sarif.RootElement.GetProperty("version").GetString());
        Assert.Equal(7, run.GetProperty("results").GetArrayLength());
        JsonElement addition = run.GetProperty("results").EnumerateArray().Single(result => result.GetProperty("ruleId").GetString() == "FRAME301");
        Assert.Equal(0.25, addition.GetProperty("properties").GetProperty("worstRelativeError").GetDouble());
        Assert.Equal(2, addition.GetProperty("relatedLocations").GetArrayLength());
    }

    [Fact]
    public void Mending_leaves_no_finding_and_gives_the_mended_samples_numbers()
    {
        string sample = CopySample();
        string before = File.ReadAllText(Path.Combine(sample, "CourierShip.cs"));

        CommandResult preview = Command.Run(sample, feed.Tool, "mend", ".");
        Assert.Contains("+    public double SelfTest() => Light.TimeOver(ReceiverBehind * 1000);", preview.Output);
        Assert.Equal(before, File.ReadAllText(Path.Combine(sample, "CourierShip.cs")));

        Assert.Equal(0, Command.Run(sample, feed.Tool, "mend", ".", "--apply").ExitCode);
        Assert.Equal(0, Command.Run(sample, feed.Tool, "survey", ".").ExitCode);

        string[] mended = Run(sample);
        string[] expected = Run(Path.Combine(feed.Repository, "samples", "Relay.Mended"));
        Assert.Equal(expected.Length, mended.Length);
        for (int i = 0; i < expected.Length; i++)
            AssertSame(expected[i], mended[i]);
    }

    [Fact]
    public void The_gate_fails_on_what_is_new_and_on_what_is_gone_and_passes_after()
    {
        string sample = CopySample();
        string code = Path.Combine(sample, "Station.cs");
        CommandResult Gate(params string[] more) => Command.Run(sample, feed.Tool, ["gate", ".", "--ledger", "known.ledger", .. more]);

        Assert.Equal(2, Gate().ExitCode);
        Assert.Equal(0, Gate("--start").ExitCode);
        Assert.Equal(2, Gate("--start").ExitCode);
        Assert.Equal(0, Gate().ExitCode);

        // Lines may move.
        File.WriteAllText(code, "// A line more.\n" + File.ReadAllText(code));
        Assert.Equal(0, Gate().ExitCode);

        File.WriteAllText(code, File.ReadAllText(code).Replace("return sent + Light.TimeOver(path);", "return sent + Light.TimeOver(ReceiverBehind);"));
        CommandResult added = Gate();
        Assert.Equal(1, added.ExitCode);
        Assert.Matches(@"Station\.cs\(\d+,\d+\): warning FRAME402: ", added.Output);

        Command.Run(sample, feed.Tool, "mend", ".", "--apply");
        Assert.Equal(1, Gate().ExitCode);
        Assert.Equal(0, Gate("--shrink").ExitCode);
        Assert.Equal(0, Gate().ExitCode);
        Assert.DoesNotContain("FRAME", File.ReadAllText(Path.Combine(sample, "known.ledger")));
    }

    [Theory]
    [InlineData("nowhere.csproj", "nowhere.csproj: there is no such file or folder.")]
    [InlineData("Light.cs", "Light.cs: not a project; a .csproj, .sln or .slnx file, or a folder that holds one, is wanted.")]
    public void A_path_that_is_no_project_is_named(string path, string message)
    {
        CommandResult survey = Command.Run(CopySample(), feed.Tool, "survey", path);

        Assert.Equal(2, survey.ExitCode);
        Assert.Contains(message, survey.All);
    }

    [Fact]
    public void A_project_that_does_not_compile_is_surveyed_as_far_as_it_can_be()
    {
        string sample = CopySample();
        File.WriteAllText(Path.Combine(sample, "Broken.cs"), "class Broken { int x = ; }");

        CommandResult survey = Command.Run(sample, feed.Tool, "survey", ".");

        Assert.Equal(3, survey.ExitCode);
        Assert.Contains("does not compile and was surveyed as far as it could be", survey.Output.ReplaceLineEndings(" "));
        Assert.Contains("FRAME301", survey.Output);
    }

    [Fact]
    public void A_setting_that_cannot_be_read_is_named_with_its_file_and_what_is_allowed()
    {
        string sample = CopySample();
        File.WriteAllText(Path.Combine(sample, ".editorconfig"), "root = true\n[*.cs]\nframesafe.error_budget = tiny\n");

        CommandResult survey = Command.Run(sample, feed.Tool, "survey", ".");

        Assert.Equal(1, survey.ExitCode);
        Assert.Contains(".editorconfig(3,1) FRAME604", survey.Output);
        Assert.Contains("is `tiny`; a positive number is wanted", survey.Output.ReplaceLineEndings(" "));
    }

    [Fact]
    public void An_unreadable_ledger_is_named_and_left_alone()
    {
        string sample = CopySample();
        string ledger = Path.Combine(sample, "known.ledger");
        File.WriteAllText(ledger, "{ \"version\": 99, \"coveragePerMille\": 0, \"entries\": [] }");

        CommandResult gate = Command.Run(sample, feed.Tool, "gate", ".", "--ledger", "known.ledger");

        Assert.Equal(2, gate.ExitCode);
        Assert.Contains("known.ledger: a ledger of version 99; this tool reads version 1.", gate.All);
        Assert.Contains("99", File.ReadAllText(ledger));
    }

    [Fact]
    public void The_readmes_first_block_is_the_two_commands_and_the_first_one_works()
    {
        string readme = File.ReadAllText(Path.Combine(feed.Repository, "README.md"));
        string[] lines = FirstBlock().Match(readme).Groups[1].Value.Split('\n');
        Assert.Equal(2, lines.Length);
        Assert.Equal("dotnet test FrameSafe.sln", lines[1]);

        string[] words = lines[0].Split(' ');
        CommandResult survey = Command.Run(feed.Repository, words[0], words[1..]);

        Assert.Equal(1, survey.ExitCode);
        Assert.Contains("7 findings.", survey.Output);
        Assert.True(File.Exists(Path.Combine(feed.Repository, "artifacts", "findings.sarif")));
    }

    [Fact]
    public void The_repositorys_own_code_has_no_finding_but_the_samples_mistakes()
    {
        CommandResult survey = Command.Run(feed.Repository, feed.Tool, "survey", "FrameSafe.sln");

        Assert.Equal(1, survey.ExitCode);
        Assert.Contains("7 findings.", survey.Output);
        Assert.All(
            survey.Output.Split('\n').Where(line => FindingLine().IsMatch(line)),
            line => Assert.StartsWith("samples/Relay.OldStyle/", line));
    }

    private static string[] Run(string folder)
        => Command.Run(folder, "dotnet", "run").MustSucceed().Output.Split('\n', StringSplitOptions.RemoveEmptyEntries);

    // The same text, and numbers that agree within rounding.
    private static void AssertSame(string expected, string actual)
    {
        string[] these = Number().Split(expected);
        string[] those = Number().Split(actual);
        Assert.Equal(these.Length, those.Length);
        for (int i = 0; i < these.Length; i++)
        {
            if (double.TryParse(these[i], NumberStyles.Float, CultureInfo.InvariantCulture, out double number))
                Assert.Equal(number, double.Parse(those[i], CultureInfo.InvariantCulture), Math.Abs(number) * 1e-14);
            else
                Assert.Equal(these[i].Trim(), those[i].Trim());
        }
    }

    // The sample as a project of its own, which references the packed package and nothing of the repository.
    private string CopySample()
    {
        string folder = feed.NewFolder("relay");
        foreach (string file in Directory.GetFiles(Path.Combine(feed.Repository, "samples", "Relay.OldStyle"), "*.cs"))
            File.Copy(file, Path.Combine(folder, Path.GetFileName(file)));
        File.WriteAllText(Path.Combine(folder, "Relay.csproj"), $"""
            <Project Sdk="Microsoft.NET.Sdk">
              <PropertyGroup>
                <OutputType>Exe</OutputType>
                <TargetFramework>net10.0</TargetFramework>
                <ImplicitUsings>enable</ImplicitUsings>
              </PropertyGroup>
              <ItemGroup>
                <PackageReference Include="FrameSafe" Version="{feed.Version}" />
              </ItemGroup>
            </Project>
            """);
        return folder;
    }

    [GeneratedRegex(@"^\S+\(\d+,\d+\) ")]
    private static partial Regex FindingLine();

    [GeneratedRegex(@"(-?\d+(?:\.\d+)?(?:E[+-]?\d+)?)")]
    private static partial Regex Number();

    [GeneratedRegex(@"```\n(.*?)\n```", RegexOptions.Singleline)]
    private static partial Regex FirstBlock();
}
