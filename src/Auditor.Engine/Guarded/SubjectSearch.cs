using Auditor.Engine.Variation;

namespace Auditor.Engine.Guarded;

/// <summary>Finds the worst cases of the rules of one subject.</summary>
/// <param name="probe">A probe of all inputs that reach one of them.</param>
/// <param name="rules">The rules, each with the numbers of the inputs that reach it.</param>
internal sealed class SubjectSearch(Probe probe, IReadOnlyList<(RuleAt At, IReadOnlyList<int> Inputs)> rules)
{
    private readonly Sweep _sweep = new(probe, rules);
    private readonly List<double[]> _corners = [];

    /// <summary>The worst cases that the tolerances make any difference to.</summary>
    public List<(RuleAt At, WorstCase Case)> Run()
    {
        var found = new List<(RuleAt, WorstCase)>();
        foreach (var (at, inputs) in rules.Where(rule => _sweep.Stated[rule.At].Standing is Score.Conforms or Score.Fails))
        {
            Add(found, at, Search(at, inputs));
        }

        foreach (var (at, inputs) in rules.Where(rule => _sweep.Stated[rule.At].Standing is Score.Absent))
        {
            Add(found, at, WhereItFails(at, inputs));
        }

        return found;
    }

    private static void Add(List<(RuleAt At, WorstCase Case)> found, RuleAt at, WorstCase? worst)
    {
        if (worst is not null)
        {
            found.Add((at, worst));
        }
    }

    private WorstCase? Search(RuleAt at, IReadOnlyList<int> inputs)
    {
        var effects = EffectsOf(at, inputs);
        if (Array.TrueForAll(effects, effect => effect.Loss == 0 && effect.IsMonotone) && !Interact(at, inputs))
        {
            return null;
        }

        var (point, score, wasSearched) = new CornerSearch(probe, at, effects, inputs).Run([]);
        if (score >= _sweep.Stated[at])
        {
            return null;
        }

        if (!_corners.Exists(corner => corner.SequenceEqual(point)))
        {
            _corners.Add(point);
        }

        return Tell(at, point, wasSearched, effects);
    }

    /// <summary>
    /// Where a rule that does not apply as stated applies and fails; null where no such place is found. It is looked for where one input
    /// alone is at its end, and where the rules beside it come out worst.
    /// </summary>
    private WorstCase? WhereItFails(RuleAt at, IReadOnlyList<int> inputs)
    {
        var effects = EffectsOf(at, inputs);
        var starts = _corners.Where(corner => probe.ScoreAt(at, corner).Standing == Score.Fails).ToArray();
        if (starts.Length == 0 && Array.TrueForAll(effects, effect => effect.Loss == 0))
        {
            return null;
        }

        var (point, score, wasSearched) = new CornerSearch(probe, at, effects, inputs).Run(starts);
        return score.Standing == Score.Fails ? Tell(at, point, wasSearched, effects) : null;
    }

    private InputEffect[] EffectsOf(RuleAt at, IReadOnlyList<int> inputs) =>
        [.. inputs.Select(input => _sweep.EffectOf(at, input, probe.Inputs[input]))];

    private WorstCase Tell(RuleAt at, double[] point, bool wasSearched, InputEffect[] effects)
    {
        probe.Move(point);
        var matter = effects.Where(effect => effect.Loss != 0).OrderByDescending(effect => effect.Loss ?? double.PositiveInfinity);
        return new WorstCase(probe.Judge(at), Corner(point), wasSearched, [.. matter]);
    }

    /// <summary>Whether inputs that make no difference one by one make any together, at either end of all.</summary>
    private bool Interact(RuleAt at, IReadOnlyList<int> inputs)
    {
        var (low, high) = (probe.Stated(), probe.Stated());
        foreach (var input in inputs)
        {
            (low[input], high[input]) = (probe.Inputs[input].Low, probe.Inputs[input].High);
        }

        var stated = _sweep.Stated[at];
        return probe.ScoreAt(at, low) != stated || probe.ScoreAt(at, high) != stated;
    }

    private List<CornerValue> Corner(double[] point) =>
        [.. probe.Inputs.Select((input, i) => new CornerValue(input, point[i])).Where(value => value.Number != value.Input.Stated)];
}
