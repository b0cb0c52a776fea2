namespace Auditor.Reports.Comparisons;

/// <summary>How the rule sets of two revisions differ.</summary>
/// <param name="IsSame">Whether every file of both is the same.</param>
/// <param name="IsFullyKnown">Whether both rule sets were at hand; a findings file tells parameters and names of rules alone.</param>
/// <param name="Changes">What differs in what they decide or say.</param>
public sealed record ChangedRuleSet(bool IsSame, bool IsFullyKnown, IReadOnlyList<ChangedRuleItem> Changes);
