using Auditor.Engine.Installation;
using Auditor.Engine.Variation;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Adjustments;

/// <summary>An adjustment at one place of a design.</summary>
/// <param name="Adjustment">What is changed.</param>
/// <param name="Subject">The subject to speak of: the circuit, where the input is one of its only leg or of all its legs.</param>
/// <param name="Holders">The subjects whose input is changed, to the same value.</param>
public sealed record Adjustable(Adjustment Adjustment, DesignSubject Subject, IReadOnlyList<DesignSubject> Holders)
{
    /// <summary>The value as the design has it; missing for a reading that is not taken.</summary>
    public Value Stated => Holders[0].Input(Adjustment.Slot.Index);

    /// <summary>The values that it may take, the stated one among them; null where every value between two bounds may be taken.</summary>
    public IReadOnlyList<Value>? Steps()
    {
        var steps = Adjustment.Ladder.StepsAt(Holders[0]);
        var stated = Stated;
        return steps is null || stated.Kind != ValueKind.Quantity || steps.Any(step => Same(step, stated))
            ? steps
            : [.. steps.Append(stated).OrderBy(step => step.Number)];
    }

    /// <summary>The changed inputs, and those that follow from them, subject by subject.</summary>
    internal IReadOnlyList<SubjectInput> Inputs =>
        [.. Holders.SelectMany(holder => Adjustment.Also.Select(also => also.Slot).Prepend(Adjustment.Slot).Select(slot => new SubjectInput(holder, slot)))];

    /// <summary>Whether two values are the same step.</summary>
    internal static bool Same(in Value a, in Value b) =>
        a.Kind == b.Kind && (a.Kind == ValueKind.Text ? a.Text == b.Text : !a.IsMissing && Comparison.Same(a.Number, b.Number));
}
