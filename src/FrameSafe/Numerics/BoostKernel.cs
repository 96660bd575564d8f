namespace FrameSafe;

/// <summary>The boost of a four-vector by a celerity ratio.</summary>
internal static class BoostKernel
{
    /// <summary>
    /// t′ = γt ± w·r, r′ = r + w(w·r/(1 + γ) ± t); minus into the frame that moves with w, plus out of it. The products of each
    /// sum are kept exact until they meet, for near a worldline they nearly cancel.
    /// </summary>
    internal static (double Time, Triple Space) Apply(Triple ratio, double time, Triple space, int sign)
    {
        double lorentz = Celerity.LorentzFactor(ratio.Norm);
        double along = ratio.Dot(space);
        double carried = Math.FusedMultiplyAdd(lorentz, time, sign * along);
        double factor = (along / (1 + lorentz)) + (sign * time);
        return (carried, space.Plus(ratio, factor));
    }
}
