using Auditor.Documents;
using Auditor.Engine.RuleTests;

namespace Auditor.Engine.Tests.RuleTests;

/// <summary>Cases as people write them beside sheets and rules: what they may give, and what is said where they come out otherwise.</summary>
public class CaseRunnerTests
{
    private const string Whole = "up.Zdb: 0.3 ohm, legs: [{ R1: 0.1 ohm }, { R1: 0.2 ohm }], param.extra: 0.05 ohm";

    [Theory]
    [InlineData(Whole, "0.65 ohm", null)]
    [InlineData(Whole, "650 mohm", null)]
    [InlineData(Whole, "0.66 ohm ± 2 %", null)]
    [InlineData(Whole, "0.65 ohm ± 0 ohm", null)]
    [InlineData(Whole, "0.7 ohm", "expected 0.7 ohm, got 0.65 Ω")]
    [InlineData(Whole, "0.7 ohm ± 5 %", "expected 0.7 ohm ± 5 %, got 0.65 Ω")]
    [InlineData(Whole, "0.6 ohm ± 5 %", "expected 0.6 ohm ± 5 %, got 0.65 Ω")]
    [InlineData(Whole, "missing", "expected missing, got 0.65 Ω")]
    [InlineData("up.Zdb: 0.3 ohm", "0.3 ohm", null)]
    [InlineData("origin.supply.loop_impedance: 0.35 ohm", "0.35 ohm", null)]
    [InlineData("up.Zdb: 0.3 ohm, legs: [{ length: 100 m }, { length: 50 m, R1: 0.2 ohm }]", "0.6 ohm", null)]
    [InlineData("up.Zdb: 0.3 ohm, legs: [{ csa: 1 mm² }]", "missing", null)]
    public void A_quantity_is_computed_from_what_its_case_gives(string given, string expected, string? failure)
    {
        var result = Run(MadeRules.Loop($"{{ name: it, given: {{ {given} }}, expect: {expected} }}"), "Zt", out var problems);

        Assert.Equal("", ProblemText.Render(problems.All));
        Assert.Equal(("made: circuit Zt", "it", failure), (result.Owner, result.Name, result.Failure));
    }

    [Fact]
    public void What_feeds_a_board_is_a_circuit_or_the_origin_by_what_is_given_of_it()
    {
        var board = MadeRules.Quantity("Zx", "board", "unit: Ω", "Zdb", "{ name: it, given: { up.supply.loop_impedance: 0.35 ohm }, expect: 0.35 ohm }");

        Assert.Null(Run(board, "Zx", out var problems).Failure);
        Assert.Equal("", ProblemText.Render(problems.All));
    }

