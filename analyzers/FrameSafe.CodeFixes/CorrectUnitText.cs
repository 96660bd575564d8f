using System.Collections.Generic;
using System.Collections.Immutable;
using System.Composition;
using System.Threading;
using FrameSafe.Analyzers;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeFixes;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace FrameSafe.CodeFixes;

/// <summary>FRAME405: replaces a unit text that cannot be read by the nearest one that can.</summary>
[ExportCodeFixProvider(LanguageNames.CSharp, Name = nameof(CorrectUnitText))]
[Shared]
public sealed class CorrectUnitText : Repair
{
    /// <inheritdoc/>
    public override ImmutableArray<string> FixableDiagnosticIds => ["FRAME405"];

    internal override IEnumerable<Mending> Mend(SyntaxNode place, Diagnostic diagnostic, SemanticModel model, CancellationToken cancellation)
    {
        if (!diagnostic.Properties.TryGetValue(FindingProperties.Unit, out string? unit) || unit is null)
            yield break;
        if (place.FirstAncestorOrSelf<LiteralExpressionSyntax>() is not { } literal || !literal.IsKind(SyntaxKind.StringLiteralExpression))
            yield break;
        yield return new(
            "Write the unit as `" + unit + "`",
            nameof(CorrectUnitText),
            literal,
            current => SyntaxFactory.LiteralExpression(SyntaxKind.StringLiteralExpression, SyntaxFactory.Literal(unit)).WithTriviaFrom(current));
    }
}
