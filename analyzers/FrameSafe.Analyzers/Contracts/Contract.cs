using System;
using System.Collections.Generic;
using System.Linq;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Text;

namespace FrameSafe.Analyzers.Contracts;

/// <summary>
/// Tags for members that nobody may edit, from a file: members by documentation-comment id (ECMA-334, annex on documentation
/// comments), with the tags of their parameters and results. See <c>analyzers/contracts/framesafe-contract.schema.json</c>.
/// </summary>
internal sealed class Contract
{
    internal const string FileSuffix = ".framesafe.json";

    private static readonly string[] TagKeys = ["unit", "frame", "clock", "kind", "maxSpeed", "between"];

    private readonly Compilation _compilation;
    private readonly Dictionary<ISymbol, Declaration> _declarations;
    private readonly Dictionary<ISymbol, Declaration> _returns;
    private readonly List<JsonProblem> _problems = [];

    private Contract(Compilation compilation, Dictionary<ISymbol, Declaration> declarations, Dictionary<ISymbol, Declaration> returns)
    {
        _compilation = compilation;
        _declarations = declarations;
        _returns = returns;
    }

    /// <summary>Adds what a text says to the tables; gives what of it cannot be read or matches nothing.</summary>
    internal static IReadOnlyList<JsonProblem> Read(
        string text, Compilation compilation, Dictionary<ISymbol, Declaration> declarations, Dictionary<ISymbol, Declaration> returns)
    {
        if (JsonReader.Read(text, out JsonProblem? problem) is not { } root)
            return [problem!];
        var contract = new Contract(compilation, declarations, returns);
        contract.Root(root);
        return contract._problems;
    }

    private void Root(JsonValue root)
    {
        if (root.Members is null)
        {
            Fail(root.Span, "an object with `members` is expected");
            return;
        }

        foreach (JsonMember member in root.Members)
        {
            switch (member.Name)
            {
                case "$schema":
                    break;
                case "version" when member.Value.Scalar is 1.0:
                    break;
                case "version":
                    Fail(member.Value.Span, "this is a contract of another version; version 1 is read");
                    break;
                case "members" when member.Value.Members is { } entries:
                    foreach (JsonMember entry in entries)
                        Entry(entry);
                    break;
                default:
                    Fail(member.Span, "`" + member.Name + "` is not known here; allowed are `$schema`, `version` and `members`");
                    break;
            }
        }
    }

    private void Entry(JsonMember entry)
    {
        ISymbol? symbol = DocumentationCommentId.GetFirstSymbolForDeclarationId(entry.Name, _compilation);
        if (symbol is null)
        {
            Fail(entry.Span, "`" + entry.Name + "` matches no member" + Nearest(entry.Name));
            return;
        }

        if (entry.Value.Members is not { } members)
        {
            Fail(entry.Value.Span, "an object is expected");
            return;
        }

        if (symbol is not IMethodSymbol method)
        {
            if (Tag(members, []) is { } tag)
                _declarations[symbol] = new(tag, Origin.Of(symbol));
            return;
        }

        foreach (JsonMember part in members)
        {
            if (part.Name == "returns" && part.Value.Members is { } result)
            {
                if (Tag(result, []) is { } tag)
                    _returns[method] = new(tag, Origin.Of(method));
            }
            else if (part.Name == "parameters" && part.Value.Members is { } parameters)
            {
                foreach (JsonMember parameter in parameters)
                    Parameter(method, parameter);
            }
            else
            {
                Fail(part.Span, "`" + part.Name + "` is not known here; allowed are `returns` and `parameters`");
            }
        }
    }

    private void Parameter(IMethodSymbol method, JsonMember entry)
    {
        IParameterSymbol? parameter = method.Parameters.FirstOrDefault(candidate => candidate.Name == entry.Name);
        if (parameter is null)
        {
            Fail(entry.Span, "`" + method.Name + "` has no parameter `" + entry.Name + "`; it has " + string.Join(", ", method.Parameters.Select(known => "`" + known.Name + "`")));
            return;
        }

        if (entry.Value.Members is { } members && Tag(members, []) is { } tag)
            _declarations[parameter] = new(tag, Origin.Of(parameter));
    }