    [Fact]
    public void A_quantity_that_is_missing_says_why()
    {
        var result = Run(MadeRules.Loop("{ name: it, expect: 1 ohm }"), "Zt", out _);

        Assert.StartsWith("expected 1 ohm, got missing: ", result.Failure, StringComparison.Ordinal);
        Assert.Contains("loop", result.Failure, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("fed.demand: 20 A", "20 A", null)]
    [InlineData("fed.circuits: [{ Ib: 4 A }, { load.current: 6 A }]", "10 A", null)]
    [InlineData("load.current: 8 A", "8 A", null)]
    public void What_a_circuit_feeds_may_be_given(string given, string expected, string? failure) =>
        Assert.Equal(failure, Run(MadeRules.Quantity("It", "circuit", "unit: A", "Ib", $"{{ name: it, given: {{ {given} }}, expect: {expected} }}"), "It", out _).Failure);

    [Theory]
    [InlineData("gives: flag", "given(rcd) && has(serves ?? none, 'lighting')", "rcd.type: A, serves: [lighting, socket-outlets]", "true", null)]
    [InlineData("gives: flag", "given(rcd) && has(serves ?? none, 'lighting')", "rcd.type: A, serves: [socket-outlets]", "true", "expected true, got false")]
    [InlineData("gives: flag", "given(rcd)", "rcd: true", "true", null)]
    [InlineData("gives: flag", "given(rcd)", "device.curve: B", "false", null)]
    [InlineData("gives: text", "device.curve", "device.curve: B", "B", null)]
    [InlineData("gives: text", "device.curve", "device.curve: B", "C", "expected C, got B")]
    public void Words_and_flags_are_held_against_what_is_expected(string gives, string formula, string given, string expected, string? failure)
    {
        var result = Run(MadeRules.Quantity("it", "circuit", gives, formula, $"{{ name: it, given: {{ {given} }}, expect: {expected} }}"), "it", out var problems);

        Assert.Equal("", ProblemText.Render(problems.All));
        Assert.Equal(failure, result.Failure);
    }

    [Theory]
    [InlineData("lod.current: 3 A", "1 ohm", "case-unknown-name: a circuit has no `lod.current` to be given; did you mean `load.current`?")]
    [InlineData("qqqqqqqqqq: 3 A", "1 ohm", "case-unknown-name: a circuit has no `qqqqqqqqqq` to be given; name an input or a quantity, as formulas do")]
    [InlineData("param.extar: 3 ohm", "1 ohm", "case-unknown-name: a rule set has no `param.extar` to be given; did you mean `extra`?")]
    [InlineData("param.extra: 3 A", "1 ohm", "case-wrong-value: `param.extra` is a quantity in Ω; give it with a fitting unit, or the fitting word")]
    [InlineData("up.Zdb: 3 A", "1 ohm", "case-wrong-value: `Zdb` is a quantity in Ω; give it with a fitting unit, or the fitting word")]
    [InlineData("up.Zdb: 3", "1 ohm", "case-wrong-value: `Zdb` is a quantity in Ω; give it with a fitting unit, or the fitting word")]
    [InlineData("serves: [lighting, lightning]", "1 ohm", "case-wrong-value: `serves` is a list of words; give it with a fitting unit, or the fitting word")]
    [InlineData("legs: 3 m", "1 ohm", "case-not-a-list: `legs` is a list of subjects; write a list of mappings")]
    [InlineData("up.Zdb: 0.3 ohm", "3 A", "case-wrong-expectation: the quantity is a quantity in Ω; expect a value of that kind, or `missing`")]
    public void A_case_that_cannot_be_run_as_written_is_told_at_its_place(string given, string expected, string told)
    {
        Run(MadeRules.Loop($"{{ name: it, given: {{ {given} }}, expect: {expected} }}"), "Zt", out var problems);

        var problem = Assert.Single(problems.All);
        Assert.Equal(told, $"{problem.Code}: {problem.Message}; {problem.Help}");
        Assert.StartsWith("sheet.yaml:", problem.Span.ToString(), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("Zt: 0.65 ohm", "conforms, margin: 35 %", null)]
    [InlineData("Zt: 0.65 ohm", "conforms, margin: 35.5 % ± 2 %", null)]
    [InlineData("Zt: 0.65 ohm", "conforms, margin: 30 %", "expected a margin of 30 %, got 35 %")]
    [InlineData("Zt: 1.5 ohm", "nonconforming, margin: -50 %", null)]
    [InlineData("Zt: 0.65 ohm", "conforms, margin: 0.35 ohm", "`0.35 ohm` is no relative margin")]
    [InlineData("Zt: 1.5 ohm", "conforms", "expected conforms, got nonconforming")]
    [InlineData("Zt: 0.65 ohm, device.curve: C", "none", null)]
    [InlineData("Zt: 0.65 ohm, device.curve: C", "conforms", "expected conforms, got none")]
    [InlineData("Zt: 0.65 ohm, device.curve: C", "none, margin: 1 %", "expected a margin of 1 %, got none")]
    public void A_rule_comes_out_as_its_case_says_or_tells_how(string given, string expected, string? failure)
    {
        var text = MadeRules.Rule("it", "when: (device.curve ?? 'B') == 'B'\ncompare: { value: Zt, at-most: 1 ohm }\n", $"{{ name: one, given: {{ {given} }}, verdict: {expected} }}");
        var rules = MadeRules.Set([MadeRules.Loop()], ("it", text));

        Assert.Equal(failure, Assert.Single(new CaseRunner(rules, new Problems()).Run(rules.Rule("it")!)).Failure);
    }

    [Fact]
    public void What_keeps_a_rule_undetermined_is_said()
    {
        var text = MadeRules.Rule("it", "compare: { value: load.current, at-most: 1 A }\n", "{ name: one, verdict: conforms }");
        var rules = MadeRules.Set([], ("it", text));

        var failure = Assert.Single(new CaseRunner(rules, new Problems()).Run(rules.Rule("it")!)).Failure;

        Assert.StartsWith("expected conforms, got undetermined (", failure, StringComparison.Ordinal);
        Assert.Contains("load.current", failure, StringComparison.Ordinal);
    }

    [Fact]
    public void All_cases_of_a_set_are_run_those_of_sheets_first()
    {
        var text = MadeRules.Rule(
            "it", "compare: { value: Zt, at-most: 1 ohm }\n", "{ name: one, given: { Zt: 1 ohm }, verdict: conforms }", "{ name: two, verdict: undetermined }");
        var rules = MadeRules.Set([MadeRules.Loop()], ("it", text));

        var results = new CaseRunner(rules, new Problems()).RunAll();

        Assert.Equal(
            ["made: installation Zs none", "made: board Zdb none", "made: board demand two", "made: circuit Ib none", "made: circuit Zt none", "made: leg R1 none", "it one", "it two"],
            results.Where(result => !result.Owner.StartsWith("record-", StringComparison.Ordinal)).Select(result => $"{result.Owner} {result.Name}"));
        Assert.All(results, result => Assert.Null(result.Failure));
    }

    private static CaseResult Run(string quantity, string symbol, out Problems problems)
    {
        var rules = MadeRules.Set([quantity]);
        problems = new Problems();
        return Assert.Single(new CaseRunner(rules, problems).Run(rules.Quantities.Single(each => each.Slot.Symbol == symbol)));
    }
}
