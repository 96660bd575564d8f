using System.Collections.Generic;
using System.Collections.Immutable;
using System.Linq;
using FrameSafe.Analyzers.Formulas;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Flow;

/// <content>Formulas that are known as a whole: what they compute says more than the tags of their parts.</content>
internal sealed partial class Walk
{
    /// <summary>What is known of an operation once the formula that it completes is recognised.</summary>
    private Value Recognise(IBinaryOperation operation, Value value)
    {
        if (operation.OperatorKind == BinaryOperatorKind.Subtract && operation.RightOperand.ConstantValue is { HasValue: true, Value: 1 or 1.0 })
            NoteLostDigits(operation);
        if (operation.OperatorKind == BinaryOperatorKind.Divide && NoteFlaw(operation) is { } meant)
            return meant;
        if (operation.OperatorKind is not (BinaryOperatorKind.Multiply or BinaryOperatorKind.Divide) || value.Tag.Dimension is not { } dimension)
            return value;
        if (operation.OperatorKind == BinaryOperatorKind.Divide && (dimension == Dimension.Speed || dimension.IsOne))
            return Composition(operation) ?? (dimension.IsOne ? Lorentz(operation) : null) ?? value;
        if ((dimension == Dimension.Energy || dimension == Dimension.Momentum) && IsWholeProduct(operation))
            NoteNewtonian(operation, dimension);
        return value;
    }

    /// <summary>What is known of a call that completes a formula: γ spelled with a power, 1/γ with a root.</summary>
    private Value Recognise(IInvocationOperation call, Value value)
        => value.Tag.Dimension is { IsOne: true } ? Lorentz(call) ?? ReciprocalLorentz(call) ?? value : value;

    private Value? ReciprocalLorentz(IInvocationOperation call)
    {
        Value[]? velocities = Velocities(call, out ReadFormula? read);
        return velocities is { Length: > 0 } && ScaleOfLight(velocities[0].Tag) is { } light
            && KnownForms.IsReciprocalLorentzFactor(read!.Formula, velocities.Length, light)
            ? Value.Reciprocal(Tag.Declared(Unit.One, kind: QuantityKind.LorentzFactor), velocities[0].Origin)
            : null;
    }

    // (u ± v)/(1 ± uv/c²) is the composition of the two velocities, written by hand: its sum is no mistake.
    private Value? Composition(IBinaryOperation operation)
    {
        Value[]? velocities = Velocities(operation, out ReadFormula? read);
        if (velocities is not { Length: 2 } || ScaleOfLight(velocities[0].Tag) is not { } light
            || !KnownForms.IsComposition(read!.Formula, light))
        {
            return null;
        }

        (Value one, Value other) = (velocities[0], velocities[1]);
        _encounters.RemoveAll(encounter => encounter.Clash.Kind == ClashKind.VelocityFrames && read.Places.Contains(encounter.Place));
        Tag composed = one.Tag with { Frame = Outermost(one.Tag.Frame, other.Tag.Frame), Speed = null };
        return Value.Of(composed, one.Origin);
    }

    private Value? Lorentz(IOperation operation)
    {
        Value[]? velocities = Velocities(operation, out ReadFormula? read);
        if (velocities is not { Length: > 0 } || ScaleOfLight(velocities[0].Tag) is not { } light
            || !KnownForms.IsLorentzFactor(read!.Formula, velocities.Length, light))
        {
            return null;
        }

        return Value.Of(
            Tag.Declared(Unit.One, kind: QuantityKind.LorentzFactor),
            velocities[0].Origin);
    }

    // Almost γ, or almost the composition: of tagged velocities alone, with c in it by value.
    private Value? NoteFlaw(IBinaryOperation operation)
    {
        IOperation numerator = operation.LeftOperand;
        while (numerator is IParenthesizedOperation or IConversionOperation)
            numerator = numerator is IConversionOperation conversion ? conversion.Operand : ((IParenthesizedOperation)numerator).Operand;
        bool isOne = numerator.ConstantValue is { HasValue: true, Value: 1 or 1.0 or 1f };
        bool isSum = numerator is IBinaryOperation { OperatorKind: BinaryOperatorKind.Add or BinaryOperatorKind.Subtract };
        if (!isOne && !isSum)
            return null;
        Value[]? velocities = Velocities(operation, out ReadFormula? read);
        if (velocities is null || ScaleOfLight(velocities[0].Tag) is not { } light || (light != 1 && velocities[0].Tag.Frame is null))
            return null;
        string? flaw = isOne ? KnownForms.FlawOfLorentzFactor(read!.Formula, velocities.Length, light)
            : velocities.Length == 2 ? KnownForms.FlawOfComposition(read!.Formula, light)
            : null;
        if (flaw is null || !_environment.IsReachable)
            return null;
        _encounters.RemoveAll(encounter => read!.Places.Contains(encounter.Place));
        _others.Add(new FlawedForm(
            operation.Syntax,
            isOne ? "the Lorentz factor" : "the composition of velocities",
            flaw,
            isOne ? "1/√(1 − v²/c²)" : "(u ± v)/(1 ± uv/c²)",
            [.. velocities.Select((value, i) => new Side(value, read!.Variables[i].Syntax, Operation: read.Variables[i]))]));
        return isOne ? Value.Of(Tag.Declared(Unit.One, kind: QuantityKind.LorentzFactor), velocities[0].Origin) : velocities[0].With(velocities[0].Tag with { Frame = null });
    }

