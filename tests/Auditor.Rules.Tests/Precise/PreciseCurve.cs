using Auditor.Formulas.Curves;

namespace Auditor.Rules.Tests.Precise;

/// <summary>Readings of the slow edge of a time-current curve, straight on logarithmic axes.</summary>
internal static class PreciseCurve
{
    /// <summary>The least current that opens a device of the rating within a time, A; null where the curve tells none.</summary>
    public static object? TripCurrent(Curve curve, DoubleDouble rating, DoubleDouble time)
    {
        var points = PointsOf(curve, rating);
        if (points.Count == 0 || !Slack.AtLeast(points[0].Time, time))
        {
            return null;
        }

        var at = points.FindIndex(point => Slack.AtLeast(time, point.Time));
        if (at < 0)
        {
            return null;
        }

        var current = at == 0 || Slack.Same(points[at].Time, time)
            ? points[at].Current
            : Straight((points[at - 1].Time, points[at - 1].Current), (points[at].Time, points[at].Current), time);
        return curve.ByRating ? current * rating : current;
    }

    /// <summary>The longest time in which a device of the rating opens at a current, s; null below the first point.</summary>
    public static object? TripTime(Curve curve, DoubleDouble rating, DoubleDouble current)
    {
        var points = PointsOf(curve, rating);
        var on = curve.ByRating ? current / rating : current;
        var at = points.FindLastIndex(point => Slack.AtLeast(on, point.Current));
        return at switch
        {
            < 0 => null,
            _ when at == points.Count - 1 => (DoubleDouble)points[at].Time,
            _ => Straight((points[at].Current, points[at].Time), (points[at + 1].Current, points[at + 1].Time), on),
        };
    }

    private static List<CurvePoint> PointsOf(Curve curve, DoubleDouble rating) =>
        [.. curve.Slow.FirstOrDefault(edge => rating > 0 && (curve.ByRating ? Slack.AtLeast(edge.Rating, rating) : Slack.Same(edge.Rating, rating)))?.Points ?? []];

    private static DoubleDouble Straight((DoubleDouble X, DoubleDouble Y) a, (DoubleDouble X, DoubleDouble Y) b, DoubleDouble x) =>
        a.Y * (b.Y / a.Y).Power((x / a.X).Log() / (b.X / a.X).Log());
}
