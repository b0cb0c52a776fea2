using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>A figure of a table.</summary>
internal sealed class TableTerm(FormulaType type, SourceSpan span, Lookup lookup, IReadOnlyList<Term> keys) : Term(type, span)
{
    public override Unit? Unit => lookup.Unit;

    public override Value Evaluate(Scope scope)
    {
        Span<Value> arguments = new Value[keys.Count];
        Value? absent = null;
        var marks = Marks.None;
        for (var i = 0; i < keys.Count; i++)
        {
            arguments[i] = keys[i].Evaluate(scope);
            marks |= arguments[i].Marks;
            if (arguments[i].IsMissing)
            {
                absent = absent is { } before ? Value.MissingFrom(before, arguments[i]) : arguments[i];
            }
        }

        if (absent is { } missing)
        {
            return missing;
        }

        var cells = scope.Trace is null ? null : new List<TableCell>();
        var value = lookup.Find(arguments, cells).With(marks);
        scope.Trace?.Read(Span, lookup, cells!, value, Unit);
        return value;
    }
}
