using System.Collections.Immutable;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Flow;

/// <content>Where values go: variables, fields, properties, elements, targets of all kinds.</content>
internal sealed partial class Walk
{
    public override Value VisitSimpleAssignment(ISimpleAssignmentOperation operation, object? argument)
    {
        Value value = Visit(operation.Value, argument);
        VisitTarget(operation.Target);
        return Assign(operation.Target, value, operation.Value, "assigned");
    }

    public override Value VisitCoalesceAssignment(ICoalesceAssignmentOperation operation, object? argument)
    {
        Value old = Visit(operation.Target);
        Value value = Visit(operation.Value);
        value = Assign(operation.Target, value, operation.Value, "assigned");
        return Value.Merge(old, value);
    }

    public override Value VisitCompoundAssignment(ICompoundAssignmentOperation operation, object? argument)
    {
        Value left = Visit(operation.Target);
        Value right = Visit(operation.Value);
        if (!IsArithmetic(operation.OperatorMethod))
            return Assign(operation.Target, Value.Unknown, null, "assigned");
        Value result = Binary(
            operation.Syntax, operation.OperatorKind, left, operation.Target, right, operation.Value, operation.Type);
        // What the sum itself disagreed about has been said; the target is the left operand.
        return Assign(operation.Target, result, null, "assigned");
    }

    public override Value VisitIncrementOrDecrement(IIncrementOrDecrementOperation operation, object? argument)
        => Visit(operation.Target);

    public override Value VisitDeconstructionAssignment(IDeconstructionAssignmentOperation operation, object? argument)
    {
        Value value = Visit(operation.Value);
        Deconstruct(operation.Target, value, operation.Value);
        return value;
    }

    public override Value VisitVariableDeclarator(IVariableDeclaratorOperation operation, object? argument)
    {
        IVariableInitializerOperation? initializer = operation.Initializer
            ?? (operation.Parent as IVariableDeclarationOperation)?.Initializer;
        Value value = initializer is null ? Value.Unknown : Visit(initializer.Value);
        foreach (IOperation ignored in operation.IgnoredArguments)
            Visit(ignored);
        if (Tags.OfLocal(operation.Symbol) is { } named)
            value = Deliver(value, initializer?.Value, named, "local `" + operation.Symbol.Name + "`", "assigned");
        _environment.Set(operation.Symbol, value);
        return value;
    }

    // The initialiser shared by all declarators is visited by each of them.
    public override Value VisitVariableDeclaration(IVariableDeclarationOperation operation, object? argument)
    {
        foreach (IVariableDeclaratorOperation declarator in operation.Declarators)
            Visit(declarator);
        return Value.Unknown;
    }

    public override Value VisitFieldInitializer(IFieldInitializerOperation operation, object? argument)
    {
        Value value = Visit(operation.Value);
        foreach (IFieldSymbol field in operation.InitializedFields)
            Deliver(value, operation.Value, Tags.Of(field), "field `" + field.Name + "`", "assigned");
        return Value.Unknown;
    }

    public override Value VisitPropertyInitializer(IPropertyInitializerOperation operation, object? argument)
    {
        Value value = Visit(operation.Value);
        foreach (IPropertySymbol property in operation.InitializedProperties)
            Deliver(value, operation.Value, Tags.Of(property), "property `" + property.Name + "`", "assigned");
        return Value.Unknown;
    }

    public override Value VisitParameterInitializer(IParameterInitializerOperation operation, object? argument)
    {
        Value value = Visit(operation.Value);
        return Deliver(value, operation.Value, Tags.Of(operation.Parameter), Describe(operation.Parameter), "passed");
    }

    /// <summary>A value goes where a tag may be declared; gives what is known of it there.</summary>
    private Value Deliver(Value value, IOperation? source, Declaration? target, string description, string verb)
    {
        if (target is null)
            return value;
        if (source is not null)
        {
            CheckSpeed(source, target, description);
            CheckConstant(source, target.Tag);
        }

        Outcome outcome = TagAlgebra.Assign(value.Tag, target.Tag);
        if (source is not null)
        {
            SayWanted(source, target.Tag);
            Note(
                source.Syntax,
                outcome.Clash,
                new(value, source.Syntax, Operation: source),
                new(Value.Of(target), null, description),
                verb);
        }

        return Value.Of(outcome.Result, target.Origin);
    }

    // A constant that no body can have as its velocity.
    private void CheckSpeed(IOperation source, Declaration target, string description)
    {
        if (target.Tag.Kind is not (QuantityKind.Velocity or QuantityKind.SpeedRatio) || source.ConstantValue is not { HasValue: true, Value: { } constant }
            || constant is not (double or float or int or long))
        {
            return;
        }

        double speed = System.Convert.ToDouble(constant, System.Globalization.CultureInfo.InvariantCulture);
        double? light = target.Tag.Kind == QuantityKind.SpeedRatio || target.Tag.Dimension is { IsOne: true } ? 1 : LightSpeed.ValueIn(target.Tag);
        if (light is { } limit && System.Math.Abs(speed) >= limit && !double.IsInfinity(speed) && _environment.IsReachable)
            _others.Add(new FasterThanLight(source.Syntax, speed / limit, new(Value.Of(target), null, description)));
    }

