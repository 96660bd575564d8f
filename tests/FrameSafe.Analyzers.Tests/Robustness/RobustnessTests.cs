using System.Collections.Immutable;
using FrameSafe.Analyzers.Tests.Verify;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;

namespace FrameSafe.Analyzers.Tests.Robustness;

/// <summary>
/// Whatever it is given, the analyzer does not throw, and finds the same in every order. By fixed seeds; FRAMESAFE_FUZZ says how
/// many times more, for a run of hours.
/// </summary>
public sealed class RobustnessTests
{
    private static readonly int Effort = int.TryParse(Environment.GetEnvironmentVariable("FRAMESAFE_FUZZ"), out int effort) ? effort : 1;

    [Fact]
    public void Generated_programs_are_walked()
    {
        var programs = new Programs(seed: 20261201);
        for (int i = 0; i < 30 * Effort; i++)
            Check([.. Enumerable.Range(0, 35).Select(n => programs.Next().Replace("Generated", "Generated" + n))]);
    }

    [Fact]
    public void Code_that_is_being_typed_is_walked()
    {
        string[] sources =
        [
            .. Directory.GetFiles(Path.Combine(Repository.Root, "samples", "Relay.OldStyle"), "*.cs")
                .Concat(Directory.GetFiles(Path.Combine(Repository.Root, "src", "FrameSafe", "Motion"), "*.cs"))
                .Order(StringComparer.Ordinal)
                .Select(File.ReadAllText),
        ];
        string[] elsewhere = ["{", "}", "(", ")", ";", "=", "=>", "+", "[Unit(\"m\")]", "[InFrame<", "double", "switch", "??", "?.", "1e999", "\"", "async", "ref", "=", "<", ">", "await", "yield", "x"];
        var mutator = new Mutator(seed: 4711);
        for (int i = 0; i < 30 * Effort; i++)
            Check([.. sources.Select(source => mutator.Mutate(source, elsewhere))]);
    }

    [Theory]
    [InlineData("+")]
    [InlineData("*")]
    public void A_chain_of_ten_thousand_terms_is_walked(string op)
        => Check(["static class Long { static double Sum([Unit(\"m\")] double x, [Unit(\"km\")] double y) => " + string.Join(op, Enumerable.Repeat("x", 5000).Append("y")) + "; }"]);

    [Fact]
    public void Deep_nesting_is_left_before_the_stack_ends()
        => Check(["static class Deep { static double Of([Unit(\"m\")] double x) => " + string.Concat(Enumerable.Repeat("-(1+", 400)) + "x" + new string(')', 400) + "; }"]);

    [Fact]
    public void Recursion_ends()
        => Check([
            """
            static class Rec
            {
                static double Even(double n, double x) => n < 1 ? x : Odd(n - 1, x) + Odd(n - 1, x);
                static double Odd(double n, double x) => n < 1 ? x : Even(n - 1, x) - Even(n - 1, x);
                static double Of([Unit("m")] double x) => Even(3, x);
            }
            """]);

    // Once as it is, once with the trees in another order and one after the other: the same findings.
    private static void Check(string[] sources)
    {
        CSharpCompilation compilation = Source.Compile([Source.Preamble, .. sources.Select(source => "using System; using System.Collections.Generic; using System.Linq; using System.Numerics; using System.Threading.Tasks; using FrameSafe;\n" + source)]);
        if (!CompilerStands(compilation))
            return;
        string[] found = Describe(Source.Findings(compilation));
        CSharpCompilation reversed = compilation.RemoveAllSyntaxTrees().AddSyntaxTrees(compilation.SyntaxTrees.Reverse());
        Assert.Equal(found, Describe(Source.Findings(reversed, concurrent: false)));
    }

    // On some mutilated code the compiler itself falls; nothing can be said of an analyzer there.
    private static bool CompilerStands(CSharpCompilation compilation)
    {
        try
        {
            compilation.GetDiagnostics();
            return true;
        }
        catch (Exception exception) when (exception is AggregateException or NullReferenceException or InvalidCastException or IndexOutOfRangeException)
        {
            return false;
        }
    }

    private static string[] Describe(ImmutableArray<Diagnostic> findings)
        => [.. findings.Select(finding => finding.ToString()).Order(StringComparer.Ordinal)];
}
