using Auditor.Documents;
using Auditor.Formulas.Curves;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Evidence;

/// <summary>Keeps what one evaluation of a formula read.</summary>
internal sealed class Tracer : ITrace
{
    private readonly List<Reading> _readings = [];

    /// <summary>What was read, in order.</summary>
    public IReadOnlyList<Reading> Readings => _readings;

    public void Read(SourceSpan term, ISubject subject, InputSlot slot, in Value value) =>
        _readings.Add(new Reading(term, value, slot.Unit) { Subject = subject, Input = slot });

    public void Read(SourceSpan term, ISubject subject, QuantitySlot slot, in Value value) =>
        _readings.Add(new Reading(term, value, slot.Unit) { Subject = subject, Quantity = slot });

    public void Read(SourceSpan term, ParameterSlot slot, in Value value) =>
        _readings.Add(new Reading(term, value, slot.Unit) { Parameter = slot });

    public void Read(SourceSpan term, Lookup lookup, IReadOnlyList<TableCell> cells, in Value value, Quantities.Unit? unit) =>
        _readings.Add(new Reading(term, value, unit) { Lookup = lookup, Cells = cells });

    public void Read(SourceSpan term, Curve curve, string reading, in Value value, Quantities.Unit unit) =>
        _readings.Add(new Reading(term, value, unit) { Curve = curve, CurveReading = reading });

    public void Whole(SourceSpan term, in Value value, Quantities.Unit? unit) => _readings.Add(new Reading(term, value, unit) { IsWhole = true });

    /// <summary>One thing read: exactly one of its kinds is set.</summary>
    internal sealed record Reading(SourceSpan Term, Value Value, Quantities.Unit? Unit)
    {
        public ISubject? Subject { get; init; }

        public InputSlot? Input { get; init; }

        public QuantitySlot? Quantity { get; init; }

        public ParameterSlot? Parameter { get; init; }

        public Lookup? Lookup { get; init; }

        public IReadOnlyList<TableCell> Cells { get; init; } = [];

        public Curve? Curve { get; init; }

        public string CurveReading { get; init; } = "";

        public bool IsWhole { get; init; }
    }
}
