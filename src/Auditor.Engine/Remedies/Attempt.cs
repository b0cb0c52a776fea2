using Auditor.Engine.Adjustments;
using Auditor.Engine.Findings;
using Auditor.Engine.Variation;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Remedies;

/// <summary>Tries the values of one candidate, or of two together, the least change first, until one is proven.</summary>
internal sealed class Attempt
{
    private const int MostHalvings = 50;

    /// <summary>Where the first of two ranges is tried, as shares of the way to its end.</summary>
    private static readonly double[] Places = [1.0 / 3, 2.0 / 3, 1];

    private readonly Recheck _recheck;
    private readonly IReadOnlyList<Candidate> _candidates;
    private readonly AdjustedDesign _design;
    private readonly RuleAt _target;
    private readonly double _loss;
    private readonly HashSet<RuleAt> _blockers = [];

    public Attempt(DependencyMap map, Recheck recheck, Finding finding, IReadOnlyList<Candidate> candidates)
    {
        _recheck = recheck;
        _candidates = candidates;
        _design = new AdjustedDesign(map, [.. candidates.Select(candidate => candidate.Place)]);
        _target = new RuleAt(finding.Rule, finding.Subject);
        _loss = recheck.IsGuarded && Standing.Of(finding.Judgement).Measure is { } stated && Standing.Of(finding, true).Measure is { } worst ? stated - worst : 0;
    }

    /// <summary>How many rules have been judged.</summary>
    public long Judged { get; private set; }

    /// <summary>Rules that ruled out what would have put the finding right.</summary>
    public IReadOnlyCollection<RuleAt> Obstacles => _blockers;

    public Remedy? Run()
    {
        foreach (var changes in Trials())
        {
            if (IsRight(changes) && Prove(changes) is { } remedy)
            {
                return remedy;
            }
        }

        return null;
    }

    private IEnumerable<IReadOnlyList<Change>> Trials()
    {
        if (_candidates is [var only])
        {
            return only.Steps.Select(step => (IReadOnlyList<Change>)[step]).Concat(Ranged([], only));
        }

        var (first, second) = (_candidates[0], _candidates[1]);
        var both = first.Steps.SelectMany(a => second.Steps.Select(b => (IReadOnlyList<Change>)[a, b])).OrderBy(pair => pair[0].Effort + pair[1].Effort);
        var before = first.Steps.Count > 0 ? first.Steps : [.. first.Ends.SelectMany(end => Places.Select(share => first.At(end, share)).OfType<Change>())];
        var mixed = before.SelectMany(a => Ranged([a], second));
        return first.Ends.Count > 0 && second.Steps.Count > 0
            ? second.Steps.SelectMany(b => Ranged([b], first).Select(pair => (IReadOnlyList<Change>)[pair[1], pair[0]]))
            : both.Concat(mixed);
    }

    /// <summary>The least change of a range, each way, that does together with other changes.</summary>
    private IEnumerable<IReadOnlyList<Change>> Ranged(IReadOnlyList<Change> others, Candidate range)
    {
        foreach (var end in range.Ends)
        {
            if (Solve(others, range, end) is { } number && range.Rounded(number, end) is { } change)
            {
                yield return [.. others, change];
            }
        }
    }

    private double? Solve(IReadOnlyList<Change> others, Candidate range, double end)
    {
        if (!Does(end))
        {
            return null;
        }

        var (inside, outside) = (end, range.Place.Stated.Number);
        for (var i = 0; i < MostHalvings; i++)
        {
            var middle = (inside + outside) / 2;
            (inside, outside) = Does(middle) ? (middle, outside) : (inside, middle);
        }

        return inside;

        bool Does(double number)
        {
            IReadOnlyList<Change> changes = [.. others, new Change(range.Place, Value.Of(number), 0)];
            return IsRight(changes) && (_recheck.IsGuarded || Recheck() is not null);
        }
    }

    private bool IsRight(IReadOnlyList<Change> changes)
    {
        _design.Set([.. _design.Places.Select(place => changes.First(change => change.Place == place).Value)]);
        Judged++;
        var standing = Standing.Of(_design.Judge(_target));
        return standing.IsKept && !(standing.Measure < _loss);
    }

    private Outcome? Recheck()
    {
        var outcome = _recheck.Run(_design, _target, _blockers, out var judged);
        Judged += judged;
        return outcome;
    }

    private Remedy? Prove(IReadOnlyList<Change> changes)
    {
        // What is broken as stated is so by guarded acceptance as well, and told sooner.
        if (Recheck() is not { } simple)
        {
            return null;
        }

        if (!_recheck.IsGuarded)
        {
            return Tell(changes, Standing.Of(_design.Judge(_target)), simple);
        }

        return _recheck.RunGuarded(_design, _target, _blockers, out var after) is { } guarded ? Tell(changes, after, guarded) : null;
    }

    private Remedy Tell(IReadOnlyList<Change> changes, Standing after, Outcome outcome) => new()
    {
        Changes = changes,
        Inputs = _design.Changes(),
        Effort = changes.Sum(change => change.Effort),
        Verdict = after.Verdict,
        Before = _recheck.Before(_target).Margin,
        After = after.Margin,
        Worsened = outcome.Worsened,
        AlsoRight = InOrder(outcome.AlsoRight),
        Open = InOrder(outcome.Open),
        Rechecked = outcome.Rechecked + 1,
    };

    /// <summary>Rules in the order of findings.</summary>
    public static RuleAt[] InOrder(IEnumerable<RuleAt> rules) =>
        [.. rules.OrderBy(at => at.Subject.Index).ThenBy(at => at.Rule.Id, StringComparer.Ordinal)];
}
