using System.Numerics;

namespace FrameSafe.Analyzers.Tags;

/// <summary>Roots of large integers.</summary>
internal static class IntegerRoot
{
    /// <summary>The largest integer whose <paramref name="degree"/>-th power is not above <paramref name="value"/> (value ≥ 0).</summary>
    internal static BigInteger Floor(BigInteger value, int degree)
    {
        if (value < 2 || degree == 1)
            return value;

        // Newton's method from above descends until it meets the root.
        BigInteger guess = BigInteger.One << (int)(((8L * value.ToByteArray().Length) / degree) + 1);
        while (true)
        {
            BigInteger next = (((degree - 1) * guess) + (value / BigInteger.Pow(guess, degree - 1))) / degree;
            if (next >= guess)
                return guess;
            guess = next;
        }
    }

    /// <summary>The root, if it is an integer.</summary>
    internal static bool TryExact(BigInteger value, int degree, out BigInteger root)
    {
        root = Floor(value, degree);
        return BigInteger.Pow(root, degree) == value;
    }
}
