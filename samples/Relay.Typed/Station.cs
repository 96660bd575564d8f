using FrameSafe;

namespace Relay;

/// <summary>The station at the head of the track: sends pulses on its timetable and takes the answers.</summary>
internal sealed class Station(CoordinateTime<Harbour> interval, Displacement<Harbour> receiver)
{
    /// <summary>When a pulse of the timetable leaves, at the head of the track.</summary>
    public SpacetimeEvent<Harbour> Sending(int pulse) => SpacetimeEvent<Harbour>.At(interval * pulse, Displacement<Harbour>.Zero);

    /// <summary>When an answer that leaves the track at an event reaches the dish.</summary>
    public CoordinateTime<Harbour> ReceptionOf(SpacetimeEvent<Harbour> answer)
        => answer.Time + Light.TimeOver(answer.Place - receiver);

    /// <summary>How long a test pulse takes from the head of the track to the dish.</summary>
    public CoordinateTime<Harbour> SelfTest() => Light.TimeOver(receiver);
}
