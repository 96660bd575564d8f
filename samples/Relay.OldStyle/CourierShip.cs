using FrameSafe;

namespace Relay;

/// <summary>
/// The courier: passes the station at time zero of every clock concerned and keeps its speed. It tows a marker buoy on a
/// long line straight ahead of itself.
/// </summary>
internal sealed class CourierShip
{
    public CourierShip([Unit("m/s")] [InFrame<Harbour>] double speed, [Unit("m")] [InFrame<Courier>] double markerOffset)
    {
        Speed = speed;
        MarkerOffset = markerOffset;
        Gamma = LorentzFactor.Of(speed);
    }

    /// <summary>Its speed along the track.</summary>
    [Unit("m/s")]
    [InFrame<Harbour>]
    public double Speed { get; }

    /// <summary>The Lorentz factor of the courier's motion past the station.</summary>
    [Kind(QuantityKind.LorentzFactor)]
    [Between<Harbour, Courier>]
    public double Gamma { get; }

    /// <summary>How far ahead the marker buoy is kept, by the courier's own measure.</summary>
    [Unit("m")]
    [InFrame<Courier>]
    public double MarkerOffset { get; }

    /// <summary>Where the courier is at a time of the harbour.</summary>
    [return: Unit("m")]
    [return: InFrame<Harbour>]
    public double PositionAt([Unit("s")] [InFrame<Harbour>] double time) => Speed * time;

    /// <summary>What the courier's own clock shows at a time of the harbour.</summary>
    [return: Unit("s")]
    [return: OnClock<Courier>]
    public double ClockAt([Unit("s")] [InFrame<Harbour>] double time) => time * Gamma;

    /// <summary>The time of the harbour at which the courier's own clock shows a reading.</summary>
    [return: Unit("s")]
    [return: InFrame<Harbour>]
    public double TimeOf([Unit("s")] [OnClock<Courier>] double reading) => reading * Gamma;

    /// <summary>
    /// An offset that is fixed on board, as the harbour finds it with both ends taken at one time of the harbour.
    /// </summary>
    [FrameBoundary]
    [Carries<Courier, Harbour>]
    [return: Unit("m")]
    [return: InFrame<Harbour>]
    public double AlongTrack([Unit("m")] [InFrame<Courier>] double offset) => offset / Gamma;

    /// <summary>Where the marker buoy is at a time of the harbour.</summary>
    [return: Unit("m")]
    [return: InFrame<Harbour>]
    public double MarkerAt([Unit("s")] [InFrame<Harbour>] double time) => PositionAt(time) + MarkerOffset;

    /// <summary>When a pulse that the station sends reaches the courier.</summary>
    [return: Unit("s")]
    [return: InFrame<Harbour>]
    public double ArrivalOf([Unit("s")] [InFrame<Harbour>] double sent)
    {
        double gain = Light.Speed - Speed;
        return sent * Light.Speed / gain;
    }
}
