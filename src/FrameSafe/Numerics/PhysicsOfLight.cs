namespace FrameSafe;

internal static class PhysicsOfLight
{
    internal const double Speed = 299_792_458;
}
