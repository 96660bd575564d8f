using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;
using FrameSafe.Tool.Surveying;

namespace FrameSafe.Tool.Gating;

/// <summary>One accepted finding, known by rule, project, member and code: lines may move, files be renamed.</summary>
/// <param name="File">The file that it was first found in, for the reader.</param>
/// <param name="Project">The project.</param>
/// <param name="Member">The member.</param>
/// <param name="Rule">The rule.</param>
/// <param name="Code">The line of code, without its indentation.</param>
/// <param name="Count">How many findings are alike in all of these.</param>
internal sealed record LedgerEntry(string File, string Project, string Member, string Rule, string Code, int Count)
{
    [JsonIgnore]
    internal FindingIdentity Identity => new(Rule, Project, Member, Code);
}

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

    internal static Ledger Of(Survey survey) => new(
        [
            .. survey.Findings
                .GroupBy(finding => finding.Identity)
                .Select(group => new LedgerEntry(
                    group.First().Place.Path, group.Key.Project, group.Key.Member, group.Key.Rule, group.Key.Code, group.Count()))
                .OrderBy(entry => entry.File, StringComparer.Ordinal)
                .ThenBy(entry => entry.Member, StringComparer.Ordinal)
                .ThenBy(entry => entry.Rule, StringComparer.Ordinal)
                .ThenBy(entry => entry.Code, StringComparer.Ordinal)
                .ThenBy(entry => entry.Project, StringComparer.Ordinal),
        ],
        survey.Numbers == 0 ? 1000 : (int)(1000L * survey.Tagged / survey.Numbers));

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
            if (form.Entries.FirstOrDefault(entry => entry.Count < 1) is { } empty)
                throw new BadInputException($"{path}: not a ledger: the count of {empty.Rule} in {empty.Member} is {empty.Count}; it is at least 1.");
            if (form.CoveragePerMille is < 0 or > 1000)
                throw new BadInputException($"{path}: not a ledger: coveragePerMille is {form.CoveragePerMille}; it is from 0 to 1000.");
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
        Dictionary<FindingIdentity, int> left = Counts(current.Entries);
        return new(
            [
                .. Entries
                    .Select(entry => entry with { Count = Math.Min(entry.Count, left.GetValueOrDefault(entry.Identity)) })
                    .Where(entry => entry.Count > 0),
            ],
            Math.Max(CoveragePerMille, current.CoveragePerMille));
    }

    private static List<LedgerEntry> Beyond(IReadOnlyList<LedgerEntry> entries, IReadOnlyList<LedgerEntry> others)
    {
        Dictionary<FindingIdentity, int> known = Counts(others);
        return
        [
            .. entries
                .Select(entry => entry with { Count = entry.Count - known.GetValueOrDefault(entry.Identity) })
                .Where(entry => entry.Count > 0),
        ];
    }

    private static Dictionary<FindingIdentity, int> Counts(IReadOnlyList<LedgerEntry> entries)
        => entries.GroupBy(entry => entry.Identity).ToDictionary(group => group.Key, group => group.Sum(entry => entry.Count));

    private sealed record Form(int Version, int CoveragePerMille, IReadOnlyList<LedgerEntry> Entries);
}
