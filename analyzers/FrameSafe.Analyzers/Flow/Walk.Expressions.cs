using System.Collections.Generic;
using System.Collections.Immutable;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Flow;

/// <content>Expressions: what is known of their values.</content>
internal sealed partial class Walk
{
    public override Value VisitLiteral(ILiteralOperation operation, object? argument) => Literal(operation);

    public override Value VisitDefaultValue(IDefaultValueOperation operation, object? argument) => Value.Of(Tag.Neutral);

    public override Value VisitParenthesized(IParenthesizedOperation operation, object? argument) => Visit(operation.Operand, argument);

    public override Value VisitParameterReference(IParameterReferenceOperation operation, object? argument)
        => Tags.Of(operation.Parameter) is { } declared
            ? _environment[operation.Parameter] is { } narrowed && !IsUnstable(operation.Parameter) ? narrowed : Value.Of(declared)
            : Variable(operation.Parameter).WithSlots(Tags.SlotsOf(operation.Parameter));

    public override Value VisitLocalReference(ILocalReferenceOperation operation, object? argument)
        => operation.Local is { HasConstantValue: true, ConstantValue: var constant } && _environment[operation.Local] is null
            ? Constant(constant)
            : Variable(operation.Local);

    public override Value VisitFieldReference(IFieldReferenceOperation operation, object? argument)
    {
        Value instance = Visit(operation.Instance);
        if (Tags.Of(operation.Field) is { } declared)
            return Value.Of(declared);
        if (!operation.Field.IsStatic && KnownMembers.IsVector(operation.Field.ContainingType))
            return instance;
        return KnownMembers.Constant(operation.Field) is { } known ? Value.Of(known)
            : operation.Field.HasConstantValue ? Constant(operation.Field.ConstantValue)
            : TupleElement(operation).WithSlots(Tags.SlotsOf(operation.Field));
    }

    public override Value VisitPropertyReference(IPropertyReferenceOperation operation, object? argument)
    {
        Value instance = Visit(operation.Instance);
        Arguments(operation.Arguments);
        if (Tags.Of(operation.Property) is { } declared)
            return Value.Of(declared);
        if (Tags.SlotsOf(operation.Property) is { } own)
            return Value.Unknown.WithSlots(own);
        if (operation.Property.IsIndexer && instance.Slots is { } slots)
            return operation.Arguments.Length == 1 ? Value.Of(ElementOf(slots, operation.Arguments[0].Value)) : Value.Unknown;
        if (operation.Property.IsIndexer || operation.Property.Name is "Value" or "Current" or "Span" or "Result")
            return instance.Parts.Length > 0 ? Value.Unknown : instance;
        if (operation.Property.Name is "X" or "Y" or "Z" or "W" && KnownMembers.IsVector(operation.Property.ContainingType))
            return instance;
        return _knowledge.Summaries.OfProperty(operation.Property, _depth, _cancellation);
    }

    public override Value VisitArrayElementReference(IArrayElementReferenceOperation operation, object? argument)
    {
        Value array = Visit(operation.ArrayReference);
        foreach (IOperation index in operation.Indices)
            Visit(index);
        if (array.Slots is not { } slots || operation.Indices.Length != 1)
            return array;
        return operation.Indices[0] is IRangeOperation range ? Sliced(array, range.LeftOperand) : Value.Of(ElementOf(slots, operation.Indices[0]));
    }

    public override Value VisitImplicitIndexerReference(IImplicitIndexerReferenceOperation operation, object? argument)
    {
        Value instance = Visit(operation.Instance);
        Visit(operation.Argument);
        return operation.Argument is IRangeOperation range ? Sliced(instance, range.LeftOperand)
            : instance.Slots is not null ? Value.Unknown
            : instance;
    }

    public override Value VisitInlineArrayAccess(IInlineArrayAccessOperation operation, object? argument)
    {
        Value instance = Visit(operation.Instance);
        Visit(operation.Argument);
        return instance;
    }

    public override Value VisitConversion(IConversionOperation operation, object? argument)
    {
        Value operand = Visit(operation.Operand, argument);
        return operation.OperatorMethod is null || IsArithmetic(operation.OperatorMethod) ? operand : Value.Unknown;
    }

    public override Value VisitUnaryOperator(IUnaryOperation operation, object? argument)
    {
        Value operand = Visit(operation.Operand);
        return operation.OperatorKind is UnaryOperatorKind.Minus or UnaryOperatorKind.Plus && IsArithmetic(operation.OperatorMethod)
            ? operand
            : Value.Unknown;
    }

