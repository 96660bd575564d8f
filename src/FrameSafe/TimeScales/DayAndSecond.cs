namespace FrameSafe;

/// <summary>A whole number of days from 2000-01-01T00:00 and the seconds since that day began: how an epoch is kept.</summary>
/// <remarks>
/// Seconds since midnight keep every whole second exact and resolve 15 ps at worst (the spacing of doubles near 86 400),
/// whatever the century; a leap second is the second after 86 399 of its day.
/// </remarks>
internal readonly record struct DayAndSecond(double Day, double Second)
{
    internal const double SecondsInDay = 86400;

    /// <summary>The Julian Date of 2000-01-01T00:00, where the day count starts.</summary>
    internal const double OriginJulianDate = 2451544.5;

    internal static readonly double FirstDay = Calendar.DayNumber(1, 1, 1);

    internal static readonly double LastDay = Calendar.DayNumber(9999, 12, 31);

    /// <summary>The date a number of seconds after the start of a day, on a scale whose days all last 86 400 s.</summary>
    internal static DayAndSecond Normalised(double day, double second, double rest = 0)
    {
        double whole = Math.Floor(second / SecondsInDay);
        // The product is exact (a whole number below 2^53) and so is the difference.
        second = second - whole * SecondsInDay + rest;
        if (second < 0) (whole, second) = (whole - 1, second + SecondsInDay);
        if (second >= SecondsInDay) (whole, second) = (whole + 1, second - SecondsInDay);
        return new DayAndSecond(day + whole, second);
    }

    /// <summary>The part of a day by which a date given in two parts of any split passes midnight, and the day.</summary>
    internal static (double Day, double Part, double PartRest) SplitJulianDate(double part1, double part2, double origin)
    {
        double whole = Math.Floor(part1) + Math.Floor(part2);
        double shift = -origin - Math.Floor(-origin);
        double part = TwoSum(part1 - Math.Floor(part1), part2 - Math.Floor(part2), out double rest);
        part = TwoSum(part, shift, out double shiftRest);
        rest += shiftRest;
        double carry = Math.Floor(part);
        part -= carry;
        if (part + rest < 0) (carry, part) = (carry - 1, part + 1);
        if (part + rest >= 1) (carry, part) = (carry + 1, part - 1);
        return (whole + carry + Math.Floor(-origin), part, rest);
    }

    /// <summary>a·b + rest, with the rounding of the product carried.</summary>
    internal static double Scale(double a, double b, double rest)
    {
        double product = a * b;
        return product + (Math.FusedMultiplyAdd(a, b, -product) + rest * b);
    }

    /// <summary>The rounded sum, and exactly what the rounding left out.</summary>
    internal static double TwoSum(double a, double b, out double rest)
    {
        double sum = a + b;
        double shadow = sum - a;
        rest = (a - (sum - shadow)) + (b - shadow);
        return sum;
    }
}
