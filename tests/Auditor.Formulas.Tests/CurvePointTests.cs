using Auditor.Formulas.Curves;

namespace Auditor.Formulas.Tests;

/// <summary>The points of a curve as a picture draws them, in amperes and seconds; curves of the example, read anew.</summary>
public class CurvePointTests
{
    private static readonly CurveSet Curves = RuleData.LoadGood("example").Curves;

    [Fact]
    public void Points_in_multiples_of_the_rating_are_given_in_amperes() =>
        Assert.Equal(
            [new CurvePoint(14.5, 3600), new CurvePoint(25.5, 60), new CurvePoint(50, 60), new CurvePoint(50, 0.1)],
            Curves.Find("EN 60898", "B")!.PointsOf(isSlow: true, 10));

    [Fact]
    public void Points_in_amperes_are_given_as_they_are() =>
        Assert.Equal([new CurvePoint(10, 100), new CurvePoint(100, 1)], Curves.Find("BS 88-3", "any")!.PointsOf(isSlow: true, 32));

    [Theory]
    [InlineData("BS 88-3", true, 20)]
    [InlineData("BS 88-3", false, 32)]
    [InlineData("EN 60898", true, 160)]
    public void An_edge_or_a_rating_that_is_not_held_has_no_points(string standard, bool isSlow, double rating) =>
        Assert.Empty(Curves.Find(standard, "B")!.PointsOf(isSlow, rating));

    [Fact]
    public void Curves_read_anew_have_all_their_edges_by_rating()
    {
        var curves = RuleData.LoadGood("example").Curves;

        Assert.Equal([32.0, 125.0], curves.Find("EN 61009", "B")!.Slow.Select(edge => edge.Rating));
        Assert.Equal([5.0, 32.0], curves.Find("BS 88-3", "any")!.Slow.Select(edge => edge.Rating));
        Assert.Empty(curves.Find("BS 88-3", "any")!.Fast);
    }
}
