using System.Collections.Generic;
using System.Collections.Immutable;
using System.Composition;
using System.Threading;
using FrameSafe.Analyzers;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeFixes;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace FrameSafe.CodeFixes;

/// <summary>FRAME302, FRAME501: writes the Lorentz factor as it is, and γ − 1 in the form that keeps all digits.</summary>
[ExportCodeFixProvider(LanguageNames.CSharp, Name = nameof(WriteKnownForm))]
[Shared]
public sealed class WriteKnownForm : Repair
{
    /// <inheritdoc/>
    public override ImmutableArray<string> FixableDiagnosticIds => ["FRAME302", "FRAME501"];

    internal override IEnumerable<Mending> Mend(SyntaxNode place, Diagnostic diagnostic, SemanticModel model, CancellationToken cancellation)
    {
        diagnostic.Properties.TryGetValue(FindingProperties.Form, out string? form);
        diagnostic.Properties.TryGetValue(FindingProperties.Velocity, out string? velocity);
        diagnostic.Properties.TryGetValue(FindingProperties.LightSpeed, out string? light);
        if (form is null || velocity is null || light is null || place is not ExpressionSyntax expression)
            yield break;
        ExpressionSyntax v = Code.Parse(velocity);
        if (!Code.IsRepeatable(v) || model.GetTypeInfo(expression, cancellation).Type?.SpecialType != SpecialType.System_Double)
            yield break;

        string c = light == "1" ? "" : SpeedOfLight.NameAt(expression, light, model, cancellation) ?? light;
        string beta = Code.Factor(v) + (c.Length == 0 ? "" : " / " + c);
        string reciprocal = "global::System.Math.Sqrt((1 - " + beta + ") * (1 + " + beta + "))";
        bool isFactor = form == "lorentz-factor";
        string text = isFactor
            ? "1 / " + reciprocal
            : beta + " * (" + beta + ") / (" + reciprocal + " * (1 + " + reciprocal + "))";
        yield return new(
            isFactor ? "Write the Lorentz factor 1/√(1 − v²/c²)" : "Write γ − 1 as β²/(s(1 + s)), s = 1/γ, which keeps all digits",
            nameof(WriteKnownForm),
            expression,
            current => Code.AsQuotientIn(place.Parent, Code.Tidy(Code.Parse(text)).WithTriviaFrom(current)));
    }
}
