using Auditor.Formulas;
using Auditor.Quantities;

namespace Auditor.Engine.RuleSets;

/// <summary>What a rule compares.</summary>
/// <param name="How">The comparison.</param>
/// <param name="Value">The value; the flag of a plain requirement.</param>
/// <param name="Limits">The limit; two for a range; the allowed ones for a choice; none for a plain requirement.</param>
/// <param name="Unit">Unit in which value and limits are shown; null for anything but quantities.</param>
public sealed record Check(CheckKind How, Formula Value, IReadOnlyList<Formula> Limits, Unit? Unit);
