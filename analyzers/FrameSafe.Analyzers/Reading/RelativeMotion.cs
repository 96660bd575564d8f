using System.Collections.Generic;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Reading;

/// <summary>One <c>[RelativeTo]</c> of a frame: the frame in which its motion is described, and its largest speed there.</summary>
internal sealed class RelativeMotion
{
    private RelativeMotion(ITypeSymbol frame, double maxSpeed, AttributeData attribute)
    {
        Frame = frame;
        MaxSpeed = maxSpeed;
        Attribute = attribute;
    }

    internal ITypeSymbol Frame { get; }

    /// <summary>As a fraction of c; 0 if not said.</summary>
    internal double MaxSpeed { get; }

    internal AttributeData Attribute { get; }

    internal bool IsPossible => MaxSpeed is >= 0 and < 1;

    internal static IEnumerable<RelativeMotion> Of(INamedTypeSymbol frame)
    {
        foreach (AttributeData attribute in frame.GetAttributes())
        {
            if (attribute.AttributeClass is not { Name: "RelativeToAttribute" } type || !Vocabulary.IsOurs(type))
                continue;
            if (TagAttributes.Named(type, attribute, 0, frame) is not { } parent)
                continue;
            double maxSpeed = 0;
            foreach (KeyValuePair<string, TypedConstant> named in attribute.NamedArguments)
            {
                if (named is { Key: "MaxSpeed", Value.Value: double given })
                    maxSpeed = given;
            }

            yield return new(parent, maxSpeed, attribute);
        }
    }
}
