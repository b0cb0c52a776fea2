namespace Auditor.Reports.Model;

/// <summary>Findings of one verdict, in the order of the audit.</summary>
/// <param name="Verdict">The verdict, in words.</param>
/// <param name="Findings">The findings; never empty.</param>
public sealed record FindingGroup(string Verdict, IReadOnlyList<ReportFinding> Findings);
