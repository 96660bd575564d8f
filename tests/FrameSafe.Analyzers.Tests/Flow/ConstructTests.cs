using System.Collections.Concurrent;
using System.Collections.Immutable;
using FrameSafe.Analyzers.Tests.Verify;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;

namespace FrameSafe.Analyzers.Tests.Flow;

/// <summary>
/// A number goes through every construct that a simulation uses and meets another one at its end: what does not go together is
/// reported there, once, and what does is silent, whichever way it came.
/// </summary>
public sealed class ConstructTests
{
    // From b to y.
    private static readonly (string Name, string Code)[] Constructs =
    [
        ("Local", "var y = b;"),
        ("Assigned", "double y = 0; y = b;"),
        ("Twice", "double x = b; double y = x;"),
        ("Parenthesised", "var y = ((b));"),
        ("Conditional", "var y = q ? b : b;"),
        ("IfElse", "double y; if (q) y = b; else y = b;"),
        ("IfOnly", "double y = b; if (q) y = b;"),
        ("ElseThrows", "double y; if (q) { y = b; } else { throw new Exception(); }"),
        ("For", "double y = b; for (int i = 0; i < 3; i++) { y = b; }"),
        ("ForCarried", "double x = b; double y = b; for (int i = 0; i < 3; i++) { y = x; x = y; }"),
        ("While", "double y = b; while (q) { y = b; q = false; }"),
        ("WhileBreak", "double y = b; while (true) { if (q) break; y = b; q = true; }"),
        ("WhileContinue", "double y = b; while (q) { q = false; if (!q) continue; y = b; }"),
        ("DoWhile", "double y; do { y = b; } while (q);"),
        ("ForeachArray", "double y = 0; foreach (var e in new[] { b, b }) y = e;"),
        ("ForeachList", "var list = new List<double>(); list.Add(b); double y = 0; foreach (double e in list) y = e;"),
        ("ListInitialiser", "var list = new List<double> { b, b }; double y = list[0];"),
        ("CollectionExpression", "double[] r = [b, b]; var y = r[1];"),
        ("Spread", "double[] r = [b]; double[] s = [.. r]; var y = s[0];"),
        ("ArrayElement", "var r = new double[3]; r[1] = b; var y = r[1];"),
        ("ArrayInitialiser", "double[] r = { b, b }; var y = r[0];"),
        ("Grid", "var r = new double[2, 2]; r[0, 1] = b; var y = r[0, 1];"),
        ("FromEnd", "double[] r = [b]; var y = r[^1];"),
        ("Slice", "double[] r = [b, b]; var y = r[0..1][0];"),
        ("Span", "Span<double> r = stackalloc double[1]; r[0] = b; var y = r[0];"),
        ("AsSpan", "double[] r = [b]; var y = r.AsSpan().Slice(0)[0];"),
        ("TupleDeconstruction", "var (p, y) = (1, b);"),
        ("TupleAssigned", "double p, y; (p, y) = (1, b);"),
        ("TupleItem", "var t = (1, b); var y = t.Item2;"),
        ("TupleNamed", "var t = (first: 1, second: b); var y = t.second;"),
        ("Swap", "double y = b, x = b; (x, y) = (y, x);"),
        ("SwitchStatement", "double y; switch (n) { case 0: y = b; break; default: y = b; break; }"),
        ("SwitchExpression", "var y = n switch { 0 => b, 1 => b, _ => b };"),
        ("SwitchGuard", "var y = n switch { > 3 when q => b, _ => throw new Exception() };"),
        ("TryFinally", "double y; try { y = b; } finally { n++; }"),
        ("TryCatch", "double y = b; try { y = b; } catch (Exception) { y = b; }"),
        ("Using", "double y; using (var s = new System.IO.MemoryStream()) { y = b; }"),
        ("Lock", "double y; lock (Gate) { y = b; }"),
        ("Checked", "double y; checked { y = b; }"),
        ("Unchecked", "var y = unchecked(b);"),
        ("Cast", "var y = (double)(float)b;"),
        ("NullableValue", "double? x = b; var y = x.Value;"),
        ("NullableDefault", "double? x = b; var y = x.GetValueOrDefault();"),
        ("NullCoalescing", "double? x = b; var y = x ?? b;"),
        ("NullCoalescingAssignment", "double? x = b; x ??= b; var y = x.Value;"),
        ("ConditionalAccess", "double[]? r = [b]; var y = r?[0] ?? b;"),
        ("Minus", "var y = -b;"),
        ("Plus", "var y = +b;"),
        ("Half", "var y = 0.5 * b;"),
        ("Third", "var y = b / 3;"),
        ("Doubled", "double y = b; y *= 2;"),
        ("Abs", "var y = Math.Abs(b);"),
        ("Max", "var y = Math.Max(b, b);"),
        ("MaxOfType", "var y = double.Max(b, 0);"),
        ("Clamp", "var y = Math.Clamp(b, b, b);"),
        ("Round", "var y = Math.Round(b, 3);"),
        ("Hypot", "var y = double.Hypot(b, b);"),
        ("RootOfSquare", "var y = Math.Sqrt(b * b);"),
        ("PowerAndRoot", "var y = Math.Pow(Math.Pow(b, 2), 0.5);"),
        ("CubeRoot", "var y = Math.Cbrt(b * b * b);"),
        ("Quotient", "var y = b * b / b;"),
        ("Lerp", "var y = double.Lerp(b, b, 0.25);"),
        ("Increment", "double y = b; y++;"),
        ("PrefixDecrement", "double y = b; --y;"),
        ("PrivateHelper", "var y = Identity(b);"),
        ("NestedHelper", "var y = Twofold(b);"),
        ("GenericHelper", "var y = Chosen(b, b);"),
        ("GenericMath", "var y = Sum(b);"),
        ("HelperWithLocals", "var y = WithLocals(b);"),
        ("LocalFunction", "double F(double x) => x; var y = F(b);"),
        ("LocalFunctionCaptured", "double F() { return b; } var y = F();"),
        ("Select", "var y = new[] { b }.Select(x => x).First();"),
        ("SelectScaled", "var y = new[] { b }.Select(x => 2 * x).Max();"),
        ("SelectBlock", "var y = new[] { b }.Select(x => { var z = x; return z; }).ToArray()[0];"),
        ("WhereMin", "var y = new[] { b }.Where(x => x > 0).Min();"),
        ("Average", "var y = new[] { b, b }.Average();"),
        ("AverageOf", "var y = new[] { 1, 2 }.Average(x => b);"),
        ("Zip", "var y = new[] { b }.Zip(new[] { b }, (p, r) => r).Last();"),
        ("Aggregate", "var y = new[] { b }.Aggregate((p, r) => Math.Max(p, r));"),
        ("OrderBy", "var y = new[] { b }.OrderBy(x => x).ElementAt(0);"),
        ("Concat", "var y = new[] { b }.Concat(new[] { b }).First();"),
        ("Vector", "var v = new Vector3((float)b, (float)b, (float)b); var y = v.X;"),
        ("VectorScaled", "var v = 2 * new Vector2((float)b, 0); var y = v.Y;"),
        ("IsPattern", "double y = 0; if (b is double z) y = z;"),
        ("VarPattern", "double y = 0; if (b is var z) y = z;"),
        ("Decimal", "var y = (double)(decimal)b;"),
        ("Nested", "double y = 0; for (int i = 0; i < 2; i++) { foreach (var e in new[] { b }) { if (q) { y = e; } else { y = b; } } }"),
        ("EarlyReturn", "if (q) return a; double y = b;"),
        ("Constant", "const int two = 2; var y = b * two;"),
        ("Fraction", "var y = b * (4.0 / 3);"),
        ("Ternaries", "var y = q ? n > 1 ? b : b : b;"),
        ("AsyncLocal", "var y = Task.FromResult(b).Result;"),
    ];

