using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>One of two terms by a condition; only the chosen one is evaluated.</summary>
internal sealed class ChooseTerm(FormulaType type, SourceSpan span, Term condition, Term whenTrue, Term whenFalse) : Term(type, span)
{
    public override Unit? Unit => whenTrue.Unit ?? whenFalse.Unit;

    public override Value Evaluate(Scope scope)
    {
        var c = condition.Evaluate(scope);
        if (c.IsMissing)
        {
            return c;
        }

        return (c.Flag ? whenTrue : whenFalse).Evaluate(scope).With(c.Marks);
    }
}
