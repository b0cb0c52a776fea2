using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>What is read outside the aggregate, as in <c>this.Zs</c>.</summary>
internal sealed class OuterTerm(SourceSpan span, Term inner) : Term(inner.Type, span)
{
    public override Unit? Unit => inner.Unit;

    public override Value Evaluate(Scope scope) => inner.Evaluate(scope.Outer!);
}
