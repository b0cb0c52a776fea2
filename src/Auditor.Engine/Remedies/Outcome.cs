using Auditor.Engine.RuleSets;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Remedies;

/// <summary>What a new audit showed beside the finding itself.</summary>
internal sealed class Outcome
{
    private readonly List<MarginMove> _worsened = [];

    /// <summary>Other nonconformities put right.</summary>
    public List<RuleAt> AlsoRight { get; } = [];

    /// <summary>Rules that come to apply and lack input, and recommendations that can no longer be judged.</summary>
    public List<RuleAt> Open { get; } = [];

    /// <summary>Rules with less margin, the greatest loss first.</summary>
    public IReadOnlyList<MarginMove> Worsened => [.. _worsened.OrderByDescending(move => move.Loss).ThenBy(move => move.At.Key, StringComparer.Ordinal)];

    /// <summary>How many rules were judged again.</summary>
    public int Rechecked { get; private set; }

    /// <summary>
    /// Takes a rule in; false where it rules the change out: it is newly broken, or a requirement that was kept can no longer be judged,
    /// so that what was proven would be lost.
    /// </summary>
    public bool Takes(RuleAt at, Standing before, Standing after)
    {
        Rechecked++;
        if (after.IsBroken && !before.IsBroken)
        {
            return false;
        }

        if (after.Verdict == Findings.Verdict.Undetermined && before.Verdict != Findings.Verdict.Undetermined)
        {
            Open.Add(at);
            return before.Verdict is null || at.Rule.Provision == Provision.Recommendation;
        }

        if (before.IsBroken && after.IsKept)
        {
            AlsoRight.Add(at);
        }
        else if (after.IsCloserThan(before))
        {
            _worsened.Add(new MarginMove(at, before.Margin!, after.Margin!));
        }

        return true;
    }
}
