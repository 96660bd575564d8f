using System;
using System.Collections.Generic;

namespace FrameSafe.Analyzers.Formulas;

/// <summary>An expression of code as mathematics: a tree over numbers and variables that can be evaluated anywhere.</summary>
internal abstract class Formula
{
    internal abstract double At(IReadOnlyList<double> values);

    internal sealed class Number(double value) : Formula
    {
        internal double Value { get; } = value;

        internal override double At(IReadOnlyList<double> values) => Value;
    }

    internal sealed class Variable(int index) : Formula
    {
        internal override double At(IReadOnlyList<double> values) => values[index];
    }

    internal sealed class Unary(Formula operand, Func<double, double> function) : Formula
    {
        internal override double At(IReadOnlyList<double> values) => function(operand.At(values));
    }

    internal sealed class Binary(Formula left, Formula right, Func<double, double, double> function) : Formula
    {
        internal override double At(IReadOnlyList<double> values) => function(left.At(values), right.At(values));
    }
}
