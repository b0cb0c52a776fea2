using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>
/// What is read at the end of a way, such as <c>up.Zs</c>. Where several shapes may stand there, one term is held for each.
/// </summary>
internal sealed class WayTerm(FormulaType type, SourceSpan span, Way way, IReadOnlyDictionary<SubjectShape, Term> byShape) : Term(type, span)
{
    public override Unit? Unit => byShape.Values.First().Unit;

    public override Value Evaluate(Scope scope)
    {
        var subject = scope.Subject.Go(way.Index);
        if (subject is null)
        {
            var missing = Value.Missing(new Absence(AbsenceKind.Subject, scope.Subject.Key, way.Name, way.WhenNone, ""));
            scope.Trace?.Whole(Span, missing, null);
            return missing;
        }

        return byShape[subject.Shape].Evaluate(scope.Trace is null ? subject.Scope : new Scope(subject, null, scope.Trace));
    }
}
