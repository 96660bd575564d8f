using System;
using System.Collections.Generic;
using System.Globalization;
using System.Runtime.CompilerServices;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Formulas;

/// <summary>
/// Reads a scalar expression as a formula: through constants, parentheses, numeric conversions, locals that are assigned once,
/// and the functions of <c>Math</c>. Two references to one variable, field or pure chain of members are one variable of the
/// formula. Where it meets anything else it gives up.
/// </summary>
internal sealed class FormulaReader
{
    // Longer expressions are no textbook formulas.
    private const int MaxNodes = 400;

    private readonly Func<ILocalSymbol, IOperation?> _definition;
    private readonly Dictionary<string, int> _indices = new(StringComparer.Ordinal);
    private readonly List<IOperation> _variables = [];
    private readonly HashSet<SyntaxNode> _places = [];
    private readonly HashSet<ISymbol> _inlining = new(SymbolEqualityComparer.Default);
    private int _nodes;

    private FormulaReader(Func<ILocalSymbol, IOperation?> definition) => _definition = definition;

    /// <summary>
    /// The formula of an expression, or null. <paramref name="definition"/> gives what a local that is assigned once was
    /// assigned, or null for any other.
    /// </summary>
    internal static ReadFormula? Read(IOperation expression, Func<ILocalSymbol, IOperation?> definition)
    {
        var reader = new FormulaReader(definition);
        return reader.Node(expression) is { } formula ? new(formula, reader._variables, reader._places) : null;
    }

    private Formula? Node(IOperation operation)
    {
        if (++_nodes > MaxNodes)
            return null;
        RuntimeHelpers.EnsureSufficientExecutionStack();
        _places.Add(operation.Syntax);
        if (operation.ConstantValue is { HasValue: true, Value: { } constant })
            return Number(constant);
        switch (operation)
        {
            case IParenthesizedOperation parenthesized:
                return Node(parenthesized.Operand);
            case IConversionOperation { OperatorMethod: null, Conversion.IsNumeric: true } conversion
                when conversion.Type?.SpecialType is SpecialType.System_Double or SpecialType.System_Single:
                return Node(conversion.Operand);
            case IUnaryOperation { OperatorKind: UnaryOperatorKind.Minus, OperatorMethod: null } negation:
                return Node(negation.Operand) is { } negated ? new Formula.Unary(negated, static x => -x) : null;
            case IUnaryOperation { OperatorKind: UnaryOperatorKind.Plus, OperatorMethod: null } plus:
                return Node(plus.Operand);
            case IBinaryOperation { OperatorMethod: null } binary:
                return Operator(binary);
            case IInvocationOperation call:
                return Call(call);
            case ILocalReferenceOperation local when _definition(local.Local) is { } definition && _inlining.Add(local.Local):
                Formula? inlined = Node(definition);
                _inlining.Remove(local.Local);
                return inlined;
            default:
                return Variable(operation);
        }
    }

    private static Formula? Number(object constant)
        => constant is double or float or int or long or short or byte or uint or decimal
            ? new Formula.Number(Convert.ToDouble(constant, CultureInfo.InvariantCulture))
            : null;

    private Formula? Operator(IBinaryOperation binary)
    {
        Func<double, double, double>? function = binary.OperatorKind switch
        {
            BinaryOperatorKind.Add => static (x, y) => x + y,
            BinaryOperatorKind.Subtract => static (x, y) => x - y,
            BinaryOperatorKind.Multiply => static (x, y) => x * y,
            BinaryOperatorKind.Divide when IsFloating(binary.Type) => static (x, y) => x / y,
            _ => null,
        };
        if (function is null || Node(binary.LeftOperand) is not { } left || Node(binary.RightOperand) is not { } right)
            return null;
        return new Formula.Binary(left, right, function);
    }

    private Formula? Call(IInvocationOperation call)
    {
        if (call.Instance is not null || call.TargetMethod.ContainingType is not { Name: "Math" or "MathF" or "Double" or "Single" } type
            || type.ContainingNamespace.Name != "System" || call.Arguments.Length is 0 or > 2)
        {
            return null;
        }

        if (Node(call.Arguments[0].Value) is not { } first)
            return null;
        if (call.Arguments.Length == 1)
        {
            Func<double, double>? function = call.TargetMethod.Name switch
            {
                "Sqrt" => Math.Sqrt,
                "Abs" => Math.Abs,
                "Cbrt" => static x => Math.Sign(x) * Math.Pow(Math.Abs(x), 1.0 / 3),
                "Exp" => Math.Exp,
                "Log" => Math.Log,
                "Sin" => Math.Sin,
                "Cos" => Math.Cos,
                "Tan" => Math.Tan,
                "Sinh" => Math.Sinh,
                "Cosh" => Math.Cosh,
                "Tanh" => Math.Tanh,
                "Asin" => Math.Asin,
                "Acos" => Math.Acos,
                "Atan" => Math.Atan,
                "Asinh" => static x => x < 0 ? -Math.Log(-x + Math.Sqrt((x * x) + 1)) : Math.Log(x + Math.Sqrt((x * x) + 1)),
                "Acosh" => static x => Math.Log(x + Math.Sqrt((x * x) - 1)),
                "Atanh" => static x => 0.5 * Math.Log((1 + x) / (1 - x)),
                _ => null,
            };
            return function is null ? null : new Formula.Unary(first, function);
        }

        Func<double, double, double>? two = call.TargetMethod.Name switch
        {
            "Pow" => Math.Pow,
            "Atan2" => Math.Atan2,
            "Hypot" => static (x, y) => Math.Sqrt((x * x) + (y * y)),
            _ => null,
        };
        return two is not null && Node(call.Arguments[1].Value) is { } second ? new Formula.Binary(first, second, two) : null;
    }

    private Formula? Variable(IOperation operation)
    {
        if (Name(operation) is not { } name)
            return null;
        if (!_indices.TryGetValue(name, out int index))
        {
            index = _variables.Count;
            _indices.Add(name, index);
            _variables.Add(operation);
        }

        return new Formula.Variable(index);
    }

    /// <summary>A name for a chain of variables and members that reads the same wherever it stands in one expression.</summary>
    internal static string? Name(IOperation? operation) => operation switch
    {
        ILocalReferenceOperation local => "local " + local.Local.Name,
        IParameterReferenceOperation parameter => "parameter " + parameter.Parameter.Name,
        IInstanceReferenceOperation => "this",
        IFieldReferenceOperation { Instance: null } field => field.Field.ContainingType.MetadataName + "." + field.Field.Name,
        IFieldReferenceOperation field => Name(field.Instance) is { } owner ? owner + "." + field.Field.Name : null,
        IPropertyReferenceOperation { Instance: null, Arguments.Length: 0 } property
            => property.Property.ContainingType.MetadataName + "." + property.Property.Name,
        IPropertyReferenceOperation { Arguments.Length: 0 } property
            => Name(property.Instance) is { } owner ? owner + "." + property.Property.Name : null,
        IParenthesizedOperation parenthesized => Name(parenthesized.Operand),
        IConversionOperation { Conversion.IsIdentity: true } conversion => Name(conversion.Operand),
        _ => null,
    };

    private static bool IsFloating(ITypeSymbol? type)
        => type?.SpecialType is SpecialType.System_Double or SpecialType.System_Single or SpecialType.System_Decimal;
}
