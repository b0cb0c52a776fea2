using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Terms;

/// <summary>A comparison of two quantities, two texts or two flags.</summary>
internal sealed class CompareTerm(SourceSpan span, Relation relation, Term left, Term right) : Term(FormulaType.Flag, span)
{
    public override Value Evaluate(Scope scope)
    {
        var a = left.Evaluate(scope);
        var b = right.Evaluate(scope);
        if (a.IsMissing || b.IsMissing)
        {
            return Value.MissingFrom(a, b);
        }

        var holds = a.Kind == ValueKind.Text ? (a.Text == b.Text) == (relation == Relation.Equal) : Holds(a.Number, b.Number);
        return Value.Of(holds, a.Marks | b.Marks);
    }

    private bool Holds(double a, double b) => relation switch
    {
        Relation.Equal => Comparison.Same(a, b),
        Relation.NotEqual => !Comparison.Same(a, b),
        Relation.Less => !Comparison.AtLeast(a, b),
        Relation.AtMost => Comparison.AtMost(a, b),
        Relation.Greater => !Comparison.AtMost(a, b),
        _ => Comparison.AtLeast(a, b),
    };
}
