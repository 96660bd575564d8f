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

/// <summary>FRAME401, FRAME402, FRAME404: multiplies or divides by the exact factor between two units.</summary>
[ExportCodeFixProvider(LanguageNames.CSharp, Name = nameof(ConvertUnit))]
[Shared]
public sealed class ConvertUnit : Repair
{
    /// <inheritdoc/>
    public override ImmutableArray<string> FixableDiagnosticIds => ["FRAME401", "FRAME402", "FRAME404"];

    internal override IEnumerable<Mending> Mend(SyntaxNode place, Diagnostic diagnostic, SemanticModel model, CancellationToken cancellation)
    {
        diagnostic.Properties.TryGetValue(FindingProperties.Factor, out string? factor);
        diagnostic.Properties.TryGetValue(FindingProperties.Divisor, out string? divisor);
        diagnostic.Properties.TryGetValue(FindingProperties.Unit, out string? unit);
        if ((factor ?? divisor) is not { } number || Code.Operand(place, diagnostic) is not { } operand)
            yield break;
        if (Literal(number, model.GetTypeInfo(operand, cancellation).Type, divides: divisor is not null) is not { } literal)
            yield break;

        SyntaxKind kind = divisor is null ? SyntaxKind.MultiplyExpression : SyntaxKind.DivideExpression;
        string sign = divisor is null ? "×" : "÷";
        yield return new(
            "Convert `" + operand.ToString() + "` to " + unit + " (" + sign + " " + number.Trim('(', ')') + ")",
            nameof(ConvertUnit),
            operand,
            current => Code.Tidy(Code.Infix(kind, current, literal)));
    }

    // In the operand's own type, so that the expression keeps it; an integer is not divided by an integer.
    private static ExpressionSyntax? Literal(string number, ITypeSymbol? type, bool divides)
    {
        bool isDecimalText = number.IndexOfAny(['.', 'e', 'P']) >= 0;
        string? text = type?.SpecialType switch
        {
            SpecialType.System_Double => number.Replace("Math.PI", "global::System.Math.PI"),
            SpecialType.System_Single => number.Contains("Math.PI")
                ? number.Replace("Math.PI", "global::System.MathF.PI").Replace(".0", "f")
                : isDecimalText ? number + "f" : number,
            SpecialType.System_Decimal => isDecimalText ? (number.Contains("PI") || number.Contains("e") ? null : number + "m") : number,
            SpecialType.System_Int32 or SpecialType.System_Int64 or SpecialType.System_Int16 or SpecialType.System_Byte
                => number.Contains("PI") || isDecimalText || !divides ? number.Replace("Math.PI", "global::System.Math.PI") : number + ".0",
            // Vectors and collections have no such operator, or one of another meaning.
            _ => null,
        };
        return text is null ? null : Code.Parse(text);
    }
}
