namespace Auditor.Formulas.Tests;

public class AggregateTests
{
    [Theory]
    [InlineData("sum_of(legs, length)", "0", "10", "35", "missing")]
    [InlineData("min_of(legs, length)", "missing", "10", "5", "missing")]
    [InlineData("max_of(legs, length)", "missing", "10", "20", "missing")]
    [InlineData("count_of(legs, length > 5 m)", "0", "1", "2", "missing")]
    [InlineData("count_of(legs, true)", "0", "1", "3", "4")]
    [InlineData("all_of(legs, length > 1 m)", "true", "true", "true", "missing")]
    [InlineData("all_of(legs, length > 5 m)", "true", "true", "false", "false")]
    [InlineData("any_of(legs, length < 10 m)", "false", "false", "true", "true")]
    [InlineData("any_of(legs, length > 30 m)", "false", "false", "false", "missing")]
    [InlineData("sum_of(legs, length ?? 100 m)", "0", "10", "35", "135")]
    [InlineData("max_of(legs, -length)", "missing", "-10", "-5", "missing")]
    public void A_collection_is_gathered(string formula, string ofNone, string ofOne, string ofMany, string withOneMissing)
    {
        Assert.Equal(ofNone, Shown(formula));
        Assert.Equal(ofOne, Shown(formula, "10 m"));
        Assert.Equal(ofMany, Shown(formula, "10 m", "5 m", "20 m"));
        Assert.Equal(withOneMissing, Shown(formula, "10 m", "5 m", null, "20 m"));
    }

    [Theory]
    [InlineData("true", null, "missing", "true")]
    [InlineData("false", null, "false", "missing")]
    [InlineData(null, "true", "missing", "true")]
    [InlineData(null, "false", "false", "missing")]
    [InlineData(null, null, "missing", "missing")]
    [InlineData("true", "false", "false", "true")]
    public void All_and_any_are_three_valued(string? first, string? second, string all, string any)
    {
        var circuit = new Thing(Plant.Circuit).Hold("legs", [.. new[] { first, second }.Select(Buried)]);

        Assert.Equal(all, Bound.Truth("all_of(legs, buried)", circuit));
        Assert.Equal(any, Bound.Truth("any_of(legs, buried)", circuit));
    }

    [Fact]
    public void The_outer_subject_is_reached_by_this()
    {
        var circuit = Circuit("10 m", "20 m").Say(("Z", "0.5 Ω"), ("L", "15 m"), ("Zs", "2 Ω"));

        Assert.Equal("1", Bound.Truth("count_of(legs, length > this.L)", circuit));
        Assert.Equal("1", Bound.Truth("sum_of(legs, this.Z)", circuit));
        Assert.Equal("4", Bound.Truth("sum_of(legs, this.Zs)", circuit));
        Assert.Equal("missing", Bound.Truth("sum_of(legs, this.R)", circuit));
        Assert.Equal("0", Bound.Truth("sum_of(legs, this.R)", circuit.Hold("legs")));
    }

    [Fact]
    public void Collections_lie_within_collections()
    {
        var first = Circuit("10 m", "20 m").Say(("Zs", "2 Ω"), ("L", "15 m"));
        var second = Circuit("40 m").Say(("Zs", "3 Ω"), ("L", "100 m"));
        var board = new Thing(Plant.Board).Say(("Zdb", "1 Ω")).Hold("circuits", first, second);
        var installation = new Thing(Plant.Installation).Say(("Zs", "0.3 Ω")).Hold("boards", board);

        Assert.Equal(70, Bound.Number("sum_of(circuits, sum_of(legs, length))", board));
        Assert.Equal(1, Bound.Number("sum_of(circuits, count_of(legs, length > this.L))", board));
        Assert.Equal(3, Bound.Number("sum_of(circuits, sum_of(legs, this.Zs) / (2 ohm)) - 0.5", board));
        Assert.Equal(2, Bound.Number("sum_of(boards, count_of(circuits, Zs > this.Zdb))", installation));
        Assert.Equal(0.6, Bound.Number("sum_of(boards, sum_of(circuits, 0 ohm) + this.Zs) * 2", installation));
        Assert.Equal("true", Bound.Truth("any_of(boards, all_of(circuits, any_of(legs, length < this.L) || Zs > this.Zdb))", installation));
    }

    [Fact]
    public void An_item_looks_upward_like_any_other_subject()
    {
        var board = new Thing(Plant.Board).Say(("Zdb", "1 Ω"));
        var circuit = new Thing(Plant.Circuit).Say(("Zs", "3 Ω")).Join("up", board);
        var leg = new Thing(Plant.Leg).Join("up", circuit);
        circuit.Hold("legs", leg, leg);

        Assert.Equal(8, Bound.Number("sum_of(legs, up.Zs + up.up.Zdb)", circuit));
    }

    private static string Shown(string formula, params string?[] lengths) => Bound.Shown(Bound.Value(formula, Circuit(lengths)));

    private static Thing Circuit(params string?[] lengths) =>
        new Thing(Plant.Circuit).Hold("legs", [.. lengths.Select(length => length is null ? new Thing(Plant.Leg) : new Thing(Plant.Leg).Say(("length", length)))]);

    private static Thing Buried(string? flag) => flag is null ? new Thing(Plant.Leg) : new Thing(Plant.Leg).Say(("buried", flag));
}
