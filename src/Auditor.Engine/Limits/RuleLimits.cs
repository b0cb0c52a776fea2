using Auditor.Engine.Guarded;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Limits;

/// <summary>Finds how each rule that an input has a part in bounds it.</summary>
internal static class RuleLimits
{
    /// <summary>The limits of the rules that apply at some value.</summary>
    public static IReadOnlyList<RuleLimit> Of(Trial trial)
    {
        var scores = trial.Rules.Select(_ => new Score[trial.Grid.Count]).ToArray();
        for (var place = 0; place < trial.Grid.Count; place++)
        {
            for (var rule = 0; rule < scores.Length; rule++)
            {
                scores[rule][place] = trial.ScoreAt(trial.Rules[rule], trial.Grid[place]);
            }
        }

        return [.. trial.Rules.Select((at, rule) => Of(trial, at, scores[rule])).OfType<RuleLimit>()];
    }

    private static RuleLimit? Of(Trial trial, RuleAt at, Score[] scores)
    {
        if (Array.TrueForAll(scores, score => score.Standing == Score.Absent))
        {
            return null;
        }

        var places = new Turns(trial, at).Added(trial.Grid, scores);
        var all = places.Select(place => place.Score).ToArray();
        var kept = Kept(new EdgeSearch(trial, at), [.. places.Select(place => place.Position)], all);
        return new RuleLimit(at, Kind(kept, all), kept);
    }

    private static LimitKind Kind(List<KeptRange> kept, Score[] scores) => kept switch
    {
        [] => Array.Exists(scores, score => score.Standing == Score.Fails) ? LimitKind.AlwaysFails : LimitKind.Undetermined,
        [{ Least: null, Most: null }] => LimitKind.NoLimit,
        [_] => LimitKind.Limit,
        _ => LimitKind.NotMonotone,
    };

    private static List<KeptRange> Kept(EdgeSearch edges, IReadOnlyList<double> grid, Score[] scores)
    {
        var kept = new List<KeptRange>();
        for (var first = 0; first < scores.Length; first++)
        {
            if (!EdgeSearch.IsKept(scores[first]))
            {
                continue;
            }

            var last = first;
            while (last + 1 < scores.Length && EdgeSearch.IsKept(scores[last + 1]))
            {
                last++;
            }

            kept.Add(new KeptRange(
                first == 0 ? null : edges.Find(grid[first], grid[first - 1]),
                last == scores.Length - 1 ? null : edges.Find(grid[last], grid[last + 1])));
            first = last;
        }

        return kept;
    }
}
