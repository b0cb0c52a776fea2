namespace Auditor.Engine.Comparisons;

/// <summary>One thing that differs in a part of the rule set.</summary>
/// <param name="What">What differs: a key of the file, a cell of the table.</param>
/// <param name="Before">What the earlier rule set says; empty for nothing.</param>
/// <param name="After">What the later rule set says; empty for nothing.</param>
public sealed record RuleDetail(string What, string Before, string After);