    // A sum of ten thousand terms is a chain as deep as it is long: it is walked down and up again without recursion.
    public override Value VisitBinaryOperator(IBinaryOperation operation, object? argument)
    {
        var chain = new Stack<IBinaryOperation>();
        IOperation first = operation;
        while (first is IBinaryOperation binary)
        {
            chain.Push(binary);
            first = binary.LeftOperand;
        }

        Value left = Visit(first);
        while (chain.Count > 0)
        {
            IBinaryOperation step = chain.Pop();
            _cancellation.ThrowIfCancellationRequested();
            Value right = Visit(step.RightOperand);
            left = !IsArithmetic(step.OperatorMethod)
                ? OperatorResult(step.OperatorMethod, left, step.LeftOperand, right, step.RightOperand)
                : step.ConstantValue.HasValue && Constant(step.ConstantValue.Value) is { Tag.IsUnknown: false } folded && IsBare(left) && IsBare(right)
                    ? folded
                    : Binary(step.Syntax, step.OperatorKind, left, step.LeftOperand, right, step.RightOperand, step.Type);
            left = Recognise(step, left);
        }

        return left;
    }

    public override Value VisitTuple(ITupleOperation operation, object? argument)
    {
        ImmutableArray<Value>.Builder parts = ImmutableArray.CreateBuilder<Value>(operation.Elements.Length);
        foreach (IOperation element in operation.Elements)
            parts.Add(Visit(element));
        return Value.Tuple(parts.MoveToImmutable());
    }

    public override Value VisitCoalesce(ICoalesceOperation operation, object? argument)
    {
        Value value = Visit(operation.Value);
        bool reachable = _environment.IsReachable;
        int mark = _environment.Mark;
        Value otherwise = Visit(operation.WhenNull);
        Changes changes = _environment.Rewind(mark, reachable);
        _environment.Join([changes, new(reachable)]);
        return Choose(operation.Syntax, value, operation.Value, otherwise, operation.WhenNull, "chosen between");
    }

    public override Value VisitConditionalAccess(IConditionalAccessOperation operation, object? argument)
    {
        Value receiver = Visit(operation.Operation);
        return Visit(operation.WhenNotNull, receiver);
    }

    public override Value VisitConditionalAccessInstance(IConditionalAccessInstanceOperation operation, object? argument)
    {
        // The receiver is the operand of the nearest access on whose far side this stands.
        IOperation side = operation;
        for (IOperation? outer = operation.Parent; outer is not null; side = outer, outer = outer.Parent)
        {
            if (outer is IConditionalAccessOperation access && access.WhenNotNull == side)
                return Quietly(access.Operation);
        }

        return Value.Unknown;
    }

    public override Value VisitSwitchExpression(ISwitchExpressionOperation operation, object? argument)
    {
        Visit(operation.Value);
        bool reachable = _environment.IsReachable;
        int mark = _environment.Mark;
        var paths = new List<Changes>();
        Value? result = null;
        IOperation? chosen = null;
        foreach (ISwitchExpressionArmOperation arm in operation.Arms)
        {
            Visit(arm.Pattern);
            Visit(arm.Guard);
            Value value = Visit(arm.Value);
            paths.Add(_environment.Rewind(mark, reachable));
            result = result is null || chosen is null ? value : Choose(arm.Value.Syntax, result, chosen, value, arm.Value, "chosen between");
            chosen ??= arm.Value;
        }

        _environment.Join(paths);
        _environment.IsReachable = reachable;
        return result ?? Value.Unknown;
    }

    public override Value VisitArrayCreation(IArrayCreationOperation operation, object? argument)
    {
        foreach (IOperation size in operation.DimensionSizes)
            Visit(size);
        return operation.Initializer is null ? Value.Of(Tag.Neutral) : Visit(operation.Initializer);
    }

    public override Value VisitArrayInitializer(IArrayInitializerOperation operation, object? argument)
        => Elements(operation.ElementValues);

    public override Value VisitCollectionExpression(ICollectionExpressionOperation operation, object? argument)
        => Elements(operation.Elements);

    public override Value VisitSpread(ISpreadOperation operation, object? argument) => Visit(operation.Operand);

    public override Value VisitWith(IWithOperation operation, object? argument)
    {
        Value value = Visit(operation.Operand);
        Visit(operation.Initializer);
        return value;
    }

    public override Value VisitAwait(IAwaitOperation operation, object? argument) => Visit(operation.Operation);

    public override Value VisitDeclarationPattern(IDeclarationPatternOperation operation, object? argument)
    {
        if (operation.DeclaredSymbol is { } variable)
            _environment.Set(variable, argument as Value ?? Value.Unknown);
        return Value.Unknown;
    }

    public override Value VisitIsPattern(IIsPatternOperation operation, object? argument)
    {
        Value value = Visit(operation.Value);
        return Visit(operation.Pattern, value);
    }

