using Auditor.Engine.Findings;

namespace Auditor.Engine.Remedies;

/// <summary>What would put the findings of an audit right.</summary>
/// <param name="Audit">The audit.</param>
/// <param name="Findings">The findings looked into, in the order of the audit.</param>
/// <param name="Judged">How many times a rule was judged to find out.</param>
public sealed record RemedyResult(AuditResult Audit, IReadOnlyList<FindingRemedies> Findings, long Judged)
{
    /// <summary>What would put a finding right; null where that was not looked into.</summary>
    public FindingRemedies? Of(string key) => Findings.FirstOrDefault(each => each.Finding.Key == key);
}
