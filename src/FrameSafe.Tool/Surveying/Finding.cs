using System.Security.Cryptography;
using System.Text;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Tool.Surveying;

/// <summary>A place in a file: path relative to where the survey ran, lines and columns from 1.</summary>
internal sealed record Place(string Path, int Line, int Column, int EndLine, int EndColumn)
{
    internal static Place Nowhere { get; } = new("", 0, 0, 0, 0);
}

/// <summary>Where a tag came from, in words.</summary>
internal sealed record OriginPlace(Place Place, string Text);

/// <summary>Lines of source around a place.</summary>
/// <param name="FirstLine">The number of the first of them, from 1.</param>
/// <param name="Text">The lines, separated by line feeds.</param>
internal sealed record Excerpt(int FirstLine, string Text)
{
    internal static Excerpt None { get; } = new(1, "");

    /// <summary>One of the lines by its number, without its indentation.</summary>
    internal string Line(int number) => Text.Split('\n').ElementAtOrDefault(number - FirstLine)?.Trim() ?? "";
}

/// <summary>One finding, free of compiler objects.</summary>
internal sealed record Finding(
    string Rule,
    DiagnosticSeverity Severity,
    string Message,
    Place Place,
    string Project,
    string Member,
    Excerpt Excerpt,
    IReadOnlyList<OriginPlace> Origins,
    double? Error,
    double? Budget,
    double? MaxSpeed,
    double? DigitsLost,
    IReadOnlyList<string> Frames)
{
    internal string SourceLine => Excerpt.Line(Place.Line);

    /// <summary>What stays the same when lines move or a file is renamed.</summary>
    internal FindingIdentity Identity => new(Rule, Project, Member, SourceLine);
}

/// <summary>What a finding is known by: the rule, and the member and the code that it is in. Line numbers are no part of it.</summary>
internal readonly record struct FindingIdentity(string Rule, string Project, string Member, string Code)
{
    /// <param name="ordinal">How many findings alike in all of this come before.</param>
    internal string Fingerprint(int ordinal)
        => Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes($"{Rule}\n{Project}\n{Member}\n{Code}\n{ordinal}")))[..16];
}
