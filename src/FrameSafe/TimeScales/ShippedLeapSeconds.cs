namespace FrameSafe;

/// <summary>The leap seconds known when this version was made.</summary>
internal static class ShippedLeapSeconds
{
    // Numbers and check sum of leap-seconds.list as the IERS issued it on 2026-07-06; in the public domain.
    internal const string List =
        """
        #$ 3992312697
        #@ 4023129600
        2272060800 10
        2287785600 11
        2303683200 12
        2335219200 13
        2366755200 14
        2398291200 15
        2429913600 16
        2461449600 17
        2492985600 18
        2524521600 19
        2571782400 20
        2603318400 21
        2634854400 22
        2698012800 23
        2776982400 24
        2840140800 25
        2871676800 26
        2918937600 27
        2950473600 28
        2982009600 29
        3029443200 30
        3076704000 31
        3124137600 32
        3345062400 33
        3439756800 34
        3550089600 35
        3644697600 36
        3692217600 37
        #h a9bad145 84c31c70 758402aa b37bfd54 5923836a
        """;
}
