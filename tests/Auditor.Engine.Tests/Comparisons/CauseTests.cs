using System.Text;
using Auditor.Engine.Comparisons;

namespace Auditor.Engine.Tests.Comparisons;

/// <summary>What moved a finding, and which of many changes it rests on.</summary>
public class CauseTests
{
    private const string Sockets = "serves: [socket-outlets]";

    [Fact]
    public void A_rule_that_begins_to_apply_does_so_by_the_input_of_its_condition()
    {
        var change = Of(Revisions.Compare(Yard.Design.With(Sockets, "serves: [lighting]"), Yard.Design), "rcd:A/2");

        Assert.Equal((FindingChangeKind.New, MovedBy.Design), (change.Kind, change.MovedBy));
        Assert.Equal("serves", Assert.IsType<InputChange>(Assert.Single(change.Causes)).Path);
    }

    [Fact]
    public void A_condition_that_a_rule_is_given_takes_its_finding_away_by_the_rule_set()
    {
        var change = Of(Revisions.Compare(Yard.Design, Yard.Design, ("provisions/spare.yaml", "of: board\n", "of: board\nwhen: spare_ways > 5\n")), "spare:A");

        Assert.Equal((FindingChangeKind.Gone, MovedBy.RuleSet), (change.Kind, change.MovedBy));
        Assert.Equal("spare", Assert.IsType<RuleChange>(Assert.Single(change.Causes)).Name);
    }

    [Fact]
    public void A_word_that_a_rule_allows_in_addition_takes_its_finding_away_by_the_rule_set()
    {
        static (string, string, string)[] Allowing(string words) =>
            [
                ("provisions/spare.yaml", "compare: { value: spare_ways, at-least: param.spare_limit }", $"compare: {{ value: id, one-of: [{words}] }}"),
                ("provisions/spare.yaml", "given: { spare_ways: 3, param.spare_limit: 2 }", "given: { id: B }"),
            ];
        var (before, after) = (Revisions.Rules(Allowing("\"'B'\"")), Revisions.Rules(Allowing("\"'B'\", \"'A'\"")));

        var change = Of(RevisionComparison.Of(Revisions.Of(Yard.Design, before), Revisions.Of(Yard.Design, after)), "spare:A");

        Assert.Equal((FindingChangeKind.Gone, MovedBy.RuleSet), (change.Kind, change.MovedBy));
    }

    [Fact]
    public void What_only_the_earlier_formula_read_is_a_cause_as_well()
    {
        var rules = Revisions.Rules(
            ("provisions/spare.yaml", "value: spare_ways, at-least", "value: \"choose(name == 'Gatehouse', spare_ways, 5)\", at-least"),
            ("provisions/spare.yaml", "given: { spare_ways: 3,", "given: { name: Gatehouse, spare_ways: 3,"));
        var after = Yard.Design.With("name: Gatehouse\n    spare-ways: 1", "name: Lodge\n    spare-ways: 3");

        var change = Of(RevisionComparison.Of(Revisions.Of(Yard.Design, rules), Revisions.Of(after, rules)), "spare:A");

        Assert.Equal(["name", "spare-ways"], change.Causes.OfType<InputChange>().Select(input => input.Path));
    }

    [Fact]
    public void A_condition_that_a_rule_loses_lets_it_find_by_the_rule_set()
    {
        var before = Revisions.Of(Yard.Design, Revisions.Rules(("provisions/spare.yaml", "of: board\n", "of: board\nwhen: spare_ways > 5\n")));

        var change = Of(RevisionComparison.Of(before, Revisions.Of(Yard.Design)), "spare:A");

        Assert.Equal((FindingChangeKind.New, MovedBy.RuleSet), (change.Kind, change.MovedBy));
    }

    [Fact]
    public void Of_more_changes_than_a_word_has_bits_each_finding_rests_on_its_own()
    {
        var (before, after) = (Many(10), Many(11));

        var comparison = Revisions.Compare(before, after);

        Assert.Equal(70, comparison.Inputs.Count);
        foreach (var circuit in new[] { 3, 64, 65, 66, 72 })
        {
            var cause = Assert.IsType<InputChange>(Assert.Single(Of(comparison, $"drop:A/{circuit}").Causes));
            Assert.Equal($"A/{circuit}/leg 1", cause.SubjectAfter);
        }
    }

