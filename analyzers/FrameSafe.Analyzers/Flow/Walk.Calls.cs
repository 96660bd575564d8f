using System.Collections.Generic;
using System.Collections.Immutable;
using FrameSafe.Analyzers.Formulas;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Flow;

/// <content>Calls: what goes in, what comes out.</content>
internal sealed partial class Walk
{
    public override Value VisitInvocation(IInvocationOperation operation, object? argument)
    {
        Value instance = Visit(operation.Instance);
        IMethodSymbol method = operation.TargetMethod;
        if (KnownFunctions.Of(method) is { } function && Values(operation.Arguments) is { } numbers)
            return Recognise(operation, Apply(function, operation, numbers));
        if (SequenceMethods.IsSequence(method))
            return Sequence(operation, instance);

        Value[] arguments = Arguments(operation.Arguments);
        if (Tags.OfReturn(method) is { } declared)
            return Value.Of(declared).With(Passed(declared.Tag, operation));
        if (method.Name is "FromResult" or "GetEnumerator" or "AsSpan" or "AsMemory" or "Slice" or "Clone" or "ToArray" or "ConfigureAwait" or "GetValueOrDefault"
            or "AsReadOnly" or "GetAwaiter" or "GetResult")
        {
            bool isExtension = operation.Instance is null && arguments.Length > 0;
            IOperation? start = method.Name is "AsSpan" or "AsMemory" or "Slice" && operation.Arguments.Length > (isExtension ? 1 : 0)
                ? operation.Arguments[isExtension ? 1 : 0].Value
                : null;
            return Sliced(isExtension ? arguments[0] : instance, start);
        }

        if (method.Name is "Add" or "Push" or "Enqueue" or "Insert" && operation.Instance is ILocalReferenceOperation list && arguments.Length > 0)
            _environment.Set(list.Local, Value.Merge(instance, arguments[arguments.Length - 1]));
        return _knowledge.Summaries.OfCall(method, operation.Arguments, arguments, _depth, _cancellation);
    }

    public override Value VisitObjectCreation(IObjectCreationOperation operation, object? argument)
    {
        Value[] arguments = Arguments(operation.Arguments);
        Value? elements = CollectionElements(operation.Initializer);
        if (elements is null)
            Visit(operation.Initializer);
        if (KnownMembers.IsVector(operation.Type))
        {
            Value? all = null;
            for (int i = 0; i < arguments.Length; i++)
                all = all is null ? arguments[i] : Choose(operation.Syntax, all, operation.Arguments[0].Value, arguments[i], operation.Arguments[i].Value, "made components of one vector");
            return all ?? Value.Unknown;
        }

        if (elements is not null && IsCollection(operation.Type))
            return elements;
        // A new collection holds nothing yet, and will hold what is put in.
        return operation is { Arguments.Length: 0, Initializer: null } && IsCollection(operation.Type) ? Value.Of(Tag.Neutral) : Value.Unknown;
    }

    // The elements of a collection initialiser, where each is added by one argument.
    private Value? CollectionElements(IObjectOrCollectionInitializerOperation? initializer)
    {
        if (initializer is null || initializer.Initializers.Length == 0)
            return null;
        foreach (IOperation added in initializer.Initializers)
        {
            if (added is not IInvocationOperation { Arguments.Length: 1 })
                return null;
        }

        Value? all = null;
        foreach (IOperation added in initializer.Initializers)
        {
            Value value = Arguments(((IInvocationOperation)added).Arguments)[0];
            all = all is null ? value : Value.Merge(all, value);
        }

        return all;
    }

    public override Value VisitDelegateCreation(IDelegateCreationOperation operation, object? argument)
    {
        if (operation.Target is IAnonymousFunctionOperation function)
            Function(function, DelegateParameters(operation.Type), DelegateReturn(operation.Type));
        else
            Visit(operation.Target);
        return Value.Unknown;
    }

    public override Value VisitAnonymousFunction(IAnonymousFunctionOperation operation, object? argument)
        => Function(operation, [], null);

    public override Value VisitLocalFunction(ILocalFunctionOperation operation, object? argument)
    {
        Nested(operation.Symbol, () => Visit(operation.Body), Returns.Of(operation.Symbol, Tags));
        return Value.Unknown;
    }

