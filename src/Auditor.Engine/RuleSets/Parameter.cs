using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;

namespace Auditor.Engine.RuleSets;

/// <summary>A choice that the standards leave open, as the rule set settles it.</summary>
/// <param name="Slot">Name and type.</param>
/// <param name="Id">Name in the set file.</param>
/// <param name="Value">The value in force.</param>
/// <param name="Text">The value as written.</param>
/// <param name="About">What it decides.</param>
/// <param name="Tighter">Which way is stricter: <c>lower</c>, <c>higher</c> or <c>none</c>.</param>
/// <param name="Clause">Clause that leaves it open; empty where none does.</param>
/// <param name="Source">Where the value comes from.</param>
/// <param name="Trust">How far it may be trusted; null where it is a choice and not a figure.</param>
/// <param name="Span">Where the value stands.</param>
public sealed record Parameter(
    ParameterSlot Slot, string Id, Value Value, string Text, string About, string Tighter, string Clause, string Source, Trust? Trust, SourceSpan Span)
{
    /// <summary>The value before any house set, with which the cases of the other files are run; that in force where no house set changes it.</summary>
    internal Value BeforeHouse { get; init; } = Value;
}
