namespace FrameSafe.Analyzers.Tags;

/// <summary>
/// A trace of the Lorentz factor applied in a direction that gives no quantity of the other kind, or of times by two clocks in
/// one ratio. Nothing is wrong yet: it becomes wrong where the number is taken for something that it is not.
/// </summary>
internal enum Misuse
{
    None = 0,

    /// <summary>t·γ: not a proper time.</summary>
    CoordinateTimeByLorentz,

    /// <summary>τ/γ: not a coordinate time.</summary>
    ProperTimeOverLorentz,

    /// <summary>L₀·γ: not a measured length.</summary>
    ProperLengthByLorentz,

    /// <summary>L/γ: not a proper length.</summary>
    MeasuredLengthOverLorentz,

    /// <summary>t/τ: harmless as a ratio, wrong as the argument of a decay law.</summary>
    CoordinateOverProperTime,

    /// <summary>τ/t, as above.</summary>
    ProperOverCoordinateTime,
}
