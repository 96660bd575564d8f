using FrameSafe;

namespace Relay;

/// <summary>What radio does in vacuum, along the track.</summary>
internal static class Light
{
    private const double Speed = 299_792_458.0;

    /// <summary>How long a pulse takes over a stretch.</summary>
    public static CoordinateTime<Harbour> TimeOver(Displacement<Harbour> stretch)
        => CoordinateTime<Harbour>.FromSeconds(stretch.LengthInMetres / Speed);

    /// <summary>Where a pulse sent ahead along the track catches a body that was at an event and keeps its velocity.</summary>
    /// <remarks>Both are linear in time: the gap that light has to make up shrinks by c − v a second.</remarks>
    public static SpacetimeEvent<Harbour> Meeting(SpacetimeEvent<Harbour> pulse, SpacetimeEvent<Harbour> body, Velocity<Harbour> velocity)
    {
        SpacetimeInterval<Harbour> ahead = body - pulse;
        double gap = ahead.Displacement.XInMetres - velocity.XInMetresPerSecond * ahead.Time.InSeconds;
        CoordinateTime<Harbour> flight = CoordinateTime<Harbour>.FromSeconds(gap / (velocity.OneMinusSpeedRatioAhead() * Speed));
        return SpacetimeEvent<Harbour>.At(
            pulse.Time + flight, pulse.Place + Displacement<Harbour>.FromMetres(flight.LightDistanceInMetres()));
    }

    // 1 − v/c along the track, whichever way the body goes.
    private static double OneMinusSpeedRatioAhead(this Velocity<Harbour> velocity)
        => velocity.XRatio >= 0 ? velocity.OneMinusSpeedRatio : 1 - velocity.XRatio;
}
