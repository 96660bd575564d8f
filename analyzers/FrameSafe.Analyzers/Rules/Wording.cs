using System.Globalization;
using System.Text;
using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>How messages name what met: the code itself, and the declaration that it goes back to.</summary>
internal static class Wording
{
    private const int LongestCode = 48;

    /// <summary>"`u` (parameter, line 8)", "`x + y` (from field `_x` in Track.cs, line 3)", "parameter `stretch` of `TimeOver` (line 15)".</summary>
    internal static string Name(Side side, SyntaxNode place)
    {
        if (side.Syntax is null)
            return side.Description + Line(side.Value.Origin, place, " (", ")");
        string code = Code(side.Syntax);
        return "`" + code + "`" + (side.Value.Origin is { } origin ? Whence(origin, code, place) : "");
    }

    /// <summary>The unit of a tag; "unknown unit" never reaches a message, for such tags do not clash.</summary>
    internal static string Unit(Tag tag) => tag.DescribeUnit() ?? tag.Dimension?.Name ?? "another unit";

    /// <summary>"a length (m)", "a speed (km/s)", "a number".</summary>
    internal static string Dimension(Tag tag)
    {
        string? name = tag.Dimension?.Name;
        string unit = Unit(tag);
        if (name is null)
            return "in " + unit;
        string article = "aeiou".IndexOf(name[0]) >= 0 ? "an " : "a ";
        return article + name + (unit == "1" ? "" : " (" + unit + ")");
    }

    /// <summary>The kind in words: "a proper time", "a celerity".</summary>
    internal static string Kind(Tag tag)
    {
        if (tag.Kind == QuantityKind.Unspecified)
            return Dimension(tag);
        var words = new StringBuilder();
        foreach (char letter in tag.Kind.ToString())
        {
            if (char.IsUpper(letter) && words.Length > 0)
                words.Append(' ');
            words.Append(char.ToLowerInvariant(letter));
        }

        words.Replace("lorentz", "Lorentz").Replace("doppler", "Doppler");
        return (words[0] is 'a' or 'e' or 'i' or 'o' or 'u' ? "an " : "a ") + words;
    }

    /// <summary>The code on one line, shortened in the middle of nowhere rather than left out.</summary>
    internal static string Code(SyntaxNode node)
    {
        var text = new StringBuilder();
        bool space = false;
        foreach (char character in node.ToString())
        {
            if (char.IsWhiteSpace(character))
            {
                space = true;
                continue;
            }

            if (space && text.Length > 0)
                text.Append(' ');
            space = false;
            text.Append(character == '`' ? '\'' : character);
            if (text.Length > LongestCode)
                return text.ToString(0, LongestCode) + "…";
        }

        return text.ToString();
    }

    /// <summary>For the origin's own location: "`u` is measured in Tug (parameter `u`)".</summary>
    internal static string Origin(Side side, string says)
        => (side.Syntax is null ? side.Description : "`" + Code(side.Syntax) + "`") + " " + says
            + (side.Value.Origin is { } origin ? " (" + origin.What + " `" + origin.Name + "`)" : "");

    private static string Whence(Origin origin, string code, SyntaxNode place)
    {
        string line = Line(origin, place, ", ", "");
        if (code == origin.Name || code.EndsWith("." + origin.Name, System.StringComparison.Ordinal))
            return " (" + origin.What + line + ")";
        if (origin.What == Reading.Origin.Result && CallOf(code) == origin.Name)
            return line.Length == 0 ? "" : " (" + line.Substring(2) + ")";
        return " (from " + origin.What + " `" + origin.Name + "`" + line + ")";
    }

    // The name of the method where the code is one call: `track.PositionAt(time)`.
    private static string CallOf(string code)
    {
        int open = code.IndexOf('(');
        if (open <= 0 || code[code.Length - 1] is not (')' or '…'))
            return "";
        int dot = code.LastIndexOf('.', open);
        return code.Substring(dot + 1, open - dot - 1);
    }

    private static string Line(Origin? origin, SyntaxNode place, string before, string after)
    {
        if (origin?.Location is not { SourceTree: { } tree } location)
            return "";
        int line = location.GetLineSpan().StartLinePosition.Line + 1;
        string file = tree == place.SyntaxTree ? "" : System.IO.Path.GetFileName(tree.FilePath) + " ";
        return before + file + "line " + line.ToString(CultureInfo.InvariantCulture) + after;
    }
}
