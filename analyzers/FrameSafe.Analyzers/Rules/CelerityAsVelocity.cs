using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME309: a celerity is used where a velocity is wanted, or the reverse.</summary>
internal sealed class CelerityAsVelocity : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME309",
        "Celerity and velocity meet",
        "{0} is {1}; {2} is {3}; a celerity is the velocity multiplied by the Lorentz factor of the whole velocity",
        Category.Motion,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "Celerity γv has no bound; velocity stays below c. Near rest they agree, which is where the mistake hides.",
        helpLinkUri: RulePage.Link("FRAME309"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash.Kind != ClashKind.CelerityAndVelocity)
            return null;
        (string left, string right) = (Wording.Kind(encounter.Left.Value.Tag), Wording.Kind(encounter.Right.Value.Tag));
        return Report(encounter, "is " + left, "is " + right, Left(encounter), left, Right(encounter), right);
    }
}
