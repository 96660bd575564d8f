using System.Collections.Generic;
using System.Collections.Immutable;
using System.Linq;
using FrameSafe.Analyzers.Flow;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>All rules.</summary>
internal static class RuleTable
{
    internal static UnreadableUnit UnreadableUnit { get; } = new();

    internal static ImpossibleFrame ImpossibleFrame { get; } = new();

    internal static ContradictingTags ContradictingTags { get; } = new();

    internal static UnreadableContract UnreadableContract { get; } = new();

    internal static UntaggedNumber UntaggedNumber { get; } = new();

    internal static ImmutableArray<Rule> All { get; } =
    [
        new MixedFrames(),
        new WrongFrame(),
        new MixedTransforms(),
        new TransformDirection(),
        new Simultaneity(),
        new ProperAndCoordinateTime(),
        new LorentzDirection(),
        new MixedClocks(),
        new MixedTimeScales(),
        new VelocityAddition(),
        new FlawedFormRule(),
        new NewtonianMotion(),
        new FasterThanLightRule(),
        new SeparationRateAsVelocity(),
        new ProperLength(),
        new CelerityAsVelocity(),
        new EnergyKinds(),
        new MixedUnits(),
        new WrongUnit(),
        new MixedDimensions(),
        new FunctionArgument(),
        UnreadableUnit,
        new NaturalUnits(),
        new LostDigitsRule(),
        new RoundedConstantRule(),
        UntaggedNumber,
        ContradictingTags,
        UnreadableContract,
        ImpossibleFrame,
    ];

    internal static ImmutableArray<DiagnosticDescriptor> Descriptors { get; } = [.. All.Select(rule => rule.Descriptor)];

    /// <summary>The findings of one body, one for each place, in the order of the code.</summary>
    internal static IEnumerable<Finding> Judge(IEnumerable<Observation> observations, Bench bench)
    {
        var places = new HashSet<SyntaxNode>();
        foreach (Observation observation in observations)
        {
            foreach (Rule rule in All)
            {
                if (rule.Judge(observation, bench) is not { } finding)
                    continue;
                if (places.Add(observation.Place))
                    yield return finding;
                break;
            }
        }
    }
}
