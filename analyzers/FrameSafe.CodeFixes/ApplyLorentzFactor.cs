using System.Collections.Generic;
using System.Collections.Immutable;
using System.Composition;
using System.Linq;
using System.Threading;
using FrameSafe.Analyzers;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeFixes;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace FrameSafe.CodeFixes;

/// <summary>FRAME201: makes a coordinate time of a proper time, or the reverse, by a Lorentz factor in scope between the two.</summary>
[ExportCodeFixProvider(LanguageNames.CSharp, Name = nameof(ApplyLorentzFactor))]
[Shared]
public sealed class ApplyLorentzFactor : Repair
{
    /// <inheritdoc/>
    public override ImmutableArray<string> FixableDiagnosticIds => ["FRAME201"];

    internal override IEnumerable<Mending> Mend(SyntaxNode place, Diagnostic diagnostic, SemanticModel model, CancellationToken cancellation)
    {
        diagnostic.Properties.TryGetValue(FindingProperties.From, out string? clock);
        diagnostic.Properties.TryGetValue(FindingProperties.To, out string? frame);
        diagnostic.Properties.TryGetValue(FindingProperties.Form, out string? form);
        if (clock is null || frame is null || Code.Operand(place, diagnostic) is not { } operand)
            yield break;

        var tags = new SymbolTags(model.Compilation);
        var scope = new Scope(model, operand, cancellation);
        List<NamedValue> factors = [.. scope.Values.Where(Relates)];
        if (factors.Count == 0)
            factors.AddRange(scope.MembersOfValues().Where(Relates));
        bool divides = form == "divide";
        foreach (NamedValue factor in factors)
        {
            yield return new(
                (divides ? "Divide `" : "Multiply `") + operand + "` by the Lorentz factor `" + factor.Text + "`",
                nameof(ApplyLorentzFactor) + ":" + factor.Symbol.Name,
                operand,
                current => Code.Tidy(Code.Infix(
                    divides ? SyntaxKind.DivideExpression : SyntaxKind.MultiplyExpression, current, Code.Parse(factor.Text))));
        }

        bool Relates(NamedValue value)
            => tags.Of(value.Symbol) is { Tag: { Kind: QuantityKind.LorentzFactor, Between: { } pair } }
                && ((pair.Frame.Id == frame && pair.Other.Id == clock) || (pair.Frame.Id == clock && pair.Other.Id == frame));
    }
}
