using FrameSafe;

namespace TripDiagram;

/// <summary>The home port, at rest.</summary>
public readonly struct Port : IInertialFrame;

/// <summary>The ship's own clock.</summary>
public readonly struct Ship : IClock;

/// <summary>A trip from the port to a far beacon: the ship accelerates, coasts and brakes, and stays there.</summary>
internal sealed class Course
{
    private readonly double _acceleration;
    private readonly double _way;

    public Course([Unit("m/s2"), Kind(QuantityKind.ProperAcceleration)] double acceleration, [Unit("m")] double way, [Kind(QuantityKind.CelerityRatio)] double cruise)
    {
        _acceleration = acceleration;
        _way = way;
        Trip = Trip<Port, Ship>.Coast(acceleration, way, cruise);
    }

    public Trip<Port, Ship> Trip { get; }

    /// <summary>Where the ship is at a time of the port.</summary>
    public Displacement<Port> PlaceAt(CoordinateTime<Port> time)
    {
        CoordinateTime<Port> speeding = Trip.Peak.Time;
        if (time.InSeconds <= 0)
            return Displacement<Port>.Zero;
        if (time <= speeding)
            return AcceleratedMotion<Port, Ship>.AfterTime(_acceleration, time).Distance;
        if (time >= Trip.HomeTime)
            return Displacement<Port>.FromMetres(_way);
        if (time >= Trip.HomeTime - speeding)
            return Displacement<Port>.FromMetres(_way) - AcceleratedMotion<Port, Ship>.AfterTime(_acceleration, Trip.HomeTime - time).Distance;
        return Trip.Peak.Distance + Displacement<Port>.FromMetres(Trip.Peak.Velocity.XInMetresPerSecond * (time - speeding).InSeconds);
    }

    /// <summary>What the ship's clock shows at a time of the port.</summary>
    public ProperTime<Ship> ClockAt(CoordinateTime<Port> time)
    {
        CoordinateTime<Port> speeding = Trip.Peak.Time;
        if (time <= speeding)
            return AcceleratedMotion<Port, Ship>.AfterTime(_acceleration, time).ProperTime;
        if (time >= Trip.HomeTime)
            return Trip.ShipTime + ProperTime<Ship>.FromSeconds((time - Trip.HomeTime).InSeconds);
        if (time >= Trip.HomeTime - speeding)
            return Trip.ShipTime - AcceleratedMotion<Port, Ship>.AfterTime(_acceleration, Trip.HomeTime - time).ProperTime;
        return Trip.Peak.ProperTime + ProperTime<Ship>.FromSeconds((time - speeding).InSeconds / Trip.Peak.Velocity.LorentzFactor);
    }

    /// <summary>The time of the port at which the ship's clock shows a reading, by halving.</summary>
    public CoordinateTime<Port> TimeOf(ProperTime<Ship> reading)
    {
        double from = 0;
        double to = Trip.HomeTime.InSeconds + reading.InSeconds;
        for (int i = 0; i < 100; i++)
        {
            double middle = (from + to) / 2;
            if (ClockAt(CoordinateTime<Port>.FromSeconds(middle)) < reading)
                from = middle;
            else
                to = middle;
        }

        return CoordinateTime<Port>.FromSeconds(to);
    }
}
