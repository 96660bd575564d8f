namespace FrameSafe;

/// <summary>A clock: whatever its reading is a proper time of. A frame's own clock, a particle, or a time scale.</summary>
/// <remarks>Declare one as an empty <c>readonly struct</c>; the name of the type is the name of the clock.</remarks>
public interface IClock;

/// <summary>A reference frame, with the clocks that are at rest in it.</summary>
/// <remarks>
/// Declare one as an empty <c>readonly struct</c> that implements one of the kinds below:
/// <code>public readonly struct Harbour : IInertialFrame;</code>
/// </remarks>
public interface IFrame : IClock;

/// <summary>A frame in which a free body moves uniformly. Two of them are related by a boost and a fixed rotation.</summary>
public interface IInertialFrame : IFrame;

/// <summary>The instantaneous rest frame of a body that may accelerate; inertial at each instant only.</summary>
public interface IRestFrame : IFrame;

/// <summary>A frame that turns against the inertial ones: velocities carried into or out of it need ω × r as well.</summary>
public interface IRotatingFrame : IFrame;

/// <summary>A rotating frame that is fixed to a body: a planet's surface, a vehicle's hull.</summary>
public interface IBodyFrame : IRotatingFrame;

/// <summary>A frame of local directions at a moving or surface point: north–east–down, east–north–up, radial–transverse–normal.</summary>
public interface ILocalFrame : IRotatingFrame;

/// <summary>A coordinate time agreed by convention rather than the reading of one clock (TAI, UTC, TT, …).</summary>
public interface ITimeScale : IClock;
