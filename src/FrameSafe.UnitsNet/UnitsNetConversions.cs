using UnitsNet;
using UnitsNet.Units;

namespace FrameSafe;

/// <summary>
/// Quantities of UnitsNet in and out. A quantity of UnitsNet has a unit and no frame or clock: the type argument names whose it is
/// on the way in, and on the way out it is let go. Each conversion rounds as often as UnitsNet's own to the SI does.
/// </summary>
public static class UnitsNetConversions
{
    /// <summary>A duration as a coordinate time of a frame.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is not finite.</exception>
    public static CoordinateTime<TFrame> ToCoordinateTime<TFrame>(this Duration duration)
        where TFrame : struct, IFrame
        => CoordinateTime<TFrame>.FromSeconds(duration.Seconds);

    /// <summary>A duration as a proper time of a clock.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is not finite.</exception>
    public static ProperTime<TClock> ToProperTime<TClock>(this Duration duration)
        where TClock : struct, IClock
        => ProperTime<TClock>.FromSeconds(duration.Seconds);

    /// <summary>A coordinate time as a duration.</summary>
    public static Duration ToDuration<TFrame>(this CoordinateTime<TFrame> time)
        where TFrame : struct, IFrame
        => Duration.FromSeconds(time.InSeconds);

    /// <summary>A proper time as a duration.</summary>
    public static Duration ToDuration<TClock>(this ProperTime<TClock> time)
        where TClock : struct, IClock
        => Duration.FromSeconds(time.InSeconds);

    /// <summary>Three lengths as a displacement in a frame.</summary>
    /// <exception cref="ArgumentOutOfRangeException">One is not finite.</exception>
    public static Displacement<TFrame> ToDisplacement<TFrame>(this (Length X, Length Y, Length Z) lengths)
        where TFrame : struct, IFrame
        => Displacement<TFrame>.FromMetres(lengths.X.Meters, lengths.Y.Meters, lengths.Z.Meters);

    /// <summary>The components of a displacement as lengths.</summary>
    public static (Length X, Length Y, Length Z) ToLengths<TFrame>(this Displacement<TFrame> displacement)
        where TFrame : struct, IFrame
        => (Length.FromMeters(displacement.XInMetres), Length.FromMeters(displacement.YInMetres), Length.FromMeters(displacement.ZInMetres));

    /// <summary>Three speeds as the components of a velocity in a frame.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The size is not below that of light.</exception>
    public static Velocity<TFrame> ToVelocity<TFrame>(this (Speed X, Speed Y, Speed Z) speeds)
        where TFrame : struct, IFrame
        => Velocity<TFrame>.FromMetresPerSecond(speeds.X.MetersPerSecond, speeds.Y.MetersPerSecond, speeds.Z.MetersPerSecond);

    /// <summary>The components of a velocity as speeds.</summary>
    public static (Speed X, Speed Y, Speed Z) ToSpeeds<TFrame>(this Velocity<TFrame> velocity)
        where TFrame : struct, IFrame
        => (
            Speed.FromMetersPerSecond(velocity.XInMetresPerSecond),
            Speed.FromMetersPerSecond(velocity.YInMetresPerSecond),
            Speed.FromMetersPerSecond(velocity.ZInMetresPerSecond));

    /// <summary>A mass.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is negative or not finite.</exception>
    public static Mass ToMass(this global::UnitsNet.Mass mass) => Mass.FromKilograms(mass.Kilograms);

    /// <summary>A mass as UnitsNet's.</summary>
    public static global::UnitsNet.Mass ToUnitsNet(this Mass mass) => global::UnitsNet.Mass.FromKilograms(mass.InKilograms);

    /// <summary>An energy as the kinetic energy of a body in a frame.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is negative or not finite.</exception>
    public static KineticEnergy<TFrame> ToKineticEnergy<TFrame>(this Energy energy)
        where TFrame : struct, IFrame
        => KineticEnergy<TFrame>.FromJoules(ToJoules(energy));

    /// <summary>An energy as the total energy of a body in a frame, rest energy included.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is negative or not finite.</exception>
    public static TotalEnergy<TFrame> ToTotalEnergy<TFrame>(this Energy energy)
        where TFrame : struct, IFrame
        => TotalEnergy<TFrame>.FromJoules(ToJoules(energy));

    /// <summary>A kinetic energy as an energy.</summary>
    public static Energy ToEnergy<TFrame>(this KineticEnergy<TFrame> energy)
        where TFrame : struct, IFrame
        => Energy.FromJoules(energy.InJoules);

    /// <summary>A total energy as an energy.</summary>
    public static Energy ToEnergy<TFrame>(this TotalEnergy<TFrame> energy)
        where TFrame : struct, IFrame
        => Energy.FromJoules(energy.InJoules);

    /// <summary>A frequency as that of light going in a direction of a frame.</summary>
    /// <exception cref="ArgumentOutOfRangeException">It is negative or not finite.</exception>
    public static PlaneWave<TFrame> ToPlaneWave<TFrame>(this Frequency frequency, Direction<TFrame> direction)
        where TFrame : struct, IFrame
        => PlaneWave<TFrame>.FromHertz(frequency.Hertz, direction);

    /// <summary>The frequency of a wave.</summary>
    public static Frequency ToFrequency<TFrame>(this PlaneWave<TFrame> wave)
        where TFrame : struct, IFrame
        => Frequency.FromHertz(wave.FrequencyInHertz);

    // The electronvolt is exact since 2019 (SI Brochure, 9th ed., section 2.2: 1.602 176 634e-19 J); UnitsNet's own factor is older.
    private static double ToJoules(Energy energy) => energy.Unit switch
    {
        EnergyUnit.ElectronVolt => energy.Value * 1.602176634e-19,
        EnergyUnit.KiloelectronVolt => energy.Value * 1.602176634e-16,
        EnergyUnit.MegaelectronVolt => energy.Value * 1.602176634e-13,
        EnergyUnit.GigaelectronVolt => energy.Value * 1.602176634e-10,
        EnergyUnit.TeraelectronVolt => energy.Value * 1.602176634e-7,
        _ => energy.Joules,
    };
}
