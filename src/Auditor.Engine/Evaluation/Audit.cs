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
    /// <summary>So many subjects are judged by one thread at a stretch.</summary>
    private const int PartSize = 512;

    /// <summary>Runs the audit.</summary>
    /// <param name="design">The design.</param>
    /// <param name="asOf">The day on which departures are judged to be in force.</param>
    /// <param name="problems">Receives departures that cannot be read.</param>
    /// <param name="acceptance">What to do with tolerances; null to go by the design.</param>
    public static AuditResult Run(Design design, DateOnly asOf, Problems problems, Acceptance? acceptance = null)
    {
        var rules = design.Evaluator.Rules;
        var findings = Judged(rules, design.Subjects);
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

    private static List<Finding> Judged(RuleSet rules, IReadOnlyList<DesignSubject> subjects) =>
        [.. InParts.Make(subjects.Count, PartSize, range => JudgedIn(rules, subjects, range)).SelectMany(part => part)];

    private static List<Finding> JudgedIn(RuleSet rules, IReadOnlyList<DesignSubject> subjects, Range range)
    {
        var findings = new List<Finding>();
        for (var i = range.Start.Value; i < range.End.Value; i++)
        {
            foreach (var rule in rules.RulesOf(subjects[i].Shape))
            {
                if (Judge.Decide(rule, subjects[i].Scope) is { Verdict: not null } judgement)
                {
                    findings.Add(new Finding(rule, subjects[i], judgement));
                }
            }
        }

        return findings;
    }
}
