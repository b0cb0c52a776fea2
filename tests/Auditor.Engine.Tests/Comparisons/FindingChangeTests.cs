using Auditor.Engine.Comparisons;
using Auditor.Engine.Findings;

namespace Auditor.Engine.Tests.Comparisons;

public class FindingChangeTests
{
    private const string RemoveRcd = "serves: [socket-outlets]";

    [Fact]
    public void A_design_compared_with_itself_has_only_unchanged_nonconformities()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design);

        Assert.Equal(["rcd:A/2", "spare:A"], comparison.Findings.Select(change => change.Finding.Key));
        Assert.All(comparison.Findings, change => Assert.Equal(FindingChangeKind.Unchanged, change.Kind));
        Assert.Empty(comparison.Inputs);
        Assert.Empty(comparison.Subjects);
        Assert.True(comparison.RuleSet.IsSame);
        Assert.Equal(0, comparison.CountNewOrWorse);
    }

    [Fact]
    public void A_longer_cable_brings_a_new_nonconformity_that_rests_on_its_length()
    {
        // 2.24 V + 4.32 V are 2.85 % of 230 V; with 100 m of 1.5 mm² they are 2.24 V + 14.4 V, or 7.23 %.
        var comparison = Revisions.Compare(Yard.Design, Yard.Design.With("csa: 1.5 mm², length: 30 m", "csa: 1.5 mm², length: 100 m"));

        var change = Assert.Single(comparison.Findings, change => change.Kind == FindingChangeKind.New);
        Assert.Equal("drop:B/2", change.Finding.Key);
        Assert.Equal("2.852 %", change.Before!.Value!.Text);
        Assert.Equal("7.235 %", change.After!.Value!.Text);
        Assert.Equal(MovedBy.Design, change.MovedBy);
        var input = Assert.IsType<InputChange>(Assert.Single(change.Causes));
        Assert.Equal(("B/2/leg 1", "length", "30 m", "100 m"), (input.SubjectAfter, input.Path, input.Before!.Text, input.After!.Text));
        Assert.Equal((33, 40), (input.Before.Place!.Line, input.Before.Place.Column));
        Assert.True(change.IsNewOrWorse);
    }

    [Fact]
    public void What_another_circuit_takes_moves_the_margin_behind_the_common_feeder()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design.With("load: { current: 8 A }", "load: { current: 9 A }"));

        Assert.Equal(
            ["drop:A/1", "drop:B/1", "drop:B/2", "rating:A/1", "rating:B/1"],
            comparison.Of(FindingChangeKind.Closer).Select(change => change.Finding.Key).Order(StringComparer.Ordinal));
        Assert.All(comparison.Of(FindingChangeKind.Closer), change =>
            Assert.Equal("B/1 load.current", change.Causes.OfType<InputChange>().Select(input => $"{input.SubjectAfter} {input.Path}").Single()));
    }

    [Fact]
    public void Changed_inputs_that_a_finding_does_not_read_are_not_its_causes()
    {
        var after = Yard.Design.With("length: 20 m", "length: 25 m").With("length: 30 m", "length: 35 m");

        var comparison = Revisions.Compare(Yard.Design, after);

        Assert.Equal(2, comparison.Inputs.Count);
        var saw = comparison.Findings.Single(change => change.Finding.Key == "drop:B/1");
        Assert.Equal(["B/1/leg 1"], saw.Causes.OfType<InputChange>().Select(input => input.SubjectAfter));
    }

    [Theory]
    [InlineData("spare-ways: 1", "spare-ways: 0", FindingChangeKind.Worse)]
    [InlineData("spare-ways: 1", "spare-ways: 2", FindingChangeKind.Gone)]
    public void A_nonconformity_that_moves_is_worse_or_gone(string before, string after, FindingChangeKind kind)
    {
        var change = Assert.Single(Revisions.Compare(Yard.Design, Yard.Design.With(before, after)).Findings, change => change.Finding.Key == "spare:A");

        Assert.Equal(kind, change.Kind);
        Assert.Equal(kind == FindingChangeKind.Worse, change.IsNewOrWorse);
    }

    [Fact]
    public void A_nonconformity_that_shrinks_is_better()
    {
        var change = Assert.Single(Revisions.Compare(Yard.Design.With("spare-ways: 1", "spare-ways: 0"), Yard.Design).Findings, change => change.Finding.Key == "spare:A");

        Assert.Equal(FindingChangeKind.Better, change.Kind);
        Assert.Equal(("-100.0 %", "-50.0 %"), (change.Before!.MarginText, change.After!.MarginText));
        Assert.False(change.IsNewOrWorse);
    }

    [Fact]
    public void A_nonconformity_hidden_behind_a_missing_input_is_undetermined_and_not_gone()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design.With("    spare-ways: 1\n", ""));

        var change = Assert.Single(comparison.Findings, change => change.Finding.Key == "spare:A");
        Assert.Equal(FindingChangeKind.Undetermined, change.Kind);
        Assert.Equal(Verdict.Nonconforming, change.Before!.Verdict);
        Assert.True(change.IsNewOrWorse);
        Assert.Equal("spare-ways", Assert.IsType<InputChange>(Assert.Single(change.Causes)).Path);
        Assert.Null(Assert.Single(comparison.Inputs).After);
    }

    [Fact]
    public void An_input_given_at_last_settles_what_was_undetermined()
    {
        var change = Assert.Single(
            Revisions.Compare(Yard.Design.With("    spare-ways: 4\n", ""), Yard.Design).Findings, change => change.Finding.Key == "spare:B");

        Assert.Equal(FindingChangeKind.Settled, change.Kind);
    }

    [Fact]
    public void A_rule_that_no_longer_applies_takes_its_nonconformity_away_by_the_input_of_its_condition()
    {
        var change = Assert.Single(
            Revisions.Compare(Yard.Design, Yard.Design.With(RemoveRcd, "serves: [lighting]")).Findings, change => change.Finding.Key == "rcd:A/2");

        Assert.Equal(FindingChangeKind.Gone, change.Kind);
        Assert.Null(change.After);
        Assert.Equal("serves", Assert.IsType<InputChange>(Assert.Single(change.Causes)).Path);
    }

    [Fact]
    public void A_requirement_that_was_kept_and_applies_no_longer_is_told()
    {
        var withRcd = Yard.Design.With(RemoveRcd, RemoveRcd + "\n        rcd: { type: A, residual-current: 30 mA }");

        var change = Assert.Single(Revisions.Compare(withRcd, withRcd.With(RemoveRcd, "serves: [lighting]")).Findings, change => change.Finding.Key == "rcd:A/2");

        Assert.Equal(FindingChangeKind.Ceased, change.Kind);
    }

    [Fact]
    public void A_group_of_inputs_that_came_is_the_cause_where_only_its_presence_is_asked()
    {
        var withRcd = Yard.Design.With(RemoveRcd, RemoveRcd + "\n        rcd: { type: A, residual-current: 30 mA }");

        var change = Assert.Single(Revisions.Compare(Yard.Design, withRcd).Findings, change => change.Finding.Key == "rcd:A/2");

        Assert.Equal(FindingChangeKind.Gone, change.Kind);
        Assert.Equal(["rcd.residual-current", "rcd.type"], change.Causes.OfType<InputChange>().Select(input => input.Path));
    }

    [Fact]
    public void A_type_that_changes_is_told_of_every_leg_that_uses_it_at_the_one_place()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design.With("small: { csa: 2.5 mm² }", "small: { csa: 4 mm² }"));

        Assert.Equal(["A/2/leg 1", "B/1/leg 1"], comparison.Inputs.Select(input => input.SubjectAfter));
        Assert.Single(comparison.Inputs.Select(input => input.After!.Place).Distinct());
    }

    [Fact]
    public void An_assumption_that_a_verdict_comes_to_hang_on_is_a_change_of_its_own()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design.With("length: 30 m", "length: \"30 m, assumed\""));

        var change = Assert.Single(comparison.Of(FindingChangeKind.Changed));
        Assert.Equal("drop:B/2", change.Finding.Key);
        Assert.Equal("conforms, on assumption", change.After!.VerdictText);
        Assert.True(change.IsNewOrWorse);
        Assert.Equal("length", Assert.Single(comparison.Inputs).Path);
    }

    [Fact]
    public void Findings_stand_worst_first_and_requirements_before_recommendations()
    {
        var after = Yard.Design.With("spare-ways: 1", "spare-ways: 0").With("spare-ways: 4", "spare-ways: 1").With("length: 30 m", "length: 100 m").With("rating: 40 A", "rating: 32 A");

        var comparison = Revisions.Compare(Yard.Design, after);

        Assert.Equal(
            ["New drop:B/2", "New spare:B", "Worse spare:A", "Closer rating:A/1", "Unchanged rcd:A/2"],
            comparison.Findings.Select(change => $"{change.Kind} {change.Finding.Key}"));
    }
}
