using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Tests;

public class LookupTests
{
    [Theory]
    [InlineData("table('capacity', 1.5 mm2, 'C')", "20")]
    [InlineData("table('capacity', 1.5 mm2, '100')", "16")]
    [InlineData("table('capacity', 2.5 mm2, 'C')", "27")]
    [InlineData("table('words', 'ring')", "red")]
    [InlineData("table('words', 'radial')", "blue")]
    [InlineData("table('ambient', 'thermoplastic 70', 30 degC)", "1")]
    [InlineData("table('ambient', 'thermoplastic 70', 30.1 degC)", "0.87")]
    [InlineData("table('ambient', 'thermoplastic 70', 40 degC)", "0.87")]
    [InlineData("table('ambient', 'thermoplastic 70', 0 degC)", "1.2")]
    [InlineData("table('ambient', 'thermoplastic 70', -0.0 degC)", "1.2")]
    [InlineData("table('ambient', 'thermoplastic 70', -4.9 degC)", "1.2")]
    [InlineData("table('ambient', 'thermoplastic 70', -40 degC)", "1.3")]
    [InlineData("table('line', 10, 'left')", "100")]
    [InlineData("table('line', 15, 'left')", "150")]
    [InlineData("table('line', 12.5, 'left')", "125")]
    [InlineData("table('line', 30, 'left')", "150")]
    [InlineData("table('line', 40, 'right')", "3")]
    public void A_figure_is_found(string formula, string figure) => Assert.Equal(figure, Bound.Truth(formula));

    /// <summary>Straight on logarithmic axes from (10, 100) to (1000, 1): the product of the two is 1000 throughout.</summary>
    [Theory]
    [InlineData("table('power', 10 A)", 100)]
    [InlineData("table('power', 100 A)", 10)]
    [InlineData("table('power', 50 A)", 20)]
    [InlineData("table('power', 1 kA)", 1)]
    public void Between_rows_a_power_law_may_hold(string formula, double seconds) => Assert.Equal(seconds, Bound.Number(formula), 1e-12);

    [Theory]
    [InlineData("table('capacity', 1.2 mm2, 'C')", "capacity holds no csa 1.2 mm² (nearest: 1.5 mm²); give the capacity of the cable itself")]
    [InlineData("table('capacity', 2 mm2, 'C')", "capacity holds no csa 2 mm² (nearest: 1.5 mm² and 2.5 mm²); give the capacity of the cable itself")]
    [InlineData("table('capacity', 4 mm2, 'C')", "capacity holds no csa 4 mm² (nearest: 2.5 mm² and 111 mm²); give the capacity of the cable itself")]
    [InlineData("table('capacity', 240 mm2, 'C')", "capacity holds no csa 240 mm² (nearest: 111 mm²); give the capacity of the cable itself")]
    [InlineData("table('capacity', 1.5 mm2, 'D')", "capacity holds no method D for csa 1.5 mm² (it holds 100, C); give the capacity of the cable itself")]
    [InlineData("table('capacity', 2.5 mm2, '100')", "Capacities of the test gives no figure for csa 2.5 mm², method 100; give the capacity of the cable itself")]
    [InlineData("table('words', 'star')", "words holds no kind star (it holds radial, ring, spur); ask")]
    [InlineData("table('words', 'spur')", "Words of the test gives no figure for kind spur; ask")]
    [InlineData("table('words', '')", "words holds no kind  (it holds radial, ring, spur); ask")]
    [InlineData("table('ambient', 'thermoplastic 70', 40.1 degC)", "ambient holds no ambient 40.1 °C for insulation thermoplastic 70 (nearest: 40 °C); choose another place")]
    [InlineData("table('ambient', 'mineral', 20 degC)", "ambient holds no insulation mineral (it holds thermoplastic 70); choose another place")]
    [InlineData("table('line', 9.9, 'left')", "line holds no x 9.9 (nearest: 10); stay within")]
    [InlineData("table('line', 40.1, 'left')", "line holds no x 40.1 (nearest: 40); stay within")]
    [InlineData("table('line', 15, 'right')", "Line of the test gives no figure for x 15, side right; stay within")]
    [InlineData("table('line', 15, 'middle')", "line holds no side middle for x 15 (it holds left, right); stay within")]
    [InlineData("table('power', 5 A)", "the calculation has no finite result (a division by zero, a root of a negative or an overflow)")]
    [InlineData("table('power', 3 kA)", "power holds no current 3000 A (nearest: 2000 A); stay within")]
    public void A_figure_that_is_not_held_is_missing_and_the_nearest_rows_are_named(string formula, string why)
    {
        var value = Bound.Value(formula);

        Assert.Equal("missing", Bound.Shown(value));
        Assert.Equal(why, Bound.Reasons(value));
    }

    [Theory]
    [InlineData(1 - 1e-13)]
    [InlineData(1 + 1e-13)]
    [InlineData(1 - 9e-10)]
    [InlineData(1 + 9e-10)]
    public void A_size_that_was_computed_finds_its_row(double slip)
    {
        // 111 mm² lies where rounding to a fixed number of binary digits would tell two neighbouring doubles apart.
        foreach (var (csa, amperes) in new[] { (1.5e-6, 20), (2.5e-6, 27), (111e-6, 300) })
        {
            var circuit = new Thing(Plant.Circuit).Say("S", Value.Of(csa * slip));

            Assert.Equal(amperes, Bound.Number("table('capacity', S, 'C')", circuit));
        }
    }

    [Fact]
    public void A_size_beyond_the_slack_finds_no_row() =>
        Assert.Equal("missing", Bound.Truth("table('capacity', S, 'C')", new Thing(Plant.Circuit).Say("S", Value.Of(1.5e-6 * (1 + 1e-8)))));

    [Fact]
    public void A_later_set_overrides_single_cells_and_may_take_up_the_name_of_a_table()
    {
        var lookup = RuleData.LoadGood("override").Lookups["figure"];

        Assert.Equal(["1/a=10 base", "1/b=12 house", "2/a=20 base", "2/b=null house", "3/a=30 house", "3/b=31 house"], lookup.Cells().Select(Described));
    }

    [Fact]
    public void A_cell_tells_where_it_stands()
    {
        var cells = new List<TableCell>();
        RuleData.Example.Lookups["capacity"].Find([Value.Of(2.5e-6), Value.Of("C")], cells);

        var cell = Assert.Single(cells);
        Assert.Equal(("2.5", "C", 27.0, Trust.Memory, 11), (cell.Row, cell.Column, cell.Number, cell.Trust, cell.Line));
        Assert.Equal("example/capacity.table.yaml", cell.Table.Path);
        Assert.Equal(["our own invention"], cell.Table.Sources);
    }

    [Fact]
    public void An_interpolated_figure_rests_on_both_cells()
    {
        var cells = new List<TableCell>();
        RuleData.Example.Lookups["line"].Find([Value.Of(15.0), Value.Of("left")], cells);

        Assert.Equal(["10", "20"], cells.Select(cell => cell.Row));
    }

    private static string Described((IReadOnlyList<object> Keys, TableCell Cell) entry) =>
        $"{string.Join('/', entry.Keys)}={(entry.Cell.IsEmpty ? "null" : entry.Cell.Number)} {entry.Cell.Table.Path.Split('/')[^2].Replace("override", "base")}";
}
