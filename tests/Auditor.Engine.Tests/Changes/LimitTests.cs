using Auditor.Engine.Adjustments;
using Auditor.Engine.Limits;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Tests.Changes;

/// <summary>How far inputs may go, where that can be worked out by hand.</summary>
public class LimitTests
{
    [Theory]
    [InlineData("compare: { value: length / csa * (1 mm2), at-most: 10.2 m }\n", 15.3)]
    [InlineData("compare: { value: length, at-most: 90 m }\n", 90)]
    [InlineData("compare: { value: length, at-most: 99.9 m }\n", 99.9)]
    [InlineData("compare: { value: length, at-most: 0.6 m }\n", 0.6)]
    [InlineData("require: length <= 40 m\n", 40)]
    [InlineData("require: length <= 99.9 m\n", 99.9)]
    [InlineData("require: key == 'A/1/leg 1' && length <= 40 m\n", 40)]
    public void A_limit_is_found_to_the_last_digits_wherever_in_the_range_it_lies(string rule, double metres)
    {
        var around = Of("12 m", rule).Around!;

        Assert.Null(around.Least);
        Assert.Equal(metres, around.Most!.Edge.Value.Number, 1e-6);
        Assert.InRange(around.Most.Edge.Beyond.Number, around.Most.Edge.Value.Number, metres * 1.001);
        Assert.Equal("it:A/1/leg 1", around.Most.Rule.At.Key);
    }

    [Theory]
    [InlineData("7 m", 5.0, null)]
    [InlineData("3 m", 5.0, null)]
    [InlineData("20 m", 5.0, null)]
    [InlineData("24 m", 5.0, null)]
    [InlineData("40 m", null, 50.0)]
    [InlineData("60 m", null, 50.0)]
    public void Of_two_stretches_the_one_with_the_stated_value_is_told_or_the_nearest(string length, double? most, double? least)
    {
        var limit = Of(length, "require: length <= 5 m || length >= 50 m\n");

        Assert.Equal(LimitKind.NotMonotone, Assert.Single(limit.Rules).Kind);
        Assert.Equal(2, limit.Required.Count);
        Assert.Equal(most, Rounded(limit.Around!.Most));
        Assert.Equal(least, Rounded(limit.Around.Least));
    }

    [Theory]
    [InlineData("require: length <= 40 m || length >= 60 m\n", 40.0, 60.0)]
    [InlineData("compare: { value: abs(length - (1.25 m)), at-least: 0.2 m }\n", 1.05, 1.45)]
    [InlineData("compare: { value: abs(length - (37 m)), at-least: 0.5 m }\n", 36.5, 37.5)]
    [InlineData("when: length <= 33.4 m\ncompare: { value: length, at-most: 33.3 m }\n", 33.3, 33.4)]
    public void A_gap_between_the_values_tried_first_is_found(string rule, double most, double least)
    {
        var kept = Assert.Single(Of("12 m", rule).Rules).Kept;

        Assert.Equal([most, least], new[] { kept[0].Most!.Value.Number, kept[1].Least!.Value.Number }.Select(number => Math.Round(number, 4)));
        Assert.Equal(2, kept.Count);
    }

    [Theory]
    [InlineData("compare: { value: abs(length - (37 m)), at-most: 0.5 m }\n", 36.5, 37.5)]
    [InlineData("require: length >= 11.9 m && length <= 12.1 m\n", 11.9, 12.1)]
    public void A_stretch_between_the_values_tried_first_is_found(string rule, double least, double most)
    {
        var kept = Assert.Single(Assert.Single(Of("12 m", rule).Rules).Kept);

        Assert.Equal([least, most], new[] { kept.Least!.Value.Number, kept.Most!.Value.Number }.Select(number => Math.Round(number, 4)));
    }

    [Fact]
    public void A_rule_that_would_bite_only_beyond_the_range_sets_no_limit() =>
        Assert.Equal(LimitKind.NoLimit, Assert.Single(Of("12 m", "compare: { value: length, at-most: 101 m }\n").Rules).Kind);

    [Fact]
    public void Of_two_rules_with_one_limit_the_first_governs()
    {
        var limit = Of("12 m", ("b", "compare: { value: length, within: { from: 2 m, to: 60 m } }\n"), ("a", "compare: { value: length, within: { from: 2 m, to: 60 m } }\n"));

        Assert.Equal(("a", "a"), (limit.Around!.Least!.Rule.At.Rule.Id, limit.Around.Most!.Rule.At.Rule.Id));
    }

