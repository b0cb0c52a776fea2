using Auditor.Engine.Installation;
using Auditor.Engine.Variation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.Guarded;

/// <summary>
/// Finds the inputs of a design that carry a tolerance: those that state one, and readings with the operating uncertainty of their
/// instrument where the rule set knows one. A tolerance in a named type or a board's defaults holds for each subject by itself.
/// </summary>
public static class ToleranceReader
{
    /// <summary>The toleranced inputs, in the order of subjects and inputs.</summary>
    public static IReadOnlyList<TolerancedInput> Read(Design design)
    {
        var found = new List<TolerancedInput>();
        foreach (var subject in design.Subjects)
        {
            foreach (var slot in subject.Shape.Inputs)
            {
                if (slot.Type.Kind == FormulaKind.Quantity && Read(design, subject, slot) is { } input)
                {
                    found.Add(input);
                }
            }
        }

        return found;
    }

    private static TolerancedInput? Read(Design design, DesignSubject subject, InputSlot slot)
    {
        if (subject.Input(slot.Index).IsMissing || subject.Source(slot) is not { } scalar || !QuantityText.TryParse(scalar.Text, out var stated, out _))
        {
            return null;
        }

        return stated.Tolerance is { } tolerance
            ? Make(design, subject, slot, tolerance.Below, tolerance.Above, ToleranceKind.Stated, Marks.None)
            : OfInstrument(design, subject, slot, stated.Standing);
    }

    private static TolerancedInput? OfInstrument(Design design, DesignSubject subject, InputSlot slot, Standing standing)
    {
        var quantity = design.Evaluator.Rules.UncertaintyOf(subject.Shape, slot);
        if (quantity is null || (quantity.Uncertainty!.OnlyMeasured && standing != Standing.Measured))
        {
            return null;
        }

        var uncertainty = subject.Quantity(quantity.Slot.Index);
        var size = uncertainty.IsMissing ? 0 : Math.Abs(uncertainty.Number);
        return Make(design, subject, slot, size, size, ToleranceKind.Instrument, uncertainty.Marks);
    }

    private static TolerancedInput? Make(
        Design design, DesignSubject subject, InputSlot slot, double below, double above, ToleranceKind kind, Marks marks)
    {
        var stated = subject.Input(slot.Index).Number;
        var bounds = design.Evaluator.Rules.Schema.BoundsOf(subject.Shape, slot);
        var (low, high) = (Math.Min(stated, bounds.Clamp(stated - below)), Math.Max(stated, bounds.Clamp(stated + above)));
        return low < high ? new TolerancedInput(new SubjectInput(subject, slot), stated, low, high, kind, marks) : null;
    }
}
