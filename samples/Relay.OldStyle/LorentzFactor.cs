using System;
using FrameSafe;

namespace Relay;

/// <summary>The Lorentz factor, from a speed in metres per second.</summary>
internal static class LorentzFactor
{
    /// <summary>γ of a speed below that of light.</summary>
    public static double Of([Unit("m/s")] double speed)
        => Light.Speed / Math.Sqrt((Light.Speed - speed) * (Light.Speed + speed));
}
