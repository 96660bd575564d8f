namespace FrameSafe.Accuracy;

/// <summary>The frame that inputs are given in.</summary>
internal readonly struct Yard : IInertialFrame;

/// <summary>A frame that moves in it.</summary>
internal readonly struct Sled : IInertialFrame;

/// <summary>A frame that moves in that one.</summary>
internal readonly struct Skate : IInertialFrame;
