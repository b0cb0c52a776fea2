using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Curves;

/// <summary>One edge of a curve for one rating or up to a rating: time falls as current grows, straight on logarithmic axes.</summary>
/// <param name="Rating">The rating, or the highest rating, in amperes.</param>
/// <param name="Points">Its points, by current.</param>
/// <param name="Trust">How far it may be trusted.</param>
public sealed record CurveEdge(double Rating, IReadOnlyList<CurvePoint> Points, Trust Trust)
{
    /// <summary>Longest time to open at a current: missing (null) below the first point, the last point's time above the last.</summary>
    public double? TimeAt(double current)
    {
        for (var i = Points.Count - 1; i >= 0; i--)
        {
            if (Comparison.AtLeast(current, Points[i].Current))
            {
                return i == Points.Count - 1 ? Points[i].Time : Between(Points[i], Points[i + 1], current);
            }
        }

        return null;
    }

    /// <summary>Least current that opens within a time; null outside the times of the points.</summary>
    public double? CurrentAt(double time)
    {
        if (!Comparison.AtMost(time, Points[0].Time))
        {
            return null;
        }

        for (var i = 0; i < Points.Count; i++)
        {
            if (Comparison.AtMost(Points[i].Time, time))
            {
                return i == 0 || Comparison.Same(Points[i].Time, time) ? Points[i].Current : CurrentBetween(Points[i - 1], Points[i], time);
            }
        }

        return null;
    }

    private static double Between(CurvePoint low, CurvePoint high, double current)
    {
        var share = Math.Log(current / low.Current) / Math.Log(high.Current / low.Current);
        return low.Time * Math.Pow(high.Time / low.Time, share);
    }

    private static double CurrentBetween(CurvePoint low, CurvePoint high, double time)
    {
        var share = Math.Log(time / low.Time) / Math.Log(high.Time / low.Time);
        return low.Current * Math.Pow(high.Current / low.Current, share);
    }
}