    private void NoteLostDigits(IBinaryOperation operation)
    {
        Value[]? velocities = Velocities(operation, out ReadFormula? read);
        if (velocities is null || ScaleOfLight(velocities[0].Tag) is not { } light
            || !KnownForms.IsLorentzFactorMinusOne(read!.Formula, velocities.Length, light) || !_environment.IsReachable)
        {
            return;
        }

        _others.Add(new LostDigits(
            operation.Syntax, read.Formula, [.. velocities.Select((value, i) => new Side(value, read.Variables[i].Syntax, Operation: read.Variables[i]))]));
    }

    // A speed that nobody measures in a frame, a thousandth or less beside that of light, is meant for it.
    private void CheckConstant(IOperation source, Tag target)
    {
        if (target is not { Frame: null, Kind: QuantityKind.Unspecified or QuantityKind.SignalSpeed } || target.Dimension != Dimension.Speed
            || source.ConstantValue is not { HasValue: true, Value: double value } || LightSpeed.ValueIn(target) is not { } exact)
        {
            return;
        }

        double error = System.Math.Abs((value / exact) - 1);
        if (error is > 0 and < 1e-3 && _environment.IsReachable)
            _others.Add(new RoundedConstant(source.Syntax, error, exact));
    }

    private void NoteNewtonian(IOperation operation, Dimension dimension)
    {
        if (FormulaReader.Read(operation, Definition) is not { Variables.Count: >= 2 and <= 4 } read)
            return;
        int mass = -1;
        ImmutableArray<Side>.Builder sides = ImmutableArray.CreateBuilder<Side>(read.Variables.Count);
        for (int i = 0; i < read.Variables.Count; i++)
        {
            Value value = Quietly(read.Variables[i]);
            sides.Add(new(value, read.Variables[i].Syntax, Operation: read.Variables[i]));
            if (value.Tag.Dimension == Dimension.Mass && mass < 0)
                mass = i;
            else if (value.Tag is not { Kind: QuantityKind.Velocity, Frame: not null })
                return;
        }

        if (mass < 0 || ScaleOfLight(sides[mass == 0 ? 1 : 0].Value.Tag) is not { } light)
            return;
        bool isEnergy = dimension == Dimension.Energy && KnownForms.IsNewtonianEnergy(read.Formula, read.Variables.Count, mass, light);
        bool isMomentum = dimension == Dimension.Momentum && read.Variables.Count == 2 && KnownForms.IsNewtonianMomentum(read.Formula, mass, light);
        if (!isEnergy && !isMomentum)
            return;
        Side massSide = sides[mass];
        sides.RemoveAt(mass);
        if (_environment.IsReachable)
        {
            _others.Add(new NewtonianForm(
                operation.Syntax, isEnergy ? QuantityKind.KineticEnergy : QuantityKind.Momentum, sides.ToImmutable(), massSide));
        }
    }

    /// <summary>The values of a formula whose variables all are velocities of one unit; null for any other.</summary>
    private Value[]? Velocities(IOperation operation, out ReadFormula? read)
    {
        read = FormulaReader.Read(operation, Definition);
        if (read is not { Variables.Count: >= 1 and <= 3 })
            return null;
        var values = new Value[read.Variables.Count];
        for (int i = 0; i < values.Length; i++)
        {
            values[i] = Quietly(read.Variables[i]);
            Tag tag = values[i].Tag;
            bool isVelocity = tag.Kind is QuantityKind.Velocity or QuantityKind.SpeedRatio
                || (tag.Kind == QuantityKind.Unspecified && tag.Dimension == Dimension.Speed);
            if (!isVelocity || tag.Scale is null || tag.Scale != values[0].Tag.Scale || tag.Dimension != values[0].Tag.Dimension)
                return null;
        }

        return values;
    }

    private IOperation? Definition(ILocalSymbol local)
        => _assignments?.Definition(local) is { } definition && !IsTaggedByCall(definition) ? definition : null;

    // A local that a call or a declared member gave has a tag of its own and stays a variable.
    private static bool IsTaggedByCall(IOperation definition)
    {
        while (definition is IConversionOperation conversion)
            definition = conversion.Operand;
        return definition is IMemberReferenceOperation or IParameterReferenceOperation
            || (definition is IInvocationOperation call && KnownFunctions.Of(call.TargetMethod) is null);
    }

    private static double? ScaleOfLight(Tag velocity) => velocity.Dimension is { IsOne: true } ? 1 : LightSpeed.ValueIn(velocity);

    // The frame of the two in which the other one moves, where that is declared.
    private FrameTag? Outermost(FrameTag? one, FrameTag? other)
    {
        if (one is null || other is null || one.Equals(other))
            return null;
        return _knowledge.Frames.IsDeclaredIn(other.Id, one.Id) ? one
            : _knowledge.Frames.IsDeclaredIn(one.Id, other.Id) ? other
            : null;
    }

    private static bool IsWholeProduct(IOperation operation)
    {
        IOperation? outer = operation.Parent;
        while (outer is IParenthesizedOperation or IConversionOperation)
            outer = outer.Parent;
        return outer is not IBinaryOperation { OperatorKind: BinaryOperatorKind.Multiply or BinaryOperatorKind.Divide };
    }
}
