using System;

namespace FrameSafe.Analyzers.Tags;

/// <summary>How far two spellings are apart.</summary>
internal static class SpellingDistance
{
    /// <summary>
    /// The Damerau–Levenshtein distance in its restricted form (optimal string alignment): insertions, deletions, substitutions
    /// and swaps of neighbours. F. J. Damerau, Comm. ACM 7 (1964) 171.
    /// </summary>
    internal static int Between(string left, string right)
    {
        var beforeLast = new int[right.Length + 1];
        var last = new int[right.Length + 1];
        var current = new int[right.Length + 1];
        for (int j = 0; j <= right.Length; j++)
            last[j] = j;

        for (int i = 1; i <= left.Length; i++)
        {
            current[0] = i;
            for (int j = 1; j <= right.Length; j++)
            {
                int cost = left[i - 1] == right[j - 1] ? 0 : 1;
                current[j] = Math.Min(Math.Min(last[j] + 1, current[j - 1] + 1), last[j - 1] + cost);
                if (i > 1 && j > 1 && left[i - 1] == right[j - 2] && left[i - 2] == right[j - 1])
                    current[j] = Math.Min(current[j], beforeLast[j - 2] + 1);
            }

            (beforeLast, last, current) = (last, current, beforeLast);
        }

        return last[right.Length];
    }
}
