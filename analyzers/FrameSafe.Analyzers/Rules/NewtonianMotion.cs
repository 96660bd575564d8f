using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Formulas;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME303: ½mv² or mv at speeds where they are no longer the kinetic energy and the momentum.</summary>
internal sealed class NewtonianMotion : Rule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME303",
        "Newtonian energy or momentum beyond the budget",
        "`{0}` is the Newtonian {1} of `{2}`, a velocity in {3}; it is {4}",
        Category.Motion,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "Kinetic energy is (γ − 1)mc² and momentum γmv; their Newtonian forms are their first terms at small speeds.",
        helpLinkUri: RulePage.Link("FRAME303"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    internal override Finding? Judge(Observation observation, Bench bench)
    {
        if (observation is not NewtonianForm form)
            return null;
        Side velocity = form.Velocities[0];
        // No range known: silent, for at everyday speeds these are the right formulas.
        if (bench.MaxSpeed(velocity.Value.Tag) is not { } speed)
            return null;
        bool isEnergy = form.Quantity == QuantityKind.KineticEnergy;
        double error = isEnergy ? Shortcuts.KineticEnergy(speed) : Shortcuts.Momentum(speed);
        if (error <= bench.Budget)
            return null;
        FrameTag frame = velocity.Value.Tag.Frame!;
        return new Finding(
                this,
                form.Place.GetLocation(),
                Wording.Code(form.Place),
                isEnergy ? "kinetic energy" : "momentum",
                Wording.Code(velocity.Syntax!),
                frame.DisplayName,
                ErrorText.WrongBy(error, ErrorText.SpeedsUpTo(speed), bench.Budget))
            .From(velocity.Value.Origin?.Location, Wording.Origin(velocity, "is a velocity in " + frame.DisplayName))
            .From(form.Mass.Value.Origin?.Location, Wording.Origin(form.Mass, "is a mass"))
            .With(FindingProperties.Error, error)
            .With(FindingProperties.MaxSpeed, speed)
            .With(FindingProperties.Budget, bench.Budget)
            .With(FindingProperties.Frames, frame.Id)
            .With(FindingProperties.Repair, form.Velocities.Length == 1 ? "form" : null)
            .With(FindingProperties.Form, isEnergy ? "kinetic-energy" : "momentum")
            .With(FindingProperties.Velocity, velocity.Syntax!.ToString())
            .With(FindingProperties.Mass, form.Mass.Syntax!.ToString())
            .With(FindingProperties.LightSpeed, LightSpeed.In(velocity.Value.Tag));
    }
}
