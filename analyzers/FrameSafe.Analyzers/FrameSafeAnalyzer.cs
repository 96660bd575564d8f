using System;
using System.Collections.Generic;
using System.Collections.Immutable;
using System.Threading;
using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Rules;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;
using Microsoft.CodeAnalysis.Diagnostics;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers;

/// <summary>
/// Finds mixed frames, clocks and units and Newtonian arithmetic. One walk of a body serves all rules; a compilation that does
/// not reference the annotations costs nothing.
/// </summary>
[DiagnosticAnalyzer(LanguageNames.CSharp)]
public sealed class FrameSafeAnalyzer : DiagnosticAnalyzer
{
    /// <inheritdoc/>
    public override ImmutableArray<DiagnosticDescriptor> SupportedDiagnostics => RuleTable.Descriptors;

    /// <inheritdoc/>
    public override void Initialize(AnalysisContext context)
    {
        context.ConfigureGeneratedCodeAnalysis(GeneratedCodeAnalysisFlags.None);
        context.EnableConcurrentExecution();
        context.RegisterCompilationStartAction(Start);
    }

    private static void Start(CompilationStartAnalysisContext context)
    {
        if (context.Compilation.GetTypeByMetadataName(Vocabulary.UnitAttribute) is null)
            return;
        var knowledge = new Knowledge(context.Compilation, context.Options, context.CancellationToken);
        context.RegisterOperationBlockAction(block => JudgeBodies(block, knowledge));
        context.RegisterSyntaxNodeAction(JudgeAttribute, SyntaxKind.Attribute);
        context.RegisterSymbolAction(symbol => JudgeDeclaration(symbol, knowledge.Tags), SymbolKind.Method, SymbolKind.Property, SymbolKind.Field);
        context.RegisterCompilationEndAction(end => JudgeSettings(end, knowledge));
    }

    private static void JudgeBodies(OperationBlockAnalysisContext context, Knowledge knowledge)
    {
        List<Observation>? observations = null;
        foreach (IOperation body in context.OperationBlocks)
        {
            if (body is IAttributeOperation || !Relevance.Concerns(body, context.OwningSymbol, knowledge.Tags))
                continue;
            var walk = new Walk(knowledge, context.OwningSymbol, context.CancellationToken);
            try
            {
                walk.Run(body);
            }
            catch (InsufficientExecutionStackException)
            {
                // Code nested too deeply to follow: nothing is known of it.
                continue;
            }

            foreach (Observation observation in walk.Observations)
                (observations ??= []).Add(observation);
        }

        if (observations is null)
            return;
        AnalyzerConfigOptions options = context.Options.AnalyzerConfigOptionsProvider.GetOptions(observations[0].Place.SyntaxTree);
        var bench = new Bench(knowledge.Frames, Settings.Budget(options, out _));
        foreach (Finding finding in RuleTable.Judge(observations, bench))
            context.ReportDiagnostic(finding.ToDiagnostic(context.Compilation));
    }

    private static void JudgeAttribute(SyntaxNodeAnalysisContext context)
    {
        var attribute = (AttributeSyntax)context.Node;
        if (!DeclarationAttributes.IsNamedLikeOurs(attribute))
            return;
        foreach (Finding finding in DeclarationAttributes.Judge(attribute, context.SemanticModel, context.CancellationToken))
            context.ReportDiagnostic(finding.ToDiagnostic(context.Compilation));
    }

    private static void JudgeDeclaration(SymbolAnalysisContext context, SymbolTags tags)
    {
        ISymbol symbol = context.Symbol;
        if (symbol.IsImplicitlyDeclared || symbol is IMethodSymbol { AssociatedSymbol: not null })
            return;
        if (symbol.IsOverride || symbol.ContainingType.AllInterfaces.Length > 0)
        {
            Report(RuleTable.ContradictingTags.Judge(symbol, tags));
            if (symbol is IMethodSymbol method)
            {
                foreach (IParameterSymbol parameter in method.Parameters)
                    Report(RuleTable.ContradictingTags.Judge(parameter, tags));
            }
        }

        if (!IsPublic(symbol))
            return;
        switch (symbol)
        {
            case IFieldSymbol field:
                Report(RuleTable.UntaggedNumber.Judge(field, field.Type, tags.Of(field)));
                break;
            case IPropertySymbol property:
                Report(RuleTable.UntaggedNumber.Judge(property, property.Type, tags.Of(property)));
                break;
            case IMethodSymbol method:
                Report(RuleTable.UntaggedNumber.Judge(method, method.ReturnType, tags.OfReturn(method)));
                foreach (IParameterSymbol parameter in method.Parameters)
                    Report(RuleTable.UntaggedNumber.Judge(parameter, parameter.Type, tags.Of(parameter)));
                break;
        }

        void Report(Finding? finding)
        {
            if (finding is not null)
                context.ReportDiagnostic(finding.ToDiagnostic(context.Compilation));
        }
    }

    private static bool IsPublic(ISymbol symbol)
    {
        for (ISymbol? outer = symbol; outer is not null and not INamespaceSymbol; outer = outer.ContainingSymbol)
        {
            if (outer.DeclaredAccessibility is not (Accessibility.Public or Accessibility.Protected or Accessibility.ProtectedOrInternal))
                return false;
        }

        return true;
    }

    private static void JudgeSettings(CompilationAnalysisContext context, Knowledge knowledge)
    {
        foreach ((Location place, string message) in knowledge.Contracts.Problems)
            context.ReportDiagnostic(RuleTable.UnreadableContract.Judge(place, message).ToDiagnostic(context.Compilation));
        var reported = new HashSet<string>();
        foreach (SyntaxTree tree in context.Compilation.SyntaxTrees)
        {
            Settings.Budget(context.Options.AnalyzerConfigOptionsProvider.GetOptions(tree), out string? unreadable);
            if (unreadable is not null && reported.Add(unreadable))
                context.ReportDiagnostic(RuleTable.ImpossibleFrame.JudgeBudget(unreadable).ToDiagnostic(context.Compilation));
            foreach (KeyValuePair<string, string> suffix in knowledge.Tags.UnreadableSuffixes(tree))
            {
                if (reported.Add(suffix.Key + "=" + suffix.Value))
                    context.ReportDiagnostic(RuleTable.ImpossibleFrame.JudgeSuffix(suffix.Key, suffix.Value).ToDiagnostic(context.Compilation));
            }
        }
    }
}
