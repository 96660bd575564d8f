using System.Collections.Generic;
using System.Linq;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Flow;

/// <content>Statements: where control goes.</content>
internal sealed partial class Walk
{
    // Tags only get poorer from pass to pass, and few passes do for them to settle; beyond, what still changes is unknown.
    private const int MaxPasses = 6;

    public override Value VisitConditional(IConditionalOperation operation, object? argument)
    {
        Visit(operation.Condition);
        bool reachable = _environment.IsReachable;
        int mark = _environment.Mark;
        Value whenTrue = Visit(operation.WhenTrue, argument);
        Changes first = _environment.Rewind(mark, reachable);
        Value whenFalse = Visit(operation.WhenFalse, argument);
        Changes second = _environment.Rewind(mark, reachable);
        _environment.Join([first, second]);
        return operation.WhenFalse is null || operation.Type is null
            ? Value.Unknown
            : Choose(operation.Syntax, whenTrue, operation.WhenTrue, whenFalse, operation.WhenFalse, "chosen between");
    }

    public override Value VisitWhileLoop(IWhileLoopOperation operation, object? argument)
    {
        if (operation.ConditionIsTop)
        {
            Loop(operation, () => Visit(operation.Condition), () => Visit(operation.Body), static () => { });
        }
        else
        {
            Loop(operation, static () => { }, () => Visit(operation.Body), () => Visit(operation.Condition), runsOnce: true);
        }

        return Value.Unknown;
    }

    public override Value VisitForLoop(IForLoopOperation operation, object? argument)
    {
        foreach (IOperation before in operation.Before)
            Visit(before);
        Loop(
            operation,
            () => Visit(operation.Condition),
            () => Visit(operation.Body),
            () =>
            {
                foreach (IOperation step in operation.AtLoopBottom)
                    Visit(step);
            });
        return Value.Unknown;
    }

    public override Value VisitForEachLoop(IForEachLoopOperation operation, object? argument)
    {
        Value element = Visit(operation.Collection);
        Loop(
            operation,
            static () => { },
            () =>
            {
                AssignLoopVariable(operation.LoopControlVariable, element);
                Visit(operation.Body);
            },
            static () => { });
        return Value.Unknown;
    }

    public override Value VisitSwitch(ISwitchOperation operation, object? argument)
    {
        Visit(operation.Value);
        bool reachable = _environment.IsReachable;
        int mark = _environment.Mark;
        var paths = new List<Changes>();
        var jumps = new Jumps(operation.ExitLabel, null, mark);
        _jumps.Push(jumps);
        bool hasDefault = false;
        foreach (ISwitchCaseOperation section in operation.Cases)
        {
            foreach (ICaseClauseOperation clause in section.Clauses)
            {
                hasDefault |= clause.CaseKind == CaseKind.Default;
                Visit(clause);
            }

            foreach (IOperation statement in section.Body)
                Visit(statement);
            paths.Add(_environment.Rewind(mark, reachable));
        }

        _jumps.Pop();
        paths.AddRange(jumps.Breaks);
        if (!hasDefault)
            paths.Add(new(reachable));
        _environment.Join(paths);
        return Value.Unknown;
    }

    public override Value VisitTry(ITryOperation operation, object? argument)
    {
        bool reachable = _environment.IsReachable;
        int mark = _environment.Mark;
        Visit(operation.Body);
        Changes body = _environment.Rewind(mark, reachable);
        var paths = new List<Changes> { body };
        foreach (ICatchClauseOperation handler in operation.Catches)
        {
            // A handler may start from any state in the body: before it, after it, or between.
            var interrupted = new Changes(true);
            foreach (KeyValuePair<ISymbol, Value> changed in body.Values)
                interrupted.Values.Add(changed.Key, changed.Value);
            _environment.Join([interrupted, new(true)]);
            Visit(handler.Filter);
            Visit(handler.Handler);
            paths.Add(_environment.Rewind(mark, reachable));
        }

        _environment.Join(paths);
        bool after = _environment.IsReachable;
        if (operation.Finally is not null)
        {
            _environment.IsReachable = reachable;
            Visit(operation.Finally);
            _environment.IsReachable &= after;
        }

        return Value.Unknown;
    }

