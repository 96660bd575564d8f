using FrameSafe.Tool.Reports;
using FrameSafe.Tool.Surveying;

namespace FrameSafe.Tool.Gating;

/// <summary>What a survey comes to against a ledger.</summary>
internal sealed class Judgement
{
    private readonly Ledger _ledger;
    private readonly Ledger _current;
    private readonly IReadOnlyList<Finding> _new;
    private readonly IReadOnlyList<LedgerEntry> _gone;
    private readonly int _found;

    private Judgement(Ledger ledger, Ledger current, IReadOnlyList<Finding> @new, IReadOnlyList<LedgerEntry> gone, int found)
    {
        _ledger = ledger;
        _current = current;
        _new = @new;
        _gone = gone;
        _found = found;
    }

    internal int GoneCount => _gone.Sum(entry => entry.Count);

    internal bool CanShrink => _gone.Count > 0 || _current.CoveragePerMille > _ledger.CoveragePerMille;

    private bool IsCovered => _current.CoveragePerMille >= _ledger.CoveragePerMille;

    internal static Judgement Of(Ledger ledger, Ledger current, Survey survey)
    {
        (IReadOnlyList<LedgerEntry> added, IReadOnlyList<LedgerEntry> gone) = ledger.Compare(current);
        ILookup<FindingIdentity, Finding> findings = survey.Findings.ToLookup(finding => finding.Identity);
        // Of findings alike the later ones count as the new ones.
        return new(ledger, current, [.. added.SelectMany(entry => findings[entry.Identity].TakeLast(entry.Count))], gone, survey.Findings.Count);
    }

    internal bool Passes(bool shrinks) => _new.Count == 0 && IsCovered && (_gone.Count == 0 || shrinks);

    internal IEnumerable<string> Lines(bool shrinks)
    {
        foreach (Finding finding in _new)
        {
            string level = finding.Severity == Microsoft.CodeAnalysis.DiagnosticSeverity.Error ? "error" : "warning";
            yield return $"{finding.Place.Path}({finding.Place.Line},{finding.Place.Column}): {level} {finding.Rule}: {finding.Message}";
        }

        if (!shrinks)
        {
            foreach (LedgerEntry entry in _gone)
                yield return $"{entry.File}: {entry.Rule} in {entry.Member} is gone from the code ({entry.Code}); take it out of the ledger with --shrink.";
        }

        if (!IsCovered)
            yield return $"Coverage of tags fell to {Screen.Percent(_current.CoveragePerMille / 1000.0)} from {Screen.Percent(_ledger.CoveragePerMille / 1000.0)}.";
        yield return Passes(shrinks)
            ? $"Gate passed: {Screen.Count(_found)}, all of them in the ledger."
            : $"Gate failed: {_new.Count} new, {GoneCount} gone{(IsCovered ? "" : ", less covered")}.";
    }
}
