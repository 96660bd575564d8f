using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace FrameSafe.Tool.Surveying;

/// <summary>The member that a piece of code is in, by the names it is nested in: <c>Relay.CourierShip.ClockAt</c>.</summary>
internal static class MemberName
{
    internal static string Of(SyntaxNode node)
        => string.Join('.', node.AncestorsAndSelf().Select(NamePart).Where(name => name is not null).Reverse());

    private static string? NamePart(SyntaxNode node) => node switch
    {
        BaseNamespaceDeclarationSyntax space => space.Name.ToString(),
        TypeDeclarationSyntax { TypeParameterList.Parameters.Count: > 0 and int count } type => $"{type.Identifier.ValueText}`{count}",
        BaseTypeDeclarationSyntax type => type.Identifier.ValueText,
        DelegateDeclarationSyntax type => type.Identifier.ValueText,
        MethodDeclarationSyntax method => method.Identifier.ValueText,
        PropertyDeclarationSyntax property => property.Identifier.ValueText,
        EventDeclarationSyntax @event => @event.Identifier.ValueText,
        ConstructorDeclarationSyntax => "new",
        VariableDeclaratorSyntax { Parent.Parent: BaseFieldDeclarationSyntax } field => field.Identifier.ValueText,
        LocalFunctionStatementSyntax local => local.Identifier.ValueText,
        IndexerDeclarationSyntax => "this[]",
        OperatorDeclarationSyntax op => "operator " + op.OperatorToken.ValueText,
        ConversionOperatorDeclarationSyntax conversion => "operator " + conversion.Type,
        _ => null,
    };
}
