using FrameSafe;

namespace Relay;

/// <summary>A drone that the courier releases along the track, forward or astern, and that answers the station's pulses.</summary>
internal sealed class DroneCraft
{
    private readonly CourierShip _courier;

    public DroneCraft(
        string name,
        CourierShip courier,
        [Unit("s")] [OnClock<Courier>] double releasedAt,
        [Unit("m/s")] [InFrame<Courier>] double speed,
        [Unit("kg")] double mass)
    {
        Name = name;
        _courier = courier;
        ReleasedAt = releasedAt;
        Speed = speed;
        Mass = mass;
        CourierGamma = courier.Gamma;
        Gamma = LorentzFactor.Of(TrackSpeed);
    }

    public string Name { get; }

    /// <summary>When it is released, by the courier's clock.</summary>
    [Unit("s")]
    [OnClock<Courier>]
    public double ReleasedAt { get; }

    /// <summary>Its speed as the courier measures it; negative astern.</summary>
    [Unit("m/s")]
    [InFrame<Courier>]
    public double Speed { get; }

    /// <summary>Its mass.</summary>
    [Unit("kg")]
    public double Mass { get; }

    /// <summary>The Lorentz factor of the courier past the station.</summary>
    [Kind(QuantityKind.LorentzFactor)]
    [Between<Harbour, Courier>]
    public double CourierGamma { get; }

    /// <summary>The Lorentz factor of this drone past the station.</summary>
    [Kind(QuantityKind.LorentzFactor)]
    [Between<Harbour, Drone>]
    public double Gamma { get; }

    /// <summary>Its speed along the track as the harbour measures it.</summary>
    [Unit("m/s")]
    [InFrame<Harbour>]
    public double TrackSpeed
        => (_courier.Speed + Speed) / (1 + _courier.Speed / Light.Speed * (Speed / Light.Speed));

    /// <summary>Where it was released.</summary>
    [Unit("m")]
    [InFrame<Harbour>]
    public double ReleasePosition => _courier.PositionAt(_courier.TimeOf(ReleasedAt));

    /// <summary>Where it is at a time of the harbour after its release.</summary>
    [return: Unit("m")]
    [return: InFrame<Harbour>]
    public double PositionAt([Unit("s")] [InFrame<Harbour>] double time)
    {
        double sinceRelease = time - ReleasedAt * CourierGamma;
        return ReleasePosition + TrackSpeed * sinceRelease;
    }

    /// <summary>When a pulse that the station sends reaches the drone.</summary>
    [return: Unit("s")]
    [return: InFrame<Harbour>]
    public double ArrivalOf([Unit("s")] [InFrame<Harbour>] double sent)
    {
        // The pulse at c(t - sent) meets the drone at its position; both are linear in t.
        double head = PositionAt(sent);
        return sent + head / (Light.Speed - TrackSpeed);
    }

    /// <summary>When its answer leaves, after a pause that its own clock counts.</summary>
    [return: Unit("s")]
    [return: InFrame<Harbour>]
    public double AnswerTo([Unit("s")] [InFrame<Harbour>] double arrival, [Unit("s")] [OnClock<Drone>] double pause)
        => arrival + pause * Gamma;

    /// <summary>Its kinetic energy past the station, which a brake there would have to take up.</summary>
    [return: Unit("J")]
    [return: InFrame<Harbour>]
    [return: Kind(QuantityKind.KineticEnergy)]
    public double KineticEnergy() => Mass * TrackSpeed * TrackSpeed * Gamma * Gamma / (Gamma + 1);
}
