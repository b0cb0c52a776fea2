using Auditor.Engine.RuleTests;

namespace Auditor.Engine.Tests.RuleTests;

/// <summary>Small changes to rules and quantities: which are made, and which a case notices.</summary>
public class MutationRunnerTests
{
    [Fact]
    public void Comparisons_are_turned_limits_shifted_and_conditions_dropped() =>
        Assert.Equal(
            [
                "2 * (1 ohm): `at-most` becomes `at-least`",
                "device.curve == 'B' && load.current > 2 A: the condition is dropped",
                "device.curve == 'B': this part of the condition is dropped",
                "load.current > 2 A: this part of the condition is dropped",
                "==: `==` becomes `!=`",
                ">: `>` becomes `>=`",
                ">: `>` becomes `<=`",
                "2 A: `2 A` is raised by 1 %",
                "2 A: `2 A` is lowered by 1 %",
                "2 * (1 ohm): `2 * (1 ohm)` is raised by 1 %",
                "2 * (1 ohm): `2 * (1 ohm)` is lowered by 1 %",
            ],
            Changes("when: device.curve == 'B' && load.current > 2 A\ncompare: { value: Zt, at-most: 2 * (1 ohm) }\n"));

    [Fact]
    public void A_condition_of_one_part_is_only_dropped_as_a_whole_and_a_limit_of_nil_is_not_shifted() =>
        Assert.Equal(
            [
                "0 ohm: `at-least` becomes `at-most`",
                "load.current >= 0 A: the condition is dropped",
                ">=: `>=` becomes `>`",
                ">=: `>=` becomes `<`",
            ],
            Changes("when: load.current >= 0 A\ncompare: { value: Zt, at-least: 0 ohm }\n"));

    [Fact]
    public void A_temperature_is_shifted_by_a_kelvin_and_both_ends_of_a_range_are_shifted() =>
        Assert.Equal(
            [
                "20 degC: `20 degC` is raised by 1 K",
                "20 degC: `20 degC` is lowered by 1 K",
                "30 degC: `30 degC` is raised by 1 K",
                "30 degC: `30 degC` is lowered by 1 K",
            ],
            Changes("compare: { value: \"max_of(legs, ambient)\", within: { from: 20 degC, to: 30 degC } }\n"));

    [Fact]
    public void What_counts_is_shifted_by_one_and_what_is_a_share_by_a_hundredth()
    {
        Assert.Equal(
            ["<=: `<=` becomes `<`", "<=: `<=` becomes `>`", "3: `3` is raised by 1", "3: `3` is lowered by 1"],
            Changes("require: count_of(legs, length > length) <= 3\n").Where(change => !change.StartsWith('>') && !change.StartsWith("length", StringComparison.Ordinal)));
        Assert.Equal(
            [">=: `>=` becomes `>`", ">=: `>=` becomes `<`", "5 percent: `5 percent` is raised by 1 %", "5 percent: `5 percent` is lowered by 1 %"],
            Changes("require: load.power_factor >= 5 percent\n"));
    }

    [Fact]
    public void A_word_is_no_limit_to_shift() => Assert.Empty(Changes("compare: { value: device.curve, equals: \"'B'\" }\n"));

    [Fact]
    public void Only_what_no_case_notices_is_left()
    {
        var text = MadeRules.Rule(
            "it", "compare: { value: Zt, at-most: 1 ohm }\n",
            "{ name: within, given: { Zt: 0.5 ohm }, verdict: conforms }", "{ name: just over, given: { Zt: 1.001 ohm }, verdict: nonconforming }");
        var rules = MadeRules.Set([MadeRules.Loop()], ("it", text));

        var report = new MutationRunner(rules).Run(rules.Rule("it")!);

        Assert.Equal(3, report.Count);
        var left = Assert.Single(report.Survivors);
        Assert.Equal("no case of it notices when `1 ohm` is lowered by 1 %", left.Unnoticed().Message);
    }

    [Fact]
    public void Comparisons_in_quantities_are_turned_with_their_own_cases()
    {
        var large = MadeRules.Quantity("large", "circuit", "gives: flag", "load.current > 5 A", "{ name: more, given: { load.current: 6 A }, expect: true }");
        var text = MadeRules.Rule(
            "it", "require: large\n", "{ name: it, given: { large: true }, verdict: conforms }", "{ name: not, given: { large: false }, verdict: nonconforming }");
        var rules = MadeRules.Set([large], ("it", text));

        var report = new MutationRunner(rules).Run();

        Assert.Equal(
            ["made: circuit large `>` becomes `>=`"],
            report.Survivors.Where(change => !change.Owner.StartsWith("record-", StringComparison.Ordinal)).Select(change => $"{change.Owner} {change.Change}"));
    }

    /// <summary>All changes made to a rule of circuits: without a case nothing notices any.</summary>
    private static IEnumerable<string> Changes(string body)
    {
        var rules = MadeRules.Set([MadeRules.Loop()], ("it", MadeRules.Rule("it", body, "{ name: one, verdict: undetermined }")));
        var rule = rules.Rule("it")!;
        var report = new MutationRunner(rules).Run(rule with { Node = MadeRules.WithoutCases(rule.Node) });

        Assert.Equal(report.Survivors.Count, report.Count);
        return report.Survivors.Select(change => $"{change.Span.Text}: {change.Change}");
    }
}
