using Auditor.Engine.HouseSets;

namespace Auditor.Engine.Tests;

/// <summary>Rows that a house set puts beside those of the set below it: told where they can change what is read between rows, and only there.</summary>
public class HouseTableTests
{
    private const string Between = "between: { n: next-row }\n";

    [Theory]
    [InlineData("{ name: n, unit: 1 }", Between, "n", "[1.5, 19]", "figure")]
    [InlineData("{ name: n, unit: 1 }", "", "n", "[1.5, 19]", "figure")]
    [InlineData("{ name: word }", "", "word", "[c, 19]", "")]
    [InlineData("{ name: word }, { name: n, unit: 1 }", Between, "[word, n]", "[a, 1.5, 19]", "figure")]
    [InlineData("{ name: word }, { name: n, unit: 1 }", "", "[word, n]", "[a, 1.5, 19]", "")]
    public void Rows_that_come_between_others_are_told_of(string keys, string between, string down, string row, string told)
    {
        using var rules = new TemporaryRules()
            .With("lookup.yaml", $"lookup: figure\nabout: For the test.\nkeys: [{keys}]\nvalue: {{ name: v, unit: A }}\n{between}when-missing: ask\n")
            .With("more.yaml", Table("more", "figure", down, row))
            .With("base.yaml", "set: base\ntitle: Base\nuses: { tables: [lookup.yaml] }\n")
            .With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\nuses: { tables: [more.yaml] }\n");

        var changes = rules.LoadSound("house.yaml").Changes;

        Assert.Equal(told, string.Join(", ", changes.Select(change => change.Name)));
        Assert.All(changes, change => Assert.Equal(
            ("its own figures", "1 figure put between or beside those that it reads between or rounds up to"), (change.Before, change.How)));
    }

    [Fact]
    public void A_lookup_that_a_house_set_brings_with_its_rows_changes_nothing_below()
    {
        using var rules = new TemporaryRules()
            .With("own.yaml", $"lookup: own\nabout: For the test.\nkeys: [{{ name: n, unit: 1 }}]\nvalue: {{ name: v, unit: A }}\n{Between}when-missing: ask\n")
            .With("rows.yaml", Table("rows", "own", "n", "[1, 10]\n  - [2, 20]"))
            .With("base.yaml", "set: base\ntitle: Base\n")
            .With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\nuses: { tables: [own.yaml, rows.yaml] }\n");

        Assert.Empty(rules.LoadSound("house.yaml").Changes);
    }

    [Fact]
    public void A_house_set_may_compute_the_uncertainty_of_a_reading_anew()
    {
        using var rules = new TemporaryRules()
            .With("below.yaml", Uncertainty("0.3 * readings.zs"))
            .With("above.yaml", Uncertainty("0.2 * readings.zs").Replace("sheet: made", "sheet: own", StringComparison.Ordinal))
            .With("base.yaml", "set: base\ntitle: Base\nuses: { sheets: [below.yaml] }\n")
            .With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\nuses: { sheets: [above.yaml] }\n");

        var set = rules.LoadSound("house.yaml");

        Assert.Equal("0.2 * readings.zs", set.UncertaintyOf(set.Schema.Shapes.Circuit, set.Schema.Shapes.Circuit.Input("readings.zs")!)!.Formula.Text);
        Assert.Equal((HouseChangeKind.Quantity, "circuit u"), Assert.Single(set.Changes.Select(change => (change.What, change.Name))));
    }

    private static string Table(string id, string lookup, string down, string rows) =>
        $"table: {id}\nlookup: {lookup}\ntitle: {id}\nsource: our own invention\ntrust: one source\ndown: {down}\nrows:\n  - {rows}\n";

    private static string Uncertainty(string formula) =>
        $"sheet: made\nabout: Made for a test.\nquantities:\n  - symbol: u\n    name: made\n    of: circuit\n    unit: Ω\n    formula: {formula}\n"
        + "    uncertainty-of: readings.zs\n    clause: { type: verification }\n    cases: [{ name: none, expect: missing }]\n";
}
