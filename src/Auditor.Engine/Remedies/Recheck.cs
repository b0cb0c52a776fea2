using Auditor.Engine.Adjustments;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Installation;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Remedies;

/// <summary>Judges again what a change touches, and holds it against the audit of the design as it is.</summary>
internal sealed class Recheck
{
    private readonly Dictionary<RuleAt, Standing> _before;
    private readonly Dictionary<string, DesignSubject> _subjects;

    public Recheck(AuditResult audit)
    {
        IsGuarded = audit.Decision == Decision.Guarded;
        _before = audit.Findings.ToDictionary(finding => new RuleAt(finding.Rule, finding.Subject), finding => Standing.Of(finding, IsGuarded));
        _subjects = audit.Design.Subjects.ToDictionary(subject => subject.Key);
    }

    /// <summary>Whether values must keep their limits everywhere within the tolerances.</summary>
    public bool IsGuarded { get; }

    /// <summary>How a rule comes out in the design as it is.</summary>
    public Standing Before(RuleAt at) => _before.GetValueOrDefault(at);

    /// <summary>Judges every rule within reach of the changes; null, with the rule that rules them out, as soon as there is one.</summary>
    /// <param name="design">The design with the changes made.</param>
    /// <param name="target">The finding to be put right.</param>
    /// <param name="blockers">Rules that have ruled other values out, judged first; a new one is added.</param>
    /// <param name="judged">How many rules were judged.</param>
    public Outcome? Run(AdjustedDesign design, RuleAt target, HashSet<RuleAt> blockers, out int judged)
    {
        var outcome = new Outcome();
        judged = 0;
        foreach (var at in design.Rules.Where(blockers.Contains).Concat(design.Rules.Where(at => !blockers.Contains(at))).ToArray())
        {
            judged++;
            if (at != target && !outcome.Takes(at, Before(at), Standing.Of(design.Judge(at))))
            {
                blockers.Add(at);
                return null;
            }
        }

        return outcome;
    }

    /// <summary>Holds a whole audit of the changed design against that of the design as it is; null where it rules the change out.</summary>
    public Outcome? Run(AuditResult changed, RuleAt target)
    {
        var outcome = new Outcome();
        var after = changed.Findings.ToDictionary(finding => new RuleAt(finding.Rule, _subjects[finding.Subject.Key]), finding => Standing.Of(finding, IsGuarded));
        var all = after.Keys.Union(_before.Keys).Where(at => at != target);
        return all.All(at => outcome.Takes(at, Before(at), after.GetValueOrDefault(at))) ? outcome : null;
    }
}
