namespace FrameSafe;

/// <summary>
/// What a number is a measure of, where the unit alone does not tell: kinds may share a dimension and still not mix.
/// </summary>
public enum QuantityKind
{
    /// <summary>Not said; inferred from the unit, the frame and the clock where they decide it.</summary>
    Unspecified = 0,

    /// <summary>A plain number.</summary>
    Number,
    /// <summary>A plane angle.</summary>
    Angle,
    /// <summary>A solid angle.</summary>
    SolidAngle,
    /// <summary>A direction: a unit vector or one of its components, in a frame.</summary>
    Direction,

    /// <summary>A place in a frame, or one coordinate of it.</summary>
    Position,
    /// <summary>The difference of two places in one frame.</summary>
    Displacement,
    /// <summary>The length of a body in its own rest frame.</summary>
    ProperLength,
    /// <summary>The length of a moving body, its ends taken at one coordinate time of the frame it is measured in.</summary>
    MeasuredLength,

    /// <summary>Velocity of something with a rest frame, or one component of it: below c.</summary>
    Velocity,
    /// <summary>The ratio v/c of a velocity, β.</summary>
    SpeedRatio,
    /// <summary>Celerity (proper velocity) γv: distance in a frame by proper time of the moving body; without bound.</summary>
    Celerity,
    /// <summary>The ratio γv/c of a celerity, γβ.</summary>
    CelerityRatio,
    /// <summary>The difference of two velocities in one frame: up to 2c, and the velocity of nothing.</summary>
    SeparationRate,
    /// <summary>The speed of a phase or of a pattern: any value.</summary>
    PhaseSpeed,
    /// <summary>The speed of a signal in a medium or in vacuum: up to c.</summary>
    SignalSpeed,
    /// <summary>Rapidity artanh(v/c).</summary>
    Rapidity,
    /// <summary>The Lorentz factor γ.</summary>
    LorentzFactor,
    /// <summary>The ratio of a received to an emitted frequency.</summary>
    DopplerFactor,

    /// <summary>Rate of change of a velocity with coordinate time.</summary>
    Acceleration,
    /// <summary>What an accelerometer reads.</summary>
    ProperAcceleration,
    /// <summary>Angular velocity.</summary>
    AngularVelocity,

    /// <summary>Elapsed time on one clock, along its worldline.</summary>
    ProperTime,
    /// <summary>Elapsed time in a frame, by its synchronised clocks.</summary>
    CoordinateTime,
    /// <summary>A date: time since a named origin on a time scale.</summary>
    Epoch,
    /// <summary>The difference of the readings of two clocks.</summary>
    ClockOffset,
    /// <summary>The ratio of two clocks' rates.</summary>
    ClockRate,

    /// <summary>Frequency of something periodic.</summary>
    Frequency,
    /// <summary>Decays (or other random events) by time.</summary>
    Activity,
    /// <summary>A wave number or a component of a wave vector.</summary>
    WaveNumber,

    /// <summary>Mass: invariant (rest) mass.</summary>
    Mass,
    /// <summary>Total energy, rest energy included.</summary>
    TotalEnergy,
    /// <summary>Kinetic energy: total less rest energy.</summary>
    KineticEnergy,
    /// <summary>Rest energy mc².</summary>
    RestEnergy,
    /// <summary>Energy by nucleon.</summary>
    EnergyPerNucleon,
    /// <summary>Energy by elementary charge.</summary>
    EnergyPerCharge,
    /// <summary>An energy that is none of the kinds above: of a photon, of a bond, electrical.</summary>
    Energy,
    /// <summary>Torque (moment of force).</summary>
    Torque,
    /// <summary>Momentum, or one component of it.</summary>
    Momentum,
    /// <summary>Magnetic rigidity p/q.</summary>
    Rigidity,
    /// <summary>Force.</summary>
    Force,

    /// <summary>Electric field strength.</summary>
    ElectricField,
    /// <summary>Magnetic flux density.</summary>
    MagneticField,
    /// <summary>Gravitational potential.</summary>
    GravitationalPotential,

    /// <summary>The interval c²Δt² − |Δx|², or its root.</summary>
    Interval,
    /// <summary>Invariant mass of a system, or its square.</summary>
    InvariantMass,
}
