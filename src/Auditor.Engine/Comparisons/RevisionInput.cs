using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.Comparisons;

/// <summary>An input as a revision states it.</summary>
/// <param name="Path">Its path as the design file writes it (<c>device.rating</c>).</param>
/// <param name="Text">Its value as written; a list of words with commas between.</param>
/// <param name="From">Where it was said: <c>subject</c>, <c>type</c> or <c>defaults</c>.</param>
/// <param name="Kind">What it holds; null where a findings file does not tell.</param>
/// <param name="Place">Where it stands; null where a findings file does not tell.</param>
public sealed record RevisionInput(string Path, string Text, string From, FormulaKind? Kind, Place? Place)
{
    /// <summary>
    /// Whether two revisions state the same: the same quantity with the same tolerance and standing, whatever the unit and the digits;
    /// the same words in any order; else the same text.
    /// </summary>
    public static bool Same(RevisionInput a, RevisionInput b) => a.Text == b.Text || (a.Kind ?? b.Kind) switch
    {
        FormulaKind.Flag => string.Equals(a.Text, b.Text, StringComparison.OrdinalIgnoreCase),
        FormulaKind.Words => WordsOf(a.Text).SequenceEqual(WordsOf(b.Text)),
        FormulaKind.Quantity or null => SameQuantity(a.Text, b.Text),
        _ => false,
    };

    /// <summary>The value in a form that is the same for the same statement, up to the last digits of a conversion.</summary>
    internal string Normal()
    {
        if (Kind is FormulaKind.Words)
        {
            return string.Join(", ", WordsOf(Text));
        }

        if (Kind is not (FormulaKind.Quantity or null) || !QuantityText.TryParse(Text, out var stated, out _))
        {
            return Kind is FormulaKind.Flag ? Text.ToLowerInvariant() : Text;
        }

        var tolerance = stated.Tolerance is { } both ? $" -{both.Below:G12} +{both.Above:G12}" : "";
        return $"{stated.Quantity.Value:G12} {stated.Quantity.Dimension}{tolerance} {stated.Standing}";
    }

    private static IEnumerable<string> WordsOf(string text) => text.Split(", ").Order(StringComparer.Ordinal);

    private static bool SameQuantity(string a, string b) =>
        QuantityText.TryParse(a, out var x, out _) && QuantityText.TryParse(b, out var y, out _)
        && x.Standing == y.Standing && x.Quantity.Dimension == y.Quantity.Dimension && Comparison.Same(x.Quantity.Value, y.Quantity.Value)
        && SameTolerance(x.Tolerance, y.Tolerance);

    private static bool SameTolerance(Tolerance? a, Tolerance? b) => (a, b) switch
    {
        (null, null) => true,
        (null, _) or (_, null) => false,
        _ => Comparison.Same(a.Below, b.Below) && Comparison.Same(a.Above, b.Above),
    };
}
