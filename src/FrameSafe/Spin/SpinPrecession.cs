namespace FrameSafe;

/// <summary>The precession of a particle's spin in fields, as the laboratory counts it, with the spin given in the particle's rest frame.</summary>
/// <remarks>
/// Thomas–BMT: Ω = −(q/m)[(a + 1/γ)B − aγ/(γ + 1)(β·B)β − (a + 1/(γ + 1))β × E/c], a = (g − 2)/2 (V. Bargmann, L. Michel,
/// V. L. Telegdi, Phys. Rev. Lett. 2 (1959) 435; J. D. Jackson, Classical Electrodynamics, 3rd ed., section 11.11).
/// </remarks>
/// <typeparam name="TLab">The frame of the laboratory.</typeparam>
public readonly struct SpinPrecession<TLab>
    where TLab : struct, IFrame
{
    private readonly double _chargeOverMass;
    private readonly double _anomaly;

    private SpinPrecession(double chargeOverMass, double anomaly)
    {
        _chargeOverMass = chargeOverMass;
        _anomaly = anomaly;
    }

    /// <summary>A particle by its charge, mass and gyromagnetic anomaly.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The mass is not above 0, or a number is not finite.</exception>
    public static SpinPrecession<TLab> Of([Unit("C")] double charge, Mass mass, [Unit("1")] double anomaly)
        => new(Require.Finite(charge) / Require.Positive(mass.InKilograms), Require.Finite(anomaly));

    /// <summary>The angular velocity of the spin.</summary>
    [return: Unit("rad/s")]
    [return: InFrame(nameof(TLab))]
    public (double X, double Y, double Z) OfSpin(Velocity<TLab> velocity, ElectromagneticField<TLab> field) => Parts(Spin(velocity, field));

    /// <summary>The angular velocity of the direction of motion: (q/mγ)[β × E/(cβ²) − B⊥].</summary>
    /// <exception cref="ArgumentException">The particle is at rest and goes nowhere.</exception>
    [return: Unit("rad/s")]
    [return: InFrame(nameof(TLab))]
    public (double X, double Y, double Z) OfMotion(Velocity<TLab> velocity, ElectromagneticField<TLab> field) => Parts(Motion(velocity, field));

    /// <summary>The angular velocity of the spin against the direction of motion.</summary>
    /// <exception cref="ArgumentException">The particle is at rest and goes nowhere.</exception>
    [return: Unit("rad/s")]
    [return: InFrame(nameof(TLab))]
    public (double X, double Y, double Z) OfSpinAgainstMotion(Velocity<TLab> velocity, ElectromagneticField<TLab> field)
    {
        // Both in twice the precision: what they share cancels without loss.
        ExtendedTriple spin = Spin(velocity, field);
        ExtendedTriple motion = Motion(velocity, field);
        return Parts(spin + (motion * -1));
    }

    /// <summary>The angular velocity of the motion across a magnetic field, along it: −qB/γm.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The field is not finite.</exception>
    [return: Unit("rad/s")]
    [return: InFrame(nameof(TLab))]
    public double CyclotronAngularVelocity([Unit("T"), InFrame(nameof(TLab))] double field, [Kind(QuantityKind.LorentzFactor)] double lorentzFactor)
        => -_chargeOverMass * Require.Finite(field) / Require.Within(lorentzFactor, 1, double.MaxValue);

    /// <summary>The angular velocity of the spin across a magnetic field, along it: −(q/m)B(a + 1/γ).</summary>
    /// <exception cref="ArgumentOutOfRangeException">The field is not finite.</exception>
    [return: Unit("rad/s")]
    [return: InFrame(nameof(TLab))]
    public double SpinAngularVelocity([Unit("T"), InFrame(nameof(TLab))] double field, [Kind(QuantityKind.LorentzFactor)] double lorentzFactor)
        => (((Extended)1 / Require.Within(lorentzFactor, 1, double.MaxValue)) + _anomaly).High * -_chargeOverMass * Require.Finite(field);

    /// <summary>The angular velocity of the spin against the motion across a magnetic field, along it: −(q/m)aB; independent of γ.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The field is not finite.</exception>
    [return: Unit("rad/s")]
    [return: InFrame(nameof(TLab))]
    public double AnomalousAngularVelocity([Unit("T"), InFrame(nameof(TLab))] double field) => -_chargeOverMass * _anomaly * Require.Finite(field);

    /// <summary>Turns of the spin against the motion in one turn of the motion: aγ.</summary>
    [return: Unit("1")]
    public double SpinTune([Kind(QuantityKind.LorentzFactor)] double lorentzFactor) => _anomaly * Require.Within(lorentzFactor, 1, double.MaxValue);

    /// <summary>γ of the motion at which an electric field leaves spin and motion together: √(1 + 1/a).</summary>
    /// <exception cref="InvalidOperationException">The anomaly is not positive: there is none.</exception>
    [return: Kind(QuantityKind.LorentzFactor)]
    public double MagicLorentzFactor()
        => _anomaly > 0
            ? Math.Sqrt(1 + (1 / _anomaly))
            : throw new InvalidOperationException(FormattableString.Invariant($"With an anomaly of {_anomaly:R} there is no magic energy; it must be above 0."));

    /// <summary>Thomas precession γ²/(γ + 1) a × v/c² of a body with an acceleration in the laboratory.</summary>
    /// <remarks>L. H. Thomas, Nature 117 (1926) 514; Jackson, eq. 11.119.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">A component is not finite.</exception>
    [return: Unit("rad/s")]
    [return: InFrame(nameof(TLab))]
    public static (double X, double Y, double Z) Thomas(
        Velocity<TLab> velocity, [Unit("m/s2"), InFrame(nameof(TLab)), Kind(QuantityKind.Acceleration)] (double X, double Y, double Z) acceleration)
    {
        Triple given = Door.Finite(new(acceleration.X, acceleration.Y, acceleration.Z), nameof(acceleration));
        double lorentz = velocity.LorentzFactor;
        // γ²v = γcw.
        return Parts(ExtendedTriple.Of(given).Cross(ExtendedTriple.Of(velocity.Ratio)) * (lorentz / (lorentz + 1) / PhysicsOfLight.Speed));
    }

    private static (double X, double Y, double Z) Parts(ExtendedTriple value) => (value.X.High, value.Y.High, value.Z.High);

    private ExtendedTriple Spin(Velocity<TLab> velocity, ElectromagneticField<TLab> field)
    {
        ExtendedTriple w = ExtendedTriple.Of(velocity.Ratio);
        Extended lorentz = Extended.Sqrt(w.Square + 1);
        ExtendedTriple magnetic = ExtendedTriple.Of(field.Magnetic);
        ExtendedTriple electric = ExtendedTriple.Of(field.Electric);
        Extended anomaly = _anomaly;
        Extended one = 1;
        // β = w/γ throughout.
        ExtendedTriple sum = (magnetic * (anomaly + (one / lorentz)))
            + (w * (-(anomaly / (lorentz * (lorentz + one)) * w.Dot(magnetic))))
            + (w.Cross(electric) * (-((anomaly + (one / (lorentz + one))) / (lorentz * PhysicsOfLight.Speed))));
        return sum * -_chargeOverMass;
    }

    private ExtendedTriple Motion(Velocity<TLab> velocity, ElectromagneticField<TLab> field)
    {
        ExtendedTriple w = ExtendedTriple.Of(velocity.Ratio);
        Extended square = w.Square;
        if (square.High == 0)
            throw new ArgumentException("A particle at rest has no direction of motion.", nameof(velocity));
        Extended lorentz = Extended.Sqrt(square + 1);
        ExtendedTriple magnetic = ExtendedTriple.Of(field.Magnetic);
        // B⊥ = B − (w·B)w/w²; β × E/(cβ²) = γ w × E/(c w²).
        ExtendedTriple across = magnetic + (w * (-(w.Dot(magnetic) / square)));
        ExtendedTriple push = w.Cross(ExtendedTriple.Of(field.Electric)) * (lorentz / (square * PhysicsOfLight.Speed));
        return (push + (across * -1)) * (_chargeOverMass / lorentz);
    }
}
