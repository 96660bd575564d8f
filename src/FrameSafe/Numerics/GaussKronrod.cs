namespace FrameSafe;

/// <summary>One step of Gauss–Kronrod quadrature with 7 and 15 points (QUADPACK, routine QK15).</summary>
internal static class GaussKronrod
{
    private static readonly double[] Nodes =
    [
        0.991455371120812639206854697526329, 0.949107912342758524526189684047851, 0.864864423359769072789712788640926,
        0.741531185599394439863864773280788, 0.586087235467691130294144691693013, 0.405845151377397166906606412076961,
        0.207784955007898467600689403773245, 0,
    ];

    private static readonly double[] KronrodWeights =
    [
        0.022935322010529224963732008058970, 0.063092092629978553290700663189204, 0.104790010322250183839876322541518,
        0.140653259715525918745189590510238, 0.169004726639267902826583426598550, 0.190350578064785409913256402421014,
        0.204432940075298892414161999234649, 0.209482141084727828012999174891714,
    ];

    private static readonly double[] GaussWeights =
    [
        0.129484966168869693270611432679082, 0.279705391489276667901467771423780, 0.381830050505118944950369775488975, 0.417959183673469387755102040816327,
    ];

    /// <summary>The integral, and the difference of both rules as its error.</summary>
    internal static (double Value, double Error) Integrate(Func<double, double> function, double from, double to)
    {
        double middle = from + ((to - from) / 2);
        double half = (to - from) / 2;
        double centre = function(middle);
        double kronrod = KronrodWeights[7] * centre;
        double gauss = GaussWeights[3] * centre;
        for (int i = 0; i < 7; i++)
        {
            double sum = function(middle - (half * Nodes[i])) + function(middle + (half * Nodes[i]));
            kronrod += KronrodWeights[i] * sum;
            if (i % 2 == 1)
                gauss += GaussWeights[i / 2] * sum;
        }

        return (kronrod * half, Math.Abs((kronrod - gauss) * half));
    }
}
