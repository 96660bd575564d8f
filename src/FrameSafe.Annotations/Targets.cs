using System;

namespace FrameSafe;

/// <summary>Where a tag of a number may stand.</summary>
internal static class Targets
{
    internal const AttributeTargets Number =
        AttributeTargets.Parameter | AttributeTargets.Field | AttributeTargets.Property | AttributeTargets.ReturnValue;
}
