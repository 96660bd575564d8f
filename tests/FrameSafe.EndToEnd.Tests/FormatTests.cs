namespace FrameSafe.EndToEnd;

/// <summary>The repairs through <c>dotnet format analyzers</c>.</summary>
[Collection(PackedFeedCollection.Name)]
public sealed class FormatTests(PackedFeed feed)
{
    [Fact]
    public void A_unit_is_converted_and_the_comment_stays()
    {
        var project = new FreshProject(feed, """
            using FrameSafe;

            public static class Track
            {
                [return: Unit("m")]
                public static double Total([Unit("m")] double near, [Unit("km")] double far)
                    => near + far; // along the keel
            }
            """);

        project.Dotnet("format", "analyzers", "Fresh.csproj", "--diagnostics", "FRAME401", "--severity", "info").MustSucceed();

        Assert.Contains("=> near + far * 1000; // along the keel", project.Read());
        Assert.DoesNotContain("FRAME", project.Build().MustSucceed().Output);
    }

    [Fact]
    public void A_compiler_error_between_two_frames_is_mended_through_the_boost_in_scope()
    {
        var project = new FreshProject(feed, """
            using FrameSafe;

            public readonly struct Yard : IInertialFrame;
            public readonly struct Skiff : IInertialFrame;

            public static class Track
            {
                public static SeparationRate<Yard> Closing(Velocity<Yard> tug, Velocity<Skiff> drone, Boost<Skiff, Yard> boost)
                    => tug - drone;
            }
            """);
        Assert.NotEqual(0, project.Build().ExitCode);

        project.Dotnet("format", "analyzers", "Fresh.csproj", "--diagnostics", "CS0019", "--severity", "info").MustSucceed();

        Assert.Contains("boost", project.Read()[project.Read().IndexOf("=>", StringComparison.Ordinal)..]);
        project.Build().MustSucceed();
    }
}
