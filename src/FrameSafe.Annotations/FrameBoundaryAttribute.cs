using System;

namespace FrameSafe;

/// <summary>Says that a member is itself a crossing: it may give a number a new frame, because carrying it over is its job.</summary>
[AttributeUsage(AttributeTargets.Method | AttributeTargets.Constructor | AttributeTargets.Property)]
public sealed class FrameBoundaryAttribute : Attribute;
