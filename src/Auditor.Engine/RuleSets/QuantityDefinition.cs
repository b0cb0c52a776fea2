using Auditor.Documents;
using Auditor.Formulas;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.RuleSets;

/// <summary>A quantity as its sheet defines it.</summary>
/// <param name="Shape">Kind of subject.</param>
/// <param name="Slot">Symbol, type and unit.</param>
/// <param name="Name">What it is.</param>
/// <param name="Formula">How it is computed.</param>
/// <param name="Clause">Where the formula comes from.</param>
/// <param name="Note">Remark for people; empty for none.</param>
/// <param name="Sheet">Name of the sheet.</param>
/// <param name="Node">Its mapping in the sheet's file.</param>
public sealed record QuantityDefinition(
    SubjectShape Shape, QuantitySlot Slot, string Name, Formula Formula, Clause Clause, string Note, string Sheet, MappingNode Node)
{
    /// <summary>The reading whose uncertainty it is; null for any other quantity.</summary>
    public Uncertainty? Uncertainty { get; init; }
}
