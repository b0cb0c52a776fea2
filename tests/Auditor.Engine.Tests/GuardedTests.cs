using Auditor.Documents;
using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Tests;

/// <summary>Guarded acceptance as a design asks for it, and what unproven findings say and rest on.</summary>
public class GuardedTests
{
    private static readonly RuleSet Rules = Made();

    [Fact]
    public void A_design_that_asks_for_guarded_acceptance_gets_it()
    {
        // 0.9 ohm and the 30 % of the instrument are 1.17 ohm, of 1 ohm allowed.
        var asked = Audit("guarded", "zs: 0.9 ohm", "9 A");
        var finding = asked.Find("reading:A/1")!;

        Assert.Equal((Decision.Guarded, Verdict.Unproven), (asked.Decision, finding.Verdict));
        Assert.Equal("Read 0.9 Ω. So as stated; not kept everywhere within the tolerances, margin -17.0 %.", finding.Message);
        Assert.Equal(Decision.Simple, Audit("simple", "zs: 0.9 ohm", "9 A").Decision);
        Assert.Equal(Verdict.Conforms, Audit("simple", "zs: 0.9 ohm", "9 A").Find("reading:A/1")!.Verdict);
        Assert.Equal(Verdict.Conforms, Audit("guarded", "zs: 0.75 ohm", "9 A").Find("reading:A/1")!.Verdict);
    }

    [Fact]
    public void What_the_caller_asks_for_goes_before_what_the_design_does()
    {
        var audit = Run(Text("guarded", "zs: 0.9 ohm", "9 A"), new Acceptance(Decision.Simple));

        Assert.Equal((Decision.Simple, Verdict.Conforms), (audit.Decision, audit.Find("reading:A/1")!.Verdict));
    }

    [Fact]
    public void A_finding_unproven_for_its_instrument_rests_on_what_is_known_of_the_instrument()
    {
        var audit = Audit("guarded", "zs: 0.9 ohm", "9 A");

        Assert.Equal(
            [(FoundationKind.FigureFromMemory, "param.share", "30 %")],
            new Foundations(audit).Of(audit.Find("reading:A/1")!).Select(each => (each.Kind, each.Name, each.Text)));
    }

    [Fact]
    public void A_finding_unproven_for_a_stated_tolerance_rests_on_nothing_uncertain()
    {
        var audit = Audit("guarded", "zs: 0.9 ohm ± 20 %", "9 A");

        Assert.Equal("Read 0.9 Ω. So as stated; not kept everywhere within the tolerances, margin -8.0 %.", audit.Find("reading:A/1")!.Message);
        Assert.Empty(new Foundations(audit).Of(audit.Find("reading:A/1")!));
    }

    [Fact]
    public void A_rule_that_only_a_tolerance_makes_apply_is_told_with_the_values_of_the_worst_case()
    {
        // As stated, 9 A are no heavy load; 10.8 A are, and twice the 5 A that such a load may draw is 10 A.
        var audit = Audit("guarded", "zs: 0.5 ohm", "9 A ± 20 %");
        var finding = audit.Find("heavy:A/1")!;

        Assert.Equal(Verdict.Unproven, finding.Verdict);
        Assert.Equal("Draws 10.8 A. So in the worst case, and only within the tolerances; not kept everywhere within the tolerances, margin -8.0 %.", finding.Message);
        Assert.Null(Audit("simple", "zs: 0.5 ohm", "9 A ± 20 %").Find("heavy:A/1"));
        Assert.Null(Audit("guarded", "zs: 0.5 ohm", "9 A ± 10 %").Find("heavy:A/1"));
    }

