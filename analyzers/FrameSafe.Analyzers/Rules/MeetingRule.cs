using System.Collections.Generic;
using FrameSafe.Analyzers.Flow;
using FrameSafe.Analyzers.Tags;

namespace FrameSafe.Analyzers.Rules;

/// <summary>A rule about two numbers that met and do not go together.</summary>
internal abstract class MeetingRule : Rule
{
    internal sealed override Finding? Judge(Observation observation, Bench bench)
        => observation is Encounter encounter ? Judge(encounter, bench) : null;

    protected abstract Finding? Judge(Encounter encounter, Bench bench);

    /// <summary>A finding with both sides' origins, the parts of the message as the descriptor orders them.</summary>
    protected Finding Report(Encounter encounter, string left, string right, params object[] arguments)
    {
        var finding = new Finding(this, encounter.Place.GetLocation(), arguments);
        return finding
            .From(encounter.Left.Value.Origin?.Location, Wording.Origin(encounter.Left, left))
            .From(encounter.Right.Value.Origin?.Location, Wording.Origin(encounter.Right, right))
            .With(FindingProperties.Frames, Frames(encounter));
    }

    protected static string Left(Encounter encounter) => Wording.Name(encounter.Left, encounter.Place);

    protected static string Right(Encounter encounter) => Wording.Name(encounter.Right, encounter.Place);

    protected static string FrameName(Tag tag) => tag.Frame?.DisplayName ?? tag.Clock?.DisplayName ?? "another frame";

    protected static string ClockName(Tag tag) => tag.Clock?.DisplayName ?? tag.Frame?.DisplayName ?? "another clock";

    private static string? Frames(Encounter encounter)
    {
        var ids = new List<string>();
        foreach (Tag tag in new[] { encounter.Left.Value.Tag, encounter.Right.Value.Tag })
        {
            if ((tag.Frame?.Id ?? tag.Clock?.Id) is { } id && !ids.Contains(id))
                ids.Add(id);
        }

        return ids.Count == 0 ? null : string.Join(";", ids);
    }
}
