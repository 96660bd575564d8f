namespace FrameSafe;

/// <summary>International Atomic Time: the realised scale, SI seconds on the geoid.</summary>
public readonly struct Tai : ITimeScale;

/// <summary>Terrestrial Time: TAI + 32.184 s in its realisation.</summary>
public readonly struct Tt : ITimeScale;

/// <summary>Coordinated Universal Time: TAI less a whole number of leap seconds.</summary>
public readonly struct Utc : ITimeScale;

/// <summary>GPS system time: TAI − 19 s, without leap seconds.</summary>
public readonly struct Gps : ITimeScale;

/// <summary>Geocentric Coordinate Time (IAU 1991, 2000).</summary>
public readonly struct Tcg : ITimeScale;

/// <summary>Barycentric Coordinate Time (IAU 1991).</summary>
public readonly struct Tcb : ITimeScale;

/// <summary>Barycentric Dynamical Time (IAU 2006).</summary>
public readonly struct Tdb : ITimeScale;
