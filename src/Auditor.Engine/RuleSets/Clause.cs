namespace Auditor.Engine.RuleSets;

/// <summary>Where a statement comes from.</summary>
/// <param name="Type">Clause type, from the closed list of the rule schemas.</param>
/// <param name="References">Clauses of the standards.</param>
/// <param name="Note">What more there is to say, such as "common practice"; empty for nothing.</param>
public sealed record Clause(string Type, IReadOnlyList<string> References, string Note);
