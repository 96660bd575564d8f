using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Flow;

/// <summary>Whether a body has anything to do with tags; most have not, and are left before they are walked.</summary>
internal static class Relevance
{
    internal static bool Concerns(IOperation body, ISymbol owner, SymbolTags tags)
    {
        if (body is IFieldInitializerOperation or IPropertyInitializerOperation or IParameterInitializerOperation)
            return true;
        if (owner is IMethodSymbol method && (tags.OfReturn(method) is not null || AnyTagged(method, tags)))
            return true;
        foreach (IOperation operation in body.DescendantsAndSelf())
        {
            switch (operation)
            {
                case IFieldReferenceOperation field when tags.Of(field.Field) is not null:
                case IPropertyReferenceOperation property when tags.Of(property.Property) is not null:
                case IParameterReferenceOperation parameter when tags.Of(parameter.Parameter) is not null:
                case IInvocationOperation call when tags.OfReturn(call.TargetMethod) is not null || AnyTagged(call.TargetMethod, tags):
                case IVariableDeclaratorOperation declarator when tags.OfLocal(declarator.Symbol) is not null:
                case IObjectCreationOperation { Constructor: { } constructor } when AnyTagged(constructor, tags):
                    return true;
            }
        }

        return false;
    }

    private static bool AnyTagged(IMethodSymbol method, SymbolTags tags)
    {
        foreach (IParameterSymbol parameter in method.Parameters)
        {
            if (tags.Of(parameter) is not null)
                return true;
        }

        return false;
    }
}
