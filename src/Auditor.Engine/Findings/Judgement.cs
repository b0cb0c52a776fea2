using Auditor.Formulas.Values;

namespace Auditor.Engine.Findings;

/// <summary>What judging one rule on one subject gave.</summary>
/// <param name="Verdict">The verdict; null when the rule does not apply.</param>
/// <param name="Value">The value compared; missing when it was not computed.</param>
/// <param name="Limits">The limits; empty for a plain requirement.</param>
/// <param name="Margin">The margin; null where nothing was measured.</param>
/// <param name="Absences">What is missing; null when nothing is.</param>
/// <param name="Marks">What the verdict rests on.</param>
public sealed record Judgement(Verdict? Verdict, Value Value, IReadOnlyList<Value> Limits, Margin? Margin, Absences? Absences, Marks Marks);