    public override Value VisitRelationalPattern(IRelationalPatternOperation operation, object? argument)
    {
        Value bound = Visit(operation.Value);
        if (argument is Value value)
        {
            Note(
                operation.Syntax,
                TagAlgebra.Compare(value.Tag, bound.Tag),
                new(value, operation.Syntax),
                new(bound, operation.Value.Syntax, Operation: operation.Value),
                "compared");
        }

        return Value.Unknown;
    }

    public override Value VisitBinaryPattern(IBinaryPatternOperation operation, object? argument)
    {
        Visit(operation.LeftPattern, argument);
        return Visit(operation.RightPattern, argument);
    }

    public override Value VisitNegatedPattern(INegatedPatternOperation operation, object? argument)
        => Visit(operation.Pattern, argument);

    private static Value Literal(IOperation operation)
        => operation.ConstantValue.HasValue ? Constant(operation.ConstantValue.Value) : Value.Unknown;

    private static Value Constant(object? value) => value switch
    {
        double number => Value.Of(Literals.TagOf(number)),
        float number => Value.Of(Literals.TagOf((double)(decimal.TryParse(
            number.ToString("R", System.Globalization.CultureInfo.InvariantCulture),
            System.Globalization.NumberStyles.Float,
            System.Globalization.CultureInfo.InvariantCulture,
            out decimal exact) ? (double)exact : number))),
        decimal number => Value.Of(Literals.TagOf((double)number)),
        int number => Value.Of(Literals.TagOf(number)),
        long number => Value.Of(Literals.TagOf(number)),
        uint number => Value.Of(Literals.TagOf(number)),
        ulong number => Value.Of(Literals.TagOf(number)),
        short number => Value.Of(Literals.TagOf(number)),
        byte number => Value.Of(Literals.TagOf(number)),
        _ => Value.Unknown,
    };

    // The speed of light, known by its value alone: what it is meant as, a speed or a light second, its neighbours tell.
    private static bool IsBareLight(Value value) => value is { Origin: null, Tag: { IsConstant: true, Kind: QuantityKind.SignalSpeed } };

    // A number of the code that no declaration stands behind.
    private static bool IsBare(Value value) => value.Origin is null && (value.Tag.IsConstant || value.Tag.IsUnknown);

    private Value Variable(ISymbol variable)
        => IsUnstable(variable) ? Value.Unknown : _environment[variable] ?? Value.Unknown;

    private Value TupleElement(IFieldReferenceOperation operation)
    {
        if (operation.Instance is null || !operation.Field.ContainingType.IsTupleType)
            return Value.Unknown;
        Value tuple = Quietly(operation.Instance);
        IFieldSymbol element = operation.Field.CorrespondingTupleField ?? operation.Field;
        ImmutableArray<IFieldSymbol> elements = operation.Field.ContainingType.TupleElements;
        for (int i = 0; i < elements.Length && i < tuple.Parts.Length; i++)
        {
            if (SymbolEqualityComparer.Default.Equals(elements[i].CorrespondingTupleField ?? elements[i], element))
                return tuple.Parts[i];
        }

        return Value.Unknown;
    }

    /// <summary>The value of something that is walked elsewhere: what it disagrees about is noted there.</summary>
    private Value Quietly(IOperation operation)
    {
        (int, int) noted = Noted;
        Value value = Visit(operation);
        Forget(noted);
        return value;
    }

    private Value Elements(ImmutableArray<IOperation> elements)
    {
        Value? all = null;
        IOperation? first = null;
        foreach (IOperation element in elements)
        {
            Value value = Visit(element);
            // A spread brings the elements of its collection; side by side they are judged as numbers all the same.
            if (all is null || first is null)
                (all, first) = (value, element);
            else
                all = Beside(all, first, value, element);
        }

        return all ?? Value.Of(Tag.Neutral);
    }

    // Arrays of unlike quantities are state vectors and tables as often as mistakes: only frames, clocks and units of one
    // dimension are judged, and only where the first element and this one are both fully known.
    private Value Beside(Value all, IOperation first, Value value, IOperation element)
    {
        if (all.Tag.Dimension is null || value.Tag.Dimension is null || all.Tag.Dimension != value.Tag.Dimension)
            return Value.Merge(all, value);
        Outcome outcome = TagAlgebra.Choose(all.Tag, value.Tag);
        if (outcome.Clash is not { Kind: ClashKind.Unit or ClashKind.Frame })
            return Value.Merge(all, value);
        Note(
            element.Syntax,
            outcome.Clash,
            new(all, first.Syntax, Operation: first),
            new(value, element.Syntax, Operation: element),
            "put side by side");
        return Value.Merge(all, value);
    }

