using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;
using FrameSafe.Tool.Surveying;

namespace FrameSafe.Tool.Gating;

/// <summary>One accepted finding, known by rule, member and code: lines may move, files may grow.</summary>
/// <param name="Rule">The rule.</param>
/// <param name="File">The file, relative to the surveyed root.</param>
/// <param name="Member">The member.</param>
/// <param name="Code">The line of code, without its indentation.</param>
/// <param name="Count">How many findings are alike in all of these.</param>
internal sealed record LedgerEntry(string Rule, string File, string Member, string Code, int Count);

/// <summary>The accepted known findings, which may only become fewer, and the coverage, which may only become more.</summary>
internal sealed class Ledger
{
    internal const int CurrentVersion = 1;

    private static readonly JsonSerializerOptions Layout = new()
    {
        WriteIndented = true,
        PropertyNamingPolicy = JsonNamingPolicy.CamelCase,
        UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow,
        RespectRequiredConstructorParameters = true,
        RespectNullableAnnotations = true,
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    private Ledger(IReadOnlyList<LedgerEntry> entries, int taggedPerMille)
    {
        Entries = entries;
        CoveragePerMille = taggedPerMille;
    }

    /// <summary>The accepted findings, in the order of file, member, rule and code: a change shows as lines added or removed.</summary>
    internal IReadOnlyList<LedgerEntry> Entries { get; }

    /// <summary>The least coverage, in thousandths.</summary>
    internal int CoveragePerMille { get; }

    internal static Ledger Of(Survey survey)
    {
        int tagged = survey.Coverage.Sum(row => row.Tagged);
        int numbers = survey.Coverage.Sum(row => row.Numbers);
        return new(
            [
                .. survey.Findings
                    .GroupBy(finding => (finding.Place.Path, finding.Member, finding.Rule, finding.SourceLine))
                    .Select(group => new LedgerEntry(group.Key.Rule, group.Key.Path, group.Key.Member, group.Key.SourceLine, group.Count()))
                    .OrderBy(entry => entry.File, StringComparer.Ordinal)
                    .ThenBy(entry => entry.Member, StringComparer.Ordinal)
                    .ThenBy(entry => entry.Rule, StringComparer.Ordinal)
                    .ThenBy(entry => entry.Code, StringComparer.Ordinal),
            ],
            numbers == 0 ? 1000 : (int)(1000L * tagged / numbers));
    }

    /// <exception cref="BadInputException">There is no such file, or it is no ledger of this version.</exception>
    internal static Ledger Read(string path)
    {
        if (!File.Exists(path))
            throw new BadInputException($"{path}: there is no such ledger; gate --start writes the first one.");
        try
        {
            Form form = JsonSerializer.Deserialize<Form>(File.ReadAllText(path), Layout)
                ?? throw new BadInputException($"{path}: not a ledger: the file is empty.");
            if (form.Version != CurrentVersion)
                throw new BadInputException($"{path}: a ledger of version {form.Version}; this tool reads version {CurrentVersion}.");
            if (form.Entries.Any(entry => entry.Count < 1))
                throw new BadInputException($"{path}: not a ledger: an entry's count is below 1.");
            return new(form.Entries, form.CoveragePerMille);
        }
        catch (JsonException exception)
        {
            string where = exception.LineNumber is { } line ? $" at line {line + 1}, column {exception.BytePositionInLine + 1}" : "";
            throw new BadInputException($"{path}: not a ledger{where}: {exception.Message.Split(" Path:")[0].ReplaceLineEndings(" ")}");
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            throw new BadInputException($"{path}: cannot be read: {exception.Message}");
        }
    }

    internal string ToText() => JsonSerializer.Serialize(new Form(CurrentVersion, CoveragePerMille, Entries), Layout) + "\n";

    /// <summary>What a survey has beyond the ledger, and what the ledger has beyond the survey.</summary>
    internal (IReadOnlyList<LedgerEntry> New, IReadOnlyList<LedgerEntry> Gone) Compare(Ledger current)
        => (Beyond(current.Entries, Entries), Beyond(Entries, current.Entries));

    /// <summary>This ledger less what is gone; never with what is new.</summary>
    internal Ledger Shrunk(Ledger current)
    {
        Dictionary<(string, string, string, string), int> left = Counts(current.Entries);
        return new(
            [
                .. Entries
                    .Select(entry => entry with { Count = Math.Min(entry.Count, left.GetValueOrDefault(Key(entry))) })
                    .Where(entry => entry.Count > 0),
            ],
            Math.Max(CoveragePerMille, current.CoveragePerMille));
    }

    private static List<LedgerEntry> Beyond(IReadOnlyList<LedgerEntry> entries, IReadOnlyList<LedgerEntry> others)
    {
        Dictionary<(string, string, string, string), int> known = Counts(others);
        return
        [
            .. entries
                .Select(entry => entry with { Count = entry.Count - known.GetValueOrDefault(Key(entry)) })
                .Where(entry => entry.Count > 0),
        ];
    }

    private static Dictionary<(string, string, string, string), int> Counts(IReadOnlyList<LedgerEntry> entries)
        => entries.GroupBy(Key).ToDictionary(group => group.Key, group => group.Sum(entry => entry.Count));

    private static (string, string, string, string) Key(LedgerEntry entry) => (entry.Rule, entry.File, entry.Member, entry.Code);

    private sealed record Form(int Version, int CoveragePerMille, IReadOnlyList<LedgerEntry> Entries);
}
