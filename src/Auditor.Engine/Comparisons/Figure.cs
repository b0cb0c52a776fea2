using Auditor.Engine.Findings;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.Comparisons;

/// <summary>A value of a finding or a parameter, to be compared with another revision's.</summary>
/// <param name="Number">The number in coherent units; null for words and flags.</param>
/// <param name="Text">The value as shown.</param>
public sealed record Figure(double? Number, string Text)
{
    /// <summary>The figure of a value; null where it is missing.</summary>
    public static Figure? Of(in Value value, Unit? unit) =>
        value.IsMissing ? null : new Figure(value.Kind == ValueKind.Quantity ? value.Number : null, ValueText.Show(value, unit));

    /// <summary>Whether two figures are the same: numbers within the slack of every comparison, anything else to the letter.</summary>
    public static bool Same(Figure? a, Figure? b) => (a, b) switch
    {
        (null, null) => true,
        (null, _) or (_, null) => false,
        ({ Number: { } x }, { Number: { } y }) => Comparison.Same(x, y),
        _ => a.Text == b.Text,
    };

    /// <summary>Whether two lists of figures are the same, one by one.</summary>
    public static bool Same(IReadOnlyList<Figure> a, IReadOnlyList<Figure> b) => a.Count == b.Count && a.Zip(b).All(pair => Same(pair.First, pair.Second));
}
