using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME302: a formula is almost a known one.</summary>
internal sealed class FlawedFormRule : Rule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME302",
        "A formula is almost the known one",
        "`{0}` is almost {1} of {2}, but {3}: {1} is {4}",
        Category.Motion,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "The expression was compared with the known formulas by what it computes, however it is spelled.",
        helpLinkUri: RulePage.Link("FRAME302"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    internal override Finding? Judge(Observation observation, Bench bench)
    {
        if (observation is not FlawedForm form)
            return null;
        Side first = form.Velocities[0];
        bool isPair = form.Velocities.Length == 2 && form.Form != "the Lorentz factor";
        string of = Wording.Name(first, form.Place) + (isPair ? " and " + Wording.Name(form.Velocities[1], form.Place) : "");
        var finding = new Finding(this, form.Place.GetLocation(), Wording.Code(form.Place), form.Form, of, form.Flaw, form.Right);
        foreach (Side velocity in form.Velocities)
            finding.From(velocity.Value.Origin?.Location, Wording.Origin(velocity, "is a velocity"));
        return finding
            .With(FindingProperties.Repair, form.Velocities.Length == 1 || isPair ? "form" : null)
            .With(FindingProperties.Form, isPair ? null : "lorentz-factor")
            .With(FindingProperties.Velocity, first.Syntax!.ToString())
            .With(FindingProperties.LightSpeed, LightSpeed.In(first.Value.Tag));
    }
}
