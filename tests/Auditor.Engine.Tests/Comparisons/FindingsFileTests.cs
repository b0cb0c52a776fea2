using Auditor.Engine.Comparisons;

namespace Auditor.Engine.Tests.Comparisons;

/// <summary>An audit compared with what a findings file of an earlier one tells: no causes, but what moved a finding where only one thing can have.</summary>
public class FindingsFileTests
{
    private static readonly string Longer = Yard.Design.With("length: 30 m", "length: 100 m");

    [Fact]
    public void With_the_same_rules_it_was_the_design()
    {
        var comparison = RevisionComparison.Of(Revisions.FromFile(Revisions.Of(Yard.Design)), Revisions.Of(Longer));

        var change = Assert.Single(comparison.Of(FindingChangeKind.New));
        Assert.Equal(("drop:B/2", MovedBy.Design), (change.Finding.Key, change.MovedBy));
        Assert.Empty(change.Causes);
        Assert.Empty(comparison.Inputs);
        Assert.False(comparison.KnowsCauses);
        Assert.False(comparison.KnowsInputs);
        Assert.True(comparison.RuleSet.IsFullyKnown);
        Assert.Equal(1, comparison.CountNewOrWorse);
    }

    [Fact]
    public void With_the_same_design_it_was_the_rule_set()
    {
        var before = Revisions.Of(Yard.Design);
        var stricter = Revisions.Of(Yard.Design, Revisions.Rules(("plain.yaml", "value: 4 %", "value: 2.5 %")));

        var comparison = RevisionComparison.Of(Revisions.FromFile(before), stricter);

        Assert.Equal(("drop:B/2", MovedBy.RuleSet), Told(Assert.Single(comparison.Of(FindingChangeKind.New))));
        Assert.Equal([("drop-limit", "4 %", "2.5 %")], comparison.RuleSet.Changes.Select(change => (change.Name, change.Details[0].Before, change.Details[0].After)));
        Assert.False(comparison.RuleSet.IsFullyKnown);
    }

    [Fact]
    public void Where_both_differ_nobody_can_tell()
    {
        var stricter = Revisions.Rules(("plain.yaml", "value: 4 %", "value: 3.9 %"));

        var comparison = RevisionComparison.Of(Revisions.FromFile(Revisions.Of(Yard.Design)), Revisions.Of(Longer, stricter));

        Assert.Equal(("drop:B/2", MovedBy.Untold), Told(Assert.Single(comparison.Of(FindingChangeKind.New))));
    }

    [Fact]
    public void A_rule_that_the_earlier_set_has_not_is_the_rule_sets_doing()
    {
        var renamed = Revisions.Rules(("provisions/rcd.yaml", "rule: rcd\n", "rule: shocks\n"));

        var comparison = RevisionComparison.Of(Revisions.FromFile(Revisions.Of(Yard.Design)), Revisions.Of(Longer, renamed));

        Assert.Equal(MovedBy.RuleSet, comparison.Findings.Single(change => change.Finding.Key == "shocks:A/2").MovedBy);
        Assert.Equal(MovedBy.RuleSet, comparison.Findings.Single(change => change.Finding.Key == "rcd:A/2").MovedBy);
    }

    [Fact]
    public void A_file_may_be_the_later_one()
    {
        var comparison = RevisionComparison.Of(Revisions.Of(Longer), Revisions.FromFile(Revisions.Of(Yard.Design)));

        Assert.Equal(("drop:B/2", MovedBy.Design), Told(Assert.Single(comparison.Of(FindingChangeKind.Gone))));
        Assert.Empty(comparison.Inputs);
    }

    [Fact]
    public void A_declaration_of_a_renaming_that_the_file_already_shows_is_an_old_one()
    {
        var before = Yard.Design.With("- id: 2\n        name: Lamps", "- id: 9\n        name: Lamps")
            + "      - id: 2\n        name: Heater\n        device: { rating: 6 A }\n        cable: { csa: 1.5 mm², length: 5 m }\n        load: { current: 1 A }\n";
        var after = before.With("- id: 9\n        name: Lamps", "- id: 9\n        formerly: B/2\n        name: Lamps");

        Assert.Empty(RevisionComparison.Of(Revisions.FromFile(Revisions.Of(before)), Revisions.Of(after)).Subjects);
    }

    private static (string, MovedBy) Told(FindingChange change) => (change.Finding.Key, change.MovedBy);
}
