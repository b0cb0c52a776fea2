namespace Auditor.Engine.RuleTests;

/// <summary>What came of changing rules.</summary>
/// <param name="Count">How many changes were made.</param>
/// <param name="Survivors">Those that no case noticed, by path and place.</param>
public sealed record MutationReport(int Count, IReadOnlyList<Mutation> Survivors);
