namespace Auditor.Formulas.Tests;

public class WayTests
{
    [Fact]
    public void A_way_reads_at_whatever_subject_stands_at_its_end()
    {
        var installation = new Thing(Plant.Installation, "-").Say(("Zs", "0.35 Ω"));
        var root = new Thing(Plant.Board, "MSB").Join("up", installation).Join("origin", installation);
        var feeder = new Thing(Plant.Circuit, "MSB/1").Say(("Zs", "0.5 Ω")).Join("up", root);
        var below = new Thing(Plant.Board, "DB1").Join("up", feeder).Join("origin", installation);
        feeder.Join("fed", below);
        var final = new Thing(Plant.Circuit, "DB1/1").Join("up", below);

        Assert.Equal(0.35, Bound.Number("up.Zs", root));
        Assert.Equal(0.5, Bound.Number("up.Zs", below));
        Assert.Equal(0.35, Bound.Number("origin.Zs", below));
        Assert.Equal(0.5, Bound.Number("up.up.Zs", final));
        Assert.Equal(0.35, Bound.Number("up.origin.Zs", final));
        Assert.Equal(0.5, Bound.Number("fed.up.Zs", feeder));
        Assert.Equal("missing", Bound.Truth("fed.up.Zs", final));
    }

    [Theory]
    [InlineData("up.Zs + 1 ohm", null)]
    [InlineData("up.U0", "cannot read as one a quantity in A and a quantity in V")]
    [InlineData("up.Ze", "`up` may lead to a circuit, which has no `Ze`")]
    [InlineData("up.Ib", "`up` may lead to an installation, which has no `Ib`")]
    [InlineData("up.up.Zs", "`up` may lead to a board, which has no `Zs`")]
    public void What_is_read_must_exist_alike_on_every_shape_that_may_stand_there(string formula, string? message)
    {
        Bound.TryFormula(formula, Plant.Board, out var problems);

        Assert.Equal(message, problems.All.SingleOrDefault()?.Message);
    }

    [Theory]
    [InlineData("Zs * 2 + Zs", "circuit Zs Same")]
    [InlineData("R + Z", "circuit R Same, circuit Z Same")]
    [InlineData("up.Zdb + up.rated_current * (0 ohm) / I", "board Zdb Up, board rated_current Up, circuit I Same")]
    [InlineData("fed.Zdb + Zs", "board Zdb Down, circuit Zs Same")]
    [InlineData("fed.up.Zs", "circuit Zs Up Down, installation Zs Up Down")]
    [InlineData("any_of(legs, up.Zs > 1 ohm && buried)", "circuit Zs Up Down, leg buried Down")]
    [InlineData("any_of(legs, this.Zs > 1 ohm)", "circuit Zs Same")]
    [InlineData("origin.Zs + up.up.Zs", "installation Zs Up, circuit Zs Up, installation Zs Up")]
    public void A_formula_knows_what_it_reads_and_which_way_it_looks(string formula, string references) =>
        Assert.Equal(references, string.Join(", ", Bound.Formula(formula).References.Select(reference =>
            $"{reference.Shape.Name} {reference.Quantity?.Symbol ?? reference.Input!.Name} {reference.Direction.ToString().Replace(",", "")}")));
}
