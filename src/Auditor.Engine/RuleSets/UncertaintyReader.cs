using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;

namespace Auditor.Engine.RuleSets;

/// <summary>Reads which reading a quantity is the uncertainty of.</summary>
/// <param name="problems">Receives what is wrong.</param>
internal sealed class UncertaintyReader(Problems problems)
{
    private readonly Dictionary<(SubjectShape Shape, int Reading), QuantitySlot> _seen = [];

    /// <summary>The reading; null where the quantity is no uncertainty, or with a problem added.</summary>
    public Uncertainty? Read(MappingNode node, SubjectShape shape, QuantitySlot quantity)
    {
        if (node.Scalar("uncertainty-of") is not { } path)
        {
            return null;
        }

        var reading = shape.Input(path.Text.Replace('-', '_'));
        if (reading is null)
        {
            problems.Add(RuleMessages.NoReading(path.Span, path.Text, shape.Name, NearestWord.Find(path.Text, shape.Inputs.Select(input => input.Path))));
            return null;
        }

        if (!Fits(reading.Type, quantity.Type))
        {
            problems.Add(RuleMessages.UncertaintyUnit(path.Span, path.Text, reading.Type, quantity.Type));
            return null;
        }

        if (!_seen.TryAdd((shape, reading.Index), quantity) && _seen[(shape, reading.Index)] != quantity)
        {
            problems.Add(RuleMessages.SecondUncertainty(path.Span, path.Text, _seen[(shape, reading.Index)].Symbol));
            return null;
        }

        return new Uncertainty(reading, node.Text("only-when") is not null);
    }

    /// <summary>An uncertainty has the dimension of a difference between two readings.</summary>
    private static bool Fits(FormulaType reading, FormulaType uncertainty) =>
        reading.Kind == FormulaKind.Quantity && uncertainty.Kind == FormulaKind.Quantity
        && reading.Dimension.TryMinus(reading.Dimension, out var difference) && difference == uncertainty.Dimension;
}