    // A tag on an instantaneous rest frame stands for a family of frames: which member a number was carried into, its transform tells.
    private Tag Passed(Tag tag, IInvocationOperation call)
        => tag.Frame is { Nature: FrameNature.Rest } && Tags.IsTransform(call.TargetMethod) && FormulaReader.Name(call.Instance) is { } transform
            ? tag with { Passage = transform }
            : tag;

    /// <summary>Walks a function inside this body, with what its parameters are given; gives what it returns.</summary>
    private Value Function(IAnonymousFunctionOperation function, ImmutableArray<Value> given, Declaration? delegateReturn)
    {
        for (int i = 0; i < function.Symbol.Parameters.Length && i < given.Length; i++)
        {
            if (Tags.Of(function.Symbol.Parameters[i]) is null)
                _environment.Set(function.Symbol.Parameters[i], given[i]);
        }

        Declaration? target = Tags.OfReturn(function.Symbol) ?? delegateReturn;
        return Nested(function.Symbol, () => Visit(function.Body), new(target, "the result of this function"));
    }

    private Value Nested(IMethodSymbol function, System.Action body, Returns returns)
    {
        Returns outer = _returns;
        _returns = returns;
        bool reachable = _environment.IsReachable;
        int mark = _environment.Mark;
        _environment.IsReachable = true;
        body();
        // Whether and when it runs is not known; what it writes is unstable, so nothing of its state goes on.
        _environment.Rewind(mark, reachable);
        _returns = outer;
        return returns.Result ?? Value.Unknown;
    }

    private ImmutableArray<Value> DelegateParameters(ITypeSymbol? type)
    {
        if (type is not INamedTypeSymbol { DelegateInvokeMethod: { } invoke })
            return [];
        ImmutableArray<Value>.Builder values = ImmutableArray.CreateBuilder<Value>(invoke.Parameters.Length);
        foreach (IParameterSymbol parameter in invoke.Parameters)
            values.Add(Value.Of(Tags.Of(parameter)));
        return values.MoveToImmutable();
    }

    private Declaration? DelegateReturn(ITypeSymbol? type)
        => type is INamedTypeSymbol { DelegateInvokeMethod: { } invoke } ? Tags.OfReturn(invoke) : null;

    /// <summary>Visits the arguments of a call and delivers each to its parameter; in the order of the parameters where they are known.</summary>
    private Value[] Arguments(ImmutableArray<IArgumentOperation> arguments)
    {
        var values = new Value[arguments.Length];
        for (int i = 0; i < arguments.Length; i++)
        {
            IArgumentOperation argument = arguments[i];
            values[i] = Visit(argument.Value);
            if (argument.Parameter is not { } parameter)
                continue;
            Declaration? declared = Tags.Of(parameter);
            if (parameter.RefKind is RefKind.Out or RefKind.Ref)
            {
                if (parameter.RefKind == RefKind.Ref && argument.Value is not IDeclarationExpressionOperation)
                    Deliver(values[i], argument.Value, declared, Describe(parameter), "passed");
                Assign(argument.Value, Value.Of(declared), argument.Value, "assigned");
            }
            else
            {
                Deliver(
                    values[i],
                    argument.ArgumentKind == ArgumentKind.DefaultValue ? null : argument.Value,
                    declared,
                    Describe(parameter),
                    IsBackwards(parameter, values[i]) ? Backwards : "passed");
            }
        }

        return values;
    }

    /// <summary>The verb of a number that goes into a transform of which it is what should come out.</summary>
    internal const string Backwards = "put in backwards";

    private bool IsBackwards(IParameterSymbol parameter, Value value)
        => value.Tag.Frame is { } frame && parameter.ContainingSymbol is IMethodSymbol method && Tags.IsTransform(method)
            && frame.Equals(Tags.OfReturn(method)?.Tag.Frame);

    // The values of plain arguments in the order of the parameters; null where there are lambdas, references or none.
    private Value[]? Values(ImmutableArray<IArgumentOperation> arguments)
    {
        var values = new Value[arguments.Length];
        foreach (IArgumentOperation argument in arguments)
        {
            if (argument.Parameter is null || argument.Parameter.Ordinal >= values.Length)
                return null;
        }

        foreach (IArgumentOperation argument in arguments)
            values[argument.Parameter!.Ordinal] = Visit(argument.Value);
        return values;
    }

