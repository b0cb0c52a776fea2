using Auditor.Engine.Variation;
using MathNet.Numerics.Random;

namespace Auditor.Engine.Guarded;

/// <summary>
/// Finds the worst point within the tolerances for one rule. The sign of each input's effect tells the corner to begin with; from there
/// each input is moved as long as that makes things worse, which confirms the corner or finds a worse one. Where signs do not settle
/// it, or there are none because inputs make a difference only together, the search begins again from random points.
/// </summary>
internal sealed class CornerSearch(Probe probe, RuleAt at, IReadOnlyList<InputEffect> effects, IReadOnlyList<int> inputs)
{
    private const int MostRounds = 8;
    private const int RandomPoints = 64;
    private const int RandomStarts = 3;
    private const int Seed = 1;

    /// <summary>The worst point found and how the rule comes out there; whether more than the signs was needed.</summary>
    /// <param name="others">Further points to begin from.</param>
    public (double[] Point, Score Score, bool WasSearched) Run(IEnumerable<double[]> others)
    {
        var corner = probe.Stated();
        for (var i = 0; i < inputs.Count; i++)
        {
            corner[inputs[i]] = effects[i].Worst;
        }

        var sides = new[] { [.. corner], End(input => input.Low), End(input => input.High) };
        var best = Descend(corner);
        var isSettled = effects.All(effect => effect.IsMonotone) && effects.Any(effect => effect.Loss != 0) && !best.HasMoved && best.Score.Standing != Score.Absent;
        foreach (var start in isSettled ? others : others.Concat(sides.Select(new StraightWay(probe, at).Worst)).Concat(RandomStartsFrom()))
        {
            var found = Descend([.. start]);
            best = found.Score < best.Score ? found with { HasMoved = true } : best;
        }

        return (Simplified(best.Point, best.Score), best.Score, !isSettled || best.HasMoved);
    }

    private (double[] Point, Score Score, bool HasMoved) Descend(double[] point)
    {
        var best = probe.ScoreAt(at, point);
        var hasMoved = false;
        for (var round = 0; round < MostRounds; round++)
        {
            var before = best;
            for (var i = 0; i < inputs.Count; i++)
            {
                best = Improve(point, i, best);
            }

            if (before <= best)
            {
                break;
            }

            hasMoved = true;
        }

        return (point, best, hasMoved);
    }

    /// <summary>Moves one input to where the rule comes out worst, the others staying.</summary>
    private Score Improve(double[] point, int i, Score best)
    {
        var input = probe.Inputs[inputs[i]];
        var line = new Line(probe, at, point, inputs[i]);
        var (number, score) = effects[i].IsMonotone ? line.WorseEnd(input.Low, input.High) : line.Worst(input.Low, input.High);
        if (score >= best)
        {
            return best;
        }

        point[inputs[i]] = number;
        return score;
    }

    private double[] End(Func<TolerancedInput, double> end)
    {
        var point = probe.Stated();
        foreach (var input in inputs)
        {
            point[input] = end(probe.Inputs[input]);
        }

        return point;
    }

    private List<double[]> RandomStartsFrom()
    {
        var random = new Xoshiro256StarStar(Seed);
        var points = new List<(double[] Point, Score Score)>();
        for (var i = 0; i < RandomPoints; i++)
        {
            var point = probe.Stated();
            foreach (var input in inputs)
            {
                var (low, high) = (probe.Inputs[input].Low, probe.Inputs[input].High);
                point[input] = low + (random.NextDouble() * (high - low));
            }

            points.Add((point, probe.ScoreAt(at, point)));
        }

        return [.. points.OrderBy(pair => pair.Score).Take(RandomStarts).Select(pair => pair.Point)];
    }

    /// <summary>Puts back what makes no difference.</summary>
    private double[] Simplified(double[] point, Score score)
    {
        foreach (var input in inputs)
        {
            var moved = point[input];
            point[input] = probe.Inputs[input].Stated;
            if (probe.ScoreAt(at, point) > score)
            {
                point[input] = moved;
            }
        }

        return point;
    }
}