    private Tag? Tag(IReadOnlyList<JsonMember> members, string[] also)
    {
        Unit? unit = null;
        FrameTag? frame = null;
        ClockTag? clock = null;
        ClockPair? between = null;
        SpeedRange? speed = null;
        QuantityKind kind = QuantityKind.Unspecified;
        foreach (JsonMember member in members)
        {
            switch (member.Name)
            {
                case "unit" when member.Value.Text is { } text:
                    if (!UnitText.TryRead(text, out unit, out UnitTextError? error))
                        Fail(member.Value.Span, "the unit `" + text + "` cannot be read: " + error.Message + (error.Nearest is { } nearest ? "; the nearest is `" + nearest + "`" : ""));
                    break;
                case "frame" when member.Value.Text is { } name:
                    frame = Type(member.Value, name, Vocabulary.Frame) is { } frameType ? FrameNames.Frame(frameType) : null;
                    break;
                case "clock" when member.Value.Text is { } name:
                    clock = Type(member.Value, name, Vocabulary.Clock) is { } clockType ? FrameNames.Clock(clockType) : null;
                    break;
                case "between" when member.Value.Text is { } names && names.Split(' ') is { Length: 2 } pair:
                    if (Type(member.Value, pair[0], Vocabulary.Clock) is { } one && Type(member.Value, pair[1], Vocabulary.Clock) is { } other)
                        between = new(FrameNames.Clock(one), FrameNames.Clock(other));
                    break;
                case "kind" when member.Value.Text is { } name:
                    if (!Enum.TryParse(name, out kind) || !Enum.IsDefined(typeof(QuantityKind), kind))
                        Fail(member.Value.Span, "`" + name + "` is no kind of quantity" + Closest(name, Enum.GetNames(typeof(QuantityKind))));
                    break;
                case "maxSpeed" when member.Value.Scalar is double most and >= 0 and < 1:
                    speed = SpeedRange.UpTo(most);
                    break;
                default:
                    Fail(member.Span, "`" + member.Name + "` is not known here, or not with this value; allowed are " + string.Join(", ", TagKeys.Concat(also).Select(key => "`" + key + "`")));
                    break;
            }
        }

        Tag tag = Tags.Tag.Declared(unit, frame, clock, kind, between, speed);
        return tag.IsUnknown ? null : tag;
    }

    private INamedTypeSymbol? Type(JsonValue value, string name, string @interface)
    {
        INamedTypeSymbol? type = _compilation.GetTypeByMetadataName(name);
        if (type is not null && Vocabulary.Implements(type, @interface))
            return type;
        Fail(value.Span, "`" + name + "` is no type that implements " + @interface);
        return null;
    }

    // Of the members of the type that is named, the one that is spelled most like it.
    private string Nearest(string id)
    {
        int end = id.IndexOf('(');
        string path = end < 0 ? id : id.Substring(0, end);
        int dot = path.LastIndexOf('.');
        if (dot < 2 || id.Length < 3)
            return "";
        INamedTypeSymbol? type = _compilation.GetTypeByMetadataName(path.Substring(2, dot - 2));
        return type is null
            ? ""
            : Closest(id, type.GetMembers().Select(member => member.GetDocumentationCommentId()).Where(known => known is not null)!);
    }

    private static string Closest(string name, IEnumerable<string?> known)
    {
        string? nearest = known.OfType<string>()
            .OrderBy(candidate => SpellingDistance.Between(name, candidate))
            .ThenBy(candidate => candidate, StringComparer.Ordinal)
            .FirstOrDefault();
        return nearest is null ? "" : "; the nearest is `" + nearest + "`";
    }

    private void Fail(TextSpan span, string message) => _problems.Add(new(span, message));
}
