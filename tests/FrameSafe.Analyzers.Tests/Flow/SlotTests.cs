using FrameSafe.Analyzers.Tests.Verify;

namespace FrameSafe.Analyzers.Tests.Flow;

/// <summary>State vectors: positions and velocities in one array, by index, by slice and by stride.</summary>
public sealed class SlotTests
{
    private const string Slots = """
        [Slot("0..3", "m", Frame = typeof(Harbour), Kind = QuantityKind.Position)]
        [Slot("3..6", "km/s", Frame = typeof(Harbour), Kind = QuantityKind.Velocity)]
        [Slot("6", "s", Clock = typeof(Tug))]
        """;

    private const string Bodies = """
        [Slot("0..3", "m", Frame = typeof(Harbour), Stride = 6)]
        [Slot("3..6", "m/s", Frame = typeof(Harbour), Stride = 6)]
        """;

    [Theory]
    [InlineData(Slots, "double y = s[0] + s[3];", "FRAME403")]
    [InlineData(Slots, "double y = s[0] + s[2];", null)]
    [InlineData(Slots, "double y = s[1] + x;", "FRAME401")]
    [InlineData(Slots, "double y = s[4] * 1000 * t + s[1];", null)]
    [InlineData(Slots, "s[1] = x;", "FRAME402")]
    [InlineData(Slots, "s[1] += s[4];", "FRAME403")]
    [InlineData(Slots, "s[6] = t;", "FRAME201")]
    [InlineData(Slots, "double y = s[n] + x;", null)]
    [InlineData(Slots, "const int vx = 3; double y = s[vx] + x;", "FRAME403")]
    [InlineData(Slots, "double y = s.AsSpan(3)[0] + x;", "FRAME403")]
    [InlineData(Slots, "var v = s.AsSpan(3, 3); double y = v[1] + s[4];", null)]
    [InlineData(Slots, "var v = s[3..6]; double y = v[0] + s[0];", "FRAME403")]
    [InlineData(Slots, "var alias = s; double y = alias[0] + alias[5];", "FRAME403")]
    [InlineData(Bodies, "double y = s[6 * n] + s[6 * n + 3];", "FRAME403")]
    [InlineData(Bodies, "double y = s[6 * n] + s[6 * (n + 1) + 2];", null)]
    [InlineData(Bodies, "for (int i = 0; i < n; i++) { int k = i * 6; s[k + 1] += s[k + 4] * t; }", null)]
    [InlineData(Bodies, "for (int i = 0; i < n; i++) { int k = i * 6; s[k + 1] += s[k + 4]; }", "FRAME403")]
    [InlineData("[Slot(\"3-6\", \"m\")]", "double y = 0;", "FRAME604")]
    [InlineData("[Slot(\"0\", \"meter\")]", "double y = 0;", "FRAME405")]
    public void A_part_of_an_array_is_followed(string slots, string code, string? rule)
        => Assert.Equal(
            rule is null ? [] : [rule],
            Source.Findings(Source.Compile(Source.Preamble + $$"""
                static class Case
                {
                    static void Do({{slots}} double[] s, [Unit("km")] double x, [Unit("s"), InFrame<Harbour>] double t, int n) { {{code}} }
                }
                """)).Select(finding => finding.Id));
}
