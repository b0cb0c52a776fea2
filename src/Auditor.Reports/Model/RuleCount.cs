namespace Auditor.Reports.Model;

/// <summary>How many findings of one rule have a verdict.</summary>
/// <param name="Verdict">The verdict, in one word.</param>
/// <param name="Total">How many.</param>
public sealed record RuleCount(string Verdict, int Total);
