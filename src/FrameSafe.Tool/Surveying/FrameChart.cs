using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Tool.Surveying;

/// <summary>A frame of the chart.</summary>
/// <param name="Id">Its full metadata name.</param>
/// <param name="Name">The name that is shown.</param>
internal sealed record ChartFrame(string Id, string Name);

/// <summary>The motion of one frame in another, as it is declared.</summary>
/// <param name="Frame">The frame that moves.</param>
/// <param name="Parent">The frame in which it moves.</param>
/// <param name="MaxSpeed">Its largest speed there as a fraction of c; 0 if not said.</param>
internal sealed record ChartMotion(string Frame, string Parent, double MaxSpeed);

/// <summary>Members that carry numbers from one frame to another.</summary>
internal sealed record ChartCrossing(string From, string To, int Members);

/// <summary>The frames of a survey, how they move, and where numbers cross.</summary>
internal sealed record FrameChart(
    IReadOnlyList<ChartFrame> Frames, IReadOnlyList<ChartMotion> Motions, IReadOnlyList<ChartCrossing> Crossings)
{
    /// <summary>The frames that the compilations declare.</summary>
    internal static FrameChart Of(IEnumerable<Compilation> compilations, CancellationToken cancellation)
    {
        var frames = new SortedDictionary<string, ChartFrame>(StringComparer.Ordinal);
        var motions = new SortedDictionary<(string, string), ChartMotion>();
        var crossings = new SortedDictionary<(string, string), int>();
        foreach (Compilation compilation in compilations)
            Visit(compilation.Assembly.GlobalNamespace);
        return new(
            [.. frames.Values],
            [.. motions.Values],
            [.. crossings.Select(crossing => new ChartCrossing(crossing.Key.Item1, crossing.Key.Item2, crossing.Value))]);

        void Visit(INamespaceOrTypeSymbol container)
        {
            cancellation.ThrowIfCancellationRequested();
            foreach (ISymbol member in container.GetMembers())
            {
                switch (member)
                {
                    case INamedTypeSymbol { TypeKind: TypeKind.Struct } type when Vocabulary.Implements(type, Vocabulary.Frame):
                        Add(type);
                        foreach (RelativeMotion motion in RelativeMotion.Of(type).Where(motion => motion.IsPossible))
                        {
                            Add(motion.Frame);
                            (string frame, string parent) = (FrameNames.Id(type), FrameNames.Id(motion.Frame));
                            motions[(frame, parent)] = new(frame, parent, motion.MaxSpeed);
                        }

                        break;
                    case IMethodSymbol method when CodeFixes.Transforms.Of(method) is { } transform
                        && transform.From.TypeKind != TypeKind.TypeParameter && transform.To.TypeKind != TypeKind.TypeParameter:
                        Add(transform.From);
                        Add(transform.To);
                        (string, string) key = (FrameNames.Id(transform.From), FrameNames.Id(transform.To));
                        crossings[key] = crossings.GetValueOrDefault(key) + 1;
                        break;
                    case INamespaceOrTypeSymbol inner:
                        Visit(inner);
                        break;
                }
            }
        }

        void Add(ITypeSymbol type)
        {
            string id = FrameNames.Id(type);
            frames.TryAdd(id, new(id, type.Name));
        }
    }
}
