using Auditor.Formulas.Curves;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Tests;

/// <summary>
/// Readings of time-current curves. The breaker of the test opens at 1.45 In within 1 h, at 2.55 In within 60 s, and from 5 In on at once (0.1 s), as
/// EN 60898-1, table 7, asks of type B; its fuse of 32 A runs straight on logarithmic axes from 10 A, 100 s to 100 A, 1 s.
/// </summary>
public class CurveTests
{
    [Theory]
    [InlineData("32 A", "0.1 s", 160)]
    [InlineData("32 A", "0.4 s", 160)]
    [InlineData("32 A", "5 s", 160)]
    [InlineData("32 A", "59.9 s", 160)]
    [InlineData("32 A", "60 s", 81.6)]
    [InlineData("32 A", "1 h", 46.4)]
    [InlineData("6 A", "0.4 s", 30)]
    [InlineData("0.5 A", "0.4 s", 2.5)]
    [InlineData("63 A", "60 s", 315)]
    [InlineData("63 A", "2 h", 91.35)]
    public void The_least_current_that_opens_a_breaker_in_time_is_read(string rating, string time, double amperes) =>
        Assert.Equal(amperes, Bound.Number($"trip_current('EN 60898', 'B', {rating}, {time})"), 1e-9);

    [Theory]
    [InlineData("32 A", "46.4 A", 3600)]
    [InlineData("32 A", "81.6 A", 60)]
    [InlineData("32 A", "100 A", 60)]
    [InlineData("32 A", "159.9 A", 60)]
    [InlineData("32 A", "160 A", 0.1)]
    [InlineData("32 A", "160.1 A", 0.1)]
    [InlineData("32 A", "6 kA", 0.1)]
    public void The_time_in_which_a_breaker_opens_is_read_and_the_longer_one_held_up_to_a_step(string rating, string current, double seconds) =>
        Assert.Equal(seconds, Bound.Number($"trip_time('EN 61009', 'B', {rating}, {current})"), 1e-9);

    /// <summary>Between 10 A, 100 s and 100 A, 1 s the time falls with the square of the current: I²t is 10 000 A²s throughout.</summary>
    [Theory]
    [InlineData("10 A", 100)]
    [InlineData("20 A", 25)]
    [InlineData("50 A", 4)]
    [InlineData("100 A", 1)]
    public void Between_points_a_curve_is_straight_on_logarithmic_axes(string current, double seconds)
    {
        Assert.Equal(seconds, Bound.Number($"trip_time('BS 88-3', 'any', 32 A, {current})"), 1e-9);
        Assert.Equal(double.Parse(current.Split(' ')[0]), Bound.Number($"trip_current('BS 88-3', 'any', 32 A, {seconds} s)"), 1e-9);
    }

    [Theory]
    [InlineData("trip_current('EN 60898', 'B', 32 A, 0.09 s)", "Breaker of the test, type B gives no current for 0.09 s at 32 A; give the maker's own figure")]
    [InlineData("trip_current('EN 60898', 'B', 32 A, 3601 s)", "Breaker of the test, type B gives no current for 3601 s at 32 A; give the maker's own figure")]
    [InlineData("trip_time('EN 60898', 'B', 32 A, 46 A)", "Breaker of the test, type B gives no time for 46 A at 32 A, which is below its first point; give the maker's own figure")]
    [InlineData("trip_current('EN 60898', 'B', 160 A, 5 s)", "Breaker of the test, type B holds no rating of 160 A; give the maker's own figure")]
    [InlineData("trip_time('EN 60898', 'B', 0 A, 5 A)", "Breaker of the test, type B holds no rating of 0 A; give the maker's own figure")]
    [InlineData("trip_current('EN 60898', 'B', -6 A, 5 s)", "Breaker of the test, type B holds no rating of -6 A; give the maker's own figure")]
    [InlineData("trip_current('EN 60898', 'C', 32 A, 5 s)", "no time-current curve is held for EN 60898 type C; give the maker's own figure")]
    [InlineData("trip_time('IEC 60269', 'any', 32 A, 5 A)", "no time-current curve is held for IEC 60269; give the maker's own figure")]
    [InlineData("trip_time('BS 88-3', 'any', 20 A, 50 A)", "Fuse of the test holds no rating of 20 A; give the maker's own figure")]
    [InlineData("trip_current('BS 88-3', 'any', 5 A, 4 s)", "Fuse of the test gives no current for 4 s at 5 A; give the maker's own figure")]
    [InlineData("trip_time('BS 88-3', 'any', 5 A, 14 A)", "Fuse of the test gives no time for 14 A at 5 A, which is below its first point; give the maker's own figure")]
    public void Outside_a_curve_nothing_is_known(string formula, string why) => Assert.Equal(why, Bound.Reasons(Bound.Value(formula)));

    [Theory]
    [InlineData("trip_time('BS 88-3', 'any', 5 A, 15 A)", 5)]
    [InlineData("trip_time('BS 88-3', 'any', 5 A, 100 A)", 5)]
    [InlineData("trip_current('BS 88-3', 'any', 5 A, 5 s)", 15)]
    [InlineData("trip_current('BS 88-3', 'gG', 32 A, 1 s)", 100)]
    public void A_single_point_holds_at_its_time_and_above_its_current(string formula, double value) => Assert.Equal(value, Bound.Number(formula), 1e-9);

    [Theory]
    [InlineData(1 - 1e-12)]
    [InlineData(1 + 1e-12)]
    public void A_current_or_time_that_was_computed_to_a_point_is_at_it(double slip)
    {
        var circuit = new Thing(Plant.Circuit).Say("I", Value.Of(160 * slip)).Say("t", Value.Of(60 * slip)).Say("device.rating", Value.Of(32 * slip));

        Assert.Equal(0.1, Bound.Number("trip_time('EN 60898', 'B', 32 A, I)", circuit), 1e-9);
        Assert.Equal(81.6, Bound.Number("trip_current('EN 60898', 'B', 32 A, t)", circuit), 1e-9);
        Assert.Equal(160, Bound.Number("trip_current('EN 60898', 'B', device.rating, 5 s)", circuit), 1e-9);
        Assert.Equal(100, Bound.Number("trip_current('BS 88-3', 'any', device.rating, 1 s)", circuit), 1e-9);
    }

    [Fact]
    public void A_later_set_goes_first_and_a_type_before_any()
    {
        var curves = new CurveSet();
        Assert.Null(curves.Add(CurveOf("any", null, "S"), 0));
        Assert.Null(curves.Add(CurveOf("b", "B", "S"), 0));
        Assert.Null(curves.Add(CurveOf("other", null, "T"), 0));
        Assert.Null(curves.Add(CurveOf("house-c", "C", "S"), 1));

        Assert.Equal("b", curves.Find("S", "B")?.Source.Id);
        Assert.Equal("house-c", curves.Find("S", "C")?.Source.Id);
        Assert.Equal("any", curves.Find("S", "D")?.Source.Id);
        Assert.Equal("other", curves.Find("T", "B")?.Source.Id);
        Assert.Null(curves.Find("U", "B"));

        Assert.Null(curves.Add(CurveOf("any", null, "S"), 1));
        Assert.Equal(1, curves.All.Count(curve => curve.Source.Title == "any" && curve == curves.Find("S", "B")));
        Assert.Equal("house-c", curves.Find("S", "C")?.Source.Id);
    }

    private static Curve CurveOf(string id, string? type, string standard) =>
        new(new TableSource(id, id, [], id + ".yaml"), [standard], type, ByRating: true, [new CurveEdge(10, [new CurvePoint(1, 1)], Trust.OneSource)], []);
}
