using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeActions;
using Microsoft.CodeAnalysis.CodeFixes;

namespace FrameSafe.EndToEnd;

/// <summary>The lightbulb: actions offered, applied and compiled in a workspace host that loads the packed package.</summary>
[Collection(PackedFeedCollection.Name)]
public sealed class WorkspaceHostTests(PackedFeed feed)
{
    private const string TwoUnits = """
        using FrameSafe;

        public static class Track
        {
            [return: Unit("m")]
            public static double Total([Unit("m")] double near, [Unit("km")] double far) => near + far;

            [return: Unit("m")]
            public static double Rest([Unit("m")] double near, [Unit("km")] double far) => near - far;
        }
        """;

    [Fact]
    public async Task A_repair_is_offered_applied_and_compiles()
    {
        using WorkspaceHost host = await WorkspaceHost.OpenAsync(new FreshProject(feed, TwoUnits));

        await host.ApplyAsync((await host.ActionsAsync("FRAME401"))[0]);

        Assert.Contains("near + far * 1000", await host.TextAsync());
        Diagnostic left = Assert.Single(await host.FindingsAsync());
        Assert.Equal("FRAME401", left.Id);
    }

    [Theory]
    [InlineData(FixAllScope.Document)]
    [InlineData(FixAllScope.Project)]
    [InlineData(FixAllScope.Solution)]
    public async Task Fix_all_leaves_nothing(FixAllScope scope)
    {
        using WorkspaceHost host = await WorkspaceHost.OpenAsync(new FreshProject(feed, TwoUnits));

        await host.FixAllAsync("FRAME401", scope);

        Assert.Contains("near + far * 1000", await host.TextAsync());
        Assert.Contains("near - far * 1000", await host.TextAsync());
        Assert.Empty(await host.FindingsAsync());
    }

    [Fact]
    public async Task The_compilers_own_error_is_mended_through_a_boost_and_its_inverse()
    {
        using WorkspaceHost host = await WorkspaceHost.OpenAsync(new FreshProject(feed, """
            using FrameSafe;

            public readonly struct Yard : IInertialFrame;
            public readonly struct Skiff : IInertialFrame;

            public static class Track
            {
                public static SeparationRate<Yard> Closing(Velocity<Yard> tug, Velocity<Skiff> drone, Boost<Yard, Skiff> toSkiff)
                    => tug - drone;
            }
            """));

        IReadOnlyList<CodeAction> actions = await host.ActionsAsync("CS0019");
        CodeAction inverse = Assert.Single(actions, action => action.Title.Contains("through the inverse of `toSkiff`"));
        await host.ApplyAsync(inverse);

        Assert.Empty(await host.FindingsAsync());
    }
}
