namespace FrameSafe;

/// <summary>A UTC date lies beyond the day up to which the leap-second table is known to hold.</summary>
public sealed class LeapSecondTableExpiredException : InvalidOperationException
{
    internal LeapSecondTableExpiredException(DateOnly asked, DateOnly validUntil)
        : base($"The leap-second table holds until {validUntil:yyyy-MM-dd}; {asked:yyyy-MM-dd} lies beyond. "
            + $"Use a newer table ({nameof(LeapSecondTable)}.{nameof(LeapSecondTable.Parse)}), or say that no further step "
            + $"is to be assumed ({nameof(LeapSecondTable)}.{nameof(LeapSecondTable.Extrapolated)}).")
    {
        Asked = asked;
        ValidUntil = validUntil;
    }

    /// <summary>The UTC day that was asked for.</summary>
    public DateOnly Asked { get; }

    /// <summary>The first UTC day for which the table says nothing.</summary>
    public DateOnly ValidUntil { get; }
}
