using Auditor.Formulas.Curves;
using Auditor.Formulas.Tables;

namespace Auditor.Formulas.Tests;

/// <summary>Which of several curves holds for a device.</summary>
public class CurveSetTests
{
    [Fact]
    public void A_curve_of_an_earlier_set_that_comes_late_stays_behind_those_of_later_sets()
    {
        var curves = new CurveSet();
        curves.Add(Made("house", "B", "S"), 1);
        curves.Add(Made("shipped", "B", "S"), 0);

        Assert.Equal(["house", "shipped"], curves.All.Select(curve => curve.Source.Id));
        Assert.Equal("house", curves.Find("S", "B")!.Source.Id);
    }

    [Fact]
    public void Curves_of_one_set_that_share_a_standard_are_rivals_even_where_each_has_others()
    {
        var curves = new CurveSet();
        curves.Add(Made("one", "B", "S", "T"), 0);

        Assert.Equal("one", curves.Add(Made("other", "B", "T", "U"), 0)?.Source.Id);
        Assert.Null(curves.Add(Made("third", "B", "U"), 0));
    }

    [Theory]
    [InlineData("B", "B", true)]
    [InlineData("B", "C", false)]
    [InlineData(null, "B", true)]
    [InlineData("B", null, true)]
    [InlineData(null, null, true)]
    public void A_later_curve_hides_an_earlier_one_that_holds_for_a_device_of_both(string? later, string? earlier, bool hides)
    {
        var curves = new CurveSet();
        curves.Add(Made("shipped", earlier, "S", "T"), 0);
        curves.Add(Made("house", later, "T"), 1);

        Assert.Equal(hides ? [("house", "shipped", 1)] : [], curves.Hidden().Select(pair => (pair.Later.Source.Id, pair.Earlier.Source.Id, pair.Set)));
    }

    [Fact]
    public void A_later_curve_for_other_devices_hides_nothing()
    {
        var curves = new CurveSet();
        curves.Add(Made("shipped", "B", "S"), 0);
        curves.Add(Made("house", "B", "T"), 1);

        Assert.Empty(curves.Hidden());
    }

    private static Curve Made(string id, string? type, params string[] standards) =>
        new(new TableSource(id, id, [], id + ".yaml"), standards, type, ByRating: true, [new CurveEdge(10, [new CurvePoint(1, 1)], Trust.OneSource)], []);
}
