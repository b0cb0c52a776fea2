using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>The negative of a quantity.</summary>
internal sealed class NegateTerm(SourceSpan span, Term operand) : Term(operand.Type, span)
{
    public override Unit? Unit => operand.Unit;

    public override Value Evaluate(Scope scope)
    {
        var value = operand.Evaluate(scope);
        return value.IsMissing ? value : Value.Of(-value.Number, value.Marks);
    }
}
