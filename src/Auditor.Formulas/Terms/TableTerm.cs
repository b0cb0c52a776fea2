using System.Runtime.CompilerServices;
using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>A figure of a table.</summary>
internal sealed class TableTerm(FormulaType type, SourceSpan span, Lookup lookup, Term[] keys) : Term(type, span)
{
    /// <summary>So many keys find room on the stack.</summary>
    private const int FewKeys = 8;

    public override Unit? Unit => lookup.Unit;

    public override Value Evaluate(Scope scope)
    {
        var few = default(FewValues);
        Span<Value> room = few;
        var arguments = keys.Length <= FewKeys ? room[..keys.Length] : new Value[keys.Length];
        Value? absent = null;
        var marks = Marks.None;
        for (var i = 0; i < keys.Length; i++)
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

    [InlineArray(FewKeys)]
    private struct FewValues
    {
        private Value _first;
    }
}
