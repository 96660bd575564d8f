using System.Collections.Generic;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Flow;

/// <summary>
/// Variables that the walk cannot follow: those that a nested function writes, whenever it may run, and those with a second
/// name by reference. Of them only what is declared is known.
/// </summary>
internal static class Unstable
{
    internal static void Find(IOperation body, HashSet<ISymbol> found)
    {
        foreach (IOperation operation in body.DescendantsAndSelf())
        {
            switch (operation)
            {
                case ISimpleAssignmentOperation { IsRef: true } assignment:
                    Add(assignment.Value, found);
                    break;
                case IVariableDeclaratorOperation { Symbol.RefKind: not RefKind.None, Initializer: { } initializer }:
                    Add(initializer.Value, found);
                    break;
                case IAddressOfOperation address:
                    Add(address.Reference, found);
                    break;
                case IAssignmentOperation assignment:
                    AddOuter(assignment.Target, found);
                    break;
                case IIncrementOrDecrementOperation step:
                    AddOuter(step.Target, found);
                    break;
                case IArgumentOperation { Parameter.RefKind: RefKind.Ref or RefKind.Out } argument:
                    AddOuter(argument.Value, found);
                    break;
            }
        }
    }

    private static void Add(IOperation operation, HashSet<ISymbol> found)
    {
        if (Variable(operation) is { } variable)
            found.Add(variable);
    }

    private static void AddOuter(IOperation target, HashSet<ISymbol> found)
    {
        if (target is ITupleOperation tuple)
        {
            foreach (IOperation element in tuple.Elements)
                AddOuter(element, found);
            return;
        }

        if (Variable(target) is not { } variable)
            return;
        for (IOperation? outer = target.Parent; outer is not null; outer = outer.Parent)
        {
            IMethodSymbol? function = outer switch
            {
                IAnonymousFunctionOperation anonymous => anonymous.Symbol,
                ILocalFunctionOperation local => local.Symbol,
                _ => null,
            };
            if (function is null)
                continue;
            if (!SymbolEqualityComparer.Default.Equals(function, variable.ContainingSymbol))
                found.Add(variable);
            return;
        }
    }

    private static ISymbol? Variable(IOperation operation) => operation switch
    {
        ILocalReferenceOperation local => local.Local,
        IParameterReferenceOperation parameter => parameter.Parameter,
        _ => null,
    };
}
