using System.Text;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;

namespace FrameSafe.Analyzers.Tests.Robustness;

/// <summary>Makes of a source what stands in an editor while it is being typed: tokens left out, doubled, swapped, from elsewhere.</summary>
internal sealed class Mutator(int seed)
{
    private readonly Random _random = new(seed);

    internal string Mutate(string source, IReadOnlyList<string> elsewhere)
    {
        List<SyntaxToken> tokens = [.. CSharpSyntaxTree.ParseText(source).GetRoot().DescendantTokens()];
        if (tokens.Count < 4)
            return source;
        var texts = tokens.ConvertAll(token => token.ToFullString());
        int changes = _random.Next(1, 5);
        for (int i = 0; i < changes; i++)
        {
            int at = _random.Next(texts.Count - 1);
            switch (_random.Next(6))
            {
                case 0:
                    texts[at] = " ";
                    break;
                case 1:
                    texts[at] += texts[at];
                    break;
                case 2:
                    (texts[at], texts[at + 1]) = (texts[at + 1], texts[at]);
                    break;
                case 3:
                    texts[at] = elsewhere[_random.Next(elsewhere.Count)] + " ";
                    break;
                case 4:
                    int other = _random.Next(texts.Count);
                    texts[at] = texts[other];
                    break;
                default:
                    // The rest of the file is not there yet.
                    if (_random.Next(8) == 0)
                        texts.RemoveRange(at + 1, texts.Count - at - 1);
                    break;
            }

            if (texts.Count < 4)
                break;
        }

        return string.Concat(texts);
    }
}
