using System.Collections.Concurrent;
using System.Collections.Generic;
using System.Globalization;
using System.Threading;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;
using Microsoft.CodeAnalysis.Text;

namespace FrameSafe.Analyzers.Rules;

/// <summary>Judges the attributes themselves where they stand: unit texts, largest speeds, frames declared relative to others.</summary>
internal static class DeclarationAttributes
{
    private const int MostKept = 500;

    private static readonly ConcurrentDictionary<string, bool> Readable = new(System.StringComparer.Ordinal);

    /// <summary>By the name alone, before anything is bound.</summary>
    internal static bool IsNamedLikeOurs(AttributeSyntax attribute) => Name(attribute.Name) is
        "Unit" or "UnitAttribute" or "MaxSpeed" or "MaxSpeedAttribute" or "RelativeTo" or "RelativeToAttribute"
        or "TimeScale" or "TimeScaleAttribute" or "Slot" or "SlotAttribute";

    internal static IEnumerable<Finding> Judge(AttributeSyntax attribute, SemanticModel model, CancellationToken cancellation)
    {
        if (IsPlainlyRight(attribute))
            yield break;
        if (attribute.ArgumentList is null && Name(attribute.Name) is not ("RelativeTo" or "RelativeToAttribute"))
            yield break;
        if (model.GetSymbolInfo(attribute, cancellation).Symbol?.ContainingType is not { } type || !Vocabulary.IsOurs(type))
            yield break;
        Finding? finding = null;
        switch (type.Name)
        {
            case "UnitAttribute":
                finding = Unit(Argument(attribute, 0));
                break;
            case "SlotAttribute":
                finding = Range(Argument(attribute, 0)) ?? Unit(Argument(attribute, 1));
                break;
            case "TimeScaleAttribute":
                finding = Unit(Named(attribute, "Unit"));
                break;
            case "MaxSpeedAttribute":
                finding = Speed(Argument(attribute, 0), attribute.Parent?.Parent switch
                {
                    ParameterSyntax parameter => parameter.Identifier.ValueText,
                    PropertyDeclarationSyntax property => property.Identifier.ValueText,
                    BaseFieldDeclarationSyntax { Declaration.Variables: { Count: > 0 } variables } => variables[0].Identifier.ValueText,
                    MethodDeclarationSyntax method => method.Identifier.ValueText,
                    _ => "this number",
                });
                break;
            case "RelativeToAttribute" when attribute.Parent?.Parent is TypeDeclarationSyntax declaration
                && model.GetDeclaredSymbol(declaration, cancellation) is { } frame:
                finding = Speed(Named(attribute, "MaxSpeed"), frame.Name) ?? Parent(attribute, frame, cancellation);
                break;
        }

        if (finding is not null)
            yield return finding;

        Finding? Unit(ExpressionSyntax? argument)
        {
            if (argument is null || model.GetConstantValue(argument, cancellation) is not { HasValue: true, Value: string text })
                return null;
            return UnitText.TryRead(text, out _, out UnitTextError? error)
                ? null
                : RuleTable.UnreadableUnit.Judge(text, Place(argument, text, error));
        }

        Finding? Range(ExpressionSyntax? argument)
            => argument is not null && model.GetConstantValue(argument, cancellation) is { HasValue: true, Value: string text }
                && !SlotMap.TryRange(text, out int _, out int _)
                ? RuleTable.ImpossibleFrame.JudgeRange(text, argument.GetLocation())
                : null;

        Finding? Speed(ExpressionSyntax? argument, string owner)
            => argument is not null && model.GetConstantValue(argument, cancellation) is { HasValue: true, Value: { } value and (double or int or float) }
                ? RuleTable.ImpossibleFrame.JudgeSpeed(
                    System.Convert.ToDouble(value, CultureInfo.InvariantCulture), owner, argument.GetLocation())
                : null;
    }

    // Nearly all attributes are literals that can be read: there is nothing to bind then, and binding is what costs.
    private static bool IsPlainlyRight(AttributeSyntax attribute)
        => attribute.ArgumentList is { Arguments: { Count: 1 } arguments } && arguments[0].Expression is LiteralExpressionSyntax literal
            && literal.Token.Value switch
            {
                string text => Name(attribute.Name) is "Unit" or "UnitAttribute" && IsReadable(text),
                double speed => Name(attribute.Name) is "MaxSpeed" or "MaxSpeedAttribute" && speed is >= 0 and < 1,
                _ => false,
            };

    private static bool IsReadable(string text)
    {
        if (Readable.TryGetValue(text, out bool known))
            return known;
        bool readable = UnitText.TryRead(text, out _, out _);
        // A handful of units serves a project; whatever else is typed is not kept.
        if (Readable.Count < MostKept)
            Readable.TryAdd(text, readable);
        return readable;
    }

    private static Finding? Parent(AttributeSyntax attribute, INamedTypeSymbol frame, CancellationToken cancellation)
    {
        foreach (RelativeMotion motion in RelativeMotion.Of(frame))
        {
            if (motion.Attribute.ApplicationSyntaxReference?.GetSyntax(cancellation) == attribute)
                return RuleTable.ImpossibleFrame.JudgeParent(frame, motion, attribute.GetLocation());
        }

        return null;
    }

    // Within a literal that is written as it is meant, the very characters; else the whole argument.
    private static Location Place(ExpressionSyntax argument, string text, UnitTextError error)
    {
        if (argument is LiteralExpressionSyntax literal && literal.Token.Text == "\"" + text + "\"" && error.Length > 0)
        {
            return Location.Create(
                argument.SyntaxTree, new TextSpan(literal.Token.SpanStart + 1 + error.Column, error.Length));
        }

        return argument.GetLocation();
    }

    private static ExpressionSyntax? Argument(AttributeSyntax attribute, int index)
    {
        SeparatedSyntaxList<AttributeArgumentSyntax>? arguments = attribute.ArgumentList?.Arguments;
        return arguments is { } list && list.Count > index && list[index].NameEquals is null ? list[index].Expression : null;
    }

    private static ExpressionSyntax? Named(AttributeSyntax attribute, string name)
    {
        if (attribute.ArgumentList is null)
            return null;
        foreach (AttributeArgumentSyntax argument in attribute.ArgumentList.Arguments)
        {
            if (argument.NameEquals?.Name.Identifier.ValueText == name)
                return argument.Expression;
        }

        return null;
    }

    private static string Name(NameSyntax name) => name switch
    {
        SimpleNameSyntax simple => simple.Identifier.ValueText,
        QualifiedNameSyntax qualified => qualified.Right.Identifier.ValueText,
        AliasQualifiedNameSyntax alias => alias.Name.Identifier.ValueText,
        _ => "",
    };
}
