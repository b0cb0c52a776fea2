using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>The least or the greatest of several quantities; missing when any of them is.</summary>
internal sealed class ExtremeTerm(FormulaType type, SourceSpan span, bool least, IReadOnlyList<Term> operands) : Term(type, span)
{
    public override Unit? Unit => operands.Select(operand => operand.Unit).FirstOrDefault(unit => unit is not null);

    public override Value Evaluate(Scope scope)
    {
        var result = operands[0].Evaluate(scope);
        for (var i = 1; i < operands.Count; i++)
        {
            var next = operands[i].Evaluate(scope);
            result = result.IsMissing || next.IsMissing ? Value.MissingFrom(result, next) : Better(result, next);
        }

        return result;
    }

    private Value Better(in Value a, in Value b) =>
        Value.Of(least ? Math.Min(a.Number, b.Number) : Math.Max(a.Number, b.Number), a.Marks | b.Marks);
}
