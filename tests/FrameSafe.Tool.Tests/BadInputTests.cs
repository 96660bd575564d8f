namespace FrameSafe.Tool.Tests;

/// <summary>What cannot be done is one line that names the thing and what is allowed; the exit code is 2 and nothing is written.</summary>
public sealed class BadInputTests
{
    [Fact]
    public Task No_such_path() => RefusesAsync(
        project => ["survey", project.At("absent")],
        project => $"{project.At("absent")}: there is no such file or folder.");

    [Fact]
    public Task A_file_that_is_no_project() => RefusesAsync(
        project => ["survey", project.At("Tow.cs")],
        project => $"{project.At("Tow.cs")}: not a project; a .csproj, .sln or .slnx file, or a folder that holds one, is wanted.");

    [Fact]
    public Task A_folder_without_a_project() => RefusesAsync(
        project => ["survey", Directory.CreateDirectory(project.At("empty")).FullName],
        project => $"{project.At("empty")}: the folder holds no .sln, .slnx or .csproj file.");

    [Fact]
    public async Task A_folder_with_two_projects()
    {
        using var project = new TinyProject();
        project.Write("Other.csproj", "<Project />");

        Ran ran = await CommandLine.RunAsync("survey", project.Folder);

        Assert.Equal(2, ran.ExitCode);
        Assert.Equal($"{project.Folder}: the folder holds 2 projects (Other.csproj, Tiny.csproj); name one of them.", ran.Errors.Trim());
    }

    [Fact]
    public async Task A_project_file_that_is_no_XML()
    {
        using var project = new TinyProject();
        project.Write("Tiny.csproj", "<Project");

        Ran ran = await CommandLine.RunAsync("survey", project.ProjectFile);

        Assert.Equal(2, ran.ExitCode);
        Assert.Contains("Tiny.csproj", ran.Errors);
        Assert.Single(ran.Errors.Trim().Split('\n'));
    }

    [Fact]
    public Task A_report_path_that_is_a_folder() => RefusesAsync(
        project => ["survey", project.Folder, "--report", Directory.CreateDirectory(project.At("out.sarif")).FullName],
        project => $"{project.At("out.sarif")}: is a folder; the name of a file is wanted.");

    [Fact]
    public Task A_report_below_a_file() => RefusesAsync(
        project => ["survey", project.Folder, "--report", project.At("Tow.cs/out.sarif")],
        project => $"{project.At("Tow.cs/out.sarif")}: {project.At("Tow.cs")} is a file, not a folder.");

    [Fact]
    public async Task A_report_of_no_known_kind()
    {
        using var project = new TinyProject();

        Ran ran = await CommandLine.RunAsync("survey", project.Folder, "--report", project.At("out.xml"));

        Assert.Equal(2, ran.ExitCode);
        Assert.StartsWith($"{project.At("out.xml")}: what kind of report that is cannot be told; the name ends in .sarif", ran.Errors);
        Assert.False(File.Exists(project.At("out.xml")));
    }

    [Theory]
    [InlineData("", "JSON")]
    [InlineData("{ \"version\": \"2.1.0\", \"runs\": [ {", "line 1")]
    [InlineData("{ \"version\": \"1.0.0\", \"runs\": [] }", "version 2.1.0 is read")]
    [InlineData("{ \"version\": \"2.1.0\", \"runs\": [ { \"tool\": { \"driver\": { \"name\": \"Other\" } } } ] }", "a report of Other")]
    [InlineData("{ \"version\": \"2.1.0\", \"runs\": [ { \"tool\": { \"driver\": { \"name\": \"FrameSafe\" } } } ] }", "missing")]
    public async Task A_report_that_cannot_be_read_back(string text, string says)
    {
        using var project = new TinyProject();
        project.Write("old.sarif", text);

        Ran ran = await CommandLine.RunAsync("survey", project.At("old.sarif"));

        Assert.Equal(2, ran.ExitCode);
        Assert.StartsWith(project.At("old.sarif") + ": ", ran.Errors);
        Assert.Contains(says, ran.Errors);
        Assert.Single(ran.Errors.Trim().Split('\n'));
    }

    [Fact]
    public Task A_ledger_that_is_not_there() => RefusesAsync(
        project => ["gate", project.Folder, "--ledger", project.At("absent.ledger")],
        project => $"{project.At("absent.ledger")}: there is no such ledger; gate --start writes the first one.");

    [Theory]
    [InlineData("", "not a ledger")]
    [InlineData("{ \"version\": 1,\n \"coveragePerMille\": nothing }", "line 2")]
    [InlineData("{ \"version\": 9, \"coveragePerMille\": 0, \"entries\": [] }", "a ledger of version 9; this tool reads version 1.")]
    [InlineData("{ \"version\": 1, \"coveragePerMille\": 1001, \"entries\": [] }", "coveragePerMille is 1001; it is from 0 to 1000.")]
    [InlineData("{ \"version\": 1, \"entries\": [] }", "coveragePerMille")]
    public async Task A_ledger_that_cannot_be_read(string text, string says)
    {
        using var project = new TinyProject();
        project.Write("framesafe.ledger", text);

        Ran ran = await CommandLine.RunAsync("gate", project.Folder, "--ledger", project.At("framesafe.ledger"));

        Assert.Equal(2, ran.ExitCode);
        Assert.StartsWith(project.At("framesafe.ledger") + ": ", ran.Errors);
        Assert.Contains(says, ran.Errors);
        Assert.Single(ran.Errors.Trim().Split('\n'));
        Assert.Equal(text, project.Read("framesafe.ledger"));
    }

    [Fact]
    public async Task A_ledger_is_never_started_over()
    {
        using var project = new TinyProject();
        project.Write("framesafe.ledger", "kept");

        Ran ran = await CommandLine.RunAsync("gate", project.Folder, "--ledger", project.At("framesafe.ledger"), "--start");

        Assert.Equal(2, ran.ExitCode);
        Assert.Equal("kept", project.Read("framesafe.ledger"));
    }

    [Fact]
    public async Task A_rule_that_does_not_exist()
    {
        using var project = new TinyProject();

        Ran mend = await CommandLine.RunAsync("mend", project.Folder, "--rule", "FRAME999");
        Ran explain = await CommandLine.RunAsync("explain", "FRAME999");

        Assert.Equal((2, 2), (mend.ExitCode, explain.ExitCode));
        Assert.StartsWith("--rule FRAME999: there is no such rule; the rules are FRAME101, ", mend.Errors);
        Assert.StartsWith("FRAME999: there is no such rule", explain.Errors);
    }

    [Fact]
    public Task A_file_of_another_solution() => RefusesAsync(
        project => ["mend", project.Folder, "--file", "/elsewhere/Other.cs"],
        _ => "--file /elsewhere/Other.cs: no file of the solution; a source file that one of its projects compiles is wanted.");

    private static async Task RefusesAsync(Func<TinyProject, string[]> arguments, Func<TinyProject, string> message)
    {
        using var project = new TinyProject();
        string[] files = Directory.GetFiles(project.Folder);

        Ran ran = await CommandLine.RunAsync(arguments(project));

        Assert.Equal(message(project), ran.Errors.Trim());
        Assert.Equal(2, ran.ExitCode);
        Assert.Equal(files.Order(), Directory.GetFiles(project.Folder).Order());
    }
}
