using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Remedies;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Tests.Changes;

/// <summary>What puts a finding right: how far it goes, what it counts as, and what it does beside.</summary>
public class RemedyTests
{
    private static readonly (string, string) Thin = ("thin", Runs.Thin);
    private static readonly (string, string) Size = ("size", Runs.Size);
    private static readonly (string, string) Length = ("run", Runs.Length);

    [Theory]
    [InlineData("20 m", "2.5 mm²", 3)]
    [InlineData("26 m", "4 mm²", 4)]
    [InlineData("40 m", "4 mm²", 4)]
    [InlineData("45 m", null, 0)]
    public void The_nearest_step_that_does_is_taken_and_none_further_than_the_terms_allow(string length, string? size, int effort)
    {
        var found = Find(Runs.Design(length), Runs.Set([Thin], Size));

        Assert.Equal(size is null ? [] : [(size, effort)], found.Remedies.Select(remedy => (Shown(remedy), remedy.Effort)));
        Assert.Empty(found.Obstacles);
    }

    [Theory]
    [InlineData("26 m", "15 m", 12)]
    [InlineData("17 m", "15 m", 9)]
    [InlineData("16 m", "15 m", 8)]
    [InlineData("30 m", "15 m", 12)]
    [InlineData("31 m", null, 0)]
    public void A_range_goes_as_far_as_it_must_rounded_to_the_safe_side_and_counts_by_tenths(string length, string? shorter, int effort) =>
        Assert.Equal(shorter is null ? [] : [(shorter, effort)], Find(Runs.Design(length), Runs.Set([Thin], Length)).Remedies.Select(remedy => (Shown(remedy), remedy.Effort)));

    [Fact]
    public void A_range_that_may_only_grow_is_rounded_upward()
    {
        var rules = Runs.Set([("long", "compare: { value: length, at-least: 15.2 m }\n")], ("run", Runs.Length.Replace("way: down", "way: up", StringComparison.Ordinal)));

        Assert.Equal("15.5 m", Shown(Assert.Single(Find(Runs.Design("12 m"), rules).Remedies)));
    }

    [Theory]
    [InlineData("100 m", "18 m")]
    [InlineData("17.5 m", null)]
    [InlineData("16 m", null)]
    public void A_range_goes_no_further_than_its_share_and_its_end(string end, string? longer)
    {
        var up = Runs.Length.Replace("way: down", "way: up", StringComparison.Ordinal).Replace("100 m", end, StringComparison.Ordinal);
        var rules = Runs.Set([("long", "compare: { value: length, at-least: 17.6 m }\n")], ("run", up));

        Assert.Equal(longer is null ? [] : [longer], Find(Runs.Design("12 m"), rules).Remedies.Select(Shown));
    }

    [Fact]
    public void A_change_that_leaves_no_margin_is_enough() =>
        Assert.Equal("2.5 mm²", Shown(Assert.Single(Find(Runs.Design("12 m"), Runs.Set([("thick", "compare: { value: csa, at-least: 2.5 mm2 }\n")], Size)).Remedies)));

    [Theory]
    [InlineData("25.5 m", "10.2 m", "2.5 mm²")]
    [InlineData("40.8 m", "10.2 m", "4 mm²")]
    [InlineData("28.75 m", "11.5 m", "2.5 mm²")]
    [InlineData("45.2 m", "11.3 m", "4 mm²")]
    [InlineData("27.25 m", "10.9 m", "2.5 mm²")]
    public void A_change_to_just_the_limit_is_enough_whatever_the_last_bits_say(string length, string limit, string size) =>
        Assert.Equal(size, Shown(Assert.Single(Find(Runs.Design(length), Runs.Set([("thin", Runs.Thin.Replace("10.2 m", limit, StringComparison.Ordinal))], Size)).Remedies)));

