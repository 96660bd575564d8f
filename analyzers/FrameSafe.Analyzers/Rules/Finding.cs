using System.Collections.Generic;
using System.Collections.Immutable;
using System.Globalization;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>What a rule reports.</summary>
internal sealed class Finding
{
    private readonly ImmutableDictionary<string, string?>.Builder _properties = ImmutableDictionary.CreateBuilder<string, string?>();
    private readonly List<Location> _origins = [];
    private readonly List<string> _originTexts = [];

    internal Finding(Rule rule, Location place, params object[] arguments)
    {
        Rule = rule;
        Place = place;
        Arguments = arguments;
    }

    internal Rule Rule { get; }

    internal Location Place { get; }

    internal object[] Arguments { get; }

    internal Finding With(string property, string? value)
    {
        if (value is not null)
            _properties[property] = value;
        return this;
    }

    internal Finding With(string property, double? value) => With(property, value?.ToString("R", CultureInfo.InvariantCulture));

    internal Finding From(Location? origin, string text)
    {
        if (origin is not null)
        {
            _origins.Add(origin);
            _originTexts.Add(text);
        }

        return this;
    }

    /// <summary>
    /// The diagnostic, with those origins that stand in the compilation itself: a project's diagnostics may not point into the sources
    /// of another, though an IDE has them at hand.
    /// </summary>
    internal Diagnostic ToDiagnostic(Compilation compilation)
    {
        var locations = new List<Location>();
        var texts = new List<string>();
        for (int i = 0; i < _origins.Count; i++)
        {
            if (_origins[i].SourceTree is { } tree && compilation.ContainsSyntaxTree(tree))
            {
                locations.Add(_origins[i]);
                texts.Add(_originTexts[i]);
            }
        }

        if (texts.Count > 0)
            _properties[FindingProperties.Origins] = string.Join("\n", texts);
        return Diagnostic.Create(Rule.Descriptor, Place, locations, _properties.ToImmutable(), Arguments);
    }
}
