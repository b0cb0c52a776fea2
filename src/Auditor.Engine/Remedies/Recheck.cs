using Auditor.Engine.Adjustments;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Remedies;

/// <summary>Judges again what a change touches, and holds it against the audit of the design as it is.</summary>
internal sealed class Recheck
{
    private readonly Dictionary<RuleAt, Standing> _before;
    private readonly IReadOnlyList<TolerancedInput> _tolerances;

    public Recheck(AuditResult audit)
    {
        IsGuarded = audit.Decision == Decision.Guarded;
        _before = audit.Findings.ToDictionary(finding => new RuleAt(finding.Rule, finding.Subject), finding => Standing.Of(finding, IsGuarded));
        _tolerances = IsGuarded ? ToleranceReader.Read(audit.Design) : [];
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

    /// <summary>
    /// By guarded acceptance: finds the worst case anew for every rule within reach of the changes; null where the finding is not put right
    /// or, with the rule, where one is broken.
    /// </summary>
    /// <param name="design">The design with the changes made.</param>
    /// <param name="target">The finding to be put right.</param>
    /// <param name="blockers">Receives the rule that rules the changes out.</param>
    /// <param name="after">How the finding comes out then.</param>
    public Outcome? RunGuarded(AdjustedDesign design, RuleAt target, HashSet<RuleAt> blockers, out Standing after)
    {
        var changes = design.Changes();
        var inputs = ToleranceReader.After(_tolerances, design, changes);
        after = Guarded(design, target, GuardedAcceptance.Run(design.Map, inputs, changes, new HashSet<RuleAt> { target }));
        if (!after.IsKept)
        {
            return null;
        }

        var cases = GuardedAcceptance.Run(design.Map, inputs, changes, design.Rules.ToHashSet());
        var outcome = new Outcome();
        foreach (var at in design.Rules.Where(at => at != target))
        {
            if (!outcome.Takes(at, Before(at), Guarded(design, at, cases)))
            {
                blockers.Add(at);
                return null;
            }
        }

        return outcome;
    }

    private static Standing Guarded(AdjustedDesign design, RuleAt at, IReadOnlyDictionary<RuleAt, WorstCase> cases)
    {
        var stated = Standing.Of(design.Judge(at));
        return cases.GetValueOrDefault(at) is not { } worst
            ? stated
            : new Standing(stated.IsKept && !worst.IsKept ? Verdict.Unproven : stated.Verdict, worst.Margin);
    }
}
