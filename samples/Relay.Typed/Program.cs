using FrameSafe;

namespace Relay;

/// <summary>The relay of timing pulses in the typed style: what mixes frames, clocks or units does not compile.</summary>
internal static class Program
{
    private const int Pulses = 6;
    private const double C = 299_792_458.0;

    private static readonly ProperTime<Drone> AnswerPause = ProperTime<Drone>.FromSeconds(2.5);

    private static void Main()
    {
        // The dish stands 640 km behind the head of the track.
        var station = new Station(CoordinateTime<Harbour>.FromSeconds(1800), Displacement<Harbour>.FromMetres(-640_000));
        var courier = new CourierShip(Velocity<Harbour>.FromMetresPerSecond(0.42 * C), Displacement<Courier>.FromMetres(3.6e7));
        DroneCraft[] drones =
        [
            Drone("Lark", courier, releasedAt: 900, speed: 0.16 * C, mass: 850),
            Drone("Dunlin", courier, releasedAt: 1200, speed: 0.08 * C, mass: 850),
            Drone("Wren", courier, releasedAt: 1500, speed: -0.11 * C, mass: 1200),
        ];

        Log.Heading("Station");
        Log.Line("self test: pulse reaches the dish after", station.SelfTest().InSeconds, "s");
        ReportCourier(station, courier);
        foreach (DroneCraft drone in drones)
            ReportDrone(station, drone);
    }

    private static DroneCraft Drone(
        string name,
        CourierShip courier,
        [Unit("s"), OnClock<Courier>] double releasedAt,
        [Unit("m/s"), InFrame<Courier>] double speed,
        [Unit("kg")] double mass)
        => new(name, courier, ProperTime<Courier>.FromSeconds(releasedAt), Velocity<Courier>.FromMetresPerSecond(speed), Mass.FromKilograms(mass));

    private static void ReportCourier(Station station, CourierShip courier)
    {
        Log.Heading("Courier");
        for (int pulse = 1; pulse <= Pulses; pulse++)
        {
            CoordinateTime<Harbour> arrival = courier.ArrivalOf(station.Sending(pulse)).Time;
            ProperTime<Courier> reading = courier.ClockAt(arrival);

            Log.Line($"pulse {pulse}: arrives, harbour time", arrival.InSeconds, "s");
            Log.Line($"pulse {pulse}: arrives, courier clock", reading.InSeconds, "s");
            Log.Line($"pulse {pulse}: courier clock behind by", arrival.OnClockAtRest().OffsetInSeconds(reading), "s");
            Log.Line($"pulse {pulse}: marker buoy at", courier.MarkerAt(arrival).XInMetres, "m");
        }
    }

    private static void ReportDrone(Station station, DroneCraft drone)
    {
        Log.Heading(drone.Name);
        Log.Line("speed along the track", drone.Velocity.XInMetresPerSecond, "m/s");
        Log.Line("kinetic energy", drone.KineticEnergy.InJoules, "J");
        for (int pulse = 1; pulse <= Pulses; pulse++)
        {
            SpacetimeEvent<Harbour> arrival = drone.ArrivalOf(station.Sending(pulse));
            SpacetimeEvent<Harbour> answer = drone.AnswerTo(arrival, AnswerPause);

            Log.Line($"pulse {pulse}: arrives, harbour time", arrival.Time.InSeconds, "s");
            Log.Line($"pulse {pulse}: answer received, harbour time", station.ReceptionOf(answer).InSeconds, "s");
        }
    }
}