    private Value Choose(SyntaxNode place, Value left, IOperation leftOperand, Value right, IOperation rightOperand, string verb)
    {
        if (left.Parts.Length > 0 || right.Parts.Length > 0)
            return Value.Merge(left, right);
        Outcome outcome = TagAlgebra.Choose(left.Tag, right.Tag);
        Note(
            place,
            outcome.Clash,
            new(left, leftOperand.Syntax, Operation: leftOperand),
            new(right, rightOperand.Syntax, Operation: rightOperand),
            verb);
        return Value.Of(outcome.Result, OriginOf(left, right));
    }

    private Value Binary(
        SyntaxNode place,
        BinaryOperatorKind kind,
        Value left,
        IOperation leftOperand,
        Value right,
        IOperation rightOperand,
        ITypeSymbol? type)
    {
        switch (kind)
        {
            // c by its value times a bare number may be a light year as well as twice c: seconds hide in bare numbers.
            case BinaryOperatorKind.Multiply or BinaryOperatorKind.Divide when IsBareLight(left) != IsBareLight(right) && (left.Tag.IsPure || right.Tag.IsPure):
                return Value.Unknown;
            case BinaryOperatorKind.Add when type?.SpecialType != SpecialType.System_String:
                return Meet(Meeting.Sum, "added");
            case BinaryOperatorKind.Subtract:
                return Meet(Meeting.Difference, "subtracted");
            case BinaryOperatorKind.Multiply:
                return Value.Of(
                    right.ReciprocalOf is { } over ? TagProducts.Quotient(left.Tag, over)
                    : left.ReciprocalOf is { } under ? TagProducts.Quotient(right.Tag, under)
                    : TagProducts.Product(left.Tag, right.Tag),
                    OriginOf(left, right));
            case BinaryOperatorKind.Divide when right.ReciprocalOf is { } factor:
                return Value.Of(TagProducts.Product(left.Tag, factor), OriginOf(left, right));
            case BinaryOperatorKind.Divide:
                // A quotient of integers is cut off, which no unit survives that the code does not name.
                return Value.Of(TagProducts.Quotient(left.Tag, right.Tag), OriginOf(left, right));
            case BinaryOperatorKind.Remainder:
                return Meet(Meeting.Comparison, "divided with remainder", TagAlgebra.Remainder(left.Tag, right.Tag));
            case BinaryOperatorKind.LessThan or BinaryOperatorKind.LessThanOrEqual or BinaryOperatorKind.GreaterThan
                or BinaryOperatorKind.GreaterThanOrEqual or BinaryOperatorKind.Equals or BinaryOperatorKind.NotEquals:
                Meet(Meeting.Comparison, "compared");
                return Value.Unknown;
            default:
                return Value.Unknown;
        }

        Value Meet(Meeting meeting, string verb, Outcome? outcome = null)
        {
            Outcome met = outcome ?? TagAlgebra.Meet(left.Tag, right.Tag, meeting);
            Note(
                place,
                met.Clash,
                new(left, leftOperand.Syntax, Operation: leftOperand),
                new(right, rightOperand.Syntax, Operation: rightOperand),
                verb);
            return Value.Of(met.Result, OriginOf(left, right));
        }
    }

    // The operand that says more about frame and clock is the one that a reader wants to be led to.
    private static Origin? OriginOf(Value left, Value right)
        => left.Origin is null || (left.Tag.Frame is null && left.Tag.Clock is null && (right.Tag.Frame is not null || right.Tag.Clock is not null))
            ? right.Origin ?? left.Origin
            : left.Origin;

    private Value OperatorResult(IMethodSymbol? method, Value left, IOperation leftOperand, Value right, IOperation rightOperand)
    {
        if (method is null)
            return Value.Unknown;
        if (method.Parameters.Length == 2)
        {
            Deliver(left, leftOperand, Tags.Of(method.Parameters[0]), Describe(method.Parameters[0]), "passed");
            Deliver(right, rightOperand, Tags.Of(method.Parameters[1]), Describe(method.Parameters[1]), "passed");
        }

        return Value.Of(Tags.OfReturn(method));
    }

    /// <summary>
    /// Whether an operator does what arithmetic does: the language's own, and those of the framework's numbers, vectors and
    /// generic-math interfaces.
    /// </summary>
    private static bool IsArithmetic(IMethodSymbol? method)
        => method is null
            || method.ContainingNamespace is { Name: "System", ContainingNamespace.IsGlobalNamespace: true }
                or { Name: "Numerics", ContainingNamespace: { Name: "System", ContainingNamespace.IsGlobalNamespace: true } };
}
