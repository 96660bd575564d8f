using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Flow;

/// <summary>Whether a body has anything to do with tags; most have not, and are left before they are walked.</summary>
internal static class Relevance
{
    internal static bool Concerns(IOperation body, ISymbol owner, SymbolTags tags)
    {
        if (tags.Concerns(owner is IMethodSymbol { AssociatedSymbol: { } member } ? member : owner))
            return true;
        foreach (IOperation operation in body.DescendantsAndSelf())
        {
            switch (operation)
            {
                case IFieldReferenceOperation field when tags.Concerns(field.Field):
                case IPropertyReferenceOperation property when tags.Concerns(property.Property):
                case IParameterReferenceOperation parameter when tags.Of(parameter.Parameter) is not null:
                case IInvocationOperation call when tags.Concerns(call.TargetMethod):
                case IObjectCreationOperation { Constructor: { } constructor } when tags.Concerns(constructor):
                case IVariableDeclaratorOperation declarator when tags.OfLocal(declarator.Symbol) is not null:
                case ILocalFunctionOperation local when tags.Concerns(local.Symbol):
                case IAnonymousFunctionOperation function when tags.Concerns(function.Symbol):
                    return true;
            }
        }

        return false;
    }
}
