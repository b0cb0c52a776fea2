using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Curves;
using OxyPlot;

namespace Auditor.Reports.Pictures.TimeCurrent;

/// <summary>The time-current band of a device: between the edges it may or may not have opened.</summary>
/// <param name="Title">What the curve is called; empty where none is held.</param>
/// <param name="Slow">Slow edge, by current; empty where it is not held.</param>
/// <param name="Fast">Fast edge, by current; empty where it is not held.</param>
/// <param name="MostCurrent">Where the chart ends, in amperes.</param>
internal sealed record DeviceBand(string Title, IReadOnlyList<DataPoint> Slow, IReadOnlyList<DataPoint> Fast, double MostCurrent)
{
    /// <summary>Times that the chart shows, in seconds.</summary>
    public const double LeastTime = 0.01;

    /// <summary>Times that the chart shows, in seconds.</summary>
    public const double MostTime = 10000;

    /// <summary>The band of the device that a plan names.</summary>
    /// <param name="plan">The plan.</param>
    /// <param name="circuit">The circuit.</param>
    /// <param name="prefix">What the roles of the device begin with.</param>
    /// <param name="curves">The curves that are held.</param>
    /// <param name="mostCurrent">Where the chart ends, in amperes.</param>
    public static DeviceBand Of(PicturePlan plan, DesignSubject circuit, string prefix, CurveSet curves, double mostCurrent)
    {
        var standard = plan.Word(circuit, prefix + "standard");
        var curve = standard is null ? null : curves.Find(standard, plan.Word(circuit, prefix + "type") ?? "");
        return curve is not null && plan.Number(circuit, prefix + "rating") is { } rating
            ? new DeviceBand(curve.Source.Title, From(curve.PointsOf(isSlow: true, rating)), Fastest(curve.PointsOf(isSlow: false, rating)), mostCurrent)
            : new DeviceBand("", [], [], mostCurrent);
    }

    /// <summary>The band of a release that opens at once above its setting; what it does below is not known.</summary>
    /// <param name="plan">The plan.</param>
    /// <param name="circuit">The circuit.</param>
    /// <param name="mostCurrent">Where the chart ends, in amperes.</param>
    public static DeviceBand OfSetting(PicturePlan plan, DesignSubject circuit, double mostCurrent)
    {
        if (plan.Number(circuit, "setting-most") is not { } most || plan.Number(circuit, "setting-time") is not { } time)
        {
            return new DeviceBand("", [], [], mostCurrent);
        }

        var least = plan.Number(circuit, "setting-least") ?? most;
        return new DeviceBand(
            "instantaneous release by its setting", [new DataPoint(most, MostTime), new DataPoint(most, time)],
            [new DataPoint(least, MostTime), new DataPoint(least, LeastTime)], mostCurrent);
    }

    /// <summary>What is known beyond the last point of the slow edge: the device takes no longer than there.</summary>
    public IReadOnlyList<DataPoint> Beyond => Slow.Count > 0 && Slow[^1].X < MostCurrent ? [Slow[^1], new DataPoint(MostCurrent, Slow[^1].Y)] : [];

    /// <summary>The slow side of the band.</summary>
    public IEnumerable<DataPoint> SlowSide => Slow.Concat(Beyond);

    /// <summary>The fast side of the band.</summary>
    public IEnumerable<DataPoint> FastSide => Fast.Append(new DataPoint(Math.Max(MostCurrent, Fast[^1].X), LeastTime));

    /// <summary>Below its first point the device need not open at all.</summary>
    private static IReadOnlyList<DataPoint> From(IReadOnlyList<CurvePoint> points) =>
        points.Count == 0 ? [] : [new DataPoint(points[0].Current, MostTime), .. points.Select(point => new DataPoint(point.Current, point.Time))];

    /// <summary>Above its last point the device may open at once.</summary>
    private static IReadOnlyList<DataPoint> Fastest(IReadOnlyList<CurvePoint> points) =>
        points.Count == 0 ? [] : [.. From(points), new DataPoint(points[^1].Current, LeastTime)];
}
