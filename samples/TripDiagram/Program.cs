using System.Globalization;
using FrameSafe;

namespace TripDiagram;

/// <summary>A trip to a beacon four light years off: both clocks, the signals exchanged on the way, and a diagram of it.</summary>
internal static class Program
{
    private static void Main(string[] arguments)
    {
        string file = arguments.Length > 0 ? arguments[0] : "trip.svg";
        const double lightYears = 4;
        Trip<Port, Ship> trip = Trip<Port, Ship>.Coast(acceleration: 9.80665, metres: lightYears * Diagram.LightYear, cruiseCelerityRatio: 2.0);
        double end = trip.HomeTime.InSeconds / Diagram.Year;

        Line("cruising at", trip.Peak.Velocity.SpeedRatio, "c");
        Line("the port's clocks at arrival", end, "a");
        Line("the ship's clock at arrival", trip.ShipTime.InSeconds / Diagram.Year, "a");
        Line("the port's ahead by", trip.HomeAheadInSeconds / Diagram.Year, "a");
        Line("mass ratio of an ideal rocket", trip.IdealMassRatio, "");

        var diagram = new Diagram(Math.Ceiling(end + lightYears));
        diagram.Path(Every(0.05, Math.Ceiling(end + lightYears)).Select(time => SpacetimeEvent<Port>.At(time, trip.PlaceAt(time))), "ship");
        diagram.Path(Every(1, Math.Ceiling(end + lightYears)).Select(time => SpacetimeEvent<Port>.At(time, Displacement<Port>.Zero)), "port");
        Exchange(trip, diagram, end);
        File.WriteAllText(file, diagram.Svg(lightYears));
        Console.WriteLine($"Diagram: {file}");
        Constellation.Print();
    }

    // A signal each year of either clock, when it is sent and received on both.
    private static void Exchange(Trip<Port, Ship> trip, Diagram diagram, double end)
    {
        Console.WriteLine();
        Console.WriteLine("From the port each year             From the ship each year of its own");
        Console.WriteLine($"  {"sent",8}{"received",12}{"by ship",10}    {"sent",8}{"port's time",13}{"received",12}");
        for (int year = 1; year <= (int)end; year++)
        {
            SpacetimeEvent<Port> sent = SpacetimeEvent<Port>.At(CoordinateTime<Port>.FromSeconds(year * Diagram.Year), Displacement<Port>.Zero);
            SpacetimeEvent<Port> received = LightTime.Reception(sent, trip.PlaceAt);
            diagram.Path([sent, received], "up");
            diagram.Tick(sent, year.ToString(CultureInfo.InvariantCulture), "port");

            string answer = "";
            ProperTime<Ship> reading = ProperTime<Ship>.FromSeconds(year * Diagram.Year);
            if (reading <= trip.ShipTime)
            {
                (CoordinateTime<Port> time, CoordinateTime<Port> back) = trip.SignalFromShip(reading);
                SpacetimeEvent<Port> answered = SpacetimeEvent<Port>.At(time, trip.PlaceAt(time));
                SpacetimeEvent<Port> home = SpacetimeEvent<Port>.At(back, Displacement<Port>.Zero);
                diagram.Path([answered, home], "down");
                diagram.Tick(answered, year.ToString(CultureInfo.InvariantCulture), "ship");
                answer = string.Create(CultureInfo.InvariantCulture, $"{year,8}{time.InSeconds / Diagram.Year,13:F3}{home.Time.InSeconds / Diagram.Year,12:F3}");
            }

            Console.WriteLine(string.Create(
                CultureInfo.InvariantCulture,
                $"  {year,8}{received.Time.InSeconds / Diagram.Year,12:F3}{trip.ShipTimeAt(received.Time).InSeconds / Diagram.Year,10:F3}    {answer}"));
        }

        Console.WriteLine();
    }

    private static IEnumerable<CoordinateTime<Port>> Every(double years, double until)
    {
        for (double year = 0; year < until; year += years)
            yield return CoordinateTime<Port>.FromSeconds(year * Diagram.Year);
        yield return CoordinateTime<Port>.FromSeconds(until * Diagram.Year);
    }

    private static void Line(string what, double value, string unit)
        => Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{what,-34}{value,10:F4} {unit}"));
}
