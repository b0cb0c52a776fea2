using Auditor.Documents;
using Auditor.Formulas.Tables;
using Auditor.Quantities;

namespace Auditor.Formulas.Curves;

/// <summary>Makes curves from files that their schema has accepted.</summary>
public static class CurveReader
{
    /// <summary>Reads one curve into a set.</summary>
    public static void Read(MappingNode file, CurveSet curves, Problems problems)
    {
        var trust = TrustWords.Find(file.Text("trust")!)!.Value;
        var source = new TableSource(file.Text("curve")!, file.Text("title")!, file.Texts("source"), file.Span.Source.Path);
        var byRating = file.Text("of") == "rating";
        curves.Add(new Curve(
            source, file.Texts("standard"), file.Text("type"), byRating, Edges(file, "slow", trust, problems), Edges(file, "fast", trust, problems)));
    }

    private static List<CurveEdge> Edges(MappingNode file, string which, Trust trust, Problems problems)
    {
        var edges = new List<CurveEdge>();
        foreach (var edge in file.Mappings(which))
        {
            var rating = edge.Scalar("ratings-up-to") ?? edge.Scalar("rating")!;
            if (!QuantityText.TryParse(rating.Text, out var stated, out _) || stated!.Quantity.Dimension != Dimension.Current)
            {
                problems.Add(TableMessages.NotNumber(rating.Span, "A, with its unit,"));
                continue;
            }

            var points = Points(edge, problems);
            if (points.Count > 0)
            {
                var own = edge.Text("trust") is { } word ? TrustWords.Find(word)!.Value : trust;
                edges.Add(new CurveEdge(stated.Quantity.Value, points, own));
            }
        }

        edges.Sort((a, b) => a.Rating.CompareTo(b.Rating));
        return edges;
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
