using FrameSafe;

namespace Relay;

/// <summary>What radio does in vacuum.</summary>
internal static class Light
{
    /// <summary>The speed of light.</summary>
    [Unit("m/s")]
    public const double Speed = 299_792_458.0;

    /// <summary>How long a pulse takes over a stretch of the track.</summary>
    [return: Unit("s")]
    [return: InFrame<Harbour>]
    public static double TimeOver([Unit("m")] [InFrame<Harbour>] double stretch) => stretch / Speed;
}
