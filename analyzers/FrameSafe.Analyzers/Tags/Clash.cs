namespace FrameSafe.Analyzers.Tags;

/// <summary>What disagrees where two tags meet.</summary>
/// <param name="Kind">What disagrees, the most telling of several.</param>
/// <param name="Left">The left one, or the value.</param>
/// <param name="Right">The right one, or the target.</param>
/// <param name="Meeting">How they meet.</param>
internal sealed record Clash(ClashKind Kind, Tag Left, Tag Right, Meeting Meeting);

/// <summary>What can disagree, the most telling first: of several disagreements at one place the first is reported.</summary>
internal enum ClashKind
{
    /// <summary>Dimensions: a length and a time.</summary>
    Dimension,

    /// <summary>A number in natural units and one in the SI that differ by a power of c or ħ.</summary>
    NaturalUnits,

    /// <summary>Units of one dimension: km and m.</summary>
    Unit,

    /// <summary>Quantities that share a dimension and still do not mix: torque and energy, frequency and activity.</summary>
    Quantity,

    /// <summary>Velocities of different frames are added or subtracted.</summary>
    VelocityFrames,

    /// <summary>Coordinate times of different frames are compared.</summary>
    Simultaneity,

    /// <summary>Frames.</summary>
    Frame,

    /// <summary>Time scales: TAI and UTC.</summary>
    TimeScale,

    /// <summary>A proper time and a coordinate time.</summary>
    ProperAndCoordinateTime,

    /// <summary>Proper times of different clocks.</summary>
    Clock,

    /// <summary>The Lorentz factor was applied the wrong way round: t·γ taken for a proper time.</summary>
    LorentzDirection,

    /// <summary>A proper and a measured length.</summary>
    ProperAndMeasuredLength,

    /// <summary>A celerity and a velocity (or γβ and β).</summary>
    CelerityAndVelocity,

    /// <summary>A separation rate goes where a velocity is wanted.</summary>
    SeparationRateAsVelocity,

    /// <summary>Kinetic, total and rest energy, or energy by nucleon or charge.</summary>
    EnergyKind,

    /// <summary>Lorentz factors or their like between different frames.</summary>
    FramePair,

    /// <summary>Results of two different transforms into one family of frames.</summary>
    Passage,
}
