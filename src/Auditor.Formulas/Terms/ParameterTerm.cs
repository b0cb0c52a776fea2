using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>A parameter of the rule set.</summary>
internal sealed class ParameterTerm(SourceSpan span, ParameterSlot slot) : Term(slot.Type, span)
{
    public override Unit? Unit => slot.Unit;

    public override Value Evaluate(Scope scope)
    {
        var value = scope.Subject.Parameter(slot.Index);
        scope.Trace?.Read(Span, slot, value);
        return value;
    }
}
