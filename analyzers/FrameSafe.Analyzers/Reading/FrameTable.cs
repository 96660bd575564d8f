using System;
using System.Collections.Generic;
using System.Linq;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Reading;

/// <summary>The frames that a compilation can see, how they move against one another, and how fast at most.</summary>
internal sealed class FrameTable
{
    private readonly Lazy<Dictionary<string, List<Motion>>> _motions;
    private readonly SymbolTags _tags;

    internal FrameTable(Compilation compilation, SymbolTags tags)
    {
        _tags = tags;
        _motions = new(() => Collect(compilation));
    }

    /// <summary>
    /// The largest speed, as a fraction of c, between two frames or clocks along the declared chain between them; null where no
    /// chain with declared speeds exists. Rapidities of a chain add up at worst, when all its steps are collinear.
    /// </summary>
    internal double? MaxSpeedBetween(string from, string to)
    {
        if (from == to)
            return 0;
        if (_motions.Value.TryGetValue(from, out List<Motion>? direct) && direct.Find(motion => motion.Other == to) is { MaxSpeed: > 0 } declared)
            return declared.MaxSpeed;
        var least = new Dictionary<string, double> { [from] = 0 };
        var open = new List<string> { from };
        while (open.Count > 0)
        {
            string nearest = open.OrderBy(id => least[id]).ThenBy(id => id, StringComparer.Ordinal).First();
            open.Remove(nearest);
            if (nearest == to)
                return Math.Tanh(least[nearest]);
            if (!_motions.Value.TryGetValue(nearest, out List<Motion>? steps))
                continue;
            foreach (Motion step in steps)
            {
                double rapidity = least[nearest] + Artanh(step.MaxSpeed);
                if (step.MaxSpeed > 0 && (!least.TryGetValue(step.Other, out double known) || rapidity < known))
                {
                    least[step.Other] = rapidity;
                    if (!open.Contains(step.Other))
                        open.Add(step.Other);
                }
            }
        }

        return null;
    }

    /// <summary>Whether the motion of one frame is declared in another.</summary>
    internal bool IsDeclaredIn(string frame, string other)
        => _motions.Value.TryGetValue(frame, out List<Motion>? motions) && motions.Exists(motion => motion.Other == other && !motion.IsReverse);

    /// <summary>The largest speed declared on a frame or on one that is declared relative to it; null where none is.</summary>
    internal double? MaxSpeedIn(string frame)
    {
        if (!_motions.Value.TryGetValue(frame, out List<Motion>? motions))
            return null;
        double most = motions.Max(motion => motion.MaxSpeed);
        return most > 0 ? most : null;
    }

    // The logarithm of a ratio is all that netstandard offers; the speeds are declared and far from the rounding of 1 - v.
    private static double Artanh(double speed) => 0.5 * Math.Log((1 + speed) / (1 - speed));

    private Dictionary<string, List<Motion>> Collect(Compilation compilation)
    {
        var motions = new Dictionary<string, List<Motion>>();
        Visit(compilation.Assembly.GlobalNamespace);
        foreach (MetadataReference reference in compilation.References)
        {
            if (compilation.GetAssemblyOrModuleSymbol(reference) is IAssemblySymbol assembly && _tags.MayCarryTags(assembly))
                Visit(assembly.GlobalNamespace);
        }

        return motions;

        void Visit(INamespaceOrTypeSymbol container)
        {
            foreach (ISymbol member in container.GetMembers())
            {
                if (member is INamespaceSymbol space)
                {
                    Visit(space);
                }
                else if (member is INamedTypeSymbol type)
                {
                    if (type.TypeKind == TypeKind.Struct)
                    {
                        foreach (RelativeMotion motion in RelativeMotion.Of(type))
                            Add(FrameNames.Id(type), FrameNames.Id(motion.Frame), motion.IsPossible ? motion.MaxSpeed : 0);
                    }

                    if (type.GetTypeMembers().Length > 0)
                        Visit(type);
                }
            }
        }

        void Add(string one, string other, double maxSpeed)
        {
            AddStep(one, new(other, maxSpeed, isReverse: false));
            AddStep(other, new(one, maxSpeed, isReverse: true));
        }

        void AddStep(string from, Motion motion)
        {
            if (!motions.TryGetValue(from, out List<Motion>? known))
                motions.Add(from, known = []);
            known.Add(motion);
        }
    }

    private readonly struct Motion(string other, double maxSpeed, bool isReverse)
    {
        internal bool IsReverse { get; } = isReverse;

        internal string Other { get; } = other;

        internal double MaxSpeed { get; } = maxSpeed;
    }
}
