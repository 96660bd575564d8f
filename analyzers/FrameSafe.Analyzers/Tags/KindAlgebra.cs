using System.Collections.Generic;
using static FrameSafe.Analyzers.Tags.QuantityKind;

namespace FrameSafe.Analyzers.Tags;

/// <summary>What sums, products and quotients of kinds of quantity are, and which kinds do not mix though they share a dimension.</summary>
internal static class KindAlgebra
{
    private static readonly Dictionary<(QuantityKind, QuantityKind), QuantityKind> Products = new()
    {
        [(ProperTime, LorentzFactor)] = CoordinateTime,
        [(MeasuredLength, LorentzFactor)] = ProperLength,
        [(Velocity, LorentzFactor)] = Celerity,
        [(SpeedRatio, LorentzFactor)] = CelerityRatio,
        [(RestEnergy, LorentzFactor)] = TotalEnergy,
        [(Velocity, CoordinateTime)] = Displacement,
        [(Celerity, ProperTime)] = Displacement,
        [(Acceleration, CoordinateTime)] = SeparationRate,
        [(Mass, Celerity)] = Momentum,
        [(SpeedRatio, SignalSpeed)] = Velocity,
        [(CelerityRatio, SignalSpeed)] = Celerity,
        [(Frequency, DopplerFactor)] = Frequency,
        [(Torque, Angle)] = Energy,
        [(AngularVelocity, CoordinateTime)] = Angle,
        [(AngularVelocity, ProperTime)] = Angle,
        [(Rigidity, SignalSpeed)] = Unspecified,
    };

    private static readonly Dictionary<(QuantityKind, QuantityKind), QuantityKind> Quotients = new()
    {
        [(CoordinateTime, LorentzFactor)] = ProperTime,
        [(ProperLength, LorentzFactor)] = MeasuredLength,
        [(Celerity, LorentzFactor)] = Velocity,
        [(CelerityRatio, LorentzFactor)] = SpeedRatio,
        [(TotalEnergy, LorentzFactor)] = RestEnergy,
        [(Celerity, Velocity)] = LorentzFactor,
        [(CelerityRatio, SpeedRatio)] = LorentzFactor,
        [(TotalEnergy, RestEnergy)] = LorentzFactor,
        [(Momentum, Mass)] = Celerity,
        [(Displacement, ProperTime)] = Celerity,
        [(SeparationRate, CoordinateTime)] = Acceleration,
        [(Velocity, SignalSpeed)] = SpeedRatio,
        [(Celerity, SignalSpeed)] = CelerityRatio,
        [(Angle, CoordinateTime)] = AngularVelocity,
        [(Angle, ProperTime)] = AngularVelocity,
    };

    private static readonly Dictionary<(QuantityKind, QuantityKind), Misuse> ProductMisuses = new()
    {
        [(CoordinateTime, LorentzFactor)] = Misuse.CoordinateTimeByLorentz,
        [(ProperLength, LorentzFactor)] = Misuse.ProperLengthByLorentz,
    };

    private static readonly Dictionary<(QuantityKind, QuantityKind), Misuse> QuotientMisuses = new()
    {
        [(ProperTime, LorentzFactor)] = Misuse.ProperTimeOverLorentz,
        [(MeasuredLength, LorentzFactor)] = Misuse.MeasuredLengthOverLorentz,
        [(CoordinateTime, ProperTime)] = Misuse.CoordinateOverProperTime,
        [(ProperTime, CoordinateTime)] = Misuse.ProperOverCoordinateTime,
    };

    internal static QuantityKind Product(QuantityKind left, QuantityKind right)
        => Products.TryGetValue((left, right), out QuantityKind kind) || Products.TryGetValue((right, left), out kind)
            ? kind
            : Unspecified;

    internal static QuantityKind Quotient(QuantityKind left, QuantityKind right)
        => Quotients.TryGetValue((left, right), out QuantityKind kind) ? kind : Unspecified;

    internal static Misuse ProductMisuse(QuantityKind left, QuantityKind right)
        => ProductMisuses.TryGetValue((left, right), out Misuse misuse) || ProductMisuses.TryGetValue((right, left), out misuse)
            ? misuse
            : Misuse.None;

    internal static Misuse QuotientMisuse(QuantityKind left, QuantityKind right)
        => QuotientMisuses.TryGetValue((left, right), out Misuse misuse) ? misuse : Misuse.None;

    internal static bool IsEnergy(QuantityKind kind)
        => kind is TotalEnergy or KineticEnergy or RestEnergy or EnergyPerNucleon or EnergyPerCharge or Energy;

    /// <summary>The kind of a sum or difference, or of a choice between both, where nothing clashes.</summary>
    internal static QuantityKind Joined(QuantityKind left, QuantityKind right, Meeting meeting) => meeting switch
    {
        Meeting.Sum => Sum(left, right),
        Meeting.Difference => Difference(left, right),
        Meeting.Target => right == Unspecified ? left : right,
        _ => left == right ? left : Unspecified,
    };

