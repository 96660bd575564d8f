using System.Diagnostics;
using System.Text;

namespace FrameSafe.Tool.Tests;

/// <summary><c>framesafe mend</c> shows first, and writes all or nothing.</summary>
public sealed class MendTests
{
    [Fact]
    public async Task Without_apply_a_diff_is_shown_and_nothing_written()
    {
        using var project = new TinyProject();

        Ran ran = await CommandLine.RunAsync("mend", project.ProjectFile);

        Assert.Equal(1, ran.ExitCode);
        Assert.Contains("--- a/Tow.cs", ran.Output);
        Assert.Contains("+++ b/Tow.cs", ran.Output);
        Assert.Contains("+    public static double Length([Unit(\"m\")] double near, [Unit(\"km\")] double far) => near + far * 1000;", ran.Output);
        Assert.Equal(TinyProject.Faulty, project.Read());
    }

    [Fact]
    public async Task The_diff_is_one_that_git_applies_and_applying_writes_the_same()
    {
        using var project = new TinyProject();
        Ran shown = await CommandLine.RunAsync("mend", project.ProjectFile, "--rule", "FRAME401");
        string diff = shown.Output[..shown.Output.LastIndexOf("1 file", StringComparison.Ordinal)];
        project.Write("mend.diff", diff);

        Git(project, "apply", "mend.diff");
        string applied = project.Read();
        project.Write("Tow.cs", TinyProject.Faulty);
        await CommandLine.RunAsync("mend", project.ProjectFile, "--rule", "FRAME401", "--apply");

        Assert.Equal(TinyProject.Faulty.Replace("near + far;", "near + far * 1000;", StringComparison.Ordinal), applied);
        Assert.Equal(applied, project.Read());
    }

    [Fact]
    public async Task Line_ends_and_the_byte_order_mark_are_kept()
    {
        using var project = new TinyProject();
        string source = TinyProject.Faulty.ReplaceLineEndings("\r\n");
        File.WriteAllText(project.At("Tow.cs"), source, new UTF8Encoding(encoderShouldEmitUTF8Identifier: true));

        await CommandLine.RunAsync("mend", project.ProjectFile, "--rule", "FRAME401", "--apply");

        byte[] expected =
        [
            .. Encoding.UTF8.Preamble, .. Encoding.UTF8.GetBytes(source.Replace("near + far;", "near + far * 1000;", StringComparison.Ordinal)),
        ];
        Assert.Equal(expected, File.ReadAllBytes(project.At("Tow.cs")));
    }

    [Fact]
    public async Task Only_the_named_file_is_mended()
    {
        using var project = new TinyProject();
        project.Write("Other.cs", TinyProject.Faultless.Replace("Tow", "Other", StringComparison.Ordinal).Replace(" * 1000", "", StringComparison.Ordinal));

        await CommandLine.RunAsync("mend", project.ProjectFile, "--file", project.At("Other.cs"), "--apply");

        Assert.Contains("near + far * 1000;", project.Read("Other.cs"));
        Assert.Equal(TinyProject.Faulty, project.Read());
    }

    [Fact]
    public async Task Where_one_file_cannot_be_written_none_is()
    {
        using var project = new TinyProject();
        string other = TinyProject.Faultless.Replace("Tow", "Unwritable", StringComparison.Ordinal).Replace(" * 1000", "", StringComparison.Ordinal);
        project.Write("Unwritable.cs", other);
        // A folder where the old text would be kept: the second replacement fails after the first has succeeded.
        Directory.CreateDirectory(project.At($"Unwritable.cs.{Environment.ProcessId}.before"));

        Ran ran = await CommandLine.RunAsync("mend", project.ProjectFile, "--apply");

        Assert.Equal(2, ran.ExitCode);
        Assert.StartsWith($"{project.At("Unwritable.cs")}: cannot be written, so nothing was mended: ", ran.Errors);
        Assert.Equal((TinyProject.Faulty, other), (project.Read(), project.Read("Unwritable.cs")));
        Assert.Equal(["Tow.cs", "Unwritable.cs"], Directory.GetFiles(project.Folder, "*.cs*").Where(file => !file.EndsWith("proj", StringComparison.Ordinal)).Select(Path.GetFileName).Order());
    }

    [Fact]
    public async Task Uncommitted_changes_are_not_written_over_unless_asked_for()
    {
        using var project = new TinyProject();
        Git(project, "init", "-q");
        Git(project, "add", "Tow.cs");
        Git(project, "-c", "user.name=t", "-c", "user.email=t@example.org", "commit", "-qm", "first");
        string changed = "// Not committed.\n" + TinyProject.Faulty;
        project.Write("Tow.cs", changed);

        Ran refused = await CommandLine.RunAsync("mend", project.ProjectFile, "--apply");
        string kept = project.Read();
        await CommandLine.RunAsync("mend", project.ProjectFile, "--apply", "--over-uncommitted");

        Assert.Equal(2, refused.ExitCode);
        Assert.Equal("Tow.cs: has uncommitted changes; commit them, or mend with --over-uncommitted.", refused.Errors.Trim());
        Assert.Equal(changed, kept);
        Assert.Contains("near + far * 1000;", project.Read());
    }

    private static void Git(TinyProject project, params string[] arguments)
    {
        using Process git = Process.Start(new ProcessStartInfo("git", arguments) { WorkingDirectory = project.Folder })!;
        git.WaitForExit();
        Assert.Equal(0, git.ExitCode);
    }
}
