using FrameSafe.Analyzers.Tests.Verify;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Tests.Rules;

/// <summary>Each rule beyond its page's examples: what it reports, and what is near it and silent.</summary>
public sealed class RuleTests
{
    private const string Helpers = """
        public readonly struct BunchRest : IRestFrame;

        public sealed class Particle
        {
            [Carries<Harbour, BunchRest>, FrameBoundary]
            [return: Unit("J"), InFrame<BunchRest>]
            public double ToRest([Unit("J"), InFrame<Harbour>] double e) => e * 0.3;

            [Carries<BunchRest, Harbour>, FrameBoundary]
            [return: Unit("J"), InFrame<Harbour>]
            public double FromRest([Unit("J"), InFrame<BunchRest>] double e) => e * 0.3;
        }

        public abstract class Base
        {
            [return: Unit("m")] public abstract double Length([Unit("s")] double t);
            [InFrame<Tug>, Unit("m")] public virtual double Place { get; set; }
        }

        public static class Sink
        {
            public static void Velocity([Unit("m/s"), InFrame<Harbour>, Kind(QuantityKind.Velocity)] double v) { }
            public static void Beta([Kind(QuantityKind.SpeedRatio), InFrame<Harbour>] double b) { }
            public static void Measured([Unit("m"), Kind(QuantityKind.MeasuredLength)] double l) { }
            public static void Total([Unit("MeV"), Kind(QuantityKind.TotalEnergy)] double e) { }
            public static void Utc([Unit("s"), OnClock<Utc>] double t) { }
            public static void Gamma([Kind(QuantityKind.LorentzFactor), Between<Harbour, Tug>] double g) { }
        }

        """;

