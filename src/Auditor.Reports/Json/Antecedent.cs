using Auditor.Formulas.Curves;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Reports.Json;

/// <summary>One thing that a quantity was computed from. Of the last five, the one of its kind is set.</summary>
/// <param name="Kind">Kind, as the findings schema names it.</param>
/// <param name="Subject">The subject of an input or quantity; null for anything else.</param>
/// <param name="Name">Its name.</param>
/// <param name="Value">Its value.</param>
/// <param name="Unit">Unit in which people read it.</param>
internal sealed record Antecedent(string Kind, ISubject? Subject, string Name, Value Value, Unit? Unit)
{
    public InputSlot? Input { get; init; }

    public QuantitySlot? Quantity { get; init; }

    public ParameterSlot? Parameter { get; init; }

    public TableCell? Cell { get; init; }

    public Curve? Curve { get; init; }
}