    // What meets, and what comes of it; null for nothing.
    private static readonly (string Name, string A, string B, string? Rule)[] Pairs =
    [
        ("Units", "[Unit(\"m\")]", "[Unit(\"km\")]", "FRAME401"),
        ("Dimensions", "[Unit(\"s\")]", "[Unit(\"m\")]", "FRAME403"),
        ("Frames", "[Unit(\"m\"), InFrame<Harbour>]", "[Unit(\"m\"), InFrame<Tug>]", "FRAME101"),
        ("Times", "[Unit(\"s\"), InFrame<Harbour>]", "[Unit(\"s\"), OnClock<Tug>]", "FRAME201"),
        ("Clocks", "[Unit(\"s\"), OnClock<Drone>]", "[Unit(\"s\"), OnClock<Tug>]", "FRAME203"),
        ("SameUnit", "[Unit(\"m\")]", "[Unit(\"m\")]", null),
        ("SameFrame", "[Unit(\"m/s\"), InFrame<Harbour>]", "[Unit(\"m/s\"), InFrame<Harbour>]", null),
        ("SameClock", "[Unit(\"s\"), OnClock<Tug>]", "[Unit(\"s\"), OnClock<Tug>]", null),
        ("Untagged", "[Unit(\"m\"), InFrame<Harbour>]", "", null),
        ("ClockOfFrame", "[Unit(\"s\"), InFrame<Harbour>]", "[Unit(\"s\"), OnClock<Harbour>]", null),
    ];

