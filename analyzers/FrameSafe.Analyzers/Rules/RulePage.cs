namespace FrameSafe.Analyzers.Rules;

/// <summary>Where the page of a rule is: <c>analyzers/rules/FRAME101.md</c> in the repository, under one address for readers.</summary>
internal static class RulePage
{
    // A reserved domain: the project has no public home yet.
    internal static string Link(string id) => "https://framesafe.example/rules/" + id;
}
