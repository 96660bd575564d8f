using FrameSafe;

namespace Relay;

/// <summary>
/// A relay of timing pulses. The station sends them along a track; a courier outward bound and the drones it has released
/// receive them, and the drones answer. What is wanted: when everything arrives, how far the clocks have drifted apart, and
/// what energy the drones carry.
/// </summary>
internal static class Program
{
    private const int Pulses = 6;

    [Unit("s")]
    [OnClock<Drone>]
    private const double AnswerPause = 2.5;

    private static void Main()
    {
        var station = new Station(interval: 1800.0, receiverBehind: 640.0);
        var courier = new CourierShip(speed: 0.42 * Light.Speed, markerOffset: 3.6e7);
        DroneCraft[] drones =
        [
            new("Lark", courier, releasedAt: 900.0, speed: 0.16 * Light.Speed, mass: 850.0),
            new("Dunlin", courier, releasedAt: 1200.0, speed: 0.08 * Light.Speed, mass: 850.0),
            new("Wren", courier, releasedAt: 1500.0, speed: -0.11 * Light.Speed, mass: 1200.0),
        ];

        Log.Heading("Station");
        Log.Line("self test: pulse reaches the dish after", station.SelfTest(), "s");
        ReportCourier(station, courier);
        foreach (DroneCraft drone in drones)
            ReportDrone(station, drone);
    }

    private static void ReportCourier(Station station, CourierShip courier)
    {
        Log.Heading("Courier");
        for (int pulse = 1; pulse <= Pulses; pulse++)
        {
            double sent = station.SendingTime(pulse);
            double arrival = courier.ArrivalOf(sent);
            double reading = courier.ClockAt(arrival);

            Log.Line($"pulse {pulse}: arrives, harbour time", arrival, "s");
            Log.Line($"pulse {pulse}: arrives, courier clock", reading, "s");
            Log.Line($"pulse {pulse}: courier clock behind by", Behind(arrival, reading), "s");
            Log.Line($"pulse {pulse}: marker buoy at", courier.MarkerAt(arrival), "m");
        }
    }

    private static void ReportDrone(Station station, DroneCraft drone)
    {
        Log.Heading(drone.Name);
        Log.Line("speed along the track", drone.TrackSpeed, "m/s");
        Log.Line("kinetic energy", drone.KineticEnergy(), "J");
        for (int pulse = 1; pulse <= Pulses; pulse++)
        {
            double sent = station.SendingTime(pulse);
            double arrival = drone.ArrivalOf(sent);
            double answered = drone.AnswerTo(arrival, AnswerPause);
            double received = station.ReceptionOf(answered, drone.PositionAt(answered));

            Log.Line($"pulse {pulse}: arrives, harbour time", arrival, "s");
            Log.Line($"pulse {pulse}: answer received, harbour time", received, "s");
        }
    }

    /// <summary>How far the courier's clock has fallen behind the station's, both read at one harbour time.</summary>
    [return: Unit("s")]
    [return: Kind(QuantityKind.ClockOffset)]
    private static double Behind(
        [Unit("s")] [OnClock<Harbour>] double stationReading,
        [Unit("s")] [OnClock<Courier>] double courierReading)
        => stationReading - courierReading;
}
