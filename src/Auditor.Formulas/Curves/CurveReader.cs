using Auditor.Documents;
using Auditor.Formulas.Tables;
using Auditor.Quantities;

namespace Auditor.Formulas.Curves;

/// <summary>Makes curves from files that their schema has accepted.</summary>
public static class CurveReader
{
    /// <summary>Reads one curve.</summary>
    /// <param name="file">Root of the file.</param>
    /// <param name="set">Number of its set in the chain.</param>
    /// <param name="curves">Receives the curve.</param>
    /// <param name="problems">Receives what is wrong.</param>
    public static void Read(MappingNode file, int set, CurveSet curves, Problems problems)
    {
        var id = file.Scalar("curve")!;
        var source = new TableSource(id.Text, file.Text("title")!, file.Texts("source"), file.Span.Source.Path);
        var byRating = file.Text("of") == "rating";
        var curve = new Curve(
            source, file.Texts("standard"), file.Text("type"), byRating, Edges(file, "slow", byRating, problems), Edges(file, "fast", byRating, problems));
        if (curves.Add(curve, set) is { } rival)
        {
            problems.Add(TableMessages.SecondCurve(id.Span, id.Text, rival.Source.Path));
        }
    }

    private static List<CurveEdge> Edges(MappingNode file, string which, bool byRating, Problems problems)
    {
        var edges = new List<CurveEdge>();
        foreach (var node in file.Mappings(which))
        {
            if (Rating(node, byRating, problems) is not var (rating, span))
            {
                continue;
            }

            if (edges.Exists(edge => edge.Rating == rating))
            {
                problems.Add(TableMessages.SecondRating(span));
            }

            var points = Points(node, problems);
            if (points.Count > 0)
            {
                edges.Add(new CurveEdge(rating, points, TrustWords.Find(node.Text("trust") ?? file.Text("trust")!)!.Value));
            }
        }

        edges.Sort((a, b) => a.Rating.CompareTo(b.Rating));
        return edges;
    }

    private static (double Rating, SourceSpan Span)? Rating(MappingNode edge, bool byRating, Problems problems)
    {
        var key = byRating ? "ratings-up-to" : "rating";
        if (edge.Scalar(key) is not { } scalar || edge.Find(byRating ? "rating" : "ratings-up-to") is not null)
        {
            problems.Add(TableMessages.NoRating(edge.Span, key));
            return null;
        }

        if (QuantityText.TryParse(scalar.Text, out var stated, out _) && stated.Quantity.Dimension == Dimension.Current)
        {
            return (stated.Quantity.Value, scalar.Span);
        }

        problems.Add(TableMessages.NotNumber(scalar.Span, "A, with its unit,"));
        return null;
    }

    private static List<CurvePoint> Points(MappingNode edge, Problems problems)
    {
        var points = new List<CurvePoint>();
        foreach (var pair in edge.Items("points").OfType<SequenceNode>())
        {
            if (pair.Items is not [ScalarNode { Kind: ScalarKind.Number } current, ScalarNode { Kind: ScalarKind.Number } time])
            {
                problems.Add(TableMessages.RowLength(pair.Span, 2, pair.Items.Count));
                return [];
            }

            var point = new CurvePoint(current.Number, time.Number);
            if (point.Current <= 0 || point.Time <= 0)
            {
                problems.Add(TableMessages.NotPositive(pair.Span));
                return [];
            }

            if (points.Count > 0 && (point.Current < points[^1].Current || point.Time > points[^1].Time))
            {
                problems.Add(TableMessages.CurveOrder(pair.Span));
                return [];
            }

            points.Add(point);
        }

        return points;
    }
}
