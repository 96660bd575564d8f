using FrameSafe.Analyzers.Reading;
using FrameSafe.CodeFixes;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace FrameSafe.Tool.Charting;

/// <summary>Reads the frame chart of one compilation: the frames it declares, those they move in, and its calls of transforms.</summary>
internal sealed class ChartReader
{
    private readonly Dictionary<string, ChartFrame> _frames = [];
    private readonly Dictionary<(string Frame, string In), double?> _motions = [];
    private readonly Dictionary<(string From, string To), int> _crossings = [];

    private ChartReader()
    {
    }

    internal static FrameChart Read(Compilation compilation, IEnumerable<string> met, CancellationToken cancellation)
    {
        if (compilation.GetTypeByMetadataName(Vocabulary.UnitAttribute) is null)
            return FrameChart.Empty;
        var reader = new ChartReader();
        reader.ReadDeclarations(compilation.Assembly.GlobalNamespace, cancellation);
        foreach (string id in met)
        {
            if (compilation.GetTypeByMetadataName(id) is { } type)
                reader.AddFrame(type);
        }

        foreach (SyntaxTree tree in compilation.SyntaxTrees)
            reader.ReadCalls(tree, compilation, cancellation);
        return new(
            [.. reader._frames.Values],
            [.. reader._motions.Select(motion => new ChartMotion(motion.Key.Frame, motion.Key.In, motion.Value))],
            [.. reader._crossings.Select(crossing => new ChartCrossing(crossing.Key.From, crossing.Key.To, crossing.Value))]);
    }

    private void ReadDeclarations(INamespaceOrTypeSymbol container, CancellationToken cancellation)
    {
        cancellation.ThrowIfCancellationRequested();
        foreach (ISymbol member in container.GetMembers())
        {
            if (member is INamedTypeSymbol { TypeKind: TypeKind.Struct } type && Vocabulary.Implements(type, Vocabulary.Frame))
                AddFrame(type);
            if (member is INamespaceOrTypeSymbol inner)
                ReadDeclarations(inner, cancellation);
        }
    }

    private void AddFrame(ITypeSymbol frame)
    {
        string id = FrameNames.Id(frame);
        if (frame is ITypeParameterSymbol || !_frames.TryAdd(id, new(id, frame.Name, Nature(frame))) || frame is not INamedTypeSymbol named)
            return;
        foreach (RelativeMotion motion in RelativeMotion.Of(named))
        {
            // A circle or an impossible speed is a finding of its own; the chart shows what is left.
            if (!Vocabulary.Implements(motion.Frame, Vocabulary.Frame))
                continue;
            AddFrame(motion.Frame);
            _motions[(id, FrameNames.Id(motion.Frame))] = motion is { IsPossible: true, MaxSpeed: > 0 } ? motion.MaxSpeed : null;
        }
    }

    private static string Nature(ITypeSymbol frame)
        => Vocabulary.Implements(frame, Vocabulary.TimeScale) ? "time scale"
            : Vocabulary.Implements(frame, Vocabulary.Frame) ? FrameNames.Frame(frame).Nature.ToString().ToLowerInvariant() switch
            {
                "unknown" => "frame",
                string nature => nature + " frame",
            }
            : "clock";

    private void ReadCalls(SyntaxTree tree, Compilation compilation, CancellationToken cancellation)
    {
        SemanticModel? model = null;
        foreach (InvocationExpressionSyntax call in tree.GetRoot(cancellation).DescendantNodes().OfType<InvocationExpressionSyntax>())
        {
            model ??= compilation.GetSemanticModel(tree);
            if (model.GetSymbolInfo(call, cancellation).Symbol is not IMethodSymbol method)
                continue;
            Transform? transform = Transforms.Of(method);
            if (transform is null && method.ContainingType is { } owner && Transforms.Of(owner) is { Map: { } map } applied && map == method.Name)
                transform = applied;
            if (transform is null or { From: ITypeParameterSymbol } or { To: ITypeParameterSymbol })
                continue;
            AddFrame(transform.From);
            AddFrame(transform.To);
            (string, string) pair = (FrameNames.Id(transform.From), FrameNames.Id(transform.To));
            _crossings[pair] = _crossings.GetValueOrDefault(pair) + 1;
        }
    }
}
