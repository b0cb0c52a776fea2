using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>
/// A collection gathered into one value. Numbers: a missing item makes the whole missing. Flags: three-valued, so one
/// false decides "all" and one true decides "any". Of nothing, the sum and the count are 0, "all" is true, "any" is
/// false, and the least and the greatest are missing.
/// </summary>
internal sealed class AggregateTerm(
    FormulaType type, SourceSpan span, Aggregate how, SubjectList collection, Term item, bool usesOuter) : Term(type, span)
{
    public override Unit? Unit => item.Unit;

    public override Value Evaluate(Scope scope)
    {
        var items = scope.Subject.Collection(collection.Index);
        var value = how is Aggregate.All or Aggregate.Any ? Judge(scope, items) : Gather(scope, items);
        scope.Trace?.Whole(Span, value, Unit);
        return value;
    }

    private Value Gather(Scope scope, IReadOnlyList<ISubject> items)
    {
        if (items.Count == 0 && how is Aggregate.Min or Aggregate.Max)
        {
            return Value.Missing(new Absence(
                AbsenceKind.Subject, scope.Subject.Key, collection.Name, $"there are no {collection.Name.Replace('_', ' ')}", ""));
        }

        var total = Value.Of(0.0);
        for (var i = 0; i < items.Count; i++)
        {
            var next = item.Evaluate(ScopeOf(scope, items[i]));
            if (total.IsMissing || next.IsMissing)
            {
                total = Value.MissingFrom(total, next);
                continue;
            }

            var marks = total.Marks | next.Marks;
            total = how switch
            {
                Aggregate.Count => Value.Of(total.Number + (next.Flag ? 1 : 0), marks),
                Aggregate.Sum => Value.Of(total.Number + next.Number, marks),
                _ when i == 0 => next,
                Aggregate.Min => Value.Of(Math.Min(total.Number, next.Number), marks),
                _ => Value.Of(Math.Max(total.Number, next.Number), marks),
            };
        }

        return total;
    }

    private Value Judge(Scope scope, IReadOnlyList<ISubject> items)
    {
        var isAll = how == Aggregate.All;
        var result = Value.Of(isAll);
        foreach (var subject in items)
        {
            var next = item.Evaluate(ScopeOf(scope, subject));
            if (isAll ? next.IsFalse : next.IsTrue)
            {
                return next;
            }

            result = result.IsMissing || next.IsMissing ? Value.MissingFrom(result, next) : result.With(next.Marks);
        }

        return result;
    }

    private Scope ScopeOf(Scope scope, ISubject subject) =>
        usesOuter || scope.Trace is not null ? new Scope(subject, scope, scope.Trace) : subject.Scope;
}
