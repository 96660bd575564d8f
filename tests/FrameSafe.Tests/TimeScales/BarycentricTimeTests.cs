namespace FrameSafe.Tests.TimeScales;

public class BarycentricTimeTests
{
    public static TheoryData<double[]> Geocentre => ErfaDates.Rows("tdbMinusTt");

    public static TheoryData<double[]> Site => ErfaDates.Rows("tdbMinusTtAtSite");

    [Theory]
    [MemberData(nameof(Geocentre))]
    public void At_the_geocentre_as_ERFA_has_it(double[] row) =>
        Assert.Equal(row[2], BarycentricTime.TdbMinusTtInSeconds(Epoch<Tt>.FromJulianDate(row[0], row[1])), 1e-15);

    [Theory]
    [MemberData(nameof(Site))]
    public void At_a_site_as_ERFA_has_it(double[] row) =>
        Assert.Equal(
            row[6],
            BarycentricTime.TdbMinusTtInSeconds(
                Epoch<Tt>.FromJulianDate(row[0], row[1]),
                universalTime: row[2], eastLongitude: row[3], fromSpinAxis: 1000 * row[4], northOfEquator: 1000 * row[5]),
            1e-15);

    // ERFA's test program (t_erfa_c.c).
    [Fact]
    public void The_value_of_ERFAs_test_program() =>
        Assert.Equal(
            -0.1280368005936998991e-2,
            BarycentricTime.TdbMinusTtInSeconds(Epoch<Tt>.FromJulianDate(2448939.5, 0.123), 0.76543, 5.0123, 5525242.0, 3190000.0),
            1e-15);

    // The one-line formula of the Astronomical Almanac, good to about 30 µs (from memory): an independent check of phase and size.
    [Theory]
    [InlineData(1980, 3, 1)]
    [InlineData(2004, 10, 20)]
    [InlineData(2027, 5, 5)]
    public void Agrees_with_the_almanacs_formula_to_30_microseconds(int year, int month, int day)
    {
        Epoch<Tt> epoch = Epoch<Tt>.FromCalendar(year, month, day);
        double anomaly = (357.53 + 0.9856003 * (epoch.JulianDate - 2451545.0)) * Math.PI / 180;
        double almanac = 0.001657 * Math.Sin(anomaly) + 0.000022 * Math.Sin(2 * anomaly);
        Assert.Equal(almanac, BarycentricTime.TdbMinusTtInSeconds(epoch), 3e-5);
    }

    [Fact]
    public void A_place_off_the_Earth_is_refused() =>
        Assert.Contains(
            "fromSpinAxis",
            Assert.Throws<ArgumentOutOfRangeException>(
                () => BarycentricTime.TdbMinusTtInSeconds(default, 0, 0, double.NaN, 0)).Message);
}
