using System.Globalization;
using FrameSafe.Analyzers.Flow;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME502: a rounded speed of light where the budget is finer than its error.</summary>
internal sealed class RoundedConstantRule : Rule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME502",
        "A physical constant is rounded",
        "`{0}` is the speed of light, wrong by {1} (budget {2}); it is exactly {3}",
        Category.Digits,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "The speed of light is exact by definition: 299 792 458 m/s.",
        helpLinkUri: RulePage.Link("FRAME502"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    internal override Finding? Judge(Observation observation, Bench bench)
    {
        if (observation is not RoundedConstant rounded || rounded.Error <= bench.Budget)
            return null;
        string exact = rounded.Exact.ToString("R", CultureInfo.InvariantCulture);
        if (exact.IndexOfAny(['.', 'E']) < 0)
            exact += ".0";
        return new Finding(
                this, rounded.Place.GetLocation(), Wording.Code(rounded.Place), ErrorText.Size(rounded.Error), ErrorText.Number(bench.Budget), exact)
            .With(FindingProperties.Error, rounded.Error)
            .With(FindingProperties.Budget, bench.Budget)
            .With(FindingProperties.Repair, "constant")
            .With(FindingProperties.Form, exact);
    }
}