    [Fact]
    public void What_is_found_of_a_leg_that_came_with_its_circuit_rests_on_the_circuit()
    {
        var rules = Revisions.Rules(
            ("provisions/rating.yaml", "of: circuit\ncompare: { value: device.rating, at-least: Ib }", "of: leg\ncompare: { value: csa, at-least: 4 mm2 }"),
            ("provisions/rating.yaml", "given: { device.rating: 16 A, Ib: 10 A }", "given: { csa: 10 mm² }"));
        var after = Yard.Design + "      - id: 3\n        name: Heater\n        device: { rating: 6 A }\n        cable: { csa: 1.5 mm², length: 5 m }\n        load: { current: 1 A }\n";
        var (few, more) = (Revisions.Of(Yard.Design, rules), Revisions.Of(after, rules));

        var came = Of(RevisionComparison.Of(few, more), "rating:B/3/leg 1");
        var went = Of(RevisionComparison.Of(more, few), "rating:B/3/leg 1");

        Assert.Equal((FindingChangeKind.New, "B/3", true), (came.Kind, Subject(came).Subject.Key, Subject(came).IsAdded));
        Assert.Equal((FindingChangeKind.Gone, "B/3", true), (went.Kind, Subject(went).Subject.Key, Subject(went).IsRemoved));
    }

    [Fact]
    public void A_departure_that_came_with_another_figure_is_not_the_only_thing_that_moved()
    {
        var departed = Yard.Design.With("spare-ways: 1", "spare-ways: 0")
            + "departures: [{ rule: spare, subject: A, reason: The yard will not grow., agreed-by: T. Example, date: 2026-10-01 }]\n";

        var change = Of(Revisions.Compare(Yard.Design, departed), "spare:A");

        Assert.Equal(MovedBy.Design | MovedBy.Departure, change.MovedBy);
        Assert.Equal("spare-ways", Assert.IsType<InputChange>(Assert.Single(change.Causes)).Path);
    }

    [Fact]
    public void A_value_that_is_another_and_as_wrong_as_before_is_a_change()
    {
        var rules = Revisions.Rules(
            ("provisions/spare.yaml", "compare: { value: spare_ways, at-least: param.spare_limit }", "compare: { value: id, equals: \"'X'\" }"),
            ("provisions/spare.yaml", "given: { spare_ways: 3, param.spare_limit: 2 }", "given: { id: X }"));

        var comparison = RevisionComparison.Of(Revisions.Of(Yard.Design, rules), Revisions.Of(Yard.Design.With("- id: A", "- id: GH"), rules));

        var change = Of(comparison, "spare:GH");
        Assert.Equal((FindingChangeKind.Changed, "A", "GH"), (change.Kind, change.Before!.Value!.Text, change.After!.Value!.Text));
        Assert.True(Assert.IsType<SubjectChange>(Assert.Single(change.Causes)).IsRenamed);
    }

    [Fact]
    public void An_input_whose_name_begins_like_that_of_another_is_no_cause_of_what_reads_the_other()
    {
        const string Supply = "supply: { earthing: TN-S, phases: 1, voltage: 230 V }";
        var rules = Revisions.Rules(
            ("provisions/rating.yaml", "of: circuit\ncompare: { value: device.rating, at-least: Ib }", "of: installation\ncompare: { value: supply.fault_current, at-most: 6 kA }"),
            ("provisions/rating.yaml", "given: { device.rating: 16 A, Ib: 10 A }", "given: { supply.fault_current: 6 kA }"));
        var before = Yard.Design.With(Supply, Supply.With("230 V", "230 V, fault-current: 1 kA, fault-current-by: enquiry"));
        var after = Yard.Design.With(Supply, Supply.With("230 V", "230 V, fault-current: 2 kA, fault-current-by: measurement"));

        var comparison = RevisionComparison.Of(Revisions.Of(before, rules), Revisions.Of(after, rules));

        Assert.Equal(["supply.fault-current", "supply.fault-current-by"], comparison.Inputs.Select(input => input.Path));
        Assert.Equal("supply.fault-current", Assert.IsType<InputChange>(Assert.Single(Of(comparison, "rating:-").Causes)).Path);
    }

    [Fact]
    public void A_departure_that_no_rule_allows_is_found_by_the_departure()
    {
        var departed = Yard.Design + "departures: [{ rule: rcd, subject: A/2, reason: None., agreed-by: T. Example, date: 2026-10-01 }]\n";

        var change = Assert.Single(Revisions.Compare(Yard.Design, departed).Findings, change => change.Finding.Rule == "record-departure-permitted");

        Assert.Equal((FindingChangeKind.New, MovedBy.Departure), (change.Kind, change.MovedBy));
    }

    private static FindingChange Of(RevisionComparison comparison, string key) => comparison.Findings.Single(change => change.Finding.Key == key);

    private static SubjectChange Subject(FindingChange change) => Assert.IsType<SubjectChange>(Assert.Single(change.Causes));

    /// <summary>The yard with seventy more circuits at the gatehouse, each with a cable of so many metres.</summary>
    private static string Many(int metres)
    {
        var text = new StringBuilder();
        for (var id = 3; id <= 72; id++)
        {
            text.Append($"      - id: {id}\n        name: Row {id}\n")
                .Append($"        device: {{ rating: 6 A }}\n        cable: {{ csa: 1.5 mm², length: {metres} m }}\n        load: {{ current: 0.1 A }}\n");
        }

        return Yard.Design.With("  - id: B\n    name: Workshop", text + "  - id: B\n    name: Workshop");
    }
}
