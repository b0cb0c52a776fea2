using System.Globalization;
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
    private Term? BindLiteral(ScriptLiteral literal)
    {
        var span = SpanOf(literal);
        return literal.Value switch
        {
            string text => new LiteralTerm(FormulaType.Text, span, Value.Of(text)),
            bool flag => new LiteralTerm(FormulaType.Flag, span, Value.Of(flag)),
            null => Fail(FormulaMessages.NotAllowed(span, "`null`")),
            _ when NumberOf(literal) is { } number => new LiteralTerm(FormulaType.Number, span, Value.Of(number)),
            _ => Fail(FormulaMessages.NotAllowed(span, "this")),
        };
    }

    /// <summary>Reads the number as written: the parser's own large whole numbers do not round to the nearest.</summary>
    private double? NumberOf(ScriptLiteral literal) => literal.Value is int or long or double or BigInteger
        ? double.Parse(source.Text.AsSpan(literal.Span.Start.Offset, literal.Span.Length), CultureInfo.InvariantCulture)
        : null;

    /// <summary>A number directly followed by a name: the name must be a unit.</summary>
    private Term? BindQuantityLiteral(ScriptBinaryExpression pair, ScriptLiteral literal, bool negative)
    {
        if (pair.Right is ScriptBinaryExpression { Operator: ScriptBinaryOperator.Power })
        {
            return Fail(FormulaMessages.PowerBrackets(SpanOf(pair)));
        }

        if (NumberOf(literal) is not { } number || pair.Right is not ScriptVariable name)
        {
            return Fail(FormulaMessages.SideBySide(SpanOf(pair)));
        }

        if (UnitCatalog.FindIdentifier(name.Name) is not { } unit)
        {
            return Fail(FormulaMessages.UnknownUnit(SpanOf(name), name.Name));
        }

        var quantity = unit.ToCoherent(negative ? -number : number);
        return double.IsFinite(quantity)
            ? new LiteralTerm(FormulaType.Of(unit.Dimension), SpanOf(pair), Value.Of(quantity), unit)
            : Fail(FormulaMessages.NumberTooLarge(SpanOf(pair)));
    }
}
