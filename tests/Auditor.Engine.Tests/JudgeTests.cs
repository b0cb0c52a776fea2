using Auditor.Engine.Findings;

namespace Auditor.Engine.Tests;

/// <summary>Every comparison that a rule may make, judged on one circuit.</summary>
public class JudgeTests
{
    [Theory]
    [InlineData("at-most: device.rating", "32 A", "31 A", "conforms", 1.0, 0.03125)]
    [InlineData("at-most: device.rating", "32 A", "32 A", "conforms", 0.0, 0.0)]
    [InlineData("at-most: device.rating", "32 A", "33 A", "nonconforming", -1.0, -0.03125)]
    [InlineData("at-least: device.rating", "32 A", "31 A", "nonconforming", -1.0, -0.03125)]
    [InlineData("at-least: device.rating", "32 A", "32 A", "conforms", 0.0, 0.0)]
    [InlineData("at-least: device.rating", "32 A", "40 A", "conforms", 8.0, 0.25)]
    [InlineData("at-most: 0 A", "32 A", "5 A", "nonconforming", -5.0, null)]
    [InlineData("at-least: 0 A", "32 A", "5 A", "conforms", 5.0, null)]
    [InlineData("at-least: -10 A", "32 A", "5 A", "conforms", 15.0, 1.5)]
    [InlineData("within: { from: 10 A, to: device.rating }", "32 A", "10 A", "conforms", 0.0, 0.0)]
    [InlineData("within: { from: 10 A, to: device.rating }", "32 A", "12 A", "conforms", 2.0, 0.2)]
    [InlineData("within: { from: 10 A, to: device.rating }", "32 A", "28 A", "conforms", 4.0, 0.125)]
    [InlineData("within: { from: 10 A, to: device.rating }", "32 A", "9 A", "nonconforming", -1.0, -0.1)]
    [InlineData("within: { from: 10 A, to: device.rating }", "32 A", "36 A", "nonconforming", -4.0, -0.125)]
    [InlineData("equals: device.rating", "32 A", "32 A", "conforms", null, null)]
    [InlineData("equals: device.rating", "32 A", "33 A", "nonconforming", null, null)]
    [InlineData("one-of: [6 A, device.rating, 10 A]", "32 A", "10 A", "conforms", null, null)]
    [InlineData("one-of: [6 A, device.rating, 10 A]", "32 A", "32 A", "conforms", null, null)]
    [InlineData("one-of: [6 A, device.rating, 10 A]", "32 A", "16 A", "nonconforming", null, null)]
    public void A_value_is_held_against_its_limit(string compare, string rating, string current, string verdict, double? absolute, double? relative)
    {
        var finding = Judged($"compare: {{ value: load.current, {compare} }}", $"device: {{ rating: {rating} }}, load: {{ current: {current} }}")!;

        Assert.Equal(verdict, finding.VerdictText);
        Near(absolute, finding.Judgement.Margin?.Absolute);
        Near(relative, finding.Judgement.Margin?.Relative);
    }

    [Theory]
    [InlineData("32.00000003 A", "conforms")]
    [InlineData("32.00000004 A", "nonconforming")]
    public void The_slack_is_one_in_a_thousand_million(string current, string verdict) =>
        Assert.Equal(verdict, Judged("compare: { value: load.current, at-most: device.rating }", $"device: {{ rating: 32 A }}, load: {{ current: {current} }}")!.VerdictText);

    [Theory]
    [InlineData("at-most: device.rating", "32.00000003 A", 0.0)]
    [InlineData("at-least: device.rating", "31.99999997 A", 0.0)]
    [InlineData("at-most: device.rating", "32.00000004 A", -1.25e-9)]
    public void A_value_at_its_limit_within_the_slack_has_no_margin(string compare, string current, double relative) => Assert.Equal(
        relative, Judged($"compare: {{ value: load.current, {compare} }}", $"device: {{ rating: 32 A }}, load: {{ current: {current} }}")!.Judgement.Margin!.Relative!.Value, 1e-15);

    [Theory]
    [InlineData("compare: { value: arrangement, equals: \"'ring'\" }", "arrangement: ring", "conforms")]
    [InlineData("compare: { value: arrangement, equals: \"'ring'\" }", "arrangement: radial", "nonconforming")]
    [InlineData("compare: { value: arrangement, equals: \"'ring'\" }", "name: x", "undetermined")]
    [InlineData("compare: { value: arrangement, one-of: [\"'ring'\", \"'radial'\"] }", "arrangement: radial", "conforms")]
    [InlineData("compare: { value: supplementary_bonding, equals: true }", "supplementary-bonding: true", "conforms")]
    [InlineData("compare: { value: supplementary_bonding, equals: true }", "supplementary-bonding: false", "nonconforming")]
    [InlineData("require: supplementary_bonding", "supplementary-bonding: true", "conforms")]
    [InlineData("require: supplementary_bonding", "supplementary-bonding: false", "nonconforming")]
    [InlineData("require: supplementary_bonding", "name: x", "undetermined")]
    [InlineData("require: supplementary_bonding || given(load)", "load: { current: 1 A }", "conforms")]
    public void Words_and_flags_are_judged(string check, string circuit, string verdict)
    {
        var finding = Judged(check, circuit)!;

        Assert.Equal(verdict, finding.VerdictText);
        Assert.Null(finding.Judgement.Margin);
        Assert.Null(finding.MarginShown);
    }

