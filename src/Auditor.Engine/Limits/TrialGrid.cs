using Auditor.Engine.Adjustments;

namespace Auditor.Engine.Limits;

/// <summary>Chooses the values at which an input with a range is tried first.</summary>
internal static class TrialGrid
{
    private const int Steps = 24;

    /// <summary>A range whose ends lie so far apart is divided by equal ratios, any other by equal differences.</summary>
    private const double WideRatio = 50;

    /// <summary>Both ends, equal steps between them, and the stated and the expected value where they lie within.</summary>
    public static IReadOnlyList<double> Of(RangeLadder range, double? stated, double? expected)
    {
        var isWide = range.From > 0 && range.To / range.From > WideRatio;
        var grid = Enumerable.Range(1, Steps - 1)
            .Select(step => isWide
                ? range.From * Math.Pow(range.To / range.From, (double)step / Steps)
                : range.From + ((range.To - range.From) * step / Steps))
            .Append(range.From)
            .Append(range.To);
        var known = new[] { stated, expected }.OfType<double>().Where(own => own > range.From && own < range.To);
        return [.. grid.Concat(known).Distinct().Order()];
    }
}
