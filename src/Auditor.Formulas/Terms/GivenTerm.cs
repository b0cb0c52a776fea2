using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Terms;

/// <summary>Whether a term has a value.</summary>
internal sealed class GivenTerm(SourceSpan span, Term operand) : Term(FormulaType.Flag, span)
{
    public override Value Evaluate(Scope scope)
    {
        var value = operand.Evaluate(scope);
        return Value.Of(!value.IsMissing, value.IsMissing ? Marks.None : value.Marks);
    }
}
