using System.Collections.Generic;
using FrameSafe.Analyzers;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;
using Microsoft.CodeAnalysis.Formatting;
using Microsoft.CodeAnalysis.Simplification;

namespace FrameSafe.CodeFixes;

/// <summary>Building blocks of repaired expressions.</summary>
internal static class Code
{
    /// <summary>An expression of a text that this library itself composed.</summary>
    internal static ExpressionSyntax Parse(string text) => SyntaxFactory.ParseExpression(text);

    /// <summary>The operand that a finding's properties name, of the expression at its place.</summary>
    internal static ExpressionSyntax? Operand(SyntaxNode place, Diagnostic finding)
    {
        SyntaxNode expression = Bare(place);
        finding.Properties.TryGetValue(FindingProperties.Operand, out string? operand);
        return (operand, expression) switch
        {
            ("whole", ExpressionSyntax whole) => whole,
            ("whole", ArgumentSyntax argument) => argument.Expression,
            ("left", BinaryExpressionSyntax binary) => binary.Left,
            ("right", BinaryExpressionSyntax binary) => binary.Right,
            ("right", AssignmentExpressionSyntax assignment) => assignment.Right,
            ("left", ConditionalExpressionSyntax conditional) => conditional.WhenTrue,
            ("right", ConditionalExpressionSyntax conditional) => conditional.WhenFalse,
            _ => null,
        };
    }

    internal static SyntaxNode Bare(SyntaxNode node)
    {
        while (node is ParenthesizedExpressionSyntax parenthesized)
            node = parenthesized.Expression;
        return node;
    }

    /// <summary>left op right, where the left one's own trivia stay around the whole.</summary>
    internal static ExpressionSyntax Infix(SyntaxKind kind, SyntaxNode left, ExpressionSyntax right)
    {
        var expression = (ExpressionSyntax)left;
        SyntaxToken op = SyntaxFactory.Token(OperatorOf(kind)).WithLeadingTrivia(SyntaxFactory.Space).WithTrailingTrivia(SyntaxFactory.Space);
        return SyntaxFactory.BinaryExpression(kind, Factor(expression.WithoutTrailingTrivia()), op, right.WithoutTrivia())
            .WithTrailingTrivia(expression.GetTrailingTrivia());
    }

    /// <summary>An expression that can stand beside * or / as it is.</summary>
    internal static ExpressionSyntax Factor(ExpressionSyntax expression)
    {
        bool stands = expression is IdentifierNameSyntax or LiteralExpressionSyntax or MemberAccessExpressionSyntax or InvocationExpressionSyntax
            or ElementAccessExpressionSyntax or ParenthesizedExpressionSyntax or PrefixUnaryExpressionSyntax or ObjectCreationExpressionSyntax
            or PostfixUnaryExpressionSyntax or CheckedExpressionSyntax or ThisExpressionSyntax
            || expression.IsKind(SyntaxKind.MultiplyExpression) || expression.IsKind(SyntaxKind.DivideExpression);
        return stands
            ? expression
            : SyntaxFactory.ParenthesizedExpression(expression.WithoutTrivia()).WithTriviaFrom(expression);
    }

    /// <summary>An expression in parentheses where what is around it binds tighter than a quotient does, or as tight.</summary>
    internal static ExpressionSyntax AsQuotientIn(SyntaxNode? parent, ExpressionSyntax quotient)
        => parent is BinaryExpressionSyntax binary && (binary.IsKind(SyntaxKind.MultiplyExpression) || binary.IsKind(SyntaxKind.DivideExpression)
                || binary.IsKind(SyntaxKind.ModuloExpression))
            || parent is PrefixUnaryExpressionSyntax or CastExpressionSyntax or MemberAccessExpressionSyntax
            ? SyntaxFactory.ParenthesizedExpression(quotient.WithoutTrivia()).WithTriviaFrom(quotient)
            : quotient;

    /// <summary>Whether evaluating it twice is evaluating it once: variables, members of them, numbers, and arithmetic of these.</summary>
    internal static bool IsRepeatable(ExpressionSyntax expression) => expression switch
    {
        IdentifierNameSyntax or LiteralExpressionSyntax or ThisExpressionSyntax or BaseExpressionSyntax => true,
        MemberAccessExpressionSyntax access => IsRepeatable(access.Expression),
        PredefinedTypeSyntax or GenericNameSyntax or AliasQualifiedNameSyntax => true,
        ParenthesizedExpressionSyntax parenthesized => IsRepeatable(parenthesized.Expression),
        PrefixUnaryExpressionSyntax unary => (unary.IsKind(SyntaxKind.UnaryMinusExpression) || unary.IsKind(SyntaxKind.UnaryPlusExpression)) && IsRepeatable(unary.Operand),
        BinaryExpressionSyntax binary => IsRepeatable(binary.Left) && IsRepeatable(binary.Right),
        ElementAccessExpressionSyntax element => IsRepeatable(element.Expression) && element.ArgumentList.Arguments.Count == 1
            && IsRepeatable(element.ArgumentList.Arguments[0].Expression),
        _ => false,
    };

    /// <summary>Lets the simplifier shorten the qualified names in a new expression, and the formatter lay it out.</summary>
    internal static T Tidy<T>(T expression)
        where T : SyntaxNode
        => expression.ReplaceNodes(
                Names(expression),
                static (_, name) => name.WithAdditionalAnnotations(Simplifier.Annotation))
            .WithAdditionalAnnotations(Formatter.Annotation);

    private static IEnumerable<SyntaxNode> Names(SyntaxNode expression)
    {
        foreach (SyntaxNode node in expression.DescendantNodes())
        {
            if (node is MemberAccessExpressionSyntax access && access.ToString().StartsWith("global::", System.StringComparison.Ordinal))
                yield return node;
        }
    }

    private static SyntaxKind OperatorOf(SyntaxKind kind) => kind switch
    {
        SyntaxKind.MultiplyExpression => SyntaxKind.AsteriskToken,
        SyntaxKind.DivideExpression => SyntaxKind.SlashToken,
        SyntaxKind.AddExpression => SyntaxKind.PlusToken,
        _ => SyntaxKind.MinusToken,
    };
}
