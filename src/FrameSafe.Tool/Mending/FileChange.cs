using System.Text;
using DiffPlex.Renderer;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Text;

namespace FrameSafe.Tool.Mending;

/// <summary>A file before and after.</summary>
internal sealed record FileChange(string Path, SourceText Before, SourceText After)
{
    private static readonly UTF8Encoding Utf8 = new(encoderShouldEmitUTF8Identifier: false);

    internal static async Task<IReadOnlyList<FileChange>> BetweenAsync(Solution before, Solution after, CancellationToken cancellation)
    {
        var changes = new List<FileChange>();
        foreach (ProjectChanges project in after.GetChanges(before).GetProjectChanges())
        {
            foreach (DocumentId id in project.GetChangedDocuments())
            {
                Document old = before.GetDocument(id)!;
                changes.Add(new(
                    old.FilePath!,
                    await old.GetTextAsync(cancellation),
                    await after.GetDocument(id)!.GetTextAsync(cancellation)));
            }
        }

        return [.. changes.DistinctBy(change => change.Path).OrderBy(change => change.Path, StringComparer.Ordinal)];
    }

    /// <summary>The change as a unified diff, which git and patch read.</summary>
    internal string Diff(string root)
    {
        string name = System.IO.Path.GetRelativePath(root, Path).Replace('\\', '/');
        return UnidiffRenderer.GenerateUnidiff(Before.ToString(), After.ToString(), "a/" + name, "b/" + name);
    }

    /// <summary>Writes the new text to a file in the encoding of the old one, with its byte order mark if it had one.</summary>
    internal void Write(string path)
    {
        using var writer = new StreamWriter(path, append: false, Before.Encoding ?? Utf8);
        After.Write(writer);
    }
}
