using System.Numerics;
using Auditor.Formulas.Terms;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;
using Scriban.Syntax;

namespace Auditor.Formulas.Binding;

/// <summary>Numbers, quantities, texts and flags written out.</summary>
internal sealed partial class Binder
{
    private LiteralTerm? BindLiteral(ScriptLiteral literal)
    {
        var span = SpanOf(literal);
        switch (literal.Value)
        {
            case string text:
                return new LiteralTerm(FormulaType.Text, span, Value.Of(text));
            case bool flag:
                return new LiteralTerm(FormulaType.Flag, span, Value.Of(flag));
            case null:
                Fail(FormulaMessages.NotAllowed(span, "`null`"));
                return null;
            default:
                return NumberOf(literal) is { } number ? new LiteralTerm(FormulaType.Number, span, Value.Of(number)) : null;
        }
    }

    private double? NumberOf(ScriptLiteral literal)
    {
        var written = source.Text[literal.Span.Start.Offset..Math.Min(literal.Span.End.Offset + 1, source.Text.Length)];
        if (written.Length > 0 && char.IsAsciiLetter(written[^1]))
        {
            Fail(FormulaMessages.NumberSuffix(SpanOf(literal), written));
            return null;
        }

        return literal.Value switch
        {
            int number => number,
            long number => number,
            double number => number,
            BigInteger number => (double)number,
            _ => null,
        };
    }

    /// <summary>A number directly followed by a name: the name must be a unit.</summary>
    private LiteralTerm? BindQuantityLiteral(ScriptBinaryExpression pair, ScriptLiteral literal, bool negative)
    {
        if (pair.Right is ScriptBinaryExpression { Operator: ScriptBinaryOperator.Power })
        {
            Fail(FormulaMessages.PowerBrackets(SpanOf(pair)));
            return null;
        }

        if (pair.Right is not ScriptVariable name)
        {
            Fail(FormulaMessages.SideBySide(SpanOf(pair)));
            return null;
        }

        if (UnitCatalog.FindIdentifier(name.Name) is not { } unit)
        {
            Fail(FormulaMessages.UnknownUnit(SpanOf(name), name.Name));
            return null;
        }

        if (NumberOf(literal) is not { } number)
        {
            return null;
        }

        var quantity = Quantity.Of(negative ? -number : number, unit);
        return new LiteralTerm(FormulaType.Of(quantity.Dimension), SpanOf(pair), Value.Of(quantity.Value), unit);
    }
}
