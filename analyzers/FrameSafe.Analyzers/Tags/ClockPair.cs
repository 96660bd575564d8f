namespace FrameSafe.Analyzers.Tags;

/// <summary>The two frames or clocks that a Lorentz factor, rapidity, Doppler factor or clock rate relates.</summary>
/// <param name="Frame">Where the motion is measured.</param>
/// <param name="Other">What moves.</param>
internal sealed record ClockPair(ClockTag Frame, ClockTag Other)
{
    /// <summary>Whether both pairs relate the same two, in whichever order: γ and relative rapidity are symmetric.</summary>
    public bool RelatesSame(ClockPair other)
        => Equals(other) || (Frame.Equals(other.Other) && Other.Equals(other.Frame));
}
