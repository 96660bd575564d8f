namespace FrameSafe.Analyzers.Tags;

/// <summary>What comes of two tags: the tag of the result, and what disagreed, if anything did.</summary>
internal readonly struct Outcome
{
    public Outcome(Tag result, Clash? clash = null)
    {
        Result = result;
        Clash = clash;
    }

    /// <summary>The tag of the result; after a clash what both agree on, so that one mistake gives one finding.</summary>
    public Tag Result { get; }

    public Clash? Clash { get; }
}
