using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Evaluation;

/// <summary>Evaluates every rule on every subject of a design.</summary>
public static class Audit
{
    /// <summary>Runs the audit.</summary>
    public static AuditResult Run(Design design)
    {
        var rules = design.Evaluator.Rules;
        var findings = new List<Finding>();
        var applied = new HashSet<Rule>();
        foreach (var subject in design.Subjects)
        {
            foreach (var rule in rules.RulesOf(subject.Shape))
            {
                var judgement = Judge.Decide(rule, subject.Scope);
                if (judgement.Verdict is not null)
                {
                    findings.Add(new Finding(rule, subject, judgement));
                    applied.Add(rule);
                }
            }
        }

        return new AuditResult(design, rules, findings, [.. rules.Rules.Where(rule => !applied.Contains(rule))]);
    }
}
