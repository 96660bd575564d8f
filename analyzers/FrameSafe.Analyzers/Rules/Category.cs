namespace FrameSafe.Analyzers.Rules;

/// <summary>The families of rules, by the first digit of the id.</summary>
internal static class Category
{
    internal const string Frames = "FrameSafe.Frames";
    internal const string Time = "FrameSafe.Time";
    internal const string Motion = "FrameSafe.Motion";
    internal const string Units = "FrameSafe.Units";
    internal const string Digits = "FrameSafe.Digits";
    internal const string Adoption = "FrameSafe.Adoption";
}
