using Auditor.Documents;
using Auditor.Formulas.Terms;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;
using Scriban.Syntax;

namespace Auditor.Formulas.Binding;

/// <summary>Operators, with the check that units fit.</summary>
internal sealed partial class Binder
{
    private const string NoTemperature = "anything but a temperature";

    private Term? BindUnary(ScriptUnaryExpression unary, Site site)
    {
        var span = SpanOf(unary);
        switch (unary.Operator)
        {
            case ScriptUnaryOperator.Not:
                return BindFlag(unary.Right!, site, "`!`") is { } flag ? new NotTerm(span, flag) : null;
            case ScriptUnaryOperator.Negate:
                return BindNegative(span, unary.Right!, site);
            default:
                return Fail(FormulaMessages.NotAllowed(span, "this sign"));
        }
    }

    private Term? BindNegative(SourceSpan span, ScriptExpression operand, Site site) => BindFactor(operand, site, "`-`") switch
    {
        null => null,
        LiteralTerm literal => new LiteralTerm(literal.Type, span, Value.Of(-literal.Constant.Number), literal.Unit),
        var number => new NegateTerm(span, number),
    };

    private Term? BindBinary(ScriptBinaryExpression binary, Site site)
    {
        if (IsJuxtaposition(binary))
        {
            return binary.Left switch
            {
                ScriptLiteral literal => BindQuantityLiteral(binary, literal, negative: false),
                ScriptUnaryExpression { Operator: ScriptUnaryOperator.Negate, Right: ScriptLiteral literal } => BindQuantityLiteral(binary, literal, negative: true),
                _ => Fail(FormulaMessages.SideBySide(SpanOf(binary))),
            };
        }

        return binary.Operator switch
        {
            ScriptBinaryOperator.Add => BindSum(binary, site, Arithmetic.Add),
            ScriptBinaryOperator.Subtract => BindSum(binary, site, Arithmetic.Subtract),
            ScriptBinaryOperator.Multiply => BindProduct(binary, site, Arithmetic.Multiply),
            ScriptBinaryOperator.Divide => BindProduct(binary, site, Arithmetic.Divide),
            ScriptBinaryOperator.Power => BindPower(binary, site),
            ScriptBinaryOperator.And => BindLogic(binary, site, isAnd: true),
            ScriptBinaryOperator.Or => BindLogic(binary, site, isAnd: false),
            ScriptBinaryOperator.EmptyCoalescing => BindCoalesce(binary, site),
            ScriptBinaryOperator.CompareEqual => BindComparison(binary, site, Relation.Equal),
            ScriptBinaryOperator.CompareNotEqual => BindComparison(binary, site, Relation.NotEqual),
            ScriptBinaryOperator.CompareLess => BindComparison(binary, site, Relation.Less),
            ScriptBinaryOperator.CompareLessOrEqual => BindComparison(binary, site, Relation.AtMost),
            ScriptBinaryOperator.CompareGreater => BindComparison(binary, site, Relation.Greater),
            ScriptBinaryOperator.CompareGreaterOrEqual => BindComparison(binary, site, Relation.AtLeast),
            _ => Fail(FormulaMessages.NotAllowed(SpanOf(binary), "this operator")),
        };
    }

    /// <summary>The parser writes terms that stand side by side as a product without a sign.</summary>
    private static bool IsJuxtaposition(ScriptBinaryExpression binary) =>
        binary.Operator == ScriptBinaryOperator.Multiply && string.IsNullOrEmpty(binary.OperatorToken?.Value);

    private (Term Left, Term Right)? BindBoth(ScriptBinaryExpression binary, Site site)
    {
        var left = Bind(binary.Left!, site);
        var right = Bind(binary.Right!, site);
        return left is null || right is null ? null : (left, right);
    }

    private ArithmeticTerm? BindSum(ScriptBinaryExpression binary, Site site, Arithmetic operation)
    {
        if (BindBoth(binary, site) is not var (left, right))
        {
            return null;
        }

        var dimension = Dimension.None;
        var fits = left.Type.Kind == FormulaKind.Quantity && right.Type.Kind == FormulaKind.Quantity
            && (operation == Arithmetic.Add
                ? left.Type.Dimension.TryPlus(right.Type.Dimension, out dimension)
                : left.Type.Dimension.TryMinus(right.Type.Dimension, out dimension));
        if (fits)
        {
            return new ArithmeticTerm(FormulaType.Of(dimension), SpanOf(binary), operation, left, right);
        }

        Fail(FormulaMessages.Dimensions(SpanOf(binary), operation == Arithmetic.Add ? "add" : "subtract", left.Type, right.Type));
        return null;
    }