    [Theory]
    [InlineData("device.rating > 10 A", "device: { rating: 32 A }, load: { current: 5 A }", "conforms")]
    [InlineData("device.rating > 10 A", "device: { rating: 6 A }, load: { current: 5 A }", null)]
    [InlineData("device.rating > 10 A", "load: { current: 5 A }", "undetermined")]
    [InlineData("device.rating > 10 A && arrangement == 'ring'", "arrangement: radial, load: { current: 5 A }", null)]
    [InlineData("device.rating > 10 A || arrangement == 'ring'", "arrangement: ring, load: { current: 5 A }", "conforms")]
    [InlineData("device.rating > 10 A || arrangement == 'ring'", "arrangement: radial, load: { current: 5 A }", "undetermined")]
    public void A_rule_applies_by_its_condition_and_is_undetermined_where_that_is_missing(string when, string circuit, string? verdict) =>
        Assert.Equal(verdict, Judged($"when: {when}\ncompare: {{ value: load.current, at-most: 10 A }}", circuit)?.VerdictText);

    [Theory]
    [InlineData("load: { current: 5 A }", "A/1: `device.rating` is not given")]
    [InlineData("device: { rating: 6 A }", "A/1: `load.current` is not given")]
    [InlineData("name: x", "A/1: `load.current` is not given|A/1: `device.rating` is not given")]
    public void An_undetermined_finding_tells_all_that_is_missing(string circuit, string absences)
    {
        var finding = Judged("compare: { value: load.current, at-most: device.rating }", circuit)!;

        Assert.Equal(Verdict.Undetermined, finding.Verdict);
        Assert.Equal(absences, string.Join('|', finding.Judgement.Absences!.Items));
    }

    [Theory]
    [InlineData("at-most: device.rating", "5 A", "at most 6 A", "1 A", "5 A against 6 A.")]
    [InlineData("at-least: device.rating", "5 A", "at least 6 A", "-1 A", "5 A against 6 A.")]
    [InlineData("within: { from: 4 A, to: device.rating }", "5 A", "from 4 A to 6 A", "1 A", "5 A against 4 A to 6 A.")]
    [InlineData("equals: device.rating", "5 A", "exactly 6 A", null, "5 A against 6 A.")]
    [InlineData("one-of: [4 A, device.rating]", "5 A", "one of 4 A, 6 A", null, "5 A against 4 A, 6 A.")]
    public void A_finding_shows_value_limit_margin_and_sentence(string compare, string value, string limit, string? margin, string message)
    {
        var finding = Judged($"compare: {{ value: load.current, {compare} }}", "device: { rating: 6 A }, load: { current: 5 A }")!;

        Assert.Equal((value, limit, margin, message), (finding.ValueShown, finding.LimitShown, finding.MarginShown, finding.Message));
    }

    [Fact]
    public void A_margin_of_temperatures_is_shown_in_kelvin()
    {
        var finding = Judged("compare: { value: origin.basis.ambient, at-most: 30 degC }", "name: x", "basis: { ambient: 25 °C }")!;

        Assert.Equal(("25 °C", "at most 30 °C", "5 K"), (finding.ValueShown, finding.LimitShown, finding.MarginShown));
    }

    [Fact]
    public void An_assumption_behind_a_conforming_finding_is_told_with_its_verdict()
    {
        var compare = "compare: { value: load.current, at-most: device.rating }";

        Assert.Equal("conforms, on assumption", Judged(compare, "device: { rating: 6 A }, load: { current: \"5 A, assumed\" }")!.VerdictText);
        Assert.Equal("nonconforming", Judged(compare, "device: { rating: 4 A }, load: { current: \"5 A, assumed\" }")!.VerdictText);
        Assert.Equal(
            "conforms, on assumption",
            Judged($"when: load.current > 1 A\n{compare.Replace("load.current", "1 A")}", "device: { rating: 6 A }, load: { current: \"5 A, assumed\" }")!.VerdictText);
    }

    private static Finding? Judged(string check, string circuit, string more = "earthing: {}")
    {
        using var files = new TemporaryRules()
            .With("set.yaml", "set: set\ntitle: One rule\nuses: { provisions: [the-rule.yaml] }\n")
            .With("the-rule.yaml", $$$"""
                rule: the-rule
                title: The rule of the test
                clause: { type: plausibility }
                provision: requirement
                status: { since: 1.0 }
                of: circuit
                {{{check}}}
                says: "{{ value }} against {{ limit }}."
                why: Because.
                departures: allowed
                cases: [{ name: none, verdict: undetermined }]
                """);
        var rules = files.LoadSound("set.yaml");
        var text = $"design-format: 1\nsupply: {{ earthing: TN-S, phases: 1, voltage: 230 V }}\n{more}\nboards:\n  - {{ id: A, circuits: [{{ id: 1, {circuit} }}] }}\n";
        return Small.Audit(text, rules: rules).Findings.SingleOrDefault();
    }

    private static void Near(double? expected, double? actual)
    {
        Assert.Equal(expected is null, actual is null);
        Assert.Equal(expected ?? 0, actual ?? 0, 1e-12);
    }
}
