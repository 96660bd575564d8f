using System.Collections.Generic;
using System.Collections.Immutable;
using System.Composition;
using System.Threading;
using FrameSafe.Analyzers;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeFixes;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace FrameSafe.CodeFixes;

/// <summary>FRAME502: writes the exact value of a constant.</summary>
[ExportCodeFixProvider(LanguageNames.CSharp, Name = nameof(WriteExactConstant))]
[Shared]
public sealed class WriteExactConstant : Repair
{
    /// <inheritdoc/>
    public override ImmutableArray<string> FixableDiagnosticIds => ["FRAME502"];

    internal override IEnumerable<Mending> Mend(SyntaxNode place, Diagnostic diagnostic, SemanticModel model, CancellationToken cancellation)
    {
        if (diagnostic.Properties.TryGetValue(FindingProperties.Form, out string? exact) && exact is not null && place is LiteralExpressionSyntax literal)
            yield return new("Write the exact value, " + exact, nameof(WriteExactConstant), literal, current => Code.Parse(exact).WithTriviaFrom(current));
    }
}