    [Theory]
    [InlineData("19.9 ohm", 19.9)]
    [InlineData("19.99 ohm", 19.99)]
    [InlineData("19.9999 ohm", 19.9999)]
    public void A_rule_that_two_tolerances_break_only_shortly_before_it_ceases_to_apply_is_unproven(string limit, double ohms)
    {
        // The rule applies up to 20 ohm. Each reading alone takes the sum to 19.8 ohm, both together to 21.6 ohm.
        using var rules = new TemporaryRules().With("set.yaml", "set: set\ntitle: Set\nuses: { provisions: [strip.yaml] }\n")
            .With("strip.yaml", Rule("strip", $"when: readings.r1 + readings.r2 <= 20 ohm\ncompare: {{ value: readings.r1 + readings.r2, at-most: {limit} }}\nsays: Made.\n"));
        var text = Text("guarded", "r1: 9 ohm ± 20 %, r2: 9 ohm ± 20 %", "9 A");
        var finding = Evaluation.Audit.Run(Small.Build(text, rules.LoadSound("set.yaml")), Small.Today, new Problems()).Find("strip:A/1")!;

        Assert.Equal(Verdict.Unproven, finding.Verdict);
        Assert.InRange(finding.WorstCase!.Judgement.Value.Number, ohms, 20.00000002);
        Assert.True(finding.WorstCase.WasSearched);
    }

    [Theory]
    [InlineData("(1 - readings.r1 / (9 ohm)) * (readings.r2 / (9 ohm) - 1) + 0 * readings.zs / (1 ohm)", "3.9 %", "r1 7.2, r2 10.8")]
    [InlineData("1 - abs(readings.r1 - (9.37 ohm)) / (1 ohm)", "99.5 %", "r1 9.37")]
    public void A_worst_case_that_no_reading_shows_by_itself_or_at_its_ends_is_found_and_told_without_the_others(string value, string limit, string corner)
    {
        using var rules = new TemporaryRules().With("set.yaml", "set: set\ntitle: Set\nuses: { provisions: [hidden.yaml] }\n")
            .With("hidden.yaml", Rule("hidden", $"compare: {{ value: {value}, at-most: {limit.Replace("%", "percent", StringComparison.Ordinal)} }}\nsays: Made.\n"));
        var text = Text("guarded", "r1: 9 ohm ± 20 %, r2: 9 ohm +1.8 ohm -0.9 ohm, zs: 1 ohm ± 20 %", "9 A");
        var finding = Evaluation.Audit.Run(Small.Build(text, rules.LoadSound("set.yaml")), Small.Today, new Problems()).Find("hidden:A/1")!;

        Assert.Equal(Verdict.Unproven, finding.Verdict);
        Assert.Equal(corner, string.Join(", ", finding.WorstCase!.Corner.Select(each => $"{each.Input.Input.Slot.Path.Split('.')[1]} {Math.Round(each.Number, 3)}")));
        Assert.True(finding.WorstCase.WasSearched);
    }

    [Fact]
    public void A_worst_case_at_an_end_of_what_goes_both_ways_was_searched_for()
    {
        using var rules = new TemporaryRules().With("set.yaml", "set: set\ntitle: Set\nuses: { provisions: [away.yaml] }\n")
            .With("away.yaml", Rule("away", "compare: { value: abs(readings.r1 - (9 ohm)), at-most: 5 ohm }\nsays: Made.\n"));
        var worst = Evaluation.Audit.Run(Small.Build(Text("guarded", "r1: 9 ohm ± 20 %", "9 A"), rules.LoadSound("set.yaml")), Small.Today, new Problems()).Find("away:A/1")!.WorstCase!;

        Assert.Equal((0.64, true), (Math.Round(worst.Margin!.Relative!.Value, 9), worst.WasSearched));
    }

    [Theory]
    [InlineData(10, 4, 0.4, 0.13674)]
    [InlineData(8, 8, 1.0, 0.09045)]
    public void A_share_has_the_standard_error_of_the_count_that_it_comes_from(int samples, int kept, double share, double error)
    {
        var told = new SampleShare(samples, kept);

        Assert.Equal((share, error), (told.Share, Math.Round(told.StandardError, 5)));
    }

