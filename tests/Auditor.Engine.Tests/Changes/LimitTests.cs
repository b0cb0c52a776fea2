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
