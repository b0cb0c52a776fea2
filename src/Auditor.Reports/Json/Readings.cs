using Auditor.Documents;
using Auditor.Formulas;
using Auditor.Formulas.Curves;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Reports.Json;

/// <summary>Keeps what one evaluation of a formula reads, each thing once, in the order of the formula.</summary>
internal sealed class Readings : ITrace
{
    private readonly List<Antecedent> _all = [];
    private readonly HashSet<(string Kind, string? Subject, string Name)> _seen = [];

    /// <summary>What a formula reads at a subject.</summary>
    public static IReadOnlyList<Antecedent> Of(Formula formula, ISubject subject)
    {
        var readings = new Readings();
        formula.Evaluate(new Scope(subject, null, readings));
        return readings._all;
    }

    public void Read(SourceSpan term, ISubject subject, InputSlot slot, in Value value) =>
        Add(new Antecedent("input", subject, slot.Path, value, slot.Unit) { Input = slot });

    public void Read(SourceSpan term, ISubject subject, QuantitySlot slot, in Value value) =>
        Add(new Antecedent("quantity", subject, slot.Symbol, value, slot.Unit) { Quantity = slot });

    public void Read(SourceSpan term, ParameterSlot slot, in Value value) =>
        Add(new Antecedent("parameter", null, slot.Name, value, slot.Unit) { Parameter = slot });

    public void Read(SourceSpan term, Lookup lookup, IReadOnlyList<TableCell> cells, in Value value, Unit? unit)
    {
        foreach (var cell in cells.Where(cell => !cell.IsEmpty))
        {
            var column = cell.Column.Length == 0 ? "" : $", column {cell.Column}";
            var (held, heldIn) = cell.Word is { } word ? (Value.Of(word), null) : (Value.Of(cell.Number), lookup.Unit ?? Unit.One);
            Add(new Antecedent("table", null, $"{cell.Table.Title}, row {cell.Row}{column}", held, heldIn) { Cell = cell });
        }
    }

    public void Read(SourceSpan term, Curve curve, string reading, in Value value, Unit unit) =>
        Add(new Antecedent("curve", null, $"{curve.Source.Title}, {reading}", value, unit) { Curve = curve });

    /// <summary>A whole is made of things that were read one by one.</summary>
    public void Whole(SourceSpan term, in Value value, Unit? unit)
    {
    }

    private void Add(Antecedent antecedent)
    {
        if (_seen.Add((antecedent.Kind, antecedent.Subject?.Key, antecedent.Name)))
        {
            _all.Add(antecedent);
        }
    }
}
