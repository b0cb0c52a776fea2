using Auditor.Engine.Variation;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Guarded;

/// <summary>An input whose true value may lie off the one that the design has. Numbers in coherent units.</summary>
/// <param name="Input">The input.</param>
/// <param name="Stated">The value as the design has it.</param>
/// <param name="Low">The least value that it may have, within what the design schema allows.</param>
/// <param name="High">The greatest value that it may have, within what the design schema allows.</param>
/// <param name="Kind">Where the tolerance comes from.</param>
/// <param name="Marks">What the tolerance rests on.</param>
public sealed record TolerancedInput(SubjectInput Input, double Stated, double Low, double High, ToleranceKind Kind, Marks Marks)
{
    /// <summary>The input with one of its values, marked as the design marks it.</summary>
    internal Value At(double number) => Value.Of(number, Input.Stated.Marks);
}
