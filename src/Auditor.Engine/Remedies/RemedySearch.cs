using Auditor.Engine.Adjustments;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Remedies;

/// <summary>
/// Searches the changes that rule data declare as remedies, singly and in pairs, for those that put a finding right. Each is proven by
/// judging again everything that it touches, downstream included; by guarded acceptance, in the worst case within the tolerances.
/// </summary>
public static class RemedySearch
{
    /// <summary>The findings that want a remedy: nonconforming or unproven ones, departures apart.</summary>
    public static IReadOnlyList<Finding> Wanting(AuditResult audit) =>
        [.. audit.Findings.Where(finding => finding.Verdict is Verdict.Nonconforming or Verdict.Unproven)];

    /// <summary>Runs the search.</summary>
    /// <param name="audit">The audit of the design.</param>
    /// <param name="findings">The findings to look into.</param>
    public static RemedyResult Run(AuditResult audit, IReadOnlyList<Finding> findings)
    {
        var map = new DependencyMap(audit.Design);
        var recheck = new Recheck(audit);
        var found = new FindingRemedies[findings.Count];
        long judged = 0;
        Parallel.For(0, findings.Count, i =>
        {
            var search = new FindingSearch(map, recheck, findings[i]);
            found[i] = search.Run();
            Interlocked.Add(ref judged, search.Judged);
        });
        return new RemedyResult(audit, found, judged);
    }

    /// <summary>Audits the design with changes as a person would make them: in its text. Null when the changed text cannot be read.</summary>
    /// <param name="audit">The audit of the design as it is.</param>
    /// <param name="changes">The changes.</param>
    /// <param name="reread">Reads the design again with changes.</param>
    public static AuditResult? Reaudit(AuditResult audit, IReadOnlyList<ChangedInput> changes, Reread reread)
    {
        var texts = DesignEdits.Of(audit.Design, changes).ToDictionary(file => file.Before.Path, file => file.After);
        return reread(texts) is { } changed
            ? Audit.Run(changed, audit.AsOf ?? DateOnly.MinValue, new Documents.Problems(), new Acceptance(audit.Decision))
            : null;
    }
}
