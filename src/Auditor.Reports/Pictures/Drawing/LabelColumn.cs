namespace Auditor.Reports.Pictures.Drawing;

/// <summary>Places labels below one another as near as can be to where they belong.</summary>
internal static class LabelColumn
{
    /// <summary>Heights of labels in a column, in order and none over another, with the least sum of squared distances from the wanted ones.</summary>
    /// <param name="wanted">Wanted heights, from the top.</param>
    /// <param name="step">Least distance between neighbours.</param>
    /// <param name="top">Least height.</param>
    /// <param name="bottom">Greatest height; the labels must fit above it.</param>
    public static double[] Spread(IReadOnlyList<double> wanted, double step, double top, double bottom)
    {
        // With the steps taken off, the heights need only not fall: neighbours that would are pooled at their mean.
        var pools = new List<(double Sum, int Count)>();
        for (var i = 0; i < wanted.Count; i++)
        {
            pools.Add((wanted[i] - (i * step), 1));
            while (pools.Count > 1 && pools[^2].Sum / pools[^2].Count > pools[^1].Sum / pools[^1].Count)
            {
                pools[^2] = (pools[^2].Sum + pools[^1].Sum, pools[^2].Count + pools[^1].Count);
                pools.RemoveAt(pools.Count - 1);
            }
        }

        var last = bottom - ((wanted.Count - 1) * step);
        return [.. pools.SelectMany(pool => Enumerable.Repeat(Math.Clamp(pool.Sum / pool.Count, top, Math.Max(top, last)), pool.Count))
            .Select((height, i) => height + (i * step))];
    }
}
