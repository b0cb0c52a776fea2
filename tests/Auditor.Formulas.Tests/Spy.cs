using Auditor.Documents;
using Auditor.Formulas.Curves;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Tests;

/// <summary>Keeps what an evaluation told.</summary>
internal sealed class Spy : ITrace
{
    /// <summary>Each part with its value, and the subject that it was read from; null for tables, curves and what a whole call gave.</summary>
    public List<(SourceSpan Span, Value Value, ISubject? Subject)> Told { get; } = [];

    public void Read(SourceSpan term, ISubject subject, InputSlot slot, in Value value) => Told.Add((term, value, subject));

    public void Read(SourceSpan term, ISubject subject, QuantitySlot slot, in Value value) => Told.Add((term, value, subject));

    public void Read(SourceSpan term, ParameterSlot slot, in Value value) => Told.Add((term, value, null));

    public void Read(SourceSpan term, Lookup lookup, IReadOnlyList<TableCell> cells, in Value value, Unit? unit) => Told.Add((term, value, null));

    public void Read(SourceSpan term, Curve curve, string reading, in Value value, Unit unit) => Told.Add((term, value, null));

    public void Whole(SourceSpan term, in Value value, Unit? unit) => Told.Add((term, value, null));
}
