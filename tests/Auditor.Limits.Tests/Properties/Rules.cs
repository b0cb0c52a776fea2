using Auditor.Engine.Findings;

namespace Auditor.Limits.Tests.Properties;

/// <summary>The rules that properties speak of, by id.</summary>
internal static class Rules
{
    public static readonly string[] Drops = ["voltage-drop-lighting", "voltage-drop-other", "voltage-drop-feeder", "voltage-drop-final-circuit", "voltage-drop-starting"];

    public static readonly string[] Disconnections = ["disconnection-tn", "disconnection-tn-rcd", "disconnection-time-rcd"];

    public static readonly string[] Times = ["adiabatic-time"];

    public static readonly string[] NearEnds = ["cpc-near-end", "line-withstand-near-end"];

    /// <summary>Looks at what rules say of every subject to which they apply in both designs.</summary>
    public static void Each(Judged before, Judged after, string[] rules, Action<(string Rule, string Subject), Judgement, Judgement> check)
    {
        foreach (var (key, was) in before.Judgements.Where(pair => rules.Contains(pair.Key.Rule) && pair.Value.Verdict is not null))
        {
            if (after.Judgements[key] is { Verdict: not null } now)
            {
                check(key, was, now);
            }
        }
    }
}
