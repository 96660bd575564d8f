using System.Collections.Generic;
using System.Collections.Immutable;
using System.Composition;
using System.Threading;
using FrameSafe.Analyzers;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeFixes;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace FrameSafe.CodeFixes;

/// <summary>FRAME303: writes the kinetic energy or the momentum in its full form, one that loses no digits at small speeds.</summary>
[ExportCodeFixProvider(LanguageNames.CSharp, Name = nameof(NewtonianToRelativistic))]
[Shared]
public sealed class NewtonianToRelativistic : Repair
{
    /// <inheritdoc/>
    public override ImmutableArray<string> FixableDiagnosticIds => ["FRAME303"];

    internal override IEnumerable<Mending> Mend(SyntaxNode place, Diagnostic diagnostic, SemanticModel model, CancellationToken cancellation)
    {
        diagnostic.Properties.TryGetValue(FindingProperties.Form, out string? form);
        diagnostic.Properties.TryGetValue(FindingProperties.Velocity, out string? velocity);
        diagnostic.Properties.TryGetValue(FindingProperties.Mass, out string? mass);
        diagnostic.Properties.TryGetValue(FindingProperties.LightSpeed, out string? light);
        if (form is null || velocity is null || mass is null || light is null || place is not ExpressionSyntax expression)
            yield break;
        ExpressionSyntax v = Code.Parse(velocity);
        ExpressionSyntax m = Code.Parse(mass);
        if (!Code.IsRepeatable(v) || !Code.IsRepeatable(m)
            || model.GetTypeInfo(expression, cancellation).Type?.SpecialType != SpecialType.System_Double)
        {
            yield break;
        }

        string c = SpeedOfLight.NameAt(expression, light, model, cancellation) ?? light;
        string beta = Code.Factor(v) + " / " + c;
        string reciprocal = "global::System.Math.Sqrt((1 - " + beta + ") * (1 + " + beta + "))";
        bool isEnergy = form == "kinetic-energy";
        // (γ - 1)mc² = mv²/(s(1 + s)) with s = 1/γ: nothing cancels at small speeds.
        string text = isEnergy
            ? Code.Factor(m) + " * " + Code.Factor(v) + " * " + Code.Factor(v) + " / (" + reciprocal + " * (1 + " + reciprocal + "))"
            : Code.Factor(m) + " * " + Code.Factor(v) + " / " + reciprocal;
        yield return new(
            isEnergy ? "Use the relativistic kinetic energy (γ − 1)mc²" : "Use the relativistic momentum γmv",
            nameof(NewtonianToRelativistic),
            expression,
            current => Code.Tidy(Code.Parse(text)).WithTriviaFrom(current));
    }
}
