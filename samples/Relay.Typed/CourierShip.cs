using FrameSafe;

namespace Relay;

/// <summary>
/// The courier: passes the station at the origin event and keeps its velocity. It tows a marker buoy on a long line straight
/// ahead of itself.
/// </summary>
internal sealed class CourierShip(Velocity<Harbour> velocity, Displacement<Courier> marker)
{
    /// <summary>Its velocity along the track.</summary>
    public Velocity<Harbour> Velocity { get; } = velocity;

    /// <summary>From the station's frame to its own.</summary>
    public Boost<Harbour, Courier> Boost { get; } = Boost<Harbour, Courier>.Into(velocity);

    /// <summary>Where it is when its own clock shows a reading, as the station finds it.</summary>
    public SpacetimeEvent<Harbour> At(ProperTime<Courier> reading)
        => Boost.Inverse.Map(SpacetimeEvent<Courier>.FromSecondsAndMetres(reading.InSeconds, 0));

    /// <summary>What its own clock shows at a time of the station.</summary>
    public ProperTime<Courier> ClockAt(CoordinateTime<Harbour> time) => time / Boost.LorentzFactor;

    /// <summary>When and where a pulse that the station sends reaches it.</summary>
    public SpacetimeEvent<Harbour> ArrivalOf(SpacetimeEvent<Harbour> sending) => Light.Meeting(sending, default, Velocity);

    /// <summary>Where the marker buoy is at a time of the station: both taken at one time of the station.</summary>
    public Displacement<Harbour> MarkerAt(CoordinateTime<Harbour> time)
    {
        // The buoy rests in the courier's frame: its place there is the same at all times, the event at the station's time is wanted.
        double fixedOffset = marker.XInMetres / Boost.LorentzFactor.Value;
        return Displacement<Harbour>.FromMetres(Velocity.XInMetresPerSecond * time.InSeconds + fixedOffset);
    }
}
