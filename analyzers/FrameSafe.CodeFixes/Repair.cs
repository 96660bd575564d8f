using System.Collections.Generic;
using System.Collections.Immutable;
using System.Linq;
using System.Threading;
using System.Threading.Tasks;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CodeActions;
using Microsoft.CodeAnalysis.CodeFixes;
using Microsoft.CodeAnalysis.Editing;

namespace FrameSafe.CodeFixes;

/// <summary>
/// A repair: for a finding, the changes that mend it, each a choice of its own. Every repair has Fix All in document, project
/// and solution, done in one pass over each document.
/// </summary>
public abstract class Repair : CodeFixProvider
{
    private static readonly FixAllProvider All = FixAllProvider.Create(
        async (context, document, diagnostics) =>
        {
            var repair = (Repair)context.CodeFixProvider;
            return await repair.ApplyAsync(document, diagnostics, context.CodeActionEquivalenceKey, context.CancellationToken)
                .ConfigureAwait(false);
        });

    /// <inheritdoc/>
    public sealed override FixAllProvider GetFixAllProvider() => All;

    /// <inheritdoc/>
    public sealed override async Task RegisterCodeFixesAsync(CodeFixContext context)
    {
        SyntaxNode? root = await context.Document.GetSyntaxRootAsync(context.CancellationToken).ConfigureAwait(false);
        SemanticModel? model = await context.Document.GetSemanticModelAsync(context.CancellationToken).ConfigureAwait(false);
        if (root is null || model is null)
            return;
        foreach (Diagnostic diagnostic in context.Diagnostics)
        {
            foreach (Mending mending in Mendings(diagnostic, root, model, context.CancellationToken))
            {
                context.RegisterCodeFix(
                    CodeAction.Create(
                        mending.Title,
                        async cancellation => await ApplyAsync(context.Document, [diagnostic], mending.Key, cancellation).ConfigureAwait(false)
                            ?? context.Document,
                        mending.Key),
                    diagnostic);
            }
        }
    }

    /// <summary>The changes that mend a finding, the best first; none where no change can be vouched for.</summary>
    internal abstract IEnumerable<Mending> Mend(SyntaxNode place, Diagnostic diagnostic, SemanticModel model, CancellationToken cancellation);

    private IEnumerable<Mending> Mendings(Diagnostic diagnostic, SyntaxNode root, SemanticModel model, CancellationToken cancellation)
    {
        if (!root.FullSpan.Contains(diagnostic.Location.SourceSpan))
            return [];
        SyntaxNode place = root.FindNode(diagnostic.Location.SourceSpan, getInnermostNodeForTie: true);
        return Mend(place, diagnostic, model, cancellation);
    }

    private async Task<Document?> ApplyAsync(
        Document document, ImmutableArray<Diagnostic> diagnostics, string? key, CancellationToken cancellation)
    {
        DocumentEditor editor = await DocumentEditor.CreateAsync(document, cancellation).ConfigureAwait(false);
        var done = new HashSet<SyntaxNode>();
        foreach (Diagnostic diagnostic in diagnostics.OrderBy(diagnostic => diagnostic.Location.SourceSpan.Start))
        {
            Mending? chosen = Mendings(diagnostic, editor.OriginalRoot, editor.SemanticModel, cancellation)
                .FirstOrDefault(mending => key is null || mending.Key == key);
            if (chosen is not null && done.Add(chosen.Target))
                editor.ReplaceNode(chosen.Target, (current, _) => chosen.Change(current));
        }

        return done.Count == 0 ? null : editor.GetChangedDocument();
    }
}
