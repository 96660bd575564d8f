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

/// <summary>FRAME301 on plain numbers: collinear velocities are composed, which adds their rapidities.</summary>
[ExportCodeFixProvider(LanguageNames.CSharp, Name = nameof(ComposeVelocities))]
[Shared]
public sealed class ComposeVelocities : Repair
{
    /// <inheritdoc/>
    public override ImmutableArray<string> FixableDiagnosticIds => ["FRAME301"];

    internal override IEnumerable<Mending> Mend(SyntaxNode place, Diagnostic diagnostic, SemanticModel model, CancellationToken cancellation)
    {
        diagnostic.Properties.TryGetValue(FindingProperties.LightSpeed, out string? light);
        (ExpressionSyntax Left, ExpressionSyntax Right, bool Adds)? sum = Code.Bare(place) switch
        {
            BinaryExpressionSyntax binary when binary.IsKind(SyntaxKind.AddExpression) => (binary.Left, binary.Right, true),
            BinaryExpressionSyntax binary when binary.IsKind(SyntaxKind.SubtractExpression) => (binary.Left, binary.Right, false),
            AssignmentExpressionSyntax assignment when assignment.IsKind(SyntaxKind.AddAssignmentExpression) => (assignment.Left, assignment.Right, true),
            AssignmentExpressionSyntax assignment when assignment.IsKind(SyntaxKind.SubtractAssignmentExpression) => (assignment.Left, assignment.Right, false),
            _ => null,
        };
        if (light is null || sum is not { } terms || !Code.IsRepeatable(terms.Left) || !Code.IsRepeatable(terms.Right))
            yield break;
        ITypeSymbol? type = model.GetTypeInfo(terms.Left, cancellation).Type;
        if (type?.SpecialType != SpecialType.System_Double || model.GetTypeInfo(terms.Right, cancellation).Type?.SpecialType != SpecialType.System_Double)
            yield break;

        string c = light == "1" ? "1" : SpeedOfLight.NameAt(terms.Left, light, model, cancellation) ?? light;
        SyntaxNode target = Code.Bare(place);
        yield return new(
            "Add the rapidities instead: (u " + (terms.Adds ? "+" : "−") + " v)/(1 " + (terms.Adds ? "+" : "−") + " uv/c²)",
            nameof(ComposeVelocities),
            target,
            current => current is AssignmentExpressionSyntax assignment
                ? assignment
                    .WithOperatorToken(SyntaxFactory.Token(SyntaxKind.EqualsToken).WithTriviaFrom(assignment.OperatorToken))
                    .WithRight(Composed(assignment.Left, assignment.Right, terms.Adds, c).WithTriviaFrom(assignment.Right)) switch
                    {
                        var plain => SyntaxFactory.AssignmentExpression(SyntaxKind.SimpleAssignmentExpression, plain.Left, plain.OperatorToken, plain.Right),
                    }
                : Code.AsQuotientIn(
                    target.Parent,
                    Composed(((BinaryExpressionSyntax)current).Left, ((BinaryExpressionSyntax)current).Right, terms.Adds, c).WithTriviaFrom(current)));
    }

    private static ExpressionSyntax Composed(ExpressionSyntax left, ExpressionSyntax right, bool adds, string light)
    {
        string sign = adds ? " + " : " - ";
        string u = left.WithoutTrivia().ToString();
        string v = right.WithoutTrivia().ToString();
        string vTerm = Code.Factor(right.WithoutTrivia()).ToString();
        string uFactor = Code.Factor(left.WithoutTrivia()).ToString();
        // A divided factor keeps its own parentheses, so that products near the range's end do not overflow into c².
        string product = light == "1" ? uFactor + " * " + Grouped(right, vTerm) : uFactor + " / " + light + " * (" + vTerm + " / " + light + ")";
        string difference = adds ? v : Grouped(right, v);
        return Code.Tidy(Code.Parse("(" + u + sign + difference + ") / (1" + sign + product + ")"));
    }

    private static string Grouped(ExpressionSyntax expression, string text)
        => expression is BinaryExpressionSyntax && !text.StartsWith("(", System.StringComparison.Ordinal) ? "(" + text + ")" : text;
}
