using Auditor.Engine.Variation;

namespace Auditor.Engine.Guarded;

/// <summary>
/// Moves each input by itself through its tolerance, all others as stated, and keeps how well each rule comes out. Rules of one subject
/// share what they compute.
/// </summary>
internal sealed class Sweep
{
    private const double StepsFromEnd = 1000;

    private readonly Dictionary<(RuleAt At, int Input), Score[]> _scores = [];
    private readonly double[][] _positions;

    /// <summary>Sweeps all inputs of a probe.</summary>
    /// <param name="probe">The probe, at the stated values; left there.</param>
    /// <param name="rules">The rules, each with the inputs that reach it.</param>
    public Sweep(Probe probe, IReadOnlyList<(RuleAt At, IReadOnlyList<int> Inputs)> rules)
    {
        _positions = [.. probe.Inputs.Select(Positions)];
        Stated = rules.ToDictionary(rule => rule.At, rule => Score.Of(probe.Judge(rule.At)));
        for (var input = 0; input < _positions.Length; input++)
        {
            var reached = rules.Where(rule => rule.Inputs.Contains(input)).Select(rule => rule.At).ToArray();
            for (var position = 0; position < _positions[input].Length; position++)
            {
                probe.Move(input, _positions[input][position]);
                Array.ForEach(reached, at => Keep(at, input, position, Score.Of(probe.Judge(at))));
            }

            probe.Move(input, probe.Inputs[input].Stated);
        }
    }

    /// <summary>How well each rule comes out with all inputs as stated.</summary>
    public IReadOnlyDictionary<RuleAt, Score> Stated { get; }

    /// <summary>What an input alone can do to a rule.</summary>
    public InputEffect EffectOf(RuleAt at, int input, TolerancedInput toleranced)
    {
        var scores = _scores[(at, input)];
        var stated = Stated[at];
        var worst = Array.IndexOf(scores, scores.Min());
        if (scores[worst] >= stated)
        {
            return new InputEffect(toleranced, toleranced.Stated, 0, IsMonotone(scores));
        }

        var isMeasured = scores[worst].Standing is Score.Fails or Score.Conforms && stated.Standing != Score.Absent && stated.Margin != scores[worst].Margin;
        return new InputEffect(
            toleranced, _positions[input][worst], isMeasured ? stated.Margin - scores[worst].Margin : null, IsMonotone(scores));
    }

    /// <summary>
    /// Places to try: the ends, the stated value, and between them. A place close to each end tells which way things go there, so that a worst
    /// place inside shows up however near to an end it lies.
    /// </summary>
    private static double[] Positions(TolerancedInput input)
    {
        var (low, high, step) = (input.Low, input.High, (input.High - input.Low) / StepsFromEnd);
        double[] places = [low, low + step, (low + input.Stated) / 2, input.Stated, (input.Stated + high) / 2, high - step, high];
        return [.. places.Distinct().Order()];
    }

    /// <summary>A rule that applies only along a part of the way is none of which one direction can be told.</summary>
    private static bool IsMonotone(Score[] scores)
    {
        if (Array.Exists(scores, score => score.Standing == Score.Absent) != Array.TrueForAll(scores, score => score.Standing == Score.Absent))
        {
            return false;
        }

        var steps = scores.Zip(scores.Skip(1), (a, b) => b.CompareTo(a)).ToArray();
        return Array.TrueForAll(steps, step => step >= 0) || Array.TrueForAll(steps, step => step <= 0);
    }

    private void Keep(RuleAt at, int input, int position, Score score)
    {
        if (!_scores.TryGetValue((at, input), out var scores))
        {
            scores = new Score[_positions[input].Length];
            _scores.Add((at, input), scores);
        }

        scores[position] = score;
    }
}