    private static IOperation ArgumentAt(IInvocationOperation call, int ordinal)
    {
        foreach (IArgumentOperation argument in call.Arguments)
        {
            if (argument.Parameter?.Ordinal == ordinal)
                return argument.Value;
        }

        return call;
    }

    private Value Apply(KnownFunction function, IInvocationOperation call, Value[] values)
    {
        Value first = values[0];
        switch (function)
        {
            case KnownFunction.Same:
                return first;
            case KnownFunction.Choice:
                Value chosen = first;
                for (int i = 1; i < values.Length; i++)
                    chosen = Choose(call.Syntax, chosen, ArgumentAt(call, 0), values[i], ArgumentAt(call, i), "put side by side in `" + call.TargetMethod.Name + "`");
                return chosen;
            case KnownFunction.Interpolation:
                return Choose(call.Syntax, first, ArgumentAt(call, 0), values[1], ArgumentAt(call, 1), "put side by side in `" + call.TargetMethod.Name + "`");
            case KnownFunction.Arctangent2:
                Choose(call.Syntax, first, ArgumentAt(call, 0), values[1], ArgumentAt(call, 1), "put side by side in `" + call.TargetMethod.Name + "`");
                return Value.Angle;
            case KnownFunction.Root:
                return Value.Of(TagProducts.Root(first.Tag), first.Origin);
            case KnownFunction.CubeRoot:
                return Value.Of(TagProducts.Power(first.Tag, new Rational(1, 3)), first.Origin);
            case KnownFunction.Power:
                Rational exponent = ArgumentAt(call, 1).ConstantValue is { HasValue: true, Value: { } given }
                    ? Rational.FromDouble(System.Convert.ToDouble(given, System.Globalization.CultureInfo.InvariantCulture))
                    : Rational.Unknown;
                return Value.Of(TagProducts.Power(first.Tag, exponent), first.Origin);
            case KnownFunction.MultiplyAdd:
                Value product = Value.Of(TagProducts.Product(first.Tag, values[1].Tag), OriginOf(first, values[1]));
                return Binary(call.Syntax, BinaryOperatorKind.Add, product, ArgumentAt(call, 0), values[2], ArgumentAt(call, 2), call.Type);
            case KnownFunction.Remainder:
                return Binary(call.Syntax, BinaryOperatorKind.Remainder, first, ArgumentAt(call, 0), values[1], ArgumentAt(call, 1), call.Type);
            case KnownFunction.OfAngle:
                Argument(call, first, isAngle: true);
                return Value.Number;
            case KnownFunction.OfNumber:
                Argument(call, first, isAngle: false);
                if (first.Tag.Misuse is Misuse.CoordinateOverProperTime or Misuse.ProperOverCoordinateTime && call.TargetMethod.Name.StartsWith("Exp", System.StringComparison.Ordinal))
                    NoteDecay(ArgumentAt(call, 0));
                return Value.Number;
            case KnownFunction.Logarithm:
                if (!IsLogarithmOfRatio(call))
                    Argument(call, first, isAngle: false);
                return Value.Number;
            case KnownFunction.InverseAngle:
                Argument(call, first, isAngle: false);
                return Value.Angle;
            case KnownFunction.DegreesToRadians:
                return Value.Of(TagProducts.Product(first.Tag, Tag.Plain with { Conversion = Scale.Pi / Scale.Of(180, 1) }), first.Origin);
            case KnownFunction.RadiansToDegrees:
                return Value.Of(TagProducts.Product(first.Tag, Tag.Plain with { Conversion = Scale.Of(180, 1) / Scale.Pi }), first.Origin);
            default:
                return Value.Unknown;
        }
    }

