using System.Collections.Immutable;
using System.Text.RegularExpressions;
using FrameSafe.Analyzers.Rules;
using FrameSafe.Analyzers.Tests.Verify;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;

namespace FrameSafe.Analyzers.Tests.Rules;

/// <summary>Every rule has a page, and the pages' examples do what they say.</summary>
public sealed partial class RulePageTests
{
    public static TheoryData<string> Ids => [.. RuleTable.All.Select(rule => rule.Descriptor.Id)];

    public static TheoryData<string, int> Examples
    {
        get
        {
            var examples = new TheoryData<string, int>();
            foreach (string id in RuleTable.All.Select(rule => rule.Descriptor.Id))
            {
                for (int i = 0; i < Blocks(id).Length; i++)
                    examples.Add(id, i);
            }

            return examples;
        }
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void A_rule_has_a_page_with_examples_and_a_link_to_it(string id)
    {
        DiagnosticDescriptor descriptor = RuleTable.All.Single(rule => rule.Descriptor.Id == id).Descriptor;

        Assert.StartsWith($"# {id} — {descriptor.Title}\n", Page(id));
        Assert.Contains($"| Category | {descriptor.Category} |", Page(id));
        Assert.EndsWith("/" + id, descriptor.HelpLinkUri);
        Assert.Contains(Blocks(id), block => block.Kind == "flagged");
        Assert.Contains(Blocks(id), block => block.Kind == "silent");
    }

    [Theory]
    [MemberData(nameof(Examples))]
    public void An_example_does_what_it_says(string id, int index)
    {
        (string kind, string code) = Blocks(id)[index];
        string? contract = code.StartsWith('{') ? code : null;
        if (contract is not null)
            code = "";
        CSharpCompilation compilation = Source.Compile(Source.Preamble + "public static class Example\n{\n" + code + "\n}\n");
        Assert.DoesNotContain(compilation.GetDiagnostics(), diagnostic => diagnostic.Severity == DiagnosticSeverity.Error);

        // Some rules are on only where a project asks for them.
        compilation = compilation.WithOptions(compilation.Options.WithSpecificDiagnosticOptions([new(id, ReportDiagnostic.Warn)]));
        ImmutableArray<Diagnostic> findings = Source.Findings(compilation, contract: contract);

        if (kind == "flagged")
            Assert.Contains(findings, finding => finding.Id == id);
        else
            Assert.Empty(findings);
    }

    [Fact]
    public void Every_page_belongs_to_a_rule()
        => Assert.Equal(
            RuleTable.All.Select(rule => rule.Descriptor.Id + ".md").Order(StringComparer.Ordinal),
            Directory.GetFiles(Path.Combine(Repository.Root, "analyzers", "rules"), "*.md").Select(Path.GetFileName).Order(StringComparer.Ordinal));

    private static string Page(string id) => File.ReadAllText(Path.Combine(Repository.Root, "analyzers", "rules", id + ".md"));

    private static (string Kind, string Code)[] Blocks(string id)
        => [.. Fence().Matches(Page(id)).Select(match => (match.Groups[1].Value, match.Groups[2].Value))];

    [GeneratedRegex(@"```(?:csharp|json) (flagged|fixed|silent)\n(.*?)\n```", RegexOptions.Singleline)]
    private static partial Regex Fence();
}
