using FrameSafe.Analyzers.Tags;

namespace FrameSafe.Analyzers.Rules;

/// <summary>How one unit is converted to another: in words for the message, in code for the repair.</summary>
internal static class Conversion
{
    /// <summary>The properties by which the repair converts an operand; none where the factor cannot be written down.</summary>
    internal static Finding WithConversion(this Finding finding, Tag from, Tag to, string operand)
    {
        if (ConversionFactor.Between(from.Scale, to.Scale) is not { } factor)
            return finding;
        return finding
            .With(FindingProperties.Repair, "convert")
            .With(FindingProperties.Operand, operand)
            .With(factor.Divides ? FindingProperties.Divisor : FindingProperties.Factor, factor.Text)
            .With(FindingProperties.Unit, Wording.Unit(to));
    }
}
