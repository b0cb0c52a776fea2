using Auditor.Engine.Guarded;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Limits;

/// <summary>
/// Looks between the places tried for what they passed over: a margin that rises to a peak may be kept there though no place tried keeps it,
/// one that falls to a dip may not be kept there though every place tried does, and a rule may fail just before it ceases to apply.
/// </summary>
internal sealed class Turns(Trial trial, RuleAt at)
{
    private const int Narrowings = 40;
    private static readonly double Golden = (Math.Sqrt(5) - 1) / 2;

    /// <summary>The places tried and those found, ascending.</summary>
    public IReadOnlyList<(double Position, Score Score)> Added(IReadOnlyList<double> grid, Score[] scores)
    {
        var places = grid.Zip(scores).ToList();
        for (var i = 1; i < grid.Count - 1 && !trial.HasSteps; i++)
        {
            if (Turn(scores, i) is { } sign && Follow(grid[i - 1], grid[i + 1], sign, scores[i].Standing) is { } found)
            {
                places.Add(found);
            }
        }

        for (var i = 0; i < grid.Count - 1 && !trial.HasSteps; i++)
        {
            if (EdgeSearch.IsKept(scores[i]) && EdgeSearch.IsKept(scores[i + 1]) && scores[i].Standing != scores[i + 1].Standing
                && CloseIn(grid[i], grid[i + 1], scores[i].Standing) is { } found)
            {
                places.Add(found);
            }
        }

        return [.. places.OrderBy(place => place.First)];
    }

    /// <summary>1 where the margin of a rule that is not kept has a peak, -1 where that of one that is kept has a dip; null for neither.</summary>
    private static int? Turn(Score[] scores, int i)
    {
        var (before, here, after) = (scores[i - 1], scores[i], scores[i + 1]);
        if (before.Standing != here.Standing || after.Standing != here.Standing)
        {
            return null;
        }

        return here.Standing switch
        {
            Score.Fails when here > before && here > after => 1,
            Score.Conforms when here < before && here < after => -1,
            _ => null,
        };
    }

    /// <summary>Closes in on where a rule begins or ceases to apply; the first place at which it is not kept, or null.</summary>
    private (double Position, Score Score)? CloseIn(double near, double far, int standing)
    {
        for (var i = 0; i < Narrowings; i++)
        {
            var middle = (near + far) / 2;
            var score = trial.ScoreAt(at, middle);
            if (!EdgeSearch.IsKept(score))
            {
                return (middle, score);
            }

            (near, far) = score.Standing == standing ? (middle, far) : (near, middle);
        }

        return null;
    }

    /// <summary>Follows a peak or a dip; the first place at which the rule comes out otherwise, or null.</summary>
    private (double Position, Score Score)? Follow(double low, double high, int sign, int standing)
    {
        for (var i = 0; i < Narrowings; i++)
        {
            var (left, right) = (high - (Golden * (high - low)), low + (Golden * (high - low)));
            var (atLeft, atRight) = (trial.ScoreAt(at, left), trial.ScoreAt(at, right));
            if (atLeft.Standing != standing)
            {
                return (left, atLeft);
            }

            if (atRight.Standing != standing)
            {
                return (right, atRight);
            }

            (low, high) = sign * atLeft.CompareTo(atRight) >= 0 ? (low, right) : (left, high);
        }

        return null;
    }
}
