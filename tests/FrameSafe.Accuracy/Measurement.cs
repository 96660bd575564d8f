namespace FrameSafe.Accuracy;

/// <summary>The error of one quantity in one case.</summary>
/// <param name="Quantity">Its name in the file.</param>
/// <param name="Case">The case.</param>
/// <param name="Ulp">The error in units of the last place of the exact value; of a vector, of its norm.</param>
/// <param name="Allowed">4, or 4 + 2·cond where the case states how ill-conditioned it is.</param>
internal sealed record Measurement(string Quantity, string Case, double Ulp, double Allowed)
{
    internal bool IsWithin => Ulp <= Allowed;

    internal static double ErrorInUlp(IReadOnlyList<double> computed, IReadOnlyList<string> exact)
    {
        if (computed.Count != exact.Count || computed.Any(value => !double.IsFinite(value)))
            return double.PositiveInfinity;
        Exact[] expected = [.. exact.Select(Exact.Parse)];
        int lastPlace = computed.Count == 1
            ? expected[0].LastPlace()
            : Exact.Of(Norm([.. exact.Select(text => double.Parse(text, System.Globalization.CultureInfo.InvariantCulture))])).LastPlace();
        double sum = 0;
        for (int i = 0; i < expected.Length; i++)
        {
            double error = (Exact.Of(computed[i]) - expected[i]).DividedByPowerOfTwo(lastPlace);
            sum += error * error;
        }

        return Math.Sqrt(sum);
    }

    private static double Norm(double[] values)
    {
        double largest = values.Max(Math.Abs);
        return largest == 0 ? 0 : largest * Math.Sqrt(values.Sum(value => value / largest * (value / largest)));
    }
}