    // What a sum or difference goes to tells which of its operands is the one to be mended; and the reading of one clock less
    // the other's is a clock offset where one is wanted, whichever sorts of time they are.
    private void SayWanted(IOperation source, Tag wanted)
    {
        int last = _encounters.Count - 1;
        if (last < 0 || _encounters[last].Place != source.Syntax)
            return;
        Encounter encounter = _encounters[last];
        if (wanted.Kind == QuantityKind.ClockOffset
            && encounter.Clash is { Kind: ClashKind.ProperAndCoordinateTime, Meeting: Meeting.Difference })
        {
            _encounters.RemoveAt(last);
        }
        else
        {
            _encounters[last] = encounter with { Wanted = wanted };
        }
    }

    /// <summary>A value goes into a variable, field, property or element.</summary>
    private Value Assign(IOperation target, Value value, IOperation? source, string verb)
    {
        switch (target)
        {
            case ILocalReferenceOperation local:
                value = Deliver(value, source, Tags.OfLocal(local.Local), "local `" + local.Local.Name + "`", verb);
                _environment.Set(local.Local, value);
                return value;
            case IParameterReferenceOperation parameter:
                value = Deliver(value, source, Tags.Of(parameter.Parameter), Describe(parameter.Parameter), verb);
                _environment.Set(parameter.Parameter, value);
                return value;
            case IFieldReferenceOperation field:
                return Deliver(value, source, Tags.Of(field.Field), "field `" + field.Field.Name + "`", verb);
            case IPropertyReferenceOperation { Property.IsIndexer: true } indexer when Tags.Of(indexer.Property) is null:
                return AssignElement(indexer.Instance, indexer.Arguments.Length == 1 ? indexer.Arguments[0].Value : null, value, source, verb);
            case IPropertyReferenceOperation property:
                return Deliver(value, source, Tags.Of(property.Property), "property `" + property.Property.Name + "`", verb);
            case IArrayElementReferenceOperation element:
                return AssignElement(element.ArrayReference, element.Indices.Length == 1 ? element.Indices[0] : null, value, source, verb);
            case IDeclarationExpressionOperation { Expression: ILocalReferenceOperation declared }:
                _environment.Set(declared.Local, value);
                return value;
            case IConversionOperation conversion:
                return Assign(conversion.Operand, value, source, verb);
            case ITupleOperation:
                Deconstruct(target, value, source);
                return value;
            default:
                return value;
        }
    }

    // An element takes the tag that its collection declares; a collection that declares none gets to know its elements.
    private Value AssignElement(IOperation? collection, IOperation? index, Value value, IOperation? source, string verb)
    {
        if (collection is not null && index is not null && Quietly(collection).Slots is { } slots)
        {
            return ElementOf(slots, index) is { } part
                ? Deliver(value, source, part, "`" + part.Origin.Name + "`", verb)
                : value;
        }

        switch (collection)
        {
            case IParameterReferenceOperation parameter when Tags.Of(parameter.Parameter) is { } declared:
                return Deliver(value, source, declared, "an element of " + Describe(parameter.Parameter), verb);
            case IFieldReferenceOperation field when Tags.Of(field.Field) is { } declared:
                return Deliver(value, source, declared, "an element of field `" + field.Field.Name + "`", verb);
            case IPropertyReferenceOperation property when Tags.Of(property.Property) is { } declared:
                return Deliver(value, source, declared, "an element of property `" + property.Property.Name + "`", verb);
            case ILocalReferenceOperation local:
                _environment.Set(local.Local, Value.Merge(_environment[local.Local] ?? Value.Unknown, value));
                return value;
            default:
                return value;
        }
    }

    private void Deconstruct(IOperation target, Value value, IOperation? source)
    {
        switch (target)
        {
            case IDeclarationExpressionOperation declaration:
                Deconstruct(declaration.Expression, value, source);
                break;
            case ITupleOperation tuple:
                ImmutableArray<IOperation> sources = source is ITupleOperation given && given.Elements.Length == tuple.Elements.Length
                    ? given.Elements
                    : [];
                for (int i = 0; i < tuple.Elements.Length; i++)
                {
                    Value part = i < value.Parts.Length ? value.Parts[i] : Value.Unknown;
                    Deconstruct(tuple.Elements[i], part, i < sources.Length ? sources[i] : tuple.Elements[i]);
                }

                break;
            case IDiscardOperation:
                break;
            default:
                VisitTarget(target);
                Assign(target, value, source ?? target, "assigned");
                break;
        }
    }

    // What is evaluated on the way to the place that is written to: the instance, the indices.
    private void VisitTarget(IOperation target)
    {
        switch (target)
        {
            case IPropertyReferenceOperation property:
                Visit(property.Instance);
                Arguments(property.Arguments);
                break;
            case IFieldReferenceOperation field:
                Visit(field.Instance);
                break;
            case IArrayElementReferenceOperation element:
                Visit(element.ArrayReference);
                foreach (IOperation index in element.Indices)
                    Visit(index);
                break;
        }
    }

    private static string Describe(IParameterSymbol parameter) => parameter.ContainingSymbol switch
    {
        IMethodSymbol { MethodKind: MethodKind.Constructor } constructor
            => "parameter `" + parameter.Name + "` of `new " + constructor.ContainingType.Name + "`",
        IMethodSymbol { AssociatedSymbol: IPropertySymbol property } => "property `" + property.Name + "`",
        IMethodSymbol { MethodKind: MethodKind.AnonymousFunction } => "parameter `" + parameter.Name + "`",
        { } owner => "parameter `" + parameter.Name + "` of `" + owner.Name + "`",
        _ => "parameter `" + parameter.Name + "`",
    };
}
