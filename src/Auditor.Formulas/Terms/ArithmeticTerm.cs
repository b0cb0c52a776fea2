using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>A sum, difference, product, quotient or power of two quantities.</summary>
internal sealed class ArithmeticTerm(FormulaType type, SourceSpan span, Arithmetic operation, Term left, Term right) : Term(type, span)
{
    public override Unit? Unit => Shown(left) ?? Shown(right);

    public override Value Evaluate(Scope scope)
    {
        var a = left.Evaluate(scope);
        var b = right.Evaluate(scope);
        if (a.IsMissing || b.IsMissing)
        {
            return Value.MissingFrom(a, b);
        }

        var number = operation switch
        {
            Arithmetic.Add => a.Number + b.Number,
            Arithmetic.Subtract => a.Number - b.Number,
            Arithmetic.Multiply => a.Number * b.Number,
            Arithmetic.Divide => a.Number / b.Number,
            _ => Power(a.Number, b.Number),
        };
        return Value.Of(number, a.Marks | b.Marks);
    }

    /// <summary>The unit of an operand that has the dimension of the whole.</summary>
    private Unit? Shown(Term operand) => operand.Type.Equals(Type) ? operand.Unit : null;

    /// <summary>Squares and square roots by the operations that every processor rounds alike.</summary>
    private static double Power(double number, double exponent) => exponent switch
    {
        2 => number * number,
        0.5 => Math.Sqrt(number),
        _ => Math.Pow(number, exponent),
    };
}