    // A decay law counts the proper time of what decays: exp(-t/τ) of a coordinate time by a proper lifetime lacks the Lorentz factor.
    private void NoteDecay(IOperation exponent)
    {
        while (exponent is IUnaryOperation or IParenthesizedOperation or IConversionOperation)
        {
            exponent = exponent switch
            {
                IUnaryOperation unary => unary.Operand,
                IParenthesizedOperation parenthesized => parenthesized.Operand,
                IConversionOperation conversion => conversion.Operand,
                _ => exponent,
            };
        }

        if (exponent is not IBinaryOperation { OperatorKind: BinaryOperatorKind.Divide } quotient)
            return;
        IOperation numerator = quotient.LeftOperand;
        while (numerator is IUnaryOperation { OperatorKind: UnaryOperatorKind.Minus } negated)
            numerator = negated.Operand;
        (Value time, Value lifetime) = (Quietly(numerator), Quietly(quotient.RightOperand));
        if (TagAlgebra.Meet(time.Tag, lifetime.Tag, Meeting.Comparison).Clash is { Kind: ClashKind.ProperAndCoordinateTime } clash)
        {
            Note(
                quotient.Syntax,
                clash,
                new(time, numerator.Syntax, Operation: numerator),
                new(lifetime, quotient.RightOperand.Syntax, Operation: quotient.RightOperand),
                "divided in a decay law");
        }
    }

    private void Argument(IInvocationOperation call, Value value, bool isAngle)
    {
        IOperation operand = ArgumentAt(call, 0);
        Clash? clash = TagAlgebra.Argument(value.Tag, isAngle);
        Note(
            operand.Syntax,
            clash,
            new(value, operand.Syntax, Operation: operand),
            new(isAngle ? Value.Angle : Value.Number, null, "`" + call.TargetMethod.Name + "`"),
            "function");
    }

    // ln a - ln b is the logarithm of a ratio, spelled so that nothing overflows.
    private static bool IsLogarithmOfRatio(IInvocationOperation call)
    {
        IOperation inner = call;
        while (inner.Parent is IParenthesizedOperation or IConversionOperation)
            inner = inner.Parent;
        return inner.Parent is IBinaryOperation { OperatorKind: BinaryOperatorKind.Subtract };
    }

    private Value Sequence(IInvocationOperation call, Value instance)
    {
        // As extensions their first argument is the receiver.
        IOperation? receiver = call.Instance;
        Value elements = instance;
        var rest = new List<IArgumentOperation>();
        foreach (IArgumentOperation argument in call.Arguments)
        {
            if (receiver is null && argument.Parameter?.Ordinal == 0)
                (receiver, elements) = (argument.Value, Visit(argument.Value));
            else
                rest.Add(argument);
        }

        IAnonymousFunctionOperation? function = null;
        Value? other = null;
        foreach (IArgumentOperation argument in rest)
        {
            if (Lambda(argument.Value) is { } lambda)
                function = lambda;
            else
                other = Visit(argument.Value);
        }

        SequenceMethod method = SequenceMethods.Of(call.TargetMethod.Name);
        ImmutableArray<Value> given = method switch
        {
            SequenceMethod.Pairwise => [elements, other ?? Value.Unknown],
            SequenceMethod.Fold => [other ?? elements, elements],
            _ => [elements, elements],
        };
        Value? result = function is null ? null : Function(function, given, null);
        switch (method)
        {
            case SequenceMethod.Map:
            case SequenceMethod.Pairwise:
                return result ?? (other is not null ? Value.Tuple([elements, other]) : Value.Unknown);
            case SequenceMethod.Fold:
                return result ?? Value.Unknown;
            case SequenceMethod.Sum:
                Value summed = result ?? elements;
                return summed.With(TagAlgebra.Sum(summed.Tag, summed.Tag).Result);
            case SequenceMethod.Reduce:
                return result ?? elements;
            case SequenceMethod.Same:
                return elements;
            case SequenceMethod.Joined:
                return other is null ? elements : Value.Merge(elements, other);
            default:
                return Value.Unknown;
        }
    }

    private static IAnonymousFunctionOperation? Lambda(IOperation operation) => operation switch
    {
        IAnonymousFunctionOperation function => function,
        IDelegateCreationOperation creation => Lambda(creation.Target),
        IConversionOperation conversion => Lambda(conversion.Operand),
        _ => null,
    };

    private static bool IsCollection(ITypeSymbol? type)
    {
        if (type is null || type.SpecialType == SpecialType.System_String)
            return false;
        foreach (INamedTypeSymbol candidate in type.AllInterfaces)
        {
            if (candidate.SpecialType == SpecialType.System_Collections_IEnumerable)
                return true;
        }

        return false;
    }
}
