using FrameSafe.Analyzers.Tags;

namespace FrameSafe.Analyzers.Tests.Tags;

/// <summary>Units by their texts, for tests.</summary>
internal static class Units
{
    internal static Unit Read(string text)
        => UnitText.TryRead(text, out Unit? unit, out UnitTextError? error)
            ? unit
            : throw new InvalidOperationException($"{text}: {error.Message} at {error.Column}");
}
