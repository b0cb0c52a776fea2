using Auditor.Documents;
using Auditor.Formulas.Curves;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Subjects;

/// <summary>Is told what a formula reads while it is evaluated. The span is that of the term in the rule file.</summary>
public interface ITrace
{
    /// <summary>An input was read.</summary>
    void Read(SourceSpan term, ISubject subject, InputSlot slot, in Value value);

    /// <summary>A quantity was read.</summary>
    void Read(SourceSpan term, ISubject subject, QuantitySlot slot, in Value value);

    /// <summary>A parameter was read.</summary>
    void Read(SourceSpan term, ParameterSlot slot, in Value value);

    /// <summary>A table was looked up; the cells are those that the value was taken or interpolated from, the unit is that of the value.</summary>
    void Read(SourceSpan term, Lookup lookup, IReadOnlyList<TableCell> cells, in Value value, Unit? unit);

    /// <summary>A curve was read.</summary>
    void Read(SourceSpan term, Curve curve, string reading, in Value value, Unit unit);

    /// <summary>A way led nowhere, or a call gave its value as a whole.</summary>
    void Whole(SourceSpan term, in Value value, Unit? unit);
}
