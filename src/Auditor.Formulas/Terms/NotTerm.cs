using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Terms;

/// <summary>The contrary of a flag.</summary>
internal sealed class NotTerm(SourceSpan span, Term operand) : Term(FormulaType.Flag, span)
{
    public override Value Evaluate(Scope scope)
    {
        var value = operand.Evaluate(scope);
        return value.IsMissing ? value : Value.Of(!value.Flag, value.Marks);
    }
}
