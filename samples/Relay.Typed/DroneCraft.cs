using FrameSafe;

namespace Relay;

/// <summary>A drone that the courier releases along the track, forward or astern, and that answers the station's pulses.</summary>
internal sealed class DroneCraft
{
    private readonly SpacetimeEvent<Harbour> _release;

    public DroneCraft(string name, CourierShip courier, ProperTime<Courier> releasedAt, Velocity<Courier> velocity, Mass mass)
    {
        Name = name;
        _release = courier.At(releasedAt);
        // Measured by the courier; the station measures the composition of both velocities.
        Velocity = courier.Boost.Inverse.Map(velocity);
        Mass = mass;
    }

    public string Name { get; }

    public Mass Mass { get; }

    /// <summary>Its velocity along the track as the station measures it.</summary>
    public Velocity<Harbour> Velocity { get; }

    /// <summary>Its kinetic energy past the station, which a brake there would have to take up.</summary>
    public KineticEnergy<Harbour> KineticEnergy => KineticEnergy<Harbour>.Of(Mass, Velocity);

    /// <summary>When and where a pulse that the station sends reaches the drone.</summary>
    public SpacetimeEvent<Harbour> ArrivalOf(SpacetimeEvent<Harbour> sending) => Light.Meeting(sending, _release, Velocity);

    /// <summary>When and where its answer leaves, after a pause that its own clock counts.</summary>
    public SpacetimeEvent<Harbour> AnswerTo(SpacetimeEvent<Harbour> arrival, ProperTime<Drone> pause)
    {
        CoordinateTime<Harbour> wait = pause * LorentzFactor<Harbour, Drone>.Of(Velocity);
        return SpacetimeEvent<Harbour>.At(
            arrival.Time + wait,
            arrival.Place + Displacement<Harbour>.FromMetres(Velocity.XInMetresPerSecond * wait.InSeconds));
    }
}
