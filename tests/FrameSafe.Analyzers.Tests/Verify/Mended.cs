using FrameSafe.CodeFixes;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeFixes;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Testing;
using Microsoft.CodeAnalysis.Testing;

namespace FrameSafe.Analyzers.Tests.Verify;

/// <summary>
/// Applies a repair by Roslyn's testing library: one by one and by Fix All, each of which must compile, give the same text and
/// leave no finding.
/// </summary>
internal static class Mended
{
    /// <summary>The members of a class, before with the places of findings marked <c>{|ID:…|}</c>, and after.</summary>
    internal static Task ByAsync<TRepair>(string before, string after, string? choice = null)
        where TRepair : Repair, new()
        => RunAsync<TRepair>(Wrap(before), Wrap(after), choice);

    /// <summary>A finding for which nothing may be offered.</summary>
    internal static Task NotByAsync<TRepair>(string code)
        where TRepair : Repair, new()
        => RunAsync<TRepair>(Wrap(code), Wrap(code), null);

    private static string Wrap(string members) => Source.Preamble + "\npublic static class Case\n{\n" + members + "\n}\n";

    private static async Task RunAsync<TRepair>(string before, string after, string? choice)
        where TRepair : Repair, new()
    {
        var test = new Test<TRepair>
        {
            TestCode = before,
            FixedCode = after,
            CodeActionEquivalenceKey = choice,
            ReferenceAssemblies = new ReferenceAssemblies("net10.0"),
            // What a repair leaves is checked against the fixed text's own markup.
            MarkupOptions = MarkupOptions.UseFirstDescriptor,
        };
        test.TestState.AdditionalReferences.AddRange(Source.References);
        await test.RunAsync();
    }

    private sealed class Test<TRepair> : CSharpCodeFixTest<FrameSafeAnalyzer, TRepair, DefaultVerifier>
        where TRepair : CodeFixProvider, new()
    {
        protected override ParseOptions CreateParseOptions() => new CSharpParseOptions(LanguageVersion.Preview);

        protected override CompilationOptions CreateCompilationOptions()
            => new CSharpCompilationOptions(OutputKind.DynamicallyLinkedLibrary, nullableContextOptions: NullableContextOptions.Enable);
    }
}
