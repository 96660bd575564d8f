using System.Collections.Generic;

namespace FrameSafe.Analyzers.Tags;

internal static class Sequences
{
    /// <summary>The items that are not null.</summary>
    internal static IEnumerable<object> AsNotNull(this IEnumerable<object?> items)
    {
        foreach (object? item in items)
        {
            if (item is not null)
                yield return item;
        }
    }
}