    public override Value VisitBranch(IBranchOperation operation, object? argument)
    {
        foreach (Jumps jumps in _jumps)
        {
            bool leaves = SymbolEqualityComparer.Default.Equals(operation.Target, jumps.Exit);
            bool goesOn = SymbolEqualityComparer.Default.Equals(operation.Target, jumps.Next);
            if (leaves || goesOn)
            {
                (leaves ? jumps.Breaks : jumps.Continues).Add(_environment.ChangesSince(jumps.Mark));
                break;
            }
        }

        _environment.IsReachable = false;
        return Value.Unknown;
    }

    // Whoever jumps to a label may come with any values.
    public override Value VisitLabeled(ILabeledOperation operation, object? argument)
    {
        _environment.ForgetSince(0);
        _environment.IsReachable = true;
        return Visit(operation.Operation);
    }

    public override Value VisitThrow(IThrowOperation operation, object? argument)
    {
        Visit(operation.Exception);
        // As an operand (x ?? throw …) it ends its own branch only, whose value then fits everything.
        if (operation.Type is not null || operation.Parent is IConditionalOperation { Type: not null } or ICoalesceOperation
            or ISwitchExpressionArmOperation or IConversionOperation)
        {
            return Value.Of(FrameSafe.Analyzers.Tags.Tag.Neutral);
        }

        _environment.IsReachable = false;
        return Value.Unknown;
    }

    public override Value VisitReturn(IReturnOperation operation, object? argument)
    {
        if (operation.ReturnedValue is { } returned)
        {
            Value value = Visit(returned);
            value = Deliver(value, returned, _returns.Target, _returns.Description, "returned");
            if (_environment.IsReachable)
                _returns.Add(value);
        }

        if (operation.Kind != OperationKind.YieldReturn)
            _environment.IsReachable = false;
        return Value.Unknown;
    }

    private void Loop(
        IOperation loop, System.Action before, System.Action body, System.Action after, bool runsOnce = false)
    {
        (ILabelSymbol? exit, ILabelSymbol? next) = loop is ILoopOperation labels ? (labels.ExitLabel, labels.ContinueLabel) : (null, null);
        for (int pass = 0; ; pass++)
        {
            (int, int) noted = Noted;
            bool reachable = _environment.IsReachable;
            int mark = _environment.Mark;
            var jumps = new Jumps(exit, next, mark);
            _jumps.Push(jumps);

            before();
            Changes skipped = _environment.ChangesSince(mark);
            body();
            if (jumps.Continues.Count > 0)
            {
                Changes end = _environment.Rewind(mark, reachable);
                _environment.Join([.. jumps.Continues, end]);
            }

            after();
            _jumps.Pop();
            Changes round = _environment.Rewind(mark, reachable);

            // The next round starts from here or from the end of this one.
            bool settled = !_environment.Join([new(reachable), round]);
            if (settled || pass == MaxPasses)
            {
                if (!settled)
                    _environment.ForgetSince(mark);
                var exits = new List<Changes>(jumps.Breaks) { runsOnce ? round : skipped };
                if (!runsOnce)
                    exits.Add(round);
                _environment.IsReachable = reachable;
                _environment.Join(exits);
                _environment.IsReachable |= reachable && exits.Any(static path => path.IsReachable);
                return;
            }

            Forget(noted);
        }
    }

    private void AssignLoopVariable(IOperation variable, Value element)
    {
        switch (variable)
        {
            case IVariableDeclaratorOperation declarator:
                _environment.Set(declarator.Symbol, element);
                break;
            case IDeclarationExpressionOperation or ITupleOperation:
                Deconstruct(variable, element, null);
                break;
            default:
                Assign(variable, element, variable, "assigned");
                break;
        }
    }
}
