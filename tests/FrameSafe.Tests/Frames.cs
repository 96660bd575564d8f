namespace FrameSafe.Tests;

internal readonly struct Harbour : IInertialFrame;

internal readonly struct Tug : IInertialFrame;

internal readonly struct Drone : IInertialFrame;
