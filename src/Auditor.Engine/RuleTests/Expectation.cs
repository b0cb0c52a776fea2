using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.RuleTests;

/// <summary>Holds what came of a case against what the case expects.</summary>
/// <param name="problems">Receives expectations that fit no value of their kind.</param>
internal sealed class Expectation(Problems problems)
{
    /// <summary>What is wrong with a relative margin; null when it is as expected, or nothing is.</summary>
    public static string? Compare(Margin? margin, ScalarNode? expected)
    {
        if (expected is null)
        {
            return null;
        }

        if (!QuantityText.TryParse(expected.Text, out var stated, out _) || !stated.Quantity.Dimension.IsNone)
        {
            return $"`{expected.Text}` is no relative margin";
        }

        if (margin?.Relative is not { } relative)
        {
            return $"expected a margin of {expected.Text}, got none";
        }

        return Near(relative, stated) ? null : $"expected a margin of {expected.Text}, got {relative * 100:0.######} %";
    }

    /// <summary>What is wrong with the value of a quantity; null when it is as expected.</summary>
    public string? Compare(in Value value, ScalarNode expected, FormulaType type, Unit? unit)
    {
        if (expected.Text == "missing" || value.IsMissing)
        {
            return value.IsMissing == (expected.Text == "missing") ? null : $"expected {expected.Text}, got {Show(value, unit)}";
        }

        if (type.Kind != FormulaKind.Quantity)
        {
            var same = CaseReader.ValueOf(expected, type) is { } wanted
                && (type.Kind == FormulaKind.Text ? wanted.Text == value.Text : wanted.Flag == value.Flag);
            return same ? null : $"expected {expected.Text}, got {Show(value, unit)}";
        }

        if (!QuantityText.TryParse(expected.Text, out var stated, out _) || stated.Quantity.Dimension != type.Dimension)
        {
            problems.Add(CaseMessages.WrongExpectation(expected.Span, type));
            return $"`{expected.Text}` is no expectation for {type}";
        }

        return Near(value.Number, stated) ? null : $"expected {expected.Text}, got {Show(value, unit)}";
    }

    /// <summary>Within the tolerance, or the same within the slack of comparisons where none is stated.</summary>
    private static bool Near(double value, StatedQuantity stated)
    {
        var wanted = stated.Quantity.Value;
        if (Comparison.Same(value, wanted) || Math.Abs(value - wanted) < 1e-12)
        {
            return true;
        }

        return stated.Tolerance is { } tolerance && value >= wanted - tolerance.Below && value <= wanted + tolerance.Above;
    }

    private static string Show(in Value value, Unit? unit) => value.Kind switch
    {
        ValueKind.Missing => "missing: " + string.Join("; ", value.Absences.Items),
        ValueKind.Quantity => $"{unit!.FromCoherent(value.Number):G7} {unit.Symbol}",
        ValueKind.Flag => value.Flag ? "true" : "false",
        _ => value.Text,
    };
}
