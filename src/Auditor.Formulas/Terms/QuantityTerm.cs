using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>A computed quantity of the subject.</summary>
internal sealed class QuantityTerm(SourceSpan span, QuantitySlot slot) : Term(slot.Type, span)
{
    public override Unit? Unit => slot.Unit;

    public override Value Evaluate(Scope scope)
    {
        var value = scope.Subject.Quantity(slot.Index);
        scope.Trace?.Read(Span, scope.Subject, slot, value);
        return value;
    }
}
