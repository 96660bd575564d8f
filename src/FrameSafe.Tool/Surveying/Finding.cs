using Microsoft.CodeAnalysis;

namespace FrameSafe.Tool.Surveying;

/// <summary>A place in a file: path relative to the surveyed root, lines and columns from 1.</summary>
internal sealed record Place(string Path, int Line, int Column, int EndLine, int EndColumn);

/// <summary>Where a tag came from, in words.</summary>
internal sealed record OriginPlace(Place Place, string Text);

/// <summary>One finding, free of compiler objects.</summary>
internal sealed record Finding(
    string Rule,
    DiagnosticSeverity Severity,
    string Message,
    Place Place,
    string Project,
    string Member,
    string SourceLine,
    IReadOnlyList<OriginPlace> Origins,
    double? Error,
    double? Budget,
    double? MaxSpeed,
    IReadOnlyList<string> Frames)
{
    /// <summary>What stays the same when lines move: the rule, the member and the code; and how many like it come before.</summary>
    internal string Fingerprint(int ordinal)
        => Convert.ToHexStringLower(System.Security.Cryptography.SHA256.HashData(
            System.Text.Encoding.UTF8.GetBytes($"{Rule}\n{Place.Path}\n{Member}\n{SourceLine}\n{ordinal}")))[..16];
}
