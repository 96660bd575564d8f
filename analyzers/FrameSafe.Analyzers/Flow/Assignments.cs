using System.Collections.Generic;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Flow;

/// <summary>
/// How the variables of one body are assigned. Unstable ones cannot be followed: those that a nested function writes, whenever
/// it may run, and those with a second name by reference; of them only what is declared is known. Locals that nothing but their
/// initialiser assigns stand for it.
/// </summary>
internal sealed class Assignments
{
    private readonly HashSet<ISymbol> _unstable = new(SymbolEqualityComparer.Default);
    private readonly HashSet<ISymbol> _reassigned = new(SymbolEqualityComparer.Default);
    private readonly Dictionary<ISymbol, IOperation> _definitions = new(SymbolEqualityComparer.Default);

    internal Assignments(IOperation body)
    {
        foreach (IOperation operation in body.DescendantsAndSelf())
        {
            switch (operation)
            {
                case ISimpleAssignmentOperation { IsRef: true } assignment:
                    AddAlias(assignment.Value);
                    break;
                case IVariableDeclaratorOperation { Symbol.RefKind: not RefKind.None } declarator:
                    AddAlias(declarator.Initializer?.Value);
                    break;
                case IVariableDeclaratorOperation { Initializer: { } initializer } declarator:
                    _definitions[declarator.Symbol] = initializer.Value;
                    break;
                case IAddressOfOperation address:
                    AddAlias(address.Reference);
                    break;
                case IAssignmentOperation assignment:
                    AddTarget(assignment.Target);
                    break;
                case IIncrementOrDecrementOperation step:
                    AddTarget(step.Target);
                    break;
                case IArgumentOperation { Parameter.RefKind: RefKind.Ref or RefKind.Out } argument:
                    AddTarget(argument.Value);
                    break;
            }
        }
    }

    internal bool IsUnstable(ISymbol variable) => _unstable.Contains(variable);

    /// <summary>What a local that is assigned once holds; null for any other.</summary>
    internal IOperation? Definition(ILocalSymbol local)
        => _definitions.TryGetValue(local, out IOperation? definition) && !_reassigned.Contains(local) ? definition : null;

    private void AddAlias(IOperation? operation)
    {
        if (operation is not null && Variable(operation) is { } variable)
        {
            _unstable.Add(variable);
            _reassigned.Add(variable);
        }
    }

    private void AddTarget(IOperation target)
    {
        if (target is ITupleOperation tuple)
        {
            foreach (IOperation element in tuple.Elements)
                AddTarget(element);
            return;
        }

        if (Variable(target) is not { } variable)
            return;
        _reassigned.Add(variable);
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
                _unstable.Add(variable);
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
