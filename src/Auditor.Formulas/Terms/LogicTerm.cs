using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Terms;

/// <summary>
/// "And" or "or" by three-valued logic: one false decides an "and", one true an "or", whatever is missing on the other side.
/// </summary>
internal sealed class LogicTerm(SourceSpan span, bool isAnd, Term left, Term right) : Term(FormulaType.Flag, span)
{
    public override Value Evaluate(Scope scope)
    {
        var a = left.Evaluate(scope);
        if (Decides(a))
        {
            return a;
        }

        var b = right.Evaluate(scope);
        if (Decides(b))
        {
            return b;
        }

        return a.IsMissing || b.IsMissing ? Value.MissingFrom(a, b) : Value.Of(isAnd, a.Marks | b.Marks);
    }

    private bool Decides(in Value value) => isAnd ? value.IsFalse : value.IsTrue;
}
