using System.Globalization;
using FrameSafe;

namespace TripDiagram;

/// <summary>Clocks of a timing constellation of our own: what each gains a day on the geoid, the parts of it told apart.</summary>
internal static class Constellation
{
    private const double MicrosecondsPerDay = 86400e6;

    private static readonly (string Name, double Radius)[] Orbits =
        [("low courier", 6_778_137), ("inner ring", 20_200_000), ("middle ring", 26_561_750), ("outer ring", 42_164_170)];

    public static void Print()
    {
        SchwarzschildField earth = SchwarzschildField.Earth;
        Console.WriteLine();
        Console.WriteLine("Clocks in circular orbits, gain on the geoid in microseconds a day");
        Console.WriteLine($"  {"clock",-14}{"radius km",12}{"height",12}{"motion",12}{"together",12}");
        foreach ((string name, double radius) in Orbits)
        {
            // At rest at that height, and what the orbit's motion takes away again.
            double height = earth.StaticClock<Ship>(radius).Against(Geoid.Clock<Port>()).MinusOne;
            double together = earth.OrbitingClock<Ship>(radius).Against(Geoid.Clock<Port>()).MinusOne;
            Console.WriteLine(string.Create(
                CultureInfo.InvariantCulture,
                $"  {name,-14}{radius / 1000,12:F1}{height * MicrosecondsPerDay,12:F3}{(together - height) * MicrosecondsPerDay,12:F3}{together * MicrosecondsPerDay,12:F3}"));
        }
    }
}
