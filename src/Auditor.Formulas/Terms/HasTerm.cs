using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Terms;

/// <summary>Whether a list of words holds a word.</summary>
internal sealed class HasTerm(SourceSpan span, Term operand, string word) : Term(FormulaType.Flag, span)
{
    public override Value Evaluate(Scope scope)
    {
        var value = operand.Evaluate(scope);
        return value.IsMissing ? value : Value.Of(value.Words.Contains(word), value.Marks);
    }
}
