namespace FrameSafe.Analyzers;

/// <summary>
/// Keys of <c>Diagnostic.Properties</c>: what a finding tells the repairs and the tool beyond its text. Numbers are written
/// in invariant round-trip form. The additional locations of the finding are the origins of the tags that met.
/// </summary>
internal static class FindingProperties
{
    /// <summary>The computed worst relative error (or, for angles, the error in radians).</summary>
    internal const string Error = "error";

    /// <summary>The budget it was compared with.</summary>
    internal const string Budget = "budget";

    /// <summary>The largest speed, as a fraction of c, that the error was computed for.</summary>
    internal const string MaxSpeed = "maxSpeed";

    /// <summary>Digits lost at worst (FRAME501).</summary>
    internal const string DigitsLost = "digitsLost";

    /// <summary>Full metadata names of the frames and clocks that met, joined by <c>;</c>.</summary>
    internal const string Frames = "frames";

    /// <summary>One line of text for each additional location, joined by line feeds: "`u` is measured in Tug (parameter)".</summary>
    internal const string Origins = "origins";

    /// <summary>
    /// Which repair fits; absent where none does: <c>convert</c>, <c>swap</c>, <c>rapidity-sum</c>, <c>carry</c>,
    /// <c>inverse</c>, <c>lorentz</c>, <c>form</c>, <c>constant</c>, <c>unit-text</c>.
    /// </summary>
    internal const string Repair = "repair";

    /// <summary>What the repair works on: <c>left</c> or <c>right</c> operand of the expression at the location, or <c>whole</c>.</summary>
    internal const string Operand = "operand";

    /// <summary>C# text of the exact number that the operand is to be multiplied by (<c>1000</c>, <c>1e-3</c>, <c>Math.PI / 180</c>).</summary>
    internal const string Factor = "factor";

    /// <summary>C# text of the exact number that the operand is to be divided by; instead of <see cref="Factor"/> where that is exact.</summary>
    internal const string Divisor = "divisor";

    /// <summary>Unit of the operand after the repair, or the nearest unit text for FRAME405.</summary>
    internal const string Unit = "unit";

    /// <summary>Full metadata name of the frame that a number is in.</summary>
    internal const string From = "from";

    /// <summary>Full metadata name of the frame that it is wanted in.</summary>
    internal const string To = "to";

    /// <summary>C# text of the speed of light in the unit of the velocities concerned (<c>rapidity-sum</c>).</summary>
    internal const string LightSpeed = "lightSpeed";

    /// <summary>Name of the right or stable form in the table of forms (<c>form</c>), or of the constant (<c>constant</c>).</summary>
    internal const string Form = "form";

    /// <summary>The code of the velocity that a Newtonian form stands on (<c>form</c>).</summary>
    internal const string Velocity = "velocity";

    /// <summary>The code of the mass that a Newtonian form stands on (<c>form</c>).</summary>
    internal const string Mass = "mass";
}
