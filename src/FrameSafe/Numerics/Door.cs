using System.Runtime.CompilerServices;

namespace FrameSafe;

/// <summary>Refuses speeds that nothing with a rest frame has, and numbers that are none, naming argument, value and allowed range.</summary>
internal static class Door
{
    internal static Triple Celerity(Triple ratio, string parameter)
    {
        double size = ratio.Norm;
        if (!(size <= FrameSafe.Celerity.Largest))
            throw Require.Outside(size, parameter, FormattableString.Invariant($"a celerity ratio of at most {FrameSafe.Celerity.Largest:R} in size"));
        return ratio;
    }

    internal static Triple SpeedRatio(Triple ratio, string parameter)
    {
        double size = ratio.Norm;
        if (!(size < 1))
        {
            string hint = size is > 1 and <= 100 ? " (a fraction of c, not a percentage)" : "";
            throw Require.Outside(size, parameter, "below 1 in size, the speed of light" + hint);
        }

        return ratio * (1 / Math.Sqrt((1 - size) * (1 + size)));
    }

    internal static Triple MetresPerSecond(Triple velocity, string parameter)
    {
        double size = velocity.Norm;
        if (!(size < PhysicsOfLight.Speed))
            throw Require.Outside(size, parameter, "below the speed of light, 299792458 m/s, in size");
        return velocity * (1 / Math.Sqrt((PhysicsOfLight.Speed - size) * (PhysicsOfLight.Speed + size)));
    }

    internal static Triple Finite(Triple value, [CallerArgumentExpression(nameof(value))] string parameter = "")
        => value.IsFinite ? value : throw Require.Outside(double.IsFinite(value.X) ? double.IsFinite(value.Y) ? value.Z : value.Y : value.X, parameter, "finite");
}
