using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;

namespace FrameSafe.Analyzers.Rules;

/// <summary>FRAME604: a declaration that no frame, and a setting that no budget, can have.</summary>
internal sealed class ImpossibleFrame : Rule
{
    private static readonly DiagnosticDescriptor Definition = new(
        "FRAME604",
        "A declaration of frames is impossible",
        "{0}",
        Category.Adoption,
        DiagnosticSeverity.Warning,
        isEnabledByDefault: true,
        description: "A largest speed is a fraction of c from 0 up to but not including 1; frames are declared relative to others without a circle.",
        helpLinkUri: RulePage.Link("FRAME604"),
        customTags: WellKnownDiagnosticTags.CompilationEnd);

    internal override DiagnosticDescriptor Descriptor => Definition;

    /// <summary>A largest speed on a frame or on a number.</summary>
    internal Finding? JudgeSpeed(double speed, string owner, Location place)
        => speed is >= 0 and < 1
            ? null
            : new(
                this,
                place,
                "The largest speed of `" + owner + "` is " + speed.ToString("R", CultureInfo.InvariantCulture)
                + " c; allowed is from 0 up to but not including 1");

    /// <summary>A frame whose declared parent is none, or that is declared relative to itself by a circle.</summary>
    internal Finding? JudgeParent(INamedTypeSymbol frame, RelativeMotion motion, Location place)
    {
        if (!Vocabulary.Implements(motion.Frame, Vocabulary.Frame))
        {
            return new(
                this, place, "`" + frame.Name + "` is declared relative to `" + motion.Frame.Name + "`, which is no frame; a type that implements IFrame is wanted");
        }

        List<INamedTypeSymbol>? circle = Circle(frame, motion.Frame);
        if (circle is null || circle.Any(other => string.CompareOrdinal(FrameNames.Id(other), FrameNames.Id(frame)) < 0))
            return null;
        return new(
            this,
            place,
            "`" + frame.Name + "` is declared relative to itself by a circle: " + string.Join(" → ", circle.Select(member => member.Name))
            + " → " + frame.Name);
    }

    internal Finding JudgeBudget(string text)
        => new(
            this,
            Location.None,
            "The setting " + Settings.ErrorBudget + " is `" + text + "`; a positive number is wanted, such as 1e-9 (which is used instead)");

    internal Finding JudgeRange(string text, Location place)
        => new(this, place, "The range `" + text + "` of a slot cannot be read; an index (`6`) or a range as C# writes it (`0..3`) is wanted");

    internal Finding JudgeSuffix(string setting, string value)
        => new(
            this,
            Location.None,
            "The setting " + setting + " is `" + value + "`, which is no frame or clock; the full name of a type that implements IFrame or IClock is wanted");

    // The chain from a frame through one of its parents back to it, the frame first.
    private static List<INamedTypeSymbol>? Circle(INamedTypeSymbol frame, ITypeSymbol parent)
    {
        var seen = new HashSet<ISymbol>(SymbolEqualityComparer.Default);
        var path = new List<INamedTypeSymbol> { frame };
        return Follow(parent) ? path : null;

        bool Follow(ITypeSymbol next)
        {
            if (SymbolEqualityComparer.Default.Equals(next, frame))
                return true;
            if (next is not INamedTypeSymbol named || !seen.Add(named))
                return false;
            path.Add(named);
            foreach (RelativeMotion motion in RelativeMotion.Of(named))
            {
                if (Follow(motion.Frame))
                    return true;
            }

            path.RemoveAt(path.Count - 1);
            return false;
        }
    }
}
