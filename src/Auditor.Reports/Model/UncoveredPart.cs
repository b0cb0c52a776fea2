using Auditor.Engine.Registers;

namespace Auditor.Reports.Model;

/// <summary>What the audit could not look at in one part of the wiring rules.</summary>
/// <param name="Part">The part.</param>
/// <param name="Decidable">Requirements that data could decide, but no rule of the set does.</param>
/// <param name="Judgement">Requirements that only a person can decide.</param>
public sealed record UncoveredPart(string Part, IReadOnlyList<RegisterRow> Decidable, IReadOnlyList<RegisterRow> Judgement);
