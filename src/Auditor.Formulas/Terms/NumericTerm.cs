using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>A function of one number.</summary>
internal sealed class NumericTerm(FormulaType type, SourceSpan span, Func<double, double> function, Term operand) : Term(type, span)
{
    public override Unit? Unit => operand.Type.Equals(Type) && !Type.Dimension.IsNone ? operand.Unit : null;

    public override Value Evaluate(Scope scope)
    {
        var value = operand.Evaluate(scope);
        return value.IsMissing ? value : Value.Of(function(value.Number), value.Marks);
    }
}
