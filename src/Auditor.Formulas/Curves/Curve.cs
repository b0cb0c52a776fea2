using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Curves;

/// <summary>Time-current behaviour of one family of protective devices.</summary>
/// <param name="Source">Where the figures come from.</param>
/// <param name="Standards">Product standards that it holds for.</param>
/// <param name="Type">Tripping characteristic; null for any.</param>
/// <param name="ByRating">Whether currents are multiples of the rated current; otherwise amperes of one rating each.</param>
/// <param name="Slow">Slow edges: by then the device has opened.</param>
/// <param name="Fast">Fast edges: before then it does not open; empty where none is held.</param>
public sealed record Curve(
    TableSource Source, IReadOnlyList<string> Standards, string? Type, bool ByRating, IReadOnlyList<CurveEdge> Slow, IReadOnlyList<CurveEdge> Fast)
{
    /// <summary>Least current, in amperes, that surely opens a device of the rating within the time.</summary>
    public Value TripCurrent(double rating, double time)
    {
        if (EdgeFor(rating) is not { } edge)
        {
            return NoRating(rating);
        }

        return edge.CurrentAt(time) is { } current
            ? Value.Of(ByRating ? current * rating : current, edge.Trust.Mark())
            : Missing($"{Source.Title} gives no current for {time:0.###} s at {rating:0.###} A");
    }

    /// <summary>Longest time, in seconds, in which a device of the rating opens at the current.</summary>
    public Value TripTime(double rating, double current)
    {
        if (EdgeFor(rating) is not { } edge)
        {
            return NoRating(rating);
        }

        return edge.TimeAt(ByRating ? current / rating : current) is { } time
            ? Value.Of(time, edge.Trust.Mark())
            : Missing($"{Source.Title} gives no time for {current:0.###} A at {rating:0.###} A, which is below its first point");
    }

    /// <summary>The points of an edge for a device of the rating, in amperes and seconds, by current; empty where the edge is not held.</summary>
    /// <param name="isSlow">Whether the slow edge is meant; otherwise the fast one.</param>
    /// <param name="rating">The rating, in amperes.</param>
    public IReadOnlyList<CurvePoint> PointsOf(bool isSlow, double rating) =>
        [.. (EdgeFor(isSlow ? Slow : Fast, rating)?.Points ?? []).Select(point => point with { Current = ByRating ? point.Current * rating : point.Current })];

    private CurveEdge? EdgeFor(double rating) => EdgeFor(Slow, rating);

    private CurveEdge? EdgeFor(IReadOnlyList<CurveEdge> edges, double rating) => edges.FirstOrDefault(edge =>
        rating > 0 && (ByRating ? Comparison.AtMost(rating, edge.Rating) : Comparison.Same(rating, edge.Rating)));

    private Value NoRating(double rating) => Missing($"{Source.Title} holds no rating of {rating:0.###} A");

    private Value Missing(string why) =>
        Value.Missing(new Absence(AbsenceKind.Curve, "", Source.Id, why, "give the maker's own figure"));
}
