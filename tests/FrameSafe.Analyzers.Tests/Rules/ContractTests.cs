using System.Collections.Immutable;
using FrameSafe.Analyzers.Tests.Verify;
using Json.Schema;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Tests.Rules;

/// <summary>Contract files: tags for code that nobody may edit, and what of them cannot be read.</summary>
public sealed class ContractTests
{
    private const string Untagged = """
        public static class Kepler
        {
            public static double Period(double axis) => axis * 0.1234;
            public static double Height;
        }

        public static class Use
        {
            public static double Of([Unit("m")] double x, [Unit("s"), InFrame<Tug>] double t) => Kepler.Period(x) + t;
            public static bool IsLow([Unit("m")] double x) => x < Kepler.Height;
        }
        """;

    [Fact]
    public void A_contract_tags_parameters_results_and_fields()
    {
        const string contract = """
            {
              "version": 1,
              "members": {
                "M:Kepler.Period(System.Double)": {
                  "parameters": { "axis": { "unit": "km" } },
                  "returns": { "unit": "s", "frame": "Harbour" }
                },
                "F:Kepler.Height": { "unit": "km" }
              }
            }
            """;

        Assert.Equal(["FRAME402", "FRAME101", "FRAME401"], Find(contract).Select(finding => finding.Id).OrderBy(id => Array.IndexOf(["FRAME402", "FRAME101", "FRAME401"], id)));
    }

    [Fact]
    public void The_frameworks_times_have_units()
    {
        ImmutableArray<Diagnostic> found = Source.Findings(Source.Compile(Source.Preamble + """
            static class Case
            {
                static double Sum([Unit("s")] double t, TimeSpan span) => t + span.TotalMilliseconds;
                static TimeSpan Make([Unit("ms")] double t) => TimeSpan.FromSeconds(t);
                static double Right([Unit("s")] double t, TimeSpan span) => t + span.TotalSeconds;
            }
            """));

        Assert.Equal(["FRAME401", "FRAME402"], found.Select(finding => finding.Id));
    }

    [Theory]
    [InlineData("{ \"members\": { \"P:Kepler.Hight\": { } } }", "`P:Kepler.Hight` matches no member; the nearest is `F:Kepler.Height`")]
    [InlineData("{ \"members\": { \"F:Kepler.Height\": { \"unit\": \"kmm\" } } }", "the unit `kmm` cannot be read")]
    [InlineData("{ \"members\": { \"F:Kepler.Height\": { \"frame\": \"Nowhere\" } } }", "`Nowhere` is no type that implements IFrame")]
    [InlineData("{ \"members\": { \"F:Kepler.Height\": { \"kind\": \"Veloctiy\" } } }", "`Veloctiy` is no kind of quantity; the nearest is `Velocity`")]
    [InlineData("{ \"members\": { \"M:Kepler.Period(System.Double)\": { \"parameters\": { \"a\": { } } } } }", "`Period` has no parameter `a`; it has `axis`")]
    [InlineData("{ \"membres\": { } }", "`membres` is not known here")]
    [InlineData("{ \"version\": 2 }", "another version")]
    [InlineData("{ \"members\": {", "a text in quotes is expected")]
    [InlineData("[]", "an object with `members` is expected")]
    [InlineData("", "a value is missing")]
    public void What_cannot_be_read_is_reported_where_it_stands(string contract, string message)
    {
        Diagnostic finding = Assert.Single(Find(contract), finding => finding.Id == "FRAME603");

        Assert.Contains(message, finding.GetMessage());
        Assert.Equal("orbits.framesafe.json", finding.Location.GetLineSpan().Path);
    }

    [Fact]
    public void The_published_schema_takes_what_the_reader_takes_and_refuses_what_it_refuses()
    {
        JsonSchema schema = JsonSchema.FromFile(Path.Combine(Repository.Root, "analyzers", "contracts", "framesafe-contract.schema.json"));
        bool IsValid(string text)
        {
            using var document = System.Text.Json.JsonDocument.Parse(text);
            return schema.Evaluate(document.RootElement).IsValid;
        }

        Assert.True(IsValid(Contracts.FrameworkContract.Text));
        Assert.True(IsValid("""{ "version": 1, "members": { "F:A.B": { "unit": "m", "frame": "A", "clock": "B", "kind": "Velocity", "between": "A B", "maxSpeed": 0.5 } } }"""));
        Assert.False(IsValid("""{ "membres": { } }"""));
        Assert.False(IsValid("""{ "version": 2, "members": { } }"""));
        Assert.False(IsValid("""{ "members": { "F:A.B": { "maxSpeed": 1 } } }"""));
        Assert.False(IsValid("""{ "members": { "Kepler.Height": { } } }"""));
    }

    private static ImmutableArray<Diagnostic> Find(string contract) => Source.Findings(Source.Compile(Source.Preamble + Untagged), contract: contract);
}
