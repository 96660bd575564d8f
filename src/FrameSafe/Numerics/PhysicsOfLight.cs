namespace FrameSafe;

/// <summary>The SI's defining constants that the library computes with (SI Brochure, 9th ed., section 2.2), exact, and what follows from them.</summary>
internal static class PhysicsOfLight
{
    internal const double Speed = 299_792_458;

    internal const double ElementaryCharge = 1.602176634e-19;

    // Quotients of integers that doubles hold exactly; in twice the precision each conversion rounds once.
    internal static readonly Extended JoulePerMegaelectronvolt = (Extended)1602176634 / 1e22;

    private static readonly Extended KilogramPerMegaelectronvolt = JoulePerMegaelectronvolt / Extended.SpeedOfLightSquared;

    private static readonly Extended NewtonSecondPerMegaelectronvolt = JoulePerMegaelectronvolt / Speed;

    internal static double ToJoules(double megaelectronvolts) => (JoulePerMegaelectronvolt * megaelectronvolts).High;

    internal static double FromJoules(Extended joules) => (joules / JoulePerMegaelectronvolt).High;

    internal static double FromSquareJoules(Extended square) => (square / JoulePerMegaelectronvolt / JoulePerMegaelectronvolt).High;

    internal static double ToKilograms(double megaelectronvolts) => (KilogramPerMegaelectronvolt * megaelectronvolts).High;

    internal static double FromKilograms(double kilograms) => ((Extended)kilograms / KilogramPerMegaelectronvolt).High;

    internal static double ToNewtonSeconds(double megaelectronvolts) => (NewtonSecondPerMegaelectronvolt * megaelectronvolts).High;

    internal static double FromNewtonSeconds(double newtonSeconds) => ((Extended)newtonSeconds / NewtonSecondPerMegaelectronvolt).High;

    /// <summary>mc²; one rounding.</summary>
    internal static double RestEnergy(double kilograms) => (Extended.SpeedOfLightSquared * kilograms).High;

    /// <summary>E/c²; one rounding.</summary>
    internal static double MassOf(double joules) => ((Extended)joules / Extended.SpeedOfLightSquared).High;
}
