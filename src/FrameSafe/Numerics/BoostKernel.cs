namespace FrameSafe;

/// <summary>The boost of a four-vector by a celerity ratio.</summary>
internal static class BoostKernel
{
    /// <summary>
    /// t′ = γt ± w·r, r′ = r + w(w·r/(1 + γ) ± t); minus into the frame that moves with w, plus out of it. The products of each
    /// sum are kept exact until they meet, for near a worldline they nearly cancel.
    /// </summary>
    internal static (double Time, Triple Space) Apply(Triple ratio, double time, Triple space, int sign)
        => Apply(ratio, Celerity.LorentzFactor(ratio.Norm), time, space, sign);

    /// <summary>The same, where γ is known already.</summary>
    internal static (double Time, Triple Space) Apply(Triple ratio, double lorentz, double time, Triple space, int sign)
    {
        double along = ratio.Dot(space);
        double carried = Math.FusedMultiplyAdd(lorentz, time, sign * along);
        double factor = (along / (1 + lorentz)) + (sign * time);
        return (carried, space.Plus(ratio, factor));
    }

    /// <summary>The same of a celerity ratio, whose time part is γ; in twice the precision where the two motions nearly cancel.</summary>
    internal static Triple Compose(Triple ratio, Triple moving, int sign)
    {
        double lorentz = Celerity.LorentzFactor(moving.Norm);
        double along = ratio.Dot(moving);
        // Carried out of the other's motion (minus) alike directions cancel, into it (plus) opposite ones.
        if (sign * along >= 0 || Math.Abs(along) < 1e-3 * lorentz)
            return Apply(ratio, lorentz, moving, sign).Space;
        ExtendedTriple w = ExtendedTriple.Of(ratio);
        ExtendedTriple u = ExtendedTriple.Of(moving);
        Extended factor = (w.Dot(u) / (Extended.Sqrt(w.Square + 1) + 1)) + (Extended.Sqrt(u.Square + 1) * sign);
        return (u + (w * factor)).High;
    }
}
