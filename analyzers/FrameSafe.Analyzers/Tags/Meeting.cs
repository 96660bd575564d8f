namespace FrameSafe.Analyzers.Tags;

/// <summary>How two numbers meet.</summary>
internal enum Meeting
{
    /// <summary>They are added.</summary>
    Sum,

    /// <summary>The right one is subtracted from the left one.</summary>
    Difference,

    /// <summary>They are compared.</summary>
    Comparison,

    /// <summary>One of them is chosen, or they stand side by side: minimum, maximum, conditional, collection, hypot, atan2.</summary>
    Choice,

    /// <summary>The left one, a value, goes where the right one, a declared target, is wanted.</summary>
    Target,
}