    [Fact]
    public void Of_two_ranges_the_first_goes_by_thirds_and_the_second_as_far_as_it_must()
    {
        // 30 m at 10 A are 300 m; half of either leaves 150 m. Two thirds of the way to 5 A are 6.667 A, with which 15.75 m make 105 m.
        var rules = Runs.Set(
            [("load", "of: circuit\ncompare: { value: \"sum_of(legs, length) * load.current / (1 A)\", at-most: 105 m }\n")], Length,
            ("current", "of: circuit\ninput: load.current\nrange: { from: 1 A, to: 100 A }\nremedy: { effort: 4, way: down, share: 50 %, round: 1 mA }\n"));
        var remedy = Assert.Single(Find(Runs.Design("30 m").Replace("9 A", "10 A", StringComparison.Ordinal), rules).Remedies);

        Assert.Equal(["15.5 m", "6.666 A"], remedy.Changes.Select(change => ValueText.Show(change.Value, change.Place.Adjustment.Slot.Unit)).Order(StringComparer.Ordinal));
    }

    [Fact]
    public void A_word_that_is_none_of_the_steps_is_not_changed()
    {
        var rules = Runs.Set(
            [("quick", "of: circuit\nrequire: device.curve == 'B'\n")], ("curve", "of: circuit\ninput: device.curve\nsteps: [B, C]\nremedy: { effort: 2, way: either }\n"));
        static string With(string curve) => Runs.Design("10 m").Replace("load:", $"device: {{ curve: {curve} }}, load:", StringComparison.Ordinal);

        Assert.Equal("B", Shown(Assert.Single(Find(With("C"), rules).Remedies)));
        Assert.Empty(Find(With("D"), rules).Remedies);
        Assert.Equal(0, Find(With("D"), rules).Tried);
    }

    [Theory]
    [InlineData("of: circuit\ncompare: { value: \"sum_of(legs, length / csa * (1 mm2))\", at-most: 10.2 m }\nput-right-by: [cable.csa]\n")]
    [InlineData("of: leg\ncompare: { value: length / csa * (1 mm2), at-most: 10.2 m }\nput-right-by: [csa]\n")]
    public void Of_two_changes_as_great_the_one_that_the_rule_names_comes_first(string rule)
    {
        var thin = ("thin", rule);
        var shorter = ("nearer", "of: leg\ninput: length\nsteps: [10 m, 20 m]\nremedy: { effort: 3, way: down }\n");

        Assert.Equal(["2.5 mm²", "10 m"], Find(Runs.Design("20 m"), Runs.Set([thin], Size, shorter)).Remedies.Select(Shown));
    }

    [Fact]
    public void Two_changes_do_together_what_neither_does_alone_and_never_change_one_input_twice()
    {
        var other = ("size-again", Runs.Size.Replace("effort: 3", "effort: 5", StringComparison.Ordinal));

        // Half of 80 m is the least, and 4 mm² allow 40.8 m.
        var found = Find(Runs.Design("80 m"), Runs.Set([Thin], Length, Size));
        var twice = Find(Runs.Design("45 m"), Runs.Set([Thin], Size, other));

        Assert.Equal(
            ["4 mm²", "40.5 m"],
            Assert.Single(found.Remedies).Changes.Select(change => ValueText.Show(change.Value, change.Place.Adjustment.Slot.Unit)).Order(StringComparer.Ordinal));
        Assert.Equal(3, found.Tried);
        Assert.Empty(twice.Remedies);
        Assert.Equal(2, twice.Tried);
    }

