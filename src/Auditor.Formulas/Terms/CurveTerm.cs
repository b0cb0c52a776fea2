using Auditor.Documents;
using Auditor.Formulas.Curves;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>
/// A reading of a time-current curve: the current that opens the device within a time, or the time in which a current opens it.
/// </summary>
internal sealed class CurveTerm(FormulaType type, SourceSpan span, CurveSet curves, bool givesCurrent, IReadOnlyList<Term> arguments) : Term(type, span)
{
    public override Unit? Unit { get; } = UnitCatalog.Of(type.Dimension)[0];

    public override Value Evaluate(Scope scope)
    {
        var standard = arguments[0].Evaluate(scope);
        var kind = arguments[1].Evaluate(scope);
        var rating = arguments[2].Evaluate(scope);
        var given = arguments[3].Evaluate(scope);
        var absent = FirstMissing(FirstMissing(standard, kind), FirstMissing(rating, given));
        if (absent is { } missing)
        {
            return missing;
        }

        var marks = standard.Marks | kind.Marks | rating.Marks | given.Marks;
        var curve = curves.Find(standard.Text, kind.Text);
        if (curve is null)
        {
            return CurveSet.None(standard.Text, kind.Text);
        }

        var value = (givesCurrent ? curve.TripCurrent(rating.Number, given.Number) : curve.TripTime(rating.Number, given.Number)).With(marks);
        scope.Trace?.Read(Span, curve, givesCurrent ? "current for a time" : "time for a current", value, Unit!);
        return value;
    }

    private static Value? FirstMissing(Value? a, Value? b)
    {
        var left = a is { IsMissing: true };
        var right = b is { IsMissing: true };
        return (left, right) switch
        {
            (true, true) => Value.MissingFrom(a!.Value, b!.Value),
            (true, false) => a,
            (false, true) => b,
            _ => null,
        };
    }
}
