using System.Numerics;

namespace FrameSafe.Analyzers.Tags;

/// <summary>Whether the units of two numbers agree, given that either may have been multiplied by a conversion factor on the way.</summary>
internal static class ScaleFit
{
    // A count beside the conversion (2·π/360, n·60) is not told from a part of it; ratios up to this size are let pass.
    private static readonly BigInteger SmallCount = new(100);

    /// <summary>Whether they agree or may; <paramref name="scale"/> is what they agree on, null where that is not certain.</summary>
    internal static bool Try(Tag left, Tag right, out Scale? scale)
    {
        scale = null;
        if (left.Scale is null || right.Scale is null)
            return true;
        if (left.Scale == right.Scale)
        {
            scale = left.Scale;
            return true;
        }

        if (left.Conversion is null && right.Conversion is null)
            return false;

        Scale? leftConverted = left.Conversion is null ? null : left.Scale / left.Conversion;
        Scale? rightConverted = right.Conversion is null ? null : right.Scale / right.Conversion;
        if (leftConverted is not null && leftConverted == right.Scale)
            scale = right.Scale;
        else if (rightConverted is not null && rightConverted == left.Scale)
            scale = left.Scale;
        else if (leftConverted is not null && leftConverted == rightConverted)
            scale = leftConverted;
        else
            return IsCount((leftConverted ?? left.Scale) / (rightConverted ?? right.Scale));
        return true;
    }

    private static bool IsCount(Scale? ratio)
        => ratio is null || (ratio.IsRatio && ratio.PiExponent.IsZero && ratio.Numerator * ratio.Denominator <= SmallCount);
}
