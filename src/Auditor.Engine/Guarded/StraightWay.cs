using Auditor.Engine.Variation;

namespace Auditor.Engine.Guarded;

/// <summary>The straight way from the stated values to another point, on which a rule may fail only somewhere between.</summary>
internal sealed class StraightWay(Probe probe, RuleAt at)
{
    private const int Steps = 32;
    private const int MostHalvings = 40;

    /// <summary>
    /// The worst place found on the way. Where a rule that is kept ceases to apply between two steps, the place is closed in on: it may
    /// fail in a narrow strip before it no longer applies.
    /// </summary>
    public double[] Worst(double[] to)
    {
        var stated = probe.Stated();
        var places = Enumerable.Range(0, Steps + 1).Select(step => (double)step / Steps).ToList();
        var scores = places.ConvertAll(share => ScoreAt(stated, to, share));
        for (var step = 0; step < Steps; step++)
        {
            if ((scores[step].Standing == Score.Absent) != (scores[step + 1].Standing == Score.Absent))
            {
                places.Add(CloseIn(stated, to, (places[step], scores[step]), places[step + 1]));
            }
        }

        return Point(stated, to, places.MinBy(share => ScoreAt(stated, to, share)));
    }

    /// <summary>A place between two at which the rule comes out worse than at both, or where it ceases to apply.</summary>
    private double CloseIn(double[] stated, double[] to, (double Share, Score Score) from, double until)
    {
        var (near, far) = (from.Share, until);
        for (var i = 0; i < MostHalvings; i++)
        {
            var middle = (near + far) / 2;
            var score = ScoreAt(stated, to, middle);
            if (score.Standing is Score.Fails or Score.Unknown)
            {
                return middle;
            }

            (near, far) = score.Standing == from.Score.Standing ? (middle, far) : (near, middle);
        }

        return near;
    }

    private Score ScoreAt(double[] stated, double[] to, double share) => probe.ScoreAt(at, Point(stated, to, share));

    private static double[] Point(double[] stated, double[] to, double share) => [.. stated.Zip(to, (a, b) => a + ((b - a) * share))];
}
