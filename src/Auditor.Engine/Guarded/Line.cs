using Auditor.Engine.Variation;

namespace Auditor.Engine.Guarded;

/// <summary>One input on its way through its tolerance, the others where a point has them.</summary>
internal sealed class Line(Probe probe, RuleAt at, double[] point, int input)
{
    private const int Steps = 32;
    private const int Narrowings = 40;
    private static readonly double Golden = (Math.Sqrt(5) - 1) / 2;

    private readonly double[] _point = [.. point];

    /// <summary>The worse of the two ends.</summary>
    public (double Number, Score Score) WorseEnd(double low, double high)
    {
        var (atLow, atHigh) = (ScoreAt(low), ScoreAt(high));
        return atLow <= atHigh ? (low, atLow) : (high, atHigh);
    }

    /// <summary>The worst place anywhere on the line: of equal steps first, then narrowed down between the neighbours of the worst step.</summary>
    public (double Number, Score Score) Worst(double low, double high)
    {
        var numbers = Enumerable.Range(0, Steps + 1).Select(step => low + ((high - low) * step / Steps)).ToArray();
        var scores = Array.ConvertAll(numbers, ScoreAt);
        var worst = Array.IndexOf(scores, scores.Min());
        var narrowed = Narrow(numbers[Math.Max(0, worst - 1)], numbers[Math.Min(Steps, worst + 1)]);
        return narrowed.Score < scores[worst] ? narrowed : (numbers[worst], scores[worst]);
    }

    private (double Number, Score Score) Narrow(double low, double high)
    {
        for (var i = 0; i < Narrowings; i++)
        {
            var (left, right) = (high - (Golden * (high - low)), low + (Golden * (high - low)));
            (low, high) = ScoreAt(left) <= ScoreAt(right) ? (low, right) : (left, high);
        }

        return ((low + high) / 2, ScoreAt((low + high) / 2));
    }

    private Score ScoreAt(double number)
    {
        _point[input] = number;
        return probe.ScoreAt(at, _point);
    }
}
