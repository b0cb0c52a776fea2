using Auditor.Documents;
using Auditor.Engine.Departures;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Installation;

namespace Auditor.Engine.Evaluation;

/// <summary>Evaluates every rule on every subject of a design.</summary>
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
        var findings = new List<Finding>();
        foreach (var subject in design.Subjects)
        {
            foreach (var rule in rules.RulesOf(subject.Shape))
            {
                var judgement = Judge.Decide(rule, subject.Scope);
                if (judgement.Verdict is not null)
                {
                    findings.Add(new Finding(rule, subject, judgement));
                }
            }
        }

        var decision = acceptance?.Decision ?? GuardedFindings.AskedBy(design);
        findings = GuardedFindings.Complete(design, findings, decision, acceptance ?? new Acceptance());
        var departures = Depart(design, findings, asOf, problems);
        var applied = findings.Select(finding => finding.Rule).ToHashSet();
        return new AuditResult(
            design, rules, findings, departures, departures.Count > 0 ? asOf : null, [.. rules.Rules.Where(rule => !applied.Contains(rule))])
        {
            Decision = decision,
        };
    }

    private static IReadOnlyList<Departure> Depart(Design design, List<Finding> findings, DateOnly asOf, Problems problems)
    {
        if (!design.File.Root.Mappings("departures").Any())
        {
            return [];
        }

        var reader = new DepartureReader(design.Evaluator.Rules, asOf, problems);
        var departures = reader.Read(design.File, findings.ToDictionary(finding => finding.Key));
        var inForce = departures.Where(departure => departure.State == DepartureState.InForce)
            .DistinctBy(departure => reader.KeyOf(departure.Rule, departure.Subject))
            .ToDictionary(departure => reader.KeyOf(departure.Rule, departure.Subject)!);
        for (var i = 0; i < findings.Count; i++)
        {
            if (inForce.TryGetValue(findings[i].Key, out var departure))
            {
                findings[i] = findings[i].With(departure);
            }
        }

        return departures;
    }
}
