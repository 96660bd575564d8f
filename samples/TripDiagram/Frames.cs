using FrameSafe;

namespace TripDiagram;

/// <summary>The home port, at rest.</summary>
public readonly struct Port : IInertialFrame;

/// <summary>The ship's own clock.</summary>
public readonly struct Ship : IClock;
