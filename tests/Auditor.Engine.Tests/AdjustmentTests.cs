using Auditor.Engine.Adjustments;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Tests;

/// <summary>What rule data say of the things that can be changed, as it is read.</summary>
public class AdjustmentTests
{
    private const string Head = "label: it\nabout: For the test.\n";

    [Fact]
    public void A_range_is_read_with_its_ends_and_with_nothing_that_is_not_said()
    {
        var length = Read("length", "of: leg\ninput: length\nrange: { from: 50 cm, to: 5 km }\n");

        Assert.Equal(new RangeLadder(0.5, 5000), length.Ladder);
        Assert.Equal(("length", "it", "cable.length"), (length.Id, length.Label, length.Path));
        Assert.Equal((false, false, false, true), (length.AllLegs, length.IsReading, length.IsForSite, length.HasLimits));
        Assert.Empty(length.Also);
        Assert.Null(length.Remedy);
        Assert.Null(length.Exists);
        Assert.Null(length.Expect);
    }

    [Theory]
    [InlineData("from: 2 m, to: 1 m")]
    [InlineData("from: 1 m, to: 1 m")]
    public void A_range_that_leads_nowhere_is_refused(string range)
    {
        using var rules = With("length", $"of: leg\ninput: length\nrange: {{ {range} }}\n");
        rules.Load("set.yaml", out var problems);

        Assert.Equal("empty-range", Assert.Single(problems.All).Code);
    }

    [Fact]
    public void A_series_is_read_with_the_keys_before_the_last()
    {
        using var rules = With("rating", "of: circuit\ninput: device.rating\nseries: { lookup: made-rating, keys: [device.standard] }\non-site: true\nlimits: false\n")
            .With("tables/lookup.yaml", "lookup: made-rating\nabout: Ratings.\nkeys: [{ name: standard }, { name: rating, unit: A }]\nvalue: { name: made, unit: 1 }\nwhen-missing: ask\n")
            .With("tables/table.yaml", "table: ratings\nlookup: made-rating\ntitle: Made up\nsource: made up\ntrust: derived\ndown: [standard, rating]\n"
                + "rows:\n  - [EN 60898, 16, 1]\n  - [EN 60898, 6, 1]\n  - [EN 60898, 10, null]\n  - [BS 88-2, 20, 1]\n");
        var set = rules.LoadSound("set.yaml");
        var rating = Assert.Single(set.Adjustments);
        var design = Small.Build(Small.DesignText("house"), set);

        Assert.Equal((true, false), (rating.IsForSite, rating.HasLimits));
        Assert.Equal([6.0, 16.0], rating.Ladder.StepsAt(design.Find("DB1/1")!)!.Select(step => step.Number));
        Assert.Empty(rating.Ladder.StepsAt(design.Find("DB2/2")!)!);
    }

    [Fact]
    public void A_key_of_a_series_that_is_no_such_key_is_refused()
    {
        using var rules = With("rating", "of: circuit\ninput: device.rating\nseries: { lookup: made-rating, keys: [device.rating] }\n")
            .With("tables/lookup.yaml", "lookup: made-rating\nabout: Ratings.\nkeys: [{ name: standard }, { name: rating, unit: A }]\nvalue: { name: made, unit: 1 }\nwhen-missing: ask\n");
        rules.Load("set.yaml", out var problems);

        Assert.Equal("wrong-result", Assert.Single(problems.All).Code);
    }

    [Fact]
    public void Steps_are_read_with_what_follows_from_them_and_with_their_condition()
    {
        var curve = Read("curve", "of: circuit\ninput: device.curve\nsteps: [D, B]\nalso: { device.standard: \"'EN 60898'\" }\nexists: given(device.rating)\n");

        Assert.Equal(["D", "B"], ((StepLadder)curve.Ladder).Steps.Select(step => step.Text));
        Assert.Equal([("device.standard", "'EN 60898'")], curve.Also.Select(also => (also.Slot.Path, also.Formula.Text)));
        Assert.Equal("given(device.rating)", curve.Exists!.Text);
    }

    [Fact]
    public void A_reading_is_read_with_what_it_should_show()
    {
        var reading = Read("zs", "of: circuit\ninput: readings.zs\nrange: { from: 1 mohm, to: 10 ohm }\nreading: true\nexpect: 2 * readings.zs\nlegs: all\n");

        Assert.Equal((true, true), (reading.IsReading, reading.AllLegs));
        Assert.Equal("2 * readings.zs", reading.Expect!.Text);
    }

    [Fact]
    public void A_remedy_is_read_with_what_is_usual_where_nothing_is_said()
    {
        Assert.Equal(
            new RemedyTerms(8, RemedyWay.Down, 3, 0.25, 0.5, false),
            Read("length", "of: leg\ninput: length\nrange: { from: 1 m, to: 5 km }\nremedy: { effort: 8, way: down, share: 25 %, round: 50 cm }\n").Remedy);
        Assert.Equal(
            new RemedyTerms(2, RemedyWay.Up, 6, 0.5, 0, true),
            Read("curve", "of: circuit\ninput: device.curve\nsteps: [B, C]\nremedy: { effort: 2, way: up, most: 6, adds: true }\n").Remedy);
        Assert.Equal(RemedyWay.Either, Read("curve", "of: circuit\ninput: device.curve\nsteps: [B, C]\nremedy: { effort: 2, way: either }\n").Remedy!.Way);
    }

    [Fact]
    public void The_uncertainty_of_a_reading_is_found_by_the_reading()
    {
        using var rules = new TemporaryRules().With("set.yaml", "set: set\ntitle: Set\nuses: { sheets: [sheet.yaml] }\n").With("sheet.yaml", """
            sheet: made
            about: Made for a test.
            quantities:
              - symbol: u_zs
                name: uncertainty of the loop reading
                of: circuit
                unit: Ω
                formula: 0.3 * readings.zs
                uncertainty-of: readings.zs
                only-when: measured
                clause: { type: verification }
                cases: [{ name: none, expect: missing }]

            """);
        var set = rules.LoadSound("set.yaml");
        var circuit = set.Schema.Shapes.Circuit;

        Assert.Equal("u_zs", set.UncertaintyOf(circuit, circuit.Input("readings.zs")!)!.Slot.Symbol);
        Assert.Equal(new Uncertainty(circuit.Input("readings.zs")!, OnlyMeasured: true), set.Quantities.Single().Uncertainty);
        Assert.Null(set.UncertaintyOf(circuit, circuit.Input("device.rating")!));
    }

    private static Adjustment Read(string id, string text)
    {
        using var rules = With(id, text);
        return Assert.Single(rules.LoadSound("set.yaml").Adjustments);
    }

    private static TemporaryRules With(string id, string text) => new TemporaryRules()
        .With("set.yaml", $"set: set\ntitle: Set\nuses: {{ tables: [tables], adjustments: [adjustments] }}\n")
        .With($"adjustments/{id}.yaml", $"adjustment: {id}\n{Head}{text}")
        .With("tables/none.yaml", "lookup: none\nabout: None.\nkeys: [{ name: n }]\nvalue: { name: n }\nwhen-missing: ask\n");
}
