namespace FrameSafe.Tool.Tests;

/// <summary>What <c>framesafe survey</c> says of a project that does not reference the analyzer.</summary>
public sealed class SurveyTests
{
    [Fact]
    public async Task Findings_are_shown_with_place_code_and_computed_error()
    {
        using var project = new TinyProject();

        Ran ran = await CommandLine.RunAsync("survey", project.ProjectFile);

        Assert.Equal(1, ran.ExitCode);
        Assert.Contains("Tow.cs(15,86) FRAME401 in Tiny.Tow.Length", ran.Output);
        Assert.Contains("Tow.cs(18,124) FRAME301 in Tiny.Tow.Speed", ran.Output);
        Assert.Contains("Tow.cs(20,119) FRAME101 in Tiny.Tow.IsAhead", ran.Output);
        Assert.Contains("=> barge + winch;", ran.Output);
        // Two collinear speeds of 0.4 c: the plain sum 0.8 c stands for 0.8/1.16 c, so it is 16 % too large.
        Assert.Contains("wrong by up to 16 %", ran.Output);
        Assert.Contains("3 findings.", ran.Output);
        Assert.Empty(ran.Errors);
    }

    [Fact]
    public async Task The_share_of_tagged_numbers_counts_signatures_fields_and_properties()
    {
        using var project = new TinyProject();

        Ran ran = await CommandLine.RunAsync("survey", project.ProjectFile);

        // Ratio; Length: result, near, far; Speed: result, barge, winch; IsAhead: place, mark. Ratio alone has no tag.
        Assert.Contains("Coverage: 8 of 9 numbers in signatures, fields and properties carry a tag (88.9 %).", ran.Output);
    }

    [Fact]
    public async Task Nothing_of_the_project_is_changed()
    {
        using var project = new TinyProject();
        string before = project.Read() + project.Read("Tiny.csproj");

        await CommandLine.RunAsync("survey", project.Folder);

        Assert.Equal(before, project.Read() + project.Read("Tiny.csproj"));
    }

    [Fact]
    public async Task Faultless_code_exits_clean()
    {
        using var project = new TinyProject(TinyProject.Faultless);

        Ran ran = await CommandLine.RunAsync("survey", project.Folder);

        Assert.Equal(0, ran.ExitCode);
        Assert.Contains("No findings.", ran.Output);
    }

    [Fact]
    public async Task What_does_not_compile_is_surveyed_as_far_as_it_can_be()
    {
        using var project = new TinyProject();
        project.Write("Broken.cs", "namespace Tiny; public static class Broken { public static Missing Field; }");

        Ran ran = await CommandLine.RunAsync("survey", project.ProjectFile);

        Assert.Equal(3, ran.ExitCode);
        Assert.Contains("FRAME401", ran.Output);
        Assert.Contains("Tiny does not compile and was surveyed as far as it could be: 1 compiler error, the first CS0246 at Broken.cs(1,60)", ran.Output.ReplaceLineEndings(" "));
    }

    [Fact]
    public async Task Quiet_says_only_what_it_comes_to()
    {
        using var project = new TinyProject();

        Ran ran = await CommandLine.RunAsync("survey", project.ProjectFile, "--quiet");

        Assert.DoesNotContain("Tow.cs(", ran.Output);
        Assert.Contains("3 findings.", ran.Output);
    }

    [Fact]
    public async Task Verbose_says_each_step_on_standard_error()
    {
        using var project = new TinyProject();

        Ran ran = await CommandLine.RunAsync("survey", project.ProjectFile, "--verbose");

        Assert.Contains("opening Tiny.csproj", ran.Errors);
        Assert.Contains("surveyed Tiny (1 of 1)", ran.Errors);
    }

    [Fact]
    public async Task Code_that_looks_like_console_markup_is_shown_as_it_is()
    {
        using var project = new TinyProject(TinyProject.Faulty.Replace("near + far;", "near + far; // [red]not[/] markup [/]", StringComparison.Ordinal));

        Ran ran = await CommandLine.RunAsync("survey", project.ProjectFile);

        Assert.Contains("near + far; // [red]not[/] markup [/]", ran.Output);
    }

    [Fact]
    public async Task A_budget_that_cannot_be_read_is_named_where_it_stands()
    {
        using var project = new TinyProject();
        project.Write(".editorconfig", "root = true\n[*.cs]\nframesafe.error_budget = small\n");

        Ran ran = await CommandLine.RunAsync("survey", project.ProjectFile);

        Assert.Equal(1, ran.ExitCode);
        Assert.Contains(".editorconfig(3,1) FRAME604", ran.Output);
        Assert.Contains("framesafe.error_budget is `small`; a positive number is wanted, such as 1e-9", ran.Output);
    }

    [Fact]
    public async Task A_wide_budget_silences_the_shortcut_and_nothing_else()
    {
        using var project = new TinyProject();
        project.Write(".editorconfig", "root = true\n[*.cs]\nframesafe.error_budget = 0.5\n");

        Ran ran = await CommandLine.RunAsync("survey", project.ProjectFile);

        Assert.DoesNotContain("FRAME301", ran.Output);
        Assert.Contains("2 findings.", ran.Output);
    }

    [Fact]
    public async Task Generated_files_count_for_nothing()
    {
        using var project = new TinyProject(TinyProject.Faultless);
        project.Write("Made.g.cs", "namespace Tiny; public static class Made { public static double Untagged; }");

        Ran ran = await CommandLine.RunAsync("survey", project.ProjectFile);

        Assert.Contains("Coverage: 3 of 3 numbers", ran.Output);
    }
}