    [Fact]
    public void What_else_a_change_puts_right_and_what_it_costs_is_told_the_greatest_loss_first()
    {
        var rules = Runs.Set(
            [
                Thin, ("also", "compare: { value: csa, at-least: 2 mm2 }\n"), ("a-little", "compare: { value: csa, at-most: 60 mm2 }\n"),
                ("b-much", "compare: { value: csa, at-most: 6 mm2 }\n"),
                ("same", "compare: { value: \"choose(csa > (1 mm2), 5 m, 6 m)\", at-most: 6 m }\n"),
            ],
            Size);

        var remedy = Assert.Single(Find(Runs.Design("20 m"), rules).Remedies);

        Assert.Equal(["also:A/1/leg 1"], remedy.AlsoRight.Select(at => at.Key));
        Assert.Equal(["b-much:A/1/leg 1", "a-little:A/1/leg 1"], remedy.Worsened.Select(move => move.At.Key));
        Assert.Equal([0.167, 0.017], remedy.Worsened.Select(move => Math.Round(move.Loss, 3)));
        Assert.Equal((-0.307, 0.216), (Math.Round(remedy.Before!.Relative!.Value, 3), Math.Round(remedy.After!.Relative!.Value, 3)));
        Assert.Equal(Verdict.Conforms, remedy.Verdict);
        Assert.Equal(5, remedy.Rechecked);
    }

    [Theory]
    [InlineData("requirement", false)]
    [InlineData("recommendation", true)]
    public void A_change_that_leaves_a_requirement_without_judgement_is_none_and_that_is_told(string provision, bool isRemedy)
    {
        var open = ("open", $"provision: {provision}\ncompare: {{ value: \"choose(csa > (2 mm2), neutral_csa, csa)\", at-least: 1 mm2 }}\n");

        var found = Find(Runs.Design("20 m"), Runs.Set([Thin, open], Size));

        Assert.Equal(isRemedy ? ["open:A/1/leg 1"] : [], found.Remedies.SelectMany(remedy => remedy.Open).Select(at => at.Key));
        Assert.Equal(isRemedy ? 1 : 0, found.Remedies.Count);
        Assert.Equal(isRemedy ? [] : ["open:A/1/leg 1"], found.Obstacles.Select(at => at.Key));
    }

    [Fact]
    public void By_guarded_acceptance_a_range_goes_as_far_as_the_worst_case_asks_for()
    {
        // With a metre more the run may be 14.3 m.
        var found = Find(Runs.Design("26 m ± 1 m"), Runs.Set([Thin], Length), Decision.Guarded);

        Assert.Equal("14 m", Shown(Assert.Single(found.Remedies)));
        Assert.Equal(Verdict.Conforms, found.Remedies[0].Verdict);
    }

    [Fact]
    public void What_the_design_has_none_of_is_added_only_there()
    {
        var rules = Runs.Set(
            [("guarded", "of: circuit\nrequire: (rcd.residual_current ?? (1 A)) <= (50 mA)\nput-right-by: [rcd]\n")],
            ("rcd", "of: circuit\ninput: rcd.residual-current\nsteps: [30 mA, 100 mA]\nremedy: { effort: 2, way: up, most: 2, adds: true }\n"));
        var with = Runs.Design("10 m").Replace("load:", "rcd: { residual-current: 100 mA }, load:", StringComparison.Ordinal);
        var typed = Runs.Design("10 m").Replace("load:", "rcd: { type: A }, load:", StringComparison.Ordinal);

        Assert.Equal("30 mA", Shown(Assert.Single(Find(Runs.Design("10 m"), rules).Remedies)));
        Assert.Empty(Find(with, rules).Remedies);
        Assert.Empty(Find(typed, rules).Remedies);
    }

    private static FindingRemedies Find(string design, RuleSet rules, Decision decision = Decision.Simple)
    {
        var audit = Runs.Audit(design, rules, decision);
        var result = RemedySearch.Run(audit, [RemedySearch.Wanting(audit).First(finding => finding.Rule.Id is not "also")]);
        Assert.InRange(result.Judged, result.Findings[0].Remedies.Count, 1_000_000);
        return result.Findings[0];
    }

    private static string Shown(Remedy remedy) => ValueText.Show(Assert.Single(remedy.Changes).Value, remedy.Changes[0].Place.Adjustment.Slot.Unit);
}
