using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>An input of the subject.</summary>
internal sealed class InputTerm(SourceSpan span, InputSlot slot) : Term(slot.Type, span)
{
    public override Unit? Unit => slot.Unit;

    public override Value Evaluate(Scope scope)
    {
        var value = scope.Subject.Input(slot.Index);
        scope.Trace?.Read(Span, scope.Subject, slot, value);
        return value;
    }
}
