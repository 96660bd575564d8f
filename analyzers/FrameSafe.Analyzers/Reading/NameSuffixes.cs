using System;
using System.Collections.Concurrent;
using System.Collections.Generic;
using System.Linq;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Diagnostics;

namespace FrameSafe.Analyzers.Reading;

/// <summary>
/// Suffixes of names that a project has agreed on: <c>framesafe.name_suffix.lab = Ring.Lab</c> says that <c>xLab</c>, <c>x_lab</c> and
/// <c>XLab</c> are measured in <c>Ring.Lab</c> (or told by it, if it is a time scale).
/// </summary>
internal sealed class NameSuffixes
{
    internal const string Setting = "framesafe.name_suffix.";

    private readonly Compilation _compilation;
    private readonly AnalyzerConfigOptionsProvider? _options;
    private readonly ConcurrentDictionary<SyntaxTree, KeyValuePair<string, ITypeSymbol>[]> _byTree = new();

    internal NameSuffixes(Compilation compilation, AnalyzerConfigOptionsProvider? options)
    {
        _compilation = compilation;
        _options = options;
    }

    /// <summary>What the name of a symbol says: a frame or a clock; null where no suffix is agreed on, or none fits.</summary>
    internal ITypeSymbol? Of(ISymbol symbol)
    {
        if (_options is null || symbol.DeclaringSyntaxReferences.Length == 0)
            return null;
        foreach (KeyValuePair<string, ITypeSymbol> suffix in _byTree.GetOrAdd(symbol.DeclaringSyntaxReferences[0].SyntaxTree, Read))
        {
            if (Ends(symbol.Name, suffix.Key))
                return suffix.Value;
        }

        return null;
    }

    /// <summary>The settings that name no frame or clock: key and value.</summary>
    internal IEnumerable<KeyValuePair<string, string>> Unreadable(SyntaxTree tree)
        => All(tree).Where(setting => Type(setting.Value) is null);

    private KeyValuePair<string, ITypeSymbol>[] Read(SyntaxTree tree)
        =>
        [
            .. All(tree)
                .Select(setting => new KeyValuePair<string, ITypeSymbol?>(setting.Key.Substring(Setting.Length), Type(setting.Value)))
                .Where(setting => setting.Value is not null && setting.Key.Length > 0)
                .Select(setting => new KeyValuePair<string, ITypeSymbol>(setting.Key, setting.Value!))
                // Of two that fit, the longer one says more.
                .OrderByDescending(setting => setting.Key.Length)
                .ThenBy(setting => setting.Key, StringComparer.Ordinal),
        ];

    private IEnumerable<KeyValuePair<string, string>> All(SyntaxTree tree)
    {
        AnalyzerConfigOptions options = _options!.GetOptions(tree);
        foreach (string key in options.Keys)
        {
            if (key.StartsWith(Setting, StringComparison.OrdinalIgnoreCase) && options.TryGetValue(key, out string? value))
                yield return new(key, value);
        }
    }

    private INamedTypeSymbol? Type(string name)
        => _compilation.GetTypeByMetadataName(name) is { } type && Vocabulary.Implements(type, Vocabulary.Clock) ? type : null;

    // At a boundary of words: an upper-case letter in the name, or an underscore before.
    private static bool Ends(string name, string suffix)
    {
        int start = name.Length - suffix.Length;
        return start > 0 && name.EndsWith(suffix, StringComparison.OrdinalIgnoreCase)
            && (char.IsUpper(name[start]) || name[start - 1] == '_');
    }
}
