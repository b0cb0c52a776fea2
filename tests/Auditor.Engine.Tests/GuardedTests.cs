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
