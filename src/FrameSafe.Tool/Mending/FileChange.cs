using System.Text;
using DiffPlex.DiffBuilder;
using DiffPlex.DiffBuilder.Model;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Text;

namespace FrameSafe.Tool.Mending;

/// <summary>A file before and after.</summary>
internal sealed record FileChange(string Path, SourceText Before, SourceText After)
{
    // Lines around a change, as a unified diff has them.
    private const int Context = 3;

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

    /// <summary>The change as a unified diff.</summary>
    internal string Diff(string root)
    {
        string name = System.IO.Path.GetRelativePath(root, Path).Replace('\\', '/');
        List<DiffPiece> lines = InlineDiffBuilder.Diff(Before.ToString(), After.ToString(), ignoreWhiteSpace: false).Lines;
        var text = new StringBuilder().Append("--- ").AppendLine(name).Append("+++ ").AppendLine(name);
        int oldLine = 1;
        int newLine = 1;
        for (int i = 0; i < lines.Count;)
        {
            if (lines[i].Type == ChangeType.Unchanged)
            {
                (oldLine, newLine, i) = (oldLine + 1, newLine + 1, i + 1);
                continue;
            }

            int start = Math.Max(0, i - Context);
            int end = EndOfHunk(lines, i);
            DiffPiece[] hunk = [.. lines.Skip(start).Take(end - start)];
            int before = i - start;
            text.Append("@@ -").Append(oldLine - before).Append(',').Append(hunk.Count(line => line.Type != ChangeType.Inserted))
                .Append(" +").Append(newLine - before).Append(',').Append(hunk.Count(line => line.Type != ChangeType.Deleted)).AppendLine(" @@");
            foreach (DiffPiece line in hunk)
                text.Append(line.Type switch { ChangeType.Inserted => '+', ChangeType.Deleted => '-', _ => ' ' }).AppendLine(line.Text);
            for (; i < end; i++)
            {
                oldLine += lines[i].Type == ChangeType.Inserted ? 0 : 1;
                newLine += lines[i].Type == ChangeType.Deleted ? 0 : 1;
            }
        }

        return text.ToString();
    }

    /// <summary>Writes the new text beside the file, to be put in its place once all of them are written.</summary>
    internal string WriteBeside()
    {
        string beside = Path + ".mended";
        using var writer = new StreamWriter(beside, append: false, Before.Encoding ?? new UTF8Encoding(false));
        After.Write(writer);
        return beside;
    }

    private static int EndOfHunk(List<DiffPiece> lines, int start)
    {
        int last = start;
        for (int i = start; i < lines.Count && i <= last + (2 * Context); i++)
        {
            if (lines[i].Type != ChangeType.Unchanged)
                last = i;
        }

        return Math.Min(lines.Count, last + Context + 1);
    }
}
