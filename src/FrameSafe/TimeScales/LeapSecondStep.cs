namespace FrameSafe;

/// <summary>One step of UTC: from the start of a day on, TAI − UTC is this many seconds.</summary>
/// <param name="From">The UTC day that begins with the new offset.</param>
/// <param name="TaiMinusUtcInSeconds">TAI − UTC from then on.</param>
public readonly record struct LeapSecondStep(DateOnly From, [property: Unit("s")] int TaiMinusUtcInSeconds);
