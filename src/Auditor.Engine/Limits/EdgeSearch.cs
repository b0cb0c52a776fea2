using Auditor.Engine.Guarded;
using Auditor.Engine.Variation;
using MathNet.Numerics.RootFinding;

namespace Auditor.Engine.Limits;

/// <summary>
/// Finds where, between a place at which a rule is kept and one at which it is not, it ceases to be kept. Where the margin runs through
/// zero its root is found; where it jumps, the place of the jump. Either is verified by evaluating on both sides.
/// </summary>
internal sealed class EdgeSearch(Trial trial, RuleAt at)
{
    private const double Accuracy = 1e-13;
    private const int MostSteps = 100;
    private const int MostHalvings = 200;

    /// <summary>How far outside the root a rule must be seen not to be kept, as a share of it: the slack of comparisons lets it be kept a little beyond.</summary>
    private static readonly double[] Nearby = [1e-8, 1e-7, 1e-6, 1e-5];

    /// <summary>The edge.</summary>
    /// <param name="inside">A place at which the rule is kept.</param>
    /// <param name="outside">A place at which it is not; the next one for steps.</param>
    public LimitEdge Find(double inside, double outside)
    {
        if (trial.HasSteps)
        {
            return Edge(inside, outside);
        }

        return Root(inside, outside) is var (last, beyond) ? Edge(last, beyond) : Halve(inside, outside);
    }

    public static bool IsKept(Score score) => score.Standing is Score.Conforms or Score.Absent;

    private LimitEdge Edge(double inside, double outside)
    {
        var last = trial.ScoreAt(at, inside);
        var isUnknown = trial.ScoreAt(at, outside).Standing == Score.Unknown;
        return new LimitEdge(inside, trial.ValueAt(inside), trial.ValueAt(outside), isUnknown, last.Margin);
    }

    /// <summary>The root of the margin and a place just outside; null where the margin has none that both sides confirm.</summary>
    private (double Last, double Beyond)? Root(double inside, double outside)
    {
        if (trial.ScoreAt(at, inside).Standing != Score.Conforms || trial.ScoreAt(at, outside).Standing != Score.Fails)
        {
            return null;
        }

        var (low, high) = (Math.Min(inside, outside), Math.Max(inside, outside));
        if (!Brent.TryFindRoot(place => MarginAt(place), low, high, Accuracy, MostSteps, out var root) || !IsKept(trial.ScoreAt(at, root)))
        {
            return null;
        }

        foreach (var share in Nearby)
        {
            var step = Math.Max(Math.Abs(root), high - low) * share * Math.Sign(outside - inside);
            if (!IsKept(trial.ScoreAt(at, root + step)) && IsKept(trial.ScoreAt(at, root - step)))
            {
                return (root, root + step);
            }
        }

        return null;
    }

    /// <summary>The margin; no number where the rule cannot be judged, which ends the search for a root.</summary>
    private double MarginAt(double place)
    {
        var score = trial.ScoreAt(at, place);
        return score.Standing is Score.Conforms or Score.Fails ? score.Margin : double.NaN;
    }

    private LimitEdge Halve(double inside, double outside)
    {
        for (var i = 0; i < MostHalvings; i++)
        {
            var middle = inside + ((outside - inside) / 2);
            if (middle == inside || middle == outside)
            {
                break;
            }

            (inside, outside) = IsKept(trial.ScoreAt(at, middle)) ? (middle, outside) : (inside, middle);
        }

        return Edge(inside, outside);
    }
}
