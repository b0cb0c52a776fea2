using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Terms;

/// <summary>Whether a text is one of several words.</summary>
internal sealed class OneOfTerm(SourceSpan span, Term operand, IReadOnlyList<string> words) : Term(FormulaType.Flag, span)
{
    public override Value Evaluate(Scope scope)
    {
        var value = operand.Evaluate(scope);
        return value.IsMissing ? value : Value.Of(words.Contains(value.Text), value.Marks);
    }
}
