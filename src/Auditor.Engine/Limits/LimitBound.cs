namespace Auditor.Engine.Limits;

/// <summary>A bound of an adjustable input, and the rule that sets it.</summary>
/// <param name="Edge">Where the bound lies.</param>
/// <param name="Rule">The rule that governs there.</param>
public sealed record LimitBound(LimitEdge Edge, RuleLimit Rule);
