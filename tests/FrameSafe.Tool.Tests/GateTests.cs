namespace FrameSafe.Tool.Tests;

/// <summary>The ledger of <c>framesafe gate</c>: what is new fails, what is gone is taken out, nothing is put in.</summary>
public sealed class GateTests
{
    private const string OneMore = """

            [return: Unit("m")]
            public static double Slack([Unit("m")] double bow, [Unit("km")] double stern) => bow + stern;
        }
        """;

    [Fact]
    public async Task It_passes_with_what_the_ledger_holds_also_when_lines_move_and_files_are_renamed()
    {
        using var project = new TinyProject();
        Assert.Equal(0, (await GateAsync(project, "--start")).ExitCode);
        project.Write("Renamed.cs", "// One line more.\n" + project.Read());
        File.Delete(project.At("Tow.cs"));

        Ran ran = await GateAsync(project);

        Assert.Equal(0, ran.ExitCode);
        Assert.Contains("Gate passed: 3 findings, all of them in the ledger.", ran.Output);
    }

    [Fact]
    public async Task A_new_finding_fails_at_its_line_and_is_not_taken_in()
    {
        using var project = new TinyProject();
        await GateAsync(project, "--start");
        string ledger = project.Read("framesafe.ledger");
        project.Write("Tow.cs", project.Read().TrimEnd()[..^1] + OneMore);

        Ran ran = await GateAsync(project, "--shrink");

        Assert.Equal(1, ran.ExitCode);
        Assert.Matches(@"(?m)^Tow\.cs\(2\d,\d+\): warning FRAME401: ", ran.Output);
        Assert.Contains("Gate failed: 1 new, 0 gone.", ran.Output);
        Assert.Equal(Entries(ledger), Entries(project.Read("framesafe.ledger")));
    }

    [Fact]
    public async Task What_is_gone_fails_until_the_ledger_is_shrunk()
    {
        using var project = new TinyProject();
        await GateAsync(project, "--start");
        int before = Entries(project.Read("framesafe.ledger"));
        project.Write("Tow.cs", project.Read().Replace("near + far;", "near + far * 1000;", StringComparison.Ordinal));

        Assert.Equal(1, (await GateAsync(project)).ExitCode);
        Assert.Equal(0, (await GateAsync(project, "--shrink")).ExitCode);
        Assert.Equal(0, (await GateAsync(project)).ExitCode);
        Assert.Equal((3, 2), (before, Entries(project.Read("framesafe.ledger"))));
    }

    [Fact]
    public async Task Coverage_may_only_rise()
    {
        using var project = new TinyProject();
        await GateAsync(project, "--start");
        project.Write("More.cs", "namespace Tiny; public static class More { public static double Untagged; }");

        Ran ran = await GateAsync(project, "--shrink");

        // 8 of 9, then 8 of 10.
        Assert.Equal(1, ran.ExitCode);
        Assert.Contains("Coverage of tags fell to 80 % from 88.8 %.", ran.Output);
        Assert.Contains("\"coveragePerMille\": 888", project.Read("framesafe.ledger"));
    }

    [Fact]
    public async Task Reports_of_pieces_are_judged_as_one()
    {
        using var north = new TinyProject(name: "North");
        using var south = new TinyProject(name: "South");
        File.Move(south.At("Tow.cs"), south.At("Haul.cs"));
        await CommandLine.RunAsync("survey", north.ProjectFile, "--report", north.At("north.sarif"));
        await CommandLine.RunAsync("survey", south.ProjectFile, "--report", north.At("south.sarif"));
        string ledger = north.At("framesafe.ledger");

        Ran start = await CommandLine.RunAsync("gate", north.At("north.sarif"), north.At("south.sarif"), "--ledger", ledger, "--start");
        Ran whole = await CommandLine.RunAsync("gate", north.At("south.sarif"), north.At("north.sarif"), "--ledger", ledger);
        Ran half = await CommandLine.RunAsync("gate", north.At("north.sarif"), "--ledger", ledger);

        Assert.Contains("Ledger started with 6 findings", start.Output);
        Assert.Equal((0, 0, 1), (start.ExitCode, whole.ExitCode, half.ExitCode));
        Assert.Contains("Gate failed: 0 new, 3 gone.", half.Output);
    }

    [Fact]
    public async Task What_does_not_compile_does_not_pass()
    {
        using var project = new TinyProject();
        await GateAsync(project, "--start");
        project.Write("Broken.cs", "namespace Tiny; public static class Broken { public static Missing Field; }");

        Ran ran = await GateAsync(project);

        Assert.Equal(3, ran.ExitCode);
        Assert.Contains("Tiny does not compile, so nothing can be said for it", ran.Output);
    }

    private static Task<Ran> GateAsync(TinyProject project, params string[] more)
        => CommandLine.RunAsync(["gate", project.ProjectFile, "--ledger", project.At("framesafe.ledger"), .. more]);

    private static int Entries(string ledger) => ledger.Split("\"rule\"").Length - 1;
}
