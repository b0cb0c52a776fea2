using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>The left value, or the right one where the left is missing; missing for both reasons where both are.</summary>
internal sealed class CoalesceTerm(FormulaType type, SourceSpan span, Term left, Term right) : Term(type, span)
{
    public override Unit? Unit => left.Unit ?? right.Unit;

    public override Value Evaluate(Scope scope)
    {
        var a = left.Evaluate(scope);
        if (!a.IsMissing)
        {
            return a;
        }

        var b = right.Evaluate(scope);
        return b.IsMissing ? Value.MissingFrom(a, b) : b;
    }
}
