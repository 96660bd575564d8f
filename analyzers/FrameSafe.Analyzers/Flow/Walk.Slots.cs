using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Flow;

/// <content>Arrays whose parts are described one by one: elements by index, and slices.</content>
internal sealed partial class Walk
{
    /// <summary>What is declared of one element of an array with parts; null where its index is not known, or nothing is declared.</summary>
    private Declaration? ElementOf(SlotMap slots, IOperation index) => TryIndex(index, slots.Stride, out int value) ? slots.At(value) : null;

    /// <summary>A slice of a value: the parts move with it, where its start is known.</summary>
    private Value Sliced(Value value, IOperation? start)
    {
        if (value.Slots is not { } slots)
            return value;
        if (start is null)
            return value;
        return TryIndex(start, slots.Stride, out int from) ? value.WithSlots(slots.From(from)) : Value.Unknown;
    }

    /// <summary>The index, or with a stride its remainder: <c>6 * i + 2</c> is 2 in a pattern of 6.</summary>
    private bool TryIndex(IOperation index, int stride, out int value)
    {
        value = 0;
        if (index.ConstantValue is { HasValue: true, Value: int constant })
        {
            value = constant;
            return true;
        }

        switch (index)
        {
            case IConversionOperation conversion:
                return TryIndex(conversion.Operand, stride, out value);
            case IParenthesizedOperation parenthesized:
                return TryIndex(parenthesized.Operand, stride, out value);
            case ILocalReferenceOperation local when Definition(local.Local) is { } definition:
                return TryIndex(definition, stride, out value);
            case IBinaryOperation { OperatorKind: BinaryOperatorKind.Add } sum
                when TryIndex(sum.LeftOperand, stride, out int left) && TryIndex(sum.RightOperand, stride, out int right):
                value = left + right;
                return true;
            case IBinaryOperation { OperatorKind: BinaryOperatorKind.Multiply } product when stride > 0:
                // A multiple of the stride, however many.
                return IsMultiple(product.LeftOperand, stride) || IsMultiple(product.RightOperand, stride);
            default:
                return false;
        }
    }

    private static bool IsMultiple(IOperation factor, int stride)
        => factor.ConstantValue is { HasValue: true, Value: int constant } && constant % stride == 0;
}
