using Auditor.Engine.Adjustments;
using Auditor.Engine.Evaluation;
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
    /// <summary>So many subjects are looked at by one thread at a stretch.</summary>
    private const int PartSize = 512;

    /// <summary>The toleranced inputs, in the order of subjects and inputs.</summary>
    public static IReadOnlyList<TolerancedInput> Read(Design design) =>
        [.. InParts.Make(design.Subjects.Count, PartSize, range => Read(design, range)).SelectMany(part => part)];

    private static List<TolerancedInput> Read(Design design, Range range)
    {
        var found = new List<TolerancedInput>();
        for (var i = range.Start.Value; i < range.End.Value; i++)
        {
            var subject = design.Subjects[i];
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

    /// <summary>The toleranced inputs with the values and tolerances that they have in a design with changes; a changed value keeps its tolerance.</summary>
    /// <param name="inputs">The toleranced inputs of the design as it is.</param>
    /// <param name="changed">The design with the changes made.</param>
    /// <param name="changes">The changes.</param>
    internal static IReadOnlyList<TolerancedInput> After(IReadOnlyList<TolerancedInput> inputs, AdjustedDesign changed, IReadOnlyList<ChangedInput> changes)
    {
        var values = changes.ToDictionary(change => change.Input, change => change.After);
        return [.. inputs.Select(input => After(input, changed, values)).OfType<TolerancedInput>()];
    }

    private static TolerancedInput? After(TolerancedInput input, AdjustedDesign changed, Dictionary<SubjectInput, Value> values)
    {
        var (subject, slot) = input.Input;
        var design = changed.Map.Design;
        if (input.Kind == ToleranceKind.Instrument)
        {
            var size = changed.Quantity(design.Evaluator.Rules.UncertaintyOf(subject.Shape, slot)!, subject);
            return Make(design, input.Input, input.Stated, Size(size), Size(size), input.Kind, size.Marks);
        }

        if (!values.TryGetValue(input.Input, out var value)
            || !QuantityText.TryParse(subject.Source(slot)!.Text, out var stated, out _) || stated.Tolerance is not { } tolerance)
        {
            return input;
        }

        var scale = tolerance.IsRelative ? Math.Abs(value.Number / input.Stated) : 1;
        return Make(design, input.Input, value.Number, scale * tolerance.Below, scale * tolerance.Above, input.Kind, input.Marks);
    }

    private static double Size(in Value uncertainty) => uncertainty.IsMissing ? 0 : Math.Abs(uncertainty.Number);

    private static TolerancedInput? Read(Design design, DesignSubject subject, InputSlot slot)
    {
        if (subject.Input(slot.Index).IsMissing || subject.Source(slot) is not { } scalar || design.Stated(scalar.Text) is not { } stated)
        {
            return null;
        }

        return stated.Tolerance is { } tolerance
            ? Make(design, new SubjectInput(subject, slot), subject.Input(slot.Index).Number, tolerance.Below, tolerance.Above, ToleranceKind.Stated, Marks.None)
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
        var input = new SubjectInput(subject, slot);
        return Make(design, input, input.Stated.Number, Size(uncertainty), Size(uncertainty), ToleranceKind.Instrument, uncertainty.Marks);
    }

    private static TolerancedInput? Make(
        Design design, SubjectInput input, double stated, double below, double above, ToleranceKind kind, Marks marks)
    {
        var bounds = design.Evaluator.Rules.Schema.BoundsOf(input.Subject.Shape, input.Slot);
        var (low, high) = (Math.Min(stated, bounds.Clamp(stated - below)), Math.Max(stated, bounds.Clamp(stated + above)));
        return low < high ? new TolerancedInput(input, stated, low, high, kind, marks) : null;
    }
}