    /// <summary>Whether two kinds do not mix, and how; null where they do or where one is not known.</summary>
    internal static ClashKind? Clash(QuantityKind left, QuantityKind right, Meeting meeting)
    {
        if (left == right || left == Unspecified || right == Unspecified)
            return null;
        if (Both(left, right, ProperTime, CoordinateTime))
            return ClashKind.ProperAndCoordinateTime;
        if (Both(left, right, Velocity, Celerity) || Both(left, right, SpeedRatio, CelerityRatio))
            return ClashKind.CelerityAndVelocity;
        // L₀ − L and L < L₀ are how contraction itself is looked at.
        if (Both(left, right, ProperLength, MeasuredLength))
            return meeting is Meeting.Difference or Meeting.Comparison ? null : ClashKind.ProperAndMeasuredLength;
        if (left == SeparationRate && right == Velocity)
            return meeting == Meeting.Target ? ClashKind.SeparationRateAsVelocity : null;
        if (IsEnergy(left) && IsEnergy(right))
            return EnergiesClash(left, right, meeting) ? ClashKind.EnergyKind : null;
        return AreApart(left, right, meeting) ? ClashKind.Quantity : null;
    }

    private static bool EnergiesClash(QuantityKind left, QuantityKind right, Meeting meeting)
    {
        if (left is EnergyPerNucleon or EnergyPerCharge || right is EnergyPerNucleon or EnergyPerCharge)
            return true;
        // Total less kinetic is the rest energy; kinetic against rest energy is the usual test for "relativistic".
        if (Both(left, right, KineticEnergy, TotalEnergy))
            return meeting != Meeting.Difference;
        return Both(left, right, KineticEnergy, RestEnergy) && meeting == Meeting.Target;
    }

    private static bool AreApart(QuantityKind left, QuantityKind right, Meeting meeting)
    {
        if ((left == Torque && IsEnergy(right)) || (right == Torque && IsEnergy(left)))
            return true;
        if (IsRate(left) && IsRate(right))
            return true;
        if (left == Angle || right == Angle)
        {
            return (left == Angle ? right : left) is SolidAngle or Number or LorentzFactor or Rapidity or DopplerFactor or ClockRate;
        }

        if (Both(left, right, Rapidity, SpeedRatio) || Both(left, right, Rapidity, LorentzFactor))
            return true;
        return Both(left, right, SpeedRatio, LorentzFactor) && meeting is not (Meeting.Sum or Meeting.Difference);
    }

    private static bool IsRate(QuantityKind kind) => kind is Frequency or Activity or AngularVelocity;

    private static QuantityKind Sum(QuantityKind left, QuantityKind right)
    {
        if (left == right)
        {
            // Sums of these are steps on the way to a mean: of a dimension, but of no kind.
            return left is Velocity or Celerity or Position or Epoch or LorentzFactor or SpeedRatio or CelerityRatio or DopplerFactor
                or ClockRate or Direction or PhaseSpeed or SignalSpeed
                ? Unspecified
                : left;
        }

        if (Both(left, right, Velocity, SeparationRate))
            return Velocity;
        if (Both(left, right, Position, Displacement))
            return Position;
        if (left == Epoch || right == Epoch)
            return Epoch;
        if (Both(left, right, ClockOffset, ProperTime))
            return ProperTime;
        if (Both(left, right, ClockOffset, CoordinateTime))
            return CoordinateTime;
        if (Both(left, right, KineticEnergy, RestEnergy) || Both(left, right, TotalEnergy, RestEnergy))
            return TotalEnergy;
        return IsEnergy(left) && IsEnergy(right) ? Energy : Unspecified;
    }

    private static QuantityKind Difference(QuantityKind left, QuantityKind right)
    {
        if (left == right)
        {
            return left switch
            {
                Velocity => SeparationRate,
                Position => Displacement,
                TotalEnergy or KineticEnergy or RestEnergy => Energy,
                Celerity or Epoch or LorentzFactor or SpeedRatio or CelerityRatio or DopplerFactor or ClockRate or Direction
                    or ProperLength or MeasuredLength or PhaseSpeed or SignalSpeed => Unspecified,
                _ => left,
            };
        }

        return (left, right) switch
        {
            (Velocity, SeparationRate) => Velocity,
            (Position, Displacement) => Position,
            (Epoch, _) => Epoch,
            (ProperTime, ClockOffset) => ProperTime,
            (CoordinateTime, ClockOffset) => CoordinateTime,
            (ProperTime, CoordinateTime) or (CoordinateTime, ProperTime) => ClockOffset,
            (TotalEnergy, KineticEnergy) => RestEnergy,
            (TotalEnergy, RestEnergy) => KineticEnergy,
            _ => IsEnergy(left) && IsEnergy(right) ? Energy : Unspecified,
        };
    }

    private static bool Both(QuantityKind left, QuantityKind right, QuantityKind one, QuantityKind other)
        => (left == one && right == other) || (left == other && right == one);
}