    [Fact]
    public void Samples_of_a_reading_spread_by_half_the_uncertainty_of_its_instrument()
    {
        // 0.27 ohm are two standard deviations: 1 ohm lies 0.741 of one above 0.9 ohm, which 77.1 % of a normal distribution do not exceed.
        var audit = Run(Text("simple", "zs: 0.9 ohm", "9 A"), new Acceptance(Decision.Simple, Samples: 20_500, Seed: 3));
        var (reading, sure) = (audit.Find("reading:A/1")!.Share!, audit.Find("sure:A/1")!.Share!);

        Assert.InRange(reading.Share, 0.756, 0.786);
        Assert.Equal((20_500, 20_500), (sure.Samples, sure.Kept));
    }

    [Fact]
    public void An_uncertainty_of_what_is_measured_says_nothing_of_what_is_not()
    {
        var measured = Audit("guarded", "r1r2: \"0.9 ohm, measured\"", "9 A").Find("continuity:A/1")!;
        var designed = Audit("guarded", "r1r2: 0.9 ohm", "9 A").Find("continuity:A/1")!;

        Assert.Equal((Verdict.Unproven, Verdict.Conforms), (measured.Verdict, designed.Verdict));
        Assert.Null(designed.WorstCase);
    }

    private static AuditResult Audit(string decision, string reading, string current) => Run(Text(decision, reading, current), null);

    private static string Text(string decision, string reading, string current) =>
        $"design-format: 1\nbasis: {{ decision: {decision} }}\nsupply: {{ earthing: TN-S, phases: 1, voltage: 230 V }}\n"
        + $"boards:\n  - id: A\n    circuits:\n      - {{ id: 1, load: {{ current: {current} }}, readings: {{ {reading} }} }}\n";

    private static AuditResult Run(string text, Acceptance? acceptance)
    {
        var problems = new Problems();
        var result = Evaluation.Audit.Run(Small.Build(text, Rules), Small.Today, problems, acceptance);
        Assert.Equal("", ProblemText.Render(problems.All));
        return result;
    }

    private static RuleSet Made()
    {
        using var rules = new TemporaryRules()
            .With("set.yaml", "set: set\ntitle: Set\nuses: { sheets: [sheet.yaml], provisions: [rules] }\nparameters: { share: { value: 30 %, source: from memory, trust: memory } }\n")
            .With("sheet.yaml", "sheet: made\nabout: Made for a test.\nquantities:\n"
                + Uncertainty("u_zs", "param.share * readings.zs", "readings.zs") + Uncertainty("u_r", "0.3 * readings.r1r2", "readings.r1r2\n    only-when: measured"))
            .With("rules/reading.yaml", Rule("reading", "compare: { value: readings.zs, at-most: 1 ohm }\nsays: \"Read {{ value }}.\"\n"))
            .With("rules/sure.yaml", Rule("sure", "compare: { value: readings.zs, at-most: 100 ohm }\nsays: Made.\n"))
            .With("rules/continuity.yaml", Rule("continuity", "compare: { value: readings.r1r2, at-most: 1 ohm }\nsays: \"Read {{ value }}.\"\n"))
            .With("rules/heavy.yaml", Rule("heavy", "when: load.current >= (10 A)\ncompare: { value: load.current, at-most: 2 * (5 A) }\nsays: \"Draws {{ load.current }}.\"\n"));
        return rules.LoadSound("set.yaml");
    }

    private static string Uncertainty(string symbol, string formula, string of) =>
        $"  - symbol: {symbol}\n    name: made\n    of: circuit\n    unit: Ω\n    formula: {formula}\n    uncertainty-of: {of}\n"
        + "    clause: { type: verification }\n    cases: [{ name: none, expect: missing }]\n";

    private static string Rule(string id, string body) =>
        $"rule: {id}\ntitle: A rule\nclause: {{ type: plausibility }}\nprovision: requirement\nstatus: {{ since: 1.0 }}\nof: circuit\n{body}"
        + "why: Made.\ndepartures: allowed\ncases: [{ name: one, verdict: undetermined }]\n";
}