    [Theory]
    [InlineData("FRAME103", "static bool F(Particle p, Particle q, [Unit(\"J\"), InFrame<Harbour>] double e) => p.ToRest(e) < q.ToRest(e);")]
    [InlineData("FRAME103", "static double F(Particle p, Particle q, [Unit(\"J\"), InFrame<Harbour>] double e) { var a = p.ToRest(e); var b = q.ToRest(e); return a - b; }")]
    [InlineData("FRAME104", "static double F(Particle p, [Unit(\"J\"), InFrame<Harbour>] double e) => p.FromRest(e);")]
    [InlineData("FRAME104", "static double F(Particle p, [Unit(\"J\"), InFrame<Harbour>] double e) { var rest = p.ToRest(e); return p.ToRest(rest); }")]
    [InlineData("FRAME105", "static bool F([Unit(\"s\"), InFrame<Harbour>] double t, [Unit(\"s\"), InFrame<Tug>] double u) => t == u;")]
    [InlineData("FRAME105", "static bool F([Unit(\"s\"), InFrame<Harbour>] double t, [Unit(\"s\"), InFrame<Tug>] double u) => u > t;")]
    [InlineData("FRAME204", "static void F([Unit(\"s\"), OnClock<Gps>] double t) => Sink.Utc(t);")]
    [InlineData("FRAME204", "static bool F([Unit(\"s\"), OnClock<Tai>] double t, [Unit(\"s\"), OnClock<Tt>] double u) => t < u;")]
    [InlineData("FRAME305", "static void F() => Sink.Beta(1.0);")]
    [InlineData("FRAME305", "static void F() => Sink.Velocity(-4e8);")]
    [InlineData("FRAME305", "[Unit(\"km/s\"), InFrame<Tug>] static double v = 300000;")]
    [InlineData("FRAME306", "static void F([Unit(\"m/s\"), InFrame<Harbour>] double a, [Unit(\"m/s\"), InFrame<Harbour>] double b) => Sink.Velocity(a - b);")]
    [InlineData("FRAME306", "static void F([Unit(\"m/s\"), InFrame<Harbour>] double a, [Unit(\"m/s\"), InFrame<Harbour>] double b) { var closing = b - a; Sink.Velocity(closing); }")]
    [InlineData("FRAME308", "static void F([Unit(\"m\"), Kind(QuantityKind.ProperLength)] double l) => Sink.Measured(l);")]
    [InlineData("FRAME308", "static double F([Unit(\"m\"), Kind(QuantityKind.ProperLength)] double l, [Unit(\"m\"), Kind(QuantityKind.MeasuredLength)] double m) => l + m;")]
    [InlineData("FRAME309", "static void F([Unit(\"m/s\"), InFrame<Harbour>, Kind(QuantityKind.Celerity)] double u) => Sink.Velocity(u);")]
    [InlineData("FRAME309", "static void F([Kind(QuantityKind.CelerityRatio), InFrame<Harbour>] double w) => Sink.Beta(w);")]
    [InlineData("FRAME310", "static void F([Unit(\"MeV\"), Kind(QuantityKind.KineticEnergy)] double t) => Sink.Total(t);")]
    [InlineData("FRAME310", "static double F([Unit(\"MeV\"), Kind(QuantityKind.KineticEnergy)] double t, [Unit(\"MeV\"), Kind(QuantityKind.EnergyPerNucleon)] double n) => t + n;")]
    [InlineData("FRAME102", "static void F([Kind(QuantityKind.LorentzFactor), Between<Harbour, Drone>] double g) => Sink.Gamma(g);")]
    [InlineData("FRAME403", "static double F([Unit(\"N.m\")] double t, [Unit(\"J\")] double e) => t - e;")]
    [InlineData("FRAME403", "static bool F([Unit(\"Hz\")] double f, [Unit(\"Bq\")] double a) => f < a;")]
    [InlineData("FRAME404", "static double F([Unit(\"m\")] double x) => Math.Exp(x);")]
    [InlineData("FRAME404", "static double F([Unit(\"s\")] double t) => Math.Log(t);")]
    [InlineData("FRAME407", "static bool F([Unit(\"GeV [c=1]\")] double m, [Unit(\"kg\")] double n) => m < n;")]
    [InlineData("FRAME601", "[return: Unit(\"1\")] public static double F([Unit(\"m\")] double x, double y) => 0;")]
    [InlineData("FRAME602", "sealed class D : Base { [return: Unit(\"km\")] public override double Length(double t) => 1; }")]
    [InlineData("FRAME602", "sealed class D : Base { public override double Length([Unit(\"ms\")] double t) => 1; }")]
    [InlineData("FRAME602", "sealed class D : Base { public override double Length(double t) => 1; [InFrame<Harbour>, Unit(\"m\")] public override double Place { get; set; } }")]
    [InlineData("FRAME604", "[RelativeTo<One>(MaxSpeed = 0.1)] readonly struct Two : IInertialFrame; [RelativeTo<Two>(MaxSpeed = 0.1)] readonly struct One : IInertialFrame;")]
    [InlineData("FRAME604", "[RelativeTo(typeof(string))] readonly struct Odd : IInertialFrame;")]
    [InlineData("FRAME604", "static void F([Unit(\"m/s\"), MaxSpeed(30)] double v) { }")]
    public void Is_reported_once(string rule, string code)
        => Assert.Equal([rule], Find(code, rule));

