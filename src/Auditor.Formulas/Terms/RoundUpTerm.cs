using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>The next size or rating of a series.</summary>
internal sealed class RoundUpTerm(SourceSpan span, Lookup series, Term operand) : Term(operand.Type, span)
{
    public override Unit? Unit => series.Keys[0].Unit;

    public override Value Evaluate(Scope scope)
    {
        var value = operand.Evaluate(scope);
        if (value.IsMissing)
        {
            return value;
        }

        if (series.RoundUp(value.Number) is var (key, cell))
        {
            var rounded = Value.Of(key, value.Marks | cell.Trust.Mark());
            scope.Trace?.Read(Span, series, [cell], rounded, Unit);
            return rounded;
        }

        var asked = QuantityText.Show(value.Number, series.Keys[0].Unit!);
        return Value.Missing(new Absence(AbsenceKind.Table, "", series.Name, $"{series.Name} holds nothing from {asked} upward", series.WhenMissing));
    }
}
