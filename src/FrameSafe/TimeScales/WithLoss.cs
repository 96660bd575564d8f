namespace FrameSafe;

/// <summary>A converted date or time, and what its type could not hold of the original.</summary>
/// <typeparam name="T">The type converted to.</typeparam>
/// <param name="Value">The converted value.</param>
/// <param name="LostSeconds">The original less <paramref name="Value"/>, in seconds.</param>
public readonly record struct WithLoss<T>(T Value, [property: Unit("s")] double LostSeconds);
