using System.Collections.Generic;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Flow;

/// <summary>
/// What the variables hold at the point that the walk has reached. Branches are undone by a log, so that a join costs what the
/// branches changed and not what is in scope.
/// </summary>
internal sealed class Environment
{
    private readonly Dictionary<ISymbol, Value> _values = new(SymbolEqualityComparer.Default);
    private readonly List<KeyValuePair<ISymbol, Value?>> _log = [];

    /// <summary>Whether control reaches this point.</summary>
    internal bool IsReachable { get; set; } = true;

    internal int Mark => _log.Count;

    internal Value? this[ISymbol variable] => _values.TryGetValue(variable, out Value? value) ? value : null;

    internal void Set(ISymbol variable, Value value)
    {
        _values.TryGetValue(variable, out Value? old);
        if (ReferenceEquals(old, value))
            return;
        _log.Add(new(variable, old));
        _values[variable] = value;
    }

    /// <summary>What has changed since the mark, and whether this point is reached; the state stays.</summary>
    internal Changes ChangesSince(int mark)
    {
        var changes = new Changes(IsReachable);
        for (int i = mark; i < _log.Count; i++)
        {
            ISymbol variable = _log[i].Key;
            if (!changes.Values.ContainsKey(variable))
                changes.Values.Add(variable, _values[variable]);
        }

        return changes;
    }

    /// <summary>Back to the state at the mark; gives what had changed.</summary>
    internal Changes Rewind(int mark, bool reachable)
    {
        Changes changes = ChangesSince(mark);
        for (int i = _log.Count - 1; i >= mark; i--)
        {
            (ISymbol variable, Value? old) = (_log[i].Key, _log[i].Value);
            if (old is null)
                _values.Remove(variable);
            else
                _values[variable] = old;
        }

        _log.RemoveRange(mark, _log.Count - mark);
        IsReachable = reachable;
        return changes;
    }

    /// <summary>Joins paths that all start from the present state; gives whether it changed anything.</summary>
    internal bool Join(IReadOnlyList<Changes> paths)
    {
        bool reachable = false;
        var joined = new Dictionary<ISymbol, Value>(SymbolEqualityComparer.Default);
        foreach (Changes path in paths)
        {
            if (!path.IsReachable)
                continue;
            reachable = true;
            foreach (ISymbol variable in path.Values.Keys)
                joined[variable] = Value.Unknown;
        }

        IsReachable = reachable;
        bool changed = false;
        foreach (ISymbol variable in new List<ISymbol>(joined.Keys))
        {
            Value? value = null;
            foreach (Changes path in paths)
            {
                if (!path.IsReachable)
                    continue;
                // A path on which the variable was not set at all is one on which it is out of scope.
                Value? here = path.Values.TryGetValue(variable, out Value? set) ? set : this[variable];
                value = value is null ? here : here is null ? value : Value.Merge(value, here);
            }

            if (value is null || (this[variable] is { } old && old.Agrees(value)))
                continue;
            Set(variable, value);
            changed = true;
        }

        return changed;
    }

    /// <summary>Nothing is known any more of the variables set since the mark.</summary>
    internal void ForgetSince(int mark)
    {
        foreach (ISymbol variable in ChangesSince(mark).Values.Keys)
            Set(variable, Value.Unknown);
    }
}

/// <summary>What one path changed.</summary>
internal sealed class Changes(bool isReachable)
{
    internal bool IsReachable { get; } = isReachable;

    internal Dictionary<ISymbol, Value> Values { get; } = new(SymbolEqualityComparer.Default);
}
