using Auditor.Documents;
using Auditor.Engine.Departures;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.HouseSets;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Evaluation;

/// <summary>Evaluates every rule on every subject of a design, and on what is on record about the audit.</summary>
public static class Audit
{
    /// <summary>Runs the audit.</summary>
    /// <param name="design">The design.</param>
    /// <param name="asOf">The day on which departures are judged to be in force.</param>
    /// <param name="problems">Receives departures that cannot be read.</param>
    /// <param name="acceptance">What to do with tolerances; null to go by the design.</param>
    public static AuditResult Run(Design design, DateOnly asOf, Problems problems, Acceptance? acceptance = null)
    {
        var rules = design.Evaluator.Rules;
        var findings = Judged(rules, design.Subjects).ToList();
        var decision = acceptance?.Decision ?? GuardedFindings.AskedBy(design);
        findings = GuardedFindings.Complete(design, findings, decision, acceptance ?? new Acceptance());
        DesignSubject[] changes = [.. ChangeSubjects.Of(design)];
        findings.AddRange(Judged(rules, changes));
        var departures = new DepartureReader(rules, asOf, problems).Read(design.File, findings);
        DesignSubject[] recorded = [.. DepartureSubjects.Of(design, departures, asOf)];
        findings.AddRange(Judged(rules, recorded));
        var applied = findings.Select(finding => finding.Rule).ToHashSet();
        return new AuditResult(
            design, rules, [.. design.Subjects, .. changes, .. recorded], findings, departures, departures.Count > 0 ? asOf : null,
            [.. rules.Rules.Where(rule => !applied.Contains(rule))])
        {
            Decision = decision,
        };
    }

    private static IEnumerable<Finding> Judged(RuleSet rules, IEnumerable<DesignSubject> subjects) =>
        from subject in subjects
        from rule in rules.RulesOf(subject.Shape)
        let judgement = Judge.Decide(rule, subject.Scope)
        where judgement.Verdict is not null
        select new Finding(rule, subject, judgement);
}
