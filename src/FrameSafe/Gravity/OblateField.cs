namespace FrameSafe;

/// <summary>The weak field of a body flattened by its rotation: the monopole and J₂.</summary>
/// <remarks>
/// φ = −(GM/r)(1 − J₂(a/r)²(3sin²λ − 1)/2), with λ the geocentric latitude. Higher harmonics of the Earth change the rate of a clock by
/// less than 1e-15. Source: N. Ashby, Living Rev. Relativ. 6 (2003) 1, section 3.
/// </remarks>
public readonly struct OblateField
{
    private OblateField(double gm, double j2, double equatorialRadius)
    {
        GravitationalParameter = gm;
        J2 = j2;
        EquatorialRadius = equatorialRadius;
    }

    /// <summary>The Earth: GM = 3.986004418e14 m³/s², J₂ = 1.0826359e-3, a = 6 378 136.6 m (IERS Conventions 2010, table 1.1).</summary>
    public static OblateField Earth => new(3.986004418e14, 1.0826359e-3, 6378136.6);

    /// <summary>GM.</summary>
    [Unit("m3/s2")]
    public double GravitationalParameter { get; }

    /// <summary>J₂, the dynamical form factor.</summary>
    [Unit("1")]
    public double J2 { get; }

    /// <summary>The equatorial radius a to which J₂ refers.</summary>
    [Unit("m")]
    public double EquatorialRadius { get; }

    /// <summary>A field from its constants.</summary>
    /// <param name="gm">GM; above 0.</param>
    /// <param name="j2">J₂; from −1 to 1.</param>
    /// <param name="equatorialRadius">The radius to which J₂ refers; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">A constant is out of its range.</exception>
    public static OblateField FromConstants([Unit("m3/s2")] double gm, [Unit("1")] double j2, [Unit("m")] double equatorialRadius) =>
        new(Require.Positive(gm), Require.Within(j2, -1, 1), Require.Positive(equatorialRadius));

    /// <summary>The potential φ; negative.</summary>
    /// <param name="radius">The distance from the body's centre; above 0.</param>
    /// <param name="sineOfLatitude">The sine of the geocentric latitude, z/r; from −1 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range.</exception>
    [return: Unit("m2/s2")]
    [return: Kind(QuantityKind.GravitationalPotential)]
    public double Potential([Unit("m")] double radius, [Unit("1")] double sineOfLatitude) => ExactPotential(radius, sineOfLatitude).High;

    /// <summary>A clock at a place, at rest in the frame that does not turn or moving in it.</summary>
    /// <param name="radius">The distance from the body's centre; above 0.</param>
    /// <param name="sineOfLatitude">The sine of the geocentric latitude, z/r; from −1 to 1.</param>
    /// <param name="speed">The speed in the frame that does not turn; from 0 on.</param>
    /// <typeparam name="TClock">The clock's name.</typeparam>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of its range, or the field is not weak there.</exception>
    public FieldClock<TClock> Clock<TClock>([Unit("m")] double radius, [Unit("1")] double sineOfLatitude, [Unit("m/s")] double speed = 0)
        where TClock : struct, IClock => WeakField.Clock<TClock>(ExactPotential(radius, sineOfLatitude), speed);

    private Extended ExactPotential(double radius, double sineOfLatitude)
    {
        Require.Positive(radius);
        Require.Within(sineOfLatitude, -1, 1);
        Extended scale = (Extended)EquatorialRadius / radius;
        Extended legendre = (Extended.Product(sineOfLatitude, sineOfLatitude) * 3 - 1) * 0.5;
        Extended flattening = scale * scale * legendre * J2;
        return -((Extended)GravitationalParameter / radius) * ((Extended)1 - flattening);
    }
}