    private Term? BindProduct(ScriptBinaryExpression binary, Site site, Arithmetic operation)
    {
        var sign = operation == Arithmetic.Multiply ? "`*`" : "`/`";
        var left = BindFactor(binary.Left!, site, sign);
        var right = BindFactor(binary.Right!, site, sign);
        if (left is null || right is null)
        {
            return null;
        }

        var exists = operation == Arithmetic.Multiply
            ? left.Type.Dimension.TryTimes(right.Type.Dimension, out var dimension)
            : left.Type.Dimension.TryOver(right.Type.Dimension, out dimension);
        return exists
            ? new ArithmeticTerm(FormulaType.Of(dimension), SpanOf(binary), operation, left, right)
            : Fail(FormulaMessages.Overflow(SpanOf(binary)));
    }

    private Term? BindFactor(ScriptExpression factor, Site site, string sign) => BindQuantity(factor, site, sign) switch
    {
        { Type.Dimension.IsTemperature: true } term => Fail(FormulaMessages.Needs(term.Span, sign, NoTemperature, term.Type)),
        var term => term,
    };

    private ArithmeticTerm? BindPower(ScriptBinaryExpression binary, Site site)
    {
        if (binary.Left is ScriptUnaryExpression or ScriptBinaryExpression { Operator: ScriptBinaryOperator.Power })
        {
            Fail(FormulaMessages.PowerBrackets(SpanOf(binary)));
            return null;
        }

        var left = BindQuantity(binary.Left!, site, "`^`");
        var right = BindQuantity(binary.Right!, site, "`^`");
        if (left is null || right is null)
        {
            return null;
        }

        var dimension = Dimension.None;
        if (!right.Type.Dimension.IsNone)
        {
            Fail(FormulaMessages.Needs(right.Span, "an exponent", "a pure number", right.Type));
            return null;
        }

        if (!left.Type.Dimension.IsNone && !(Constant(right) is { } exponent && left.Type.Dimension.TryPower(exponent, out dimension)))
        {
            Fail(FormulaMessages.PowerExponent(right.Span));
            return null;
        }

        return new ArithmeticTerm(FormulaType.Of(dimension), SpanOf(binary), Arithmetic.Power, left, right);
    }

    private static double? Constant(Term term) => term is LiteralTerm { Constant: { Kind: ValueKind.Quantity } value } ? value.Number : null;

    private LogicTerm? BindLogic(ScriptBinaryExpression binary, Site site, bool isAnd)
    {
        var sign = isAnd ? "`&&`" : "`||`";
        var left = BindFlag(binary.Left!, site, sign);
        var right = BindFlag(binary.Right!, site, sign);
        return left is null || right is null ? null : new LogicTerm(SpanOf(binary), isAnd, left, right);
    }

    private CoalesceTerm? BindCoalesce(ScriptBinaryExpression binary, Site site)
    {
        if (BindBoth(binary, site) is not var (left, right))
        {
            return null;
        }

        if (left.Type.Equals(right.Type))
        {
            return new CoalesceTerm(Joined(left.Type, right), SpanOf(binary), left, right);
        }

        Fail(FormulaMessages.Dimensions(SpanOf(binary), "take the one or the other of", left.Type, right.Type));
        return null;
    }

    /// <summary>A vocabulary stays known through `??` and `choose` where the other side is one of its words.</summary>
    private static FormulaType Joined(FormulaType type, Term other) => type.Vocabulary switch
    {
        null => type,
        _ when type.Kind == FormulaKind.Words => type,
        var words when other is LiteralTerm { Constant.Kind: ValueKind.Text } literal => words.Contains(literal.Constant.Text) ? type : FormulaType.Text,
        var words => Equals(other.Type.Vocabulary, words) ? type : FormulaType.Text,
    };

    private CompareTerm? BindComparison(ScriptBinaryExpression binary, Site site, Relation relation)
    {
        if (BindBoth(binary, site) is not var (left, right))
        {
            return null;
        }

        var fault = (left.Type.Equals(right.Type), left.Type.Kind) switch
        {
            (false, _) => FormulaMessages.Dimensions(SpanOf(binary), "compare", left.Type, right.Type),
            (true, FormulaKind.Words) => FormulaMessages.Needs(left.Span, "a comparison", "single values (ask a list `has(list, 'word')`)", left.Type),
            (true, not FormulaKind.Quantity) when relation is not (Relation.Equal or Relation.NotEqual) =>
                FormulaMessages.Needs(left.Span, "a comparison by size", "quantities", left.Type),
            _ => null,
        };
        if (fault is not null)
        {
            Fail(fault);
            return null;
        }

        CheckWord(left, right, problems);
        CheckWord(right, left, problems);
        return new CompareTerm(SpanOf(binary), relation, left, right);
    }

    /// <summary>Tells of a word written out that the input beside it can never be.</summary>
    public static void CheckWord(Term words, Term literal, Problems problems)
    {
        if (words.Type is { Kind: FormulaKind.Text, Vocabulary: { } allowed } && literal is LiteralTerm { Constant.Text: { } word } && !allowed.Contains(word))
        {
            problems.Add(FormulaMessages.UnknownWord(literal.Span, word, allowed, NearestWord.Find(word, allowed)));
        }
    }
}
