using System;
using System.Globalization;
using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Formulas;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME501: this spelling loses digits over the declared range.</summary>
internal sealed class LostDigitsRule : Rule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME501",
        "A spelling loses digits",
        "`{0}` loses {1} of 16 digits at {2} c, and all of them towards rest (speeds up to {3} c; budget {4})",
        Category.Digits,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "γ − 1 by subtraction keeps what is left of a number near one. β²/(s(1 + s)) with s = 1/γ keeps all digits.",
        helpLinkUri: RulePage.Link("FRAME501"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    internal override Finding? Judge(Observation observation, Bench bench)
    {
        if (observation is not LostDigits lost)
            return null;
        Side velocity = lost.Velocities[0];
        Tag tag = velocity.Value.Tag;
        double light = tag.Dimension is { IsOne: true } ? 1 : LightSpeed.ValueIn(tag) ?? 0;
        // No range known: silent.
        if (light == 0 || bench.MaxSpeed(tag) is not { } most)
            return null;
        double least = tag.Speed?.Least ?? 0;
        // Measured where the range begins, or a thousandth of where it ends.
        double speed = Math.Max(least, most / 1000);
        double digits = Digits.LostByLorentzFactorMinusOne(lost.Formula, lost.Velocities.Length, light, speed);
        if (digits < 1 || Math.Pow(10, digits - 16) <= bench.Budget)
            return null;
        return new Finding(
                this,
                lost.Place.GetLocation(),
                Wording.Code(lost.Place),
                digits.ToString("0", CultureInfo.InvariantCulture),
                ErrorText.Number(speed),
                ErrorText.Number(most),
                ErrorText.Number(bench.Budget))
            .From(velocity.Value.Origin?.Location, Wording.Origin(velocity, "is a velocity"))
            .With(FindingProperties.DigitsLost, digits)
            .With(FindingProperties.MaxSpeed, most)
            .With(FindingProperties.Budget, bench.Budget)
            .With(FindingProperties.Repair, lost.Velocities.Length == 1 ? "form" : null)
            .With(FindingProperties.Form, lost.Velocities.Length == 1 ? "lorentz-factor-minus-one" : null)
            .With(FindingProperties.Velocity, velocity.Syntax!.ToString())
            .With(FindingProperties.LightSpeed, LightSpeed.In(tag));
    }
}