    [Fact]
    public void Of_two_rules_the_stricter_governs_and_a_recommendation_bounds_only_what_is_advised()
    {
        var limit = Of("12 m", ("loose", "compare: { value: length, at-most: 80 m }\n"), ("strict", "compare: { value: length, at-most: 60 m }\n"),
            ("least", "compare: { value: length, at-least: 2 m }\n"), ("advice", "provision: recommendation\ncompare: { value: length, at-most: 30 m }\n"));

        Assert.Equal((2.0, 60.0), (Rounded(limit.Around!.Least), Rounded(limit.Around.Most)));
        Assert.Equal(("least", "strict"), (limit.Around.Least!.Rule.At.Rule.Id, limit.Around.Most!.Rule.At.Rule.Id));
        Assert.Equal((2.0, 30.0), (Rounded(limit.Advised!.Least), Rounded(limit.Advised.Most)));
    }

    [Fact]
    public void Rules_that_leave_nothing_in_common_leave_no_stretch()
    {
        var limit = Of("12 m", ("more", "compare: { value: length, at-least: 50 m }\n"), ("less", "compare: { value: length, at-most: 20 m }\n"));

        Assert.Empty(limit.Required);
        Assert.Null(limit.Around);
    }

    [Fact]
    public void A_temperature_may_go_through_zero()
    {
        var rules = Runs.Set(
            [("warm", "of: installation\ncompare: { value: basis.ambient, within: { from: -12.5 degC, to: 31.5 degC } }\n")],
            ("ambient", "of: installation\ninput: basis.ambient\nrange: { from: -20 °C, to: 90 °C }\n"));
        var limit = Search(Runs.Design("12 m", more: "basis: { ambient: 20 °C }\n"), rules);

        Assert.Equal((-12.5, 31.5), (Rounded(limit.Around!.Least), Rounded(limit.Around.Most)));
    }

    [Fact]
    public void A_gap_in_the_allowed_temperatures_is_found()
    {
        var rules = Runs.Set(
            [("gap", "of: installation\nrequire: basis.ambient <= 40 degC || basis.ambient >= 46 degC\n")],
            ("ambient", "of: installation\ninput: basis.ambient\nrange: { from: -20 °C, to: 90 °C }\n"));
        var limit = Search(Runs.Design("12 m", more: "basis: { ambient: 20 °C }\n"), rules);

        Assert.Equal((40.0, 46.0), (Rounded(limit.Required[0].Most), Rounded(limit.Required[1].Least)));
    }

    [Fact]
    public void Of_steps_the_last_that_keeps_the_rule_is_told_with_the_next()
    {
        var rules = Runs.Set([("thin", Runs.Thin)], ("size", Runs.Size));
        var least = Search(Runs.Design("20 m", "6 mm²"), rules).Around!.Least!.Edge;

        Assert.Equal((2.5e-6, 1.5e-6), (Math.Round(least.Value.Number, 9), Math.Round(least.Beyond.Number, 9)));
    }

    [Fact]
    public void A_reading_of_which_nothing_is_expected_says_so()
    {
        var rules = Runs.Set(
            [("read", "of: circuit\ncompare: { value: readings.zs, at-most: 1 ohm }\n")], ("zs", "of: circuit\ninput: readings.zs\nrange: { from: 1 mohm, to: 10 ohm }\nreading: true\n"));
        var limit = Search(Runs.Design("12 m"), rules);

        Assert.Equal(1.0, Rounded(limit.Around!.Most));
        Assert.Contains("nothing is said of what to expect", Assert.Single(limit.Expected.Absences.Items).ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void A_rule_that_an_input_cannot_help_bounds_nothing()
    {
        var limit = Of(
            "12 m", ("never", "compare: { value: length, at-most: 0.1 m }\n"), ("always", "compare: { value: length, at-most: 1 km }\n"),
            ("unknown", "compare: { value: neutral_csa * length / length, at-most: 1 mm2 }\n"));

        Assert.Equal(
            ["always NoLimit", "never AlwaysFails", "unknown Undetermined"], limit.Rules.Select(rule => $"{rule.At.Rule.Id} {rule.Kind}"));
        Assert.Equal(new AllowedRange(null, null), limit.Around);
    }

    private static InputLimit Of(string length, string rule) => Of(length, ("it", rule));

    private static InputLimit Of(string length, params (string Id, string Text)[] rules) => Search(Runs.Design(length), Runs.Set(rules, ("run", Runs.Length)));

    private static InputLimit Search(string text, RuleSet rules)
    {
        var design = Runs.Build(text, rules);
        var result = LimitSearch.Run(design, Adjustables.WithLimits(design));
        Assert.InRange(result.Judged, 1, long.MaxValue);
        return Assert.Single(result.Inputs);
    }

    private static double? Rounded(LimitBound? bound) => bound is null ? null : Math.Round(bound.Edge.Value.Number, 6);
}
