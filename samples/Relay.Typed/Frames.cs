using FrameSafe;

namespace Relay;

/// <summary>The station's frame: the track begins here and every timetable is written in it.</summary>
public readonly struct Harbour : IInertialFrame;

/// <summary>The rest frame of the courier, which passes the station outward bound.</summary>
[RelativeTo<Harbour>(MaxSpeed = 0.5)]
public readonly struct Courier : IInertialFrame;

/// <summary>The rest frame of a drone that the courier has released.</summary>
[RelativeTo<Courier>(MaxSpeed = 0.2)]
public readonly struct Drone : IInertialFrame;
