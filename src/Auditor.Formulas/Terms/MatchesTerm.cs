using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Terms;

/// <summary>Whether a whole text is what a pattern says.</summary>
internal sealed class MatchesTerm(SourceSpan span, Term operand, TextPattern pattern) : Term(FormulaType.Flag, span)
{
    public override Value Evaluate(Scope scope)
    {
        var value = operand.Evaluate(scope);
        return value.IsMissing ? value : Value.Of(pattern.Fits(value.Text), value.Marks);
    }
}
