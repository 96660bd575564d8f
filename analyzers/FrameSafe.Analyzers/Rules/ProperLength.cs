using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME308: a proper length is used as a length measured in another frame, or the reverse.</summary>
internal sealed class ProperLength : MeetingRule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME308",
        "Proper and measured length meet",
        "{0} is {1}; {2} is {3}; a measured length is the proper length divided by the Lorentz factor",
        Category.Motion,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "A body is shorter by the Lorentz factor in a frame in which it moves lengthwise.",
        helpLinkUri: RulePage.Link("FRAME308"));

    internal override DiagnosticDescriptor Descriptor => Definition;

    protected override Finding? Judge(Encounter encounter, Bench bench)
    {
        if (encounter.Clash.Kind != ClashKind.ProperAndMeasuredLength)
            return null;
        (string left, string right) = (Wording.Kind(encounter.Left.Value.Tag), Wording.Kind(encounter.Right.Value.Tag));
        return Report(encounter, "is " + left, "is " + right, Left(encounter), left, Right(encounter), right);
    }
}
