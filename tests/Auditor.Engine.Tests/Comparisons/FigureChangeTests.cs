using Auditor.Engine.Comparisons;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Tests.Comparisons;

/// <summary>Figures of curves and of tables of words that differ between two rule sets.</summary>
public class FigureChangeTests
{
    private const string Edges = "slow:\n  - { ratings-up-to: 32 A, points: [[5, 0.1]] }\n  - { ratings-up-to: 63 A, points: [[5, 0.1], [7, 0.05]] }\n";

    private static readonly string Design = Text("40 A");

    [Fact]
    public void A_curve_that_changed_is_told_by_its_points_and_moves_what_reads_them()
    {
        var comparison = Compare(Design, Design, Edges, Edges.With("[[5, 0.1]]", "[[6, 0.1]]"));

        var curve = Assert.Single(comparison.RuleSet.Changes);
        Assert.Equal((RuleItem.Curve, "made", "Made curve", false, false), (curve.Item, curve.Name, curve.Title, curve.IsAdded, curve.IsRemoved));
        Assert.Equal([new RuleDetail("slow edge, 32 A", "5 for 0.1 s", "6 for 0.1 s")], curve.Details);
        var change = Assert.Single(comparison.Findings, change => change.Finding.Key == "opens:A/1");
        Assert.Equal((FindingChangeKind.Closer, MovedBy.RuleSet), (change.Kind, change.MovedBy));
        Assert.Same(curve, Assert.Single(change.Causes));
    }

    [Fact]
    public void A_curve_that_changed_elsewhere_has_no_part_in_what_another_input_moved()
    {
        var comparison = Compare(Design, Text("41 A"), Edges, Edges.With("[7, 0.05]", "[8, 0.05]"));

        Assert.Equal("slow edge, 63 A", Assert.Single(Assert.Single(comparison.RuleSet.Changes).Details).What);
        var change = Assert.Single(comparison.Findings, change => change.Finding.Key == "opens:A/1");
        Assert.Equal((FindingChangeKind.Further, MovedBy.Design), (change.Kind, change.MovedBy));
        Assert.Equal("load.current", Assert.IsType<InputChange>(Assert.Single(change.Causes)).Path);
    }

    [Fact]
    public void A_curve_that_is_the_same_is_no_change() => Assert.Empty(Compare(Design, Text("41 A"), Edges, Edges).RuleSet.Changes);

    [Fact]
    public void A_word_of_a_table_that_became_another_is_told()
    {
        var comparison = Compare(Design, Design, Edges, Edges, "[B, quick]", "[B, slow]");

        var table = Assert.Single(comparison.RuleSet.Changes);
        Assert.Equal((RuleItem.Table, "tempers"), (table.Item, table.Name));
        Assert.Equal([new RuleDetail("row B", "quick", "slow")], table.Details);
    }

    [Fact]
    public void A_row_that_went_is_told_of_a_table_that_stays_and_one_that_came_as_well()
    {
        var went = Assert.Single(Compare(Design, Design, Edges, Edges, "\n  - [C, slow]", "").RuleSet.Changes);
        var came = Assert.Single(Compare(Design, Design, Edges, Edges, "[C, slow]", "[C, slow]\n  - [D, slower]").RuleSet.Changes);

        Assert.Equal(("tempers", false, false), (went.Name, went.IsAdded, went.IsRemoved));
        Assert.Equal([new RuleDetail("row C", "slow", "")], went.Details);
        Assert.Equal(("tempers", false, false), (came.Name, came.IsAdded, came.IsRemoved));
        Assert.Equal([new RuleDetail("row D", "", "slower")], came.Details);
    }

    private static RevisionComparison Compare(string before, string after, string edgesBefore, string edgesAfter, string old = "[B, quick]", string replacement = "[B, quick]") =>
        RevisionComparison.Of(Revisions.Of(before, Rules(edgesBefore, old, old)), Revisions.Of(after, Rules(edgesAfter, old, replacement)));

    private static string Text(string current) =>
        "design-format: 1\nsupply: { earthing: TN-S, phases: 1, voltage: 230 V }\nboards:\n  - id: A\n    circuits:\n"
        + $"      - {{ id: 1, device: {{ standard: EN 60898, curve: B, rating: 32 A }}, load: {{ current: {current} }} }}\n";

    private static RuleSet Rules(string edges, string old, string replacement)
    {
        using var rules = new TemporaryRules()
            .With("set.yaml", "set: set\ntitle: Set\nuses: { tables: [lookup.yaml, table.yaml], curves: [curve.yaml], provisions: [opens.yaml] }\n")
            .With("lookup.yaml", "lookup: temper\nabout: Made up.\nkeys: [{ name: type }]\nvalue: { name: temper }\nwhen-missing: ask\n")
            .With("table.yaml", "table: tempers\nlookup: temper\ntitle: Tempers\nsource: made up\ntrust: derived\ndown: type\nrows:\n  - [B, quick]\n  - [C, slow]\n".With(old, replacement))
            .With("curve.yaml", "curve: made\ntitle: Made curve\nsource: made up\ntrust: derived\nstandard: EN 60898\ntype: B\nof: rating\n" + edges)
            .With("opens.yaml", "rule: opens\ntitle: A rule\nclause: { type: plausibility }\nprovision: requirement\nstatus: { since: 1.0 }\nof: circuit\n"
                + "compare: { value: \"10 * load.current - trip_current(device.standard, device.curve, device.rating, 0.1 s)\", at-least: 100 A }\n"
                + "says: Made.\nwhy: Made.\ndepartures: allowed\ncases: [{ name: one, verdict: undetermined }]\n");
        return rules.LoadSound("set.yaml");
    }
}
