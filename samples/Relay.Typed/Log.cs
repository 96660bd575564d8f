using System;
using System.Globalization;

namespace Relay;

/// <summary>The run's results, a line each, in full precision so that two runs can be compared.</summary>
internal static class Log
{
    public static void Heading(string text)
    {
        Console.WriteLine();
        Console.WriteLine(text);
    }

    public static void Line(string what, double value, string unit)
        => Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"  {what,-46} {value,24:R} {unit}"));
}
