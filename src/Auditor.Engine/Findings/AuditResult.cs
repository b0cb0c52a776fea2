using Auditor.Engine.Departures;
using Auditor.Engine.Guarded;
using Auditor.Engine.Installation;
using Auditor.Engine.Remedies;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Findings;

/// <summary>Everything that one audit found.</summary>
/// <param name="Design">The design.</param>
/// <param name="Rules">The rule set.</param>
/// <param name="Subjects">What was judged: the subjects of the design in its order, then what is on record about the audit.</param>
/// <param name="Findings">All findings: subjects in their order, then rules by id.</param>
/// <param name="Departures">The departures that the design records, in its order.</param>
/// <param name="AsOf">The day of the audit; null where it made no difference.</param>
/// <param name="NotApplied">Rules of the set that applied to no subject, by id.</param>
public sealed record AuditResult(
    Design Design, RuleSet Rules, IReadOnlyList<DesignSubject> Subjects, IReadOnlyList<Finding> Findings, IReadOnlyList<Departure> Departures,
    DateOnly? AsOf, IReadOnlyList<Rule> NotApplied)
{
    /// <summary>How values were held against limits.</summary>
    public Decision Decision { get; init; }

    /// <summary>What would put findings right; null where nobody asked.</summary>
    public RemedyResult? Remedies { get; init; }

    /// <summary>How many findings have a verdict.</summary>
    public int Count(Verdict verdict) => Findings.Count(finding => finding.Verdict == verdict);

    /// <summary>The finding of that key, present or former rule id; null when there is none.</summary>
    public Finding? Find(string key)
    {
        var colon = key.IndexOf(':');
        var rule = colon > 0 ? Rules.Rule(key[..colon]) : null;
        return rule is null ? null : Findings.FirstOrDefault(finding => finding.Rule == rule && finding.Subject.Key == key[(colon + 1)..]);
    }
}
