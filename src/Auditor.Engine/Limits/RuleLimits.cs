using Auditor.Engine.Guarded;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Limits;

/// <summary>Finds how each rule that an input has a part in bounds it.</summary>
internal static class RuleLimits
{
    /// <summary>Every so many places of the grid are tried first.</summary>
    private const int Coarse = 3;

    /// <summary>The limits of the rules that apply at some value.</summary>
    public static IReadOnlyList<RuleLimit> Of(Trial trial)
    {
        var scores = trial.Rules.Select(_ => new Score[trial.Grid.Count]).ToArray();
        var (first, others) = Places(trial);
        Fill(trial, scores, first, [.. Enumerable.Range(0, scores.Length)]);
        var moving = Enumerable.Range(0, scores.Length).Where(rule => first.Exists(place => !Same(scores[rule][place], scores[rule][first[0]]))).ToArray();
        Fill(trial, scores, others, moving);
        foreach (var rule in Enumerable.Range(0, scores.Length).Except(moving))
        {
            others.ForEach(place => scores[rule][place] = scores[rule][first[0]]);
        }

        return [.. trial.Rules.Select((at, rule) => Of(trial, at, scores[rule])).OfType<RuleLimit>()];
    }

    /// <summary>
    /// The places to try first, both ends and what the design states among them, and the others. A rule that comes out the same to the last
    /// bit at all of the first is one that the input reaches on paper only.
    /// </summary>
    private static (List<int> First, List<int> Others) Places(Trial trial)
    {
        var places = Enumerable.Range(0, trial.Grid.Count)
            .ToLookup(place => trial.HasSteps || place % Coarse == 0 || place == trial.Grid.Count - 1 || trial.Grid[place] == trial.Stated);
        return ([.. places[true]], [.. places[false]]);
    }

    private static void Fill(Trial trial, Score[][] scores, List<int> places, int[] rules)
    {
        foreach (var place in places)
        {
            foreach (var rule in rules)
            {
                scores[rule][place] = trial.ScoreAt(trial.Rules[rule], trial.Grid[place]);
            }
        }
    }

    private static bool Same(Score one, Score other) => one.Standing == other.Standing && one.Margin.Equals(other.Margin);

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
