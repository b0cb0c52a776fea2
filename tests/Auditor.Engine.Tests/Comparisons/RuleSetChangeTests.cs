using Auditor.Engine.Comparisons;

namespace Auditor.Engine.Tests.Comparisons;

/// <summary>A limit that moved is not a design that moved.</summary>
public class RuleSetChangeTests
{
    private const string Longer = "length: 35 m";

    private static FindingChange Of(RevisionComparison comparison, string key) => comparison.Findings.Single(change => change.Finding.Key == key);

    [Fact]
    public void A_parameter_that_moved_is_told_apart_from_the_design()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design, ("plain.yaml", "value: 4 %", "value: 2.5 %"));

        var rule = Assert.Single(comparison.RuleSet.Changes);
        Assert.Equal((RuleItem.Parameter, "drop-limit", "4 %", "2.5 %"), (rule.Item, rule.Name, rule.Details[0].Before, rule.Details[0].After));
        Assert.Empty(comparison.Inputs);
        Assert.Equal("drop:B/2", Assert.Single(comparison.Of(FindingChangeKind.New)).Finding.Key);
        Assert.All(comparison.Findings.Where(change => change.Kind != FindingChangeKind.Unchanged), change => Assert.Equal(MovedBy.RuleSet, change.MovedBy));
        Assert.True(Of(comparison, "drop:B/2").HasOtherLimit);
    }

    [Fact]
    public void Where_both_moved_each_margin_tells_which_of_them_moved_it()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design.With("length: 30 m", Longer), ("plain.yaml", "value: 4 %", "value: 3.9 %"));

        Assert.Equal(MovedBy.RuleSet, Of(comparison, "drop:B/1").MovedBy);
        Assert.Equal(MovedBy.Design | MovedBy.RuleSet, Of(comparison, "drop:B/2").MovedBy);
        Assert.Equal(["length", "drop-limit"], Of(comparison, "drop:B/2").Causes.Select(cause => cause is InputChange input ? input.Path : ((RuleChange)cause).Name));
    }

    [Fact]
    public void A_parameter_that_a_finding_does_not_read_leaves_it_to_the_design()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design.With("length: 30 m", Longer), ("plain.yaml", "value: 2,", "value: 3,"));

        Assert.Equal(MovedBy.Design, Of(comparison, "drop:B/2").MovedBy);
        Assert.Equal((FindingChangeKind.Worse, MovedBy.RuleSet), (Of(comparison, "spare:A").Kind, Of(comparison, "spare:A").MovedBy));
    }

    [Fact]
    public void A_figure_of_a_table_moves_only_what_reads_that_figure()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design, ("tables/copper.yaml", "[2.5, 14]", "[2.5, 15]"));

        var table = Assert.Single(comparison.RuleSet.Changes);
        Assert.Equal((RuleItem.Table, "copper"), (table.Item, table.Name));
        Assert.Equal([new RuleDetail("row 2.5", "14 mΩ/m", "15 mΩ/m")], table.Details);
        Assert.Equal(["drop:A/2", "drop:B/1"], comparison.Of(FindingChangeKind.Closer).Select(change => change.Finding.Key));
    }

    [Fact]
    public void A_formula_that_changed_moves_what_it_computes()
    {
        var comparison = Revisions.Compare(
            Yard.Design, Yard.Design, ("sheets/plain.yaml", "formula: table('resistance', csa) * length", "formula: 1.1 * table('resistance', csa) * length"));

        var quantity = Assert.Single(comparison.RuleSet.Changes);
        Assert.Equal((RuleItem.Quantity, "leg R"), (quantity.Item, quantity.Name));
        Assert.All(comparison.Of(FindingChangeKind.Closer), change => Assert.Same(quantity, Assert.Single(change.Causes)));
        Assert.Equal(4, comparison.Of(FindingChangeKind.Closer).Count());
    }

    [Fact]
    public void A_formula_laid_out_otherwise_and_a_case_added_are_no_change()
    {
        var comparison = Revisions.Compare(
            Yard.Design, Yard.Design,
            ("sheets/plain.yaml", "formula: up.vd_db + vd", "formula: >-\n      up.vd_db\n      + vd"),
            ("provisions/rcd.yaml", "cases: [", "cases: [{ name: one, given: { serves: [lighting] }, verdict: none }, "));

        Assert.False(comparison.RuleSet.IsSame);
        Assert.Empty(comparison.RuleSet.Changes);
    }

    [Fact]
    public void A_rule_under_another_id_is_known_by_its_former_one()
    {
        var comparison = Revisions.Compare(
            Yard.Design, Yard.Design,
            ("provisions/rcd.yaml", "rule: rcd\n", "rule: socket-protection\nformerly: [rcd]\n"));

        var change = Of(comparison, "socket-protection:A/2");
        Assert.Equal((FindingChangeKind.Unchanged, "rcd:A/2"), (change.Kind, change.Before!.Key));
    }

    [Fact]
    public void A_rule_that_only_one_rule_set_has_is_added_or_removed()
    {
        var comparison = Revisions.Compare(
            Yard.Design, Yard.Design, ("provisions/rcd.yaml", "rule: rcd\n", "rule: shocks\n"));

        Assert.Equal(
            [("rcd", false, true), ("shocks", true, false)],
            comparison.RuleSet.Changes.Where(change => change.Item == RuleItem.Rule).Select(change => (change.Name, change.IsAdded, change.IsRemoved)));
        Assert.Equal((FindingChangeKind.Gone, MovedBy.RuleSet), (Of(comparison, "rcd:A/2").Kind, Of(comparison, "rcd:A/2").MovedBy));
        Assert.Equal((FindingChangeKind.New, MovedBy.RuleSet), (Of(comparison, "shocks:A/2").Kind, Of(comparison, "shocks:A/2").MovedBy));
    }

    [Fact]
    public void A_recommendation_that_became_a_requirement_counts_as_worse()
    {
        var comparison = Revisions.Compare(
            Yard.Design, Yard.Design, ("provisions/spare.yaml", "provision: recommendation", "provision: requirement"));

        var change = Of(comparison, "spare:A");
        Assert.Equal((FindingChangeKind.Changed, MovedBy.RuleSet), (change.Kind, change.MovedBy));
        Assert.True(change.IsNewOrWorse);
        Assert.Equal([new RuleDetail("provision", "recommendation", "requirement")], Assert.Single(comparison.RuleSet.Changes).Details);
    }
}