    private static readonly ConcurrentDictionary<string, Lazy<ImmutableArray<Diagnostic>>> Found = new();

    public static TheoryData<string, string> Cases
    {
        get
        {
            var cases = new TheoryData<string, string>();
            foreach ((string pair, _, _, _) in Pairs)
            {
                foreach ((string construct, _) in Constructs)
                    cases.Add(pair, construct);
            }

            return cases;
        }
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void A_number_keeps_what_is_known_of_it(string pair, string construct)
    {
        (_, _, _, string? rule) = Pairs.Single(candidate => candidate.Name == pair);
        string[] found =
        [
            .. Found.GetOrAdd(pair, name => new(() => Find(name))).Value
                .Where(finding => MethodOf(finding) == construct)
                .Select(finding => finding.Id),
        ];

        // A square of a time is no clock's time, and a cube no frame's length: what their roots are is not known, and silent.
        bool isLost = (construct is "CubeRoot" or "PowerAndRoot" or "RootOfSquare" or "Quotient" && pair is "Times" or "Clocks")
            || (construct == "CubeRoot" && pair == "Frames");
        Assert.Equal(rule is null || isLost ? [] : [rule], found);
    }

    private static ImmutableArray<Diagnostic> Find(string pair)
    {
        (_, string a, string b, _) = Pairs.Single(candidate => candidate.Name == pair);
        CSharpCompilation compilation = Source.Compile(Source.Preamble + $$"""
            internal static class Case
            {
                private static readonly object Gate = new();
                private static double Identity(double x) => x;
                private static double Twofold(double x) => 2 * Identity(x);
                private static T Chosen<T>(T x, T z) => x;
                private static T Sum<T>(T x) where T : INumber<T> => x + x;
                private static double WithLocals(double x) { double z = x; if (z > 0) { z = -z; } return z; }

            {{string.Join("\n", Constructs.Select(construct => $"    public static double {construct.Name}({a} double a, {b} double b, bool q, int n) {{ {construct.Code} return a + y; }}"))}}
            }
            """);
        Assert.Empty(compilation.GetDiagnostics().Where(diagnostic => diagnostic.Severity == DiagnosticSeverity.Error));
        return Source.Findings(compilation);
    }

    private static string MethodOf(Diagnostic finding)
        => finding.Location.SourceTree!.GetRoot().FindNode(finding.Location.SourceSpan)
            .AncestorsAndSelf().OfType<Microsoft.CodeAnalysis.CSharp.Syntax.MethodDeclarationSyntax>().First().Identifier.ValueText;
}