    [Theory]
    [InlineData("static double F(Particle p, [Unit(\"J\"), InFrame<Harbour>] double a, [Unit(\"J\"), InFrame<Harbour>] double b) => p.ToRest(a) + p.ToRest(b);")]
    [InlineData("static double F(Particle p, Particle q, [Unit(\"J\"), InFrame<Harbour>] double e) => p.ToRest(e) / q.ToRest(e);")]
    [InlineData("static double F(Particle p, [Unit(\"J\"), InFrame<Harbour>] double e) => p.FromRest(p.ToRest(e)) - e;")]
    [InlineData("static double F([Unit(\"s\"), OnClock<Utc>] double t, [Unit(\"s\"), OnClock<Utc>] double u) => t - u;")]
    [InlineData("static double F([Unit(\"m/s\"), InFrame<Harbour>] double a, [Unit(\"m/s\"), InFrame<Harbour>] double b) => (a + b) / 2;")]
    [InlineData("static void F([Unit(\"m/s\"), InFrame<Harbour>] double a, [Unit(\"m/s\"), InFrame<Harbour>] double b, double w) => Sink.Velocity(w * a + (1 - w) * b);")]
    [InlineData("static double F([Unit(\"MeV\"), Kind(QuantityKind.TotalEnergy)] double e, [Unit(\"MeV\"), Kind(QuantityKind.RestEnergy)] double m) => Math.Sqrt((e - m) * (e + m));")]
    [InlineData("static double F([Unit(\"J\")] double e, [Unit(\"kg\")] double m, [Unit(\"m/s\")] double v) => e - m * v * v;")]
    [InlineData("static double F([Unit(\"Hz\")] double f, [Unit(\"s\")] double t) => Math.Sin(2 * Math.PI * f * t);")]
    [InlineData("static double F([Unit(\"m/s2\")] double g, [Unit(\"m\")] double h) => Math.Sqrt(2 * g * h);")]
    [InlineData("static double F([Unit(\"deg\")] double a) => Math.Sin(a * Math.PI / 180);")]
    [InlineData("static double F([Unit(\"h\")] double t) { [return: Unit(\"s\")] double G() => t * 3600; return G(); }")]
    [InlineData("static double F([Unit(\"m\"), InFrame<Harbour>] double x, [Unit(\"m\"), InFrame<Harbour>] double y) => double.Hypot(x, y) * Math.Cos(Math.Atan2(y, x)) - x;")]
    [InlineData("static double F([Unit(\"eV\")] double e, [Unit(\"J\")] double j) => e * 1.602176634e-19 + j;")]
    [InlineData("static double F([Unit(\"GeV/c\")] double p, [Unit(\"T\")] double b) => p / (0.299792458 * b);")]
    [InlineData("static bool F([Unit(\"m\")] double x) => x > 0 && x < double.MaxValue && x != 1e3;")]
    [InlineData("static void F() => Sink.Beta(0.999999);")]
    [InlineData("static double F([Unit(\"m/s\"), InFrame<Harbour>] double v, [Unit(\"s\"), InFrame<Harbour>] double dt, [Unit(\"m/s2\"), InFrame<Harbour>] double a) => v + a * dt;")]
    [InlineData("static double F([Unit(\"J\"), InFrame<Harbour>] double e1, [Unit(\"kg.m/s\"), InFrame<Harbour>] double p1, [Unit(\"J\"), InFrame<Tug>] double e2, [Unit(\"kg.m/s\"), InFrame<Tug>] double p2) { const double c = 299792458.0; return (e1 * e1 - p1 * p1 * c * c) - (e2 * e2 - p2 * p2 * c * c); }")]
    [InlineData("sealed class D : Base { public override double Length(double t) => 1; }")]
    [InlineData("static double F([Unit(\"m\")] double x, double years) { const double year = 365.25 * 86400; return x + years * year * 299792458.0; }")]
    [InlineData("static double F([Unit(\"m\")] double x) => x < 299792458.0 ? x : 299792458.0;")]
    [InlineData("static double F([Unit(\"m\")] double x, [Unit(\"s\")] double t) => x + t * 299792458.0;")]
    [InlineData("static double F(double r) => 0.5 * Math.Log((1 + r) / (1 - r)) + 1 / Math.Sqrt(1 - r * r);")]
    [InlineData("static double F(double gamma, double beta, double x) => gamma * x + beta - 3e8;")]
    [InlineData("static T F<T>(T a, T b, T t) where T : INumber<T> => a + (b - a) * t;")]
    public void Is_silent(string code) => Assert.Empty(Find(code, null));

    private static IEnumerable<string> Find(string code, string? rule)
    {
        Microsoft.CodeAnalysis.CSharp.CSharpCompilation compilation = Source.Compile(Source.Preamble + Helpers + "public static class Case\n{\n" + code + "\n}\n");
        if (rule != "FRAME604")
            Assert.DoesNotContain(compilation.GetDiagnostics(), diagnostic => diagnostic.Severity == DiagnosticSeverity.Error);
        if (rule is not null)
            compilation = compilation.WithOptions(compilation.Options.WithSpecificDiagnosticOptions([new(rule, ReportDiagnostic.Warn)]));
        // What the helpers lack is not the case's.
        return Source.Findings(compilation)
            .Where(finding => finding.Location.SourceSpan.Start > Source.Preamble.Length + Helpers.Length)
            .Select(finding => finding.Id);
    }
}
