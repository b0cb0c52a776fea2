using Auditor.Documents;
using Auditor.Engine.Departures;
using Auditor.Engine.Findings;

namespace Auditor.Engine.Tests;

public class DepartureTests
{
    private static readonly string[] SocketCircuits = ["DB1/1", "DB2/1"];

    [Theory]
    [InlineData("rule: socket-rcd, subject: DB2/1", DepartureState.InForce)]
    [InlineData("rule: socket-rcd, subject: DB2/1, until: 2026-09-15", DepartureState.InForce)]
    [InlineData("rule: socket-rcd, subject: DB2/1, until: 2026-09-14", DepartureState.InForce)]
    [InlineData("rule: socket-rcd, subject: DB2/1, until: 2026-09-13", DepartureState.Expired)]
    [InlineData("rule: socket-rcd, subject: DB1/1", DepartureState.NotNeeded)]
    [InlineData("rule: socket-rcd, subject: DB1/1, until: 2026-09-13", DepartureState.Expired)]
    [InlineData("rule: zs-limit, subject: DB2/1", DepartureState.NotNeeded)]
    [InlineData("rule: zs-cold, subject: DB1/1", DepartureState.Forbidden)]
    [InlineData("rule: zs-cold, subject: DB1/1, until: 2026-09-02", DepartureState.Forbidden)]
    [InlineData("rule: socket-rcd, subject: DB1/2", DepartureState.Unmatched)]
    [InlineData("rule: socket-rcd, subject: DB9/1", DepartureState.Unmatched)]
    [InlineData("rule: no-such-rule, subject: DB1/1", DepartureState.Unmatched)]
    [InlineData("rule: bonding-size, subject: bonding/gas", DepartureState.InForce)]
    [InlineData("rule: supply-voltage, subject: \"-\"", DepartureState.NotNeeded)]
    [InlineData("rule: zs-in-time, subject: DB1/1", DepartureState.NotNeeded)]
    public void A_departure_comes_to_what_its_finding_and_the_day_make_of_it(string departure, DepartureState state) =>
        Assert.Equal(state, Assert.Single(Audit(departure).Departures).State);

    [Fact]
    public void A_rule_of_departures_may_ask_what_the_installation_states()
    {
        static string Rule(string id, string of, string require) =>
            $"rule: {id}\ntitle: A rule\nclause: {{ type: plausibility }}\nprovision: requirement\nstatus: {{ since: 1.0 }}\nof: {of}\nrequire: {require}\nsays: Made.\nwhy: Made.\n"
            + "departures: allowed\ncases: [{ name: one, verdict: undetermined }]\n";
        using var rules = new TemporaryRules()
            .With("set.yaml", "set: set\ntitle: Set\nuses: { provisions: [rules] }\n")
            .With("rules/short.yaml", Rule("short", "leg", "length < 1 m"))
            .With("rules/earthed.yaml", Rule("earthed", "departure", "up.supply.earthing == 'TN-C-S'"));
        const string Departed = "departures: [{ rule: short, subject: DB1/2/leg 1, reason: Agreed., agreed-by: T. Example, date: 2026-09-01 }]\n";

        var findings = Small.Audit(Small.DesignText("house") + Departed, rules: rules.LoadSound("set.yaml")).Findings;

        Assert.Equal(Verdict.Conforms, Assert.Single(findings, finding => finding.Rule.Id == "earthed").Verdict);
        Assert.Equal(Verdict.Departed, Assert.Single(findings, finding => finding.Key == "short:DB1/2/leg 1").Verdict);
    }

    [Fact]
    public void A_departure_in_force_turns_its_finding_and_no_other()
    {
        var plain = Small.Audit(Small.DesignText("house"));
        var result = Audit("rule: socket-rcd, subject: DB2/1");
        var finding = result.Find("socket-rcd:DB2/1")!;

        Assert.Equal(Verdict.Departed, finding.Verdict);
        Assert.Equal("departed", finding.VerdictText);
        Assert.Equal(Verdict.Nonconforming, finding.Judgement.Verdict);
        Assert.Equal("no less safe", finding.Departure!.Reason);
        Assert.Equal("B. Helper", finding.Departure.AgreedBy);
        Assert.Equal(new DateOnly(2026, 9, 1), finding.Departure.Date);
        Assert.Equal(Small.Today, result.AsOf);
        Assert.Equal(
            plain.Findings.Where(each => each.Key != finding.Key).Select(each => $"{each.Key} {each.Verdict}"),
            result.Findings.Where(each => each.Key != finding.Key && each.Subject.Shape.Name != "departure").Select(each => $"{each.Key} {each.Verdict}"));
    }

    [Theory]
    [InlineData("rule: socket-rcd, subject: DB2/1, until: 2026-09-13")]
    [InlineData("rule: zs-cold, subject: DB2/1")]
    public void A_departure_out_of_force_changes_nothing(string departure) => Assert.All(Audit(departure).Findings, finding => Assert.Null(finding.Departure));

    [Fact]
    public void Departures_come_in_their_order_and_one_nonconformity_may_have_two()
    {
        var result = Audit("rule: bonding-size, subject: bonding/gas", "rule: socket-rcd, subject: DB2/1", "rule: socket-rcd, subject: DB2/1, until: 2030-01-01");

        Assert.Equal(["bonding-size", "socket-rcd", "socket-rcd"], result.Departures.Select(departure => departure.Rule));
        Assert.Null(result.Find("socket-rcd:DB2/1")!.Departure!.Until);
        Assert.Equal(2, result.Count(Verdict.Departed));
    }

    [Theory]
    [InlineData("DB2/*", "DB2/1")]
    [InlineData("*", "DB1/1 DB2/1")]
    [InlineData("*/1", "DB1/1 DB2/1")]
    [InlineData("DB*1", "DB1/1 DB2/1")]
    [InlineData("**2**/*", "DB2/1")]
    [InlineData("DB2*/*1", "DB2/1")]
    [InlineData("DB2/1*1", "")]
    [InlineData("DB2/", "")]
    [InlineData("db2/*", "")]
    [InlineData("DB?/1", "")]
    [InlineData("DB[0-9]/1", "")]
    public void A_star_in_a_subject_stands_for_any_characters(string pattern, string subjects)
    {
        var departure = Assert.Single(Audit($"rule: socket-rcd, subject: \"{pattern}\"").Departures);
        var expected = subjects switch
        {
            "" => DepartureState.Unmatched,
            _ when subjects.Contains("DB2/1", StringComparison.Ordinal) => DepartureState.InForce,
            _ => DepartureState.NotNeeded,
        };
        Assert.Equal(expected, departure.State);
        var rule = new SubjectPattern(pattern);
        Assert.Equal(subjects, string.Join(' ', SocketCircuits.Where(rule.Fits)));
    }

    [Fact]
    public void No_pattern_takes_long()
    {
        var pattern = new SubjectPattern(string.Concat(Enumerable.Repeat("*a", 50_000)) + "*b");
        Assert.False(pattern.Fits(new string('a', 100_000)));
        Assert.True(pattern.Fits(new string('a', 100_000) + "b"));
    }

    [Fact]
    public void A_pattern_accepts_every_nonconformity_that_it_fits_and_nothing_that_conforms()
    {
        var result = Audit("rule: \"leg-length\", subject: \"DB*\"");
        var legs = result.Findings.Where(finding => finding.Rule.Id == "leg-length").ToArray();

        Assert.Contains(legs, finding => finding.Verdict == Verdict.Departed);
        Assert.Contains(legs, finding => finding.Verdict == Verdict.Conforms);
        Assert.All(legs, finding => Assert.Equal(finding.Judgement.Verdict == Verdict.Nonconforming, finding.Departure is not null));
    }

    [Theory]
    [InlineData("rule: socket-rcd, subject: DB2/1", "matched conforms, needed conforms, permitted conforms")]
    [InlineData("rule: socket-rcd, subject: DB2/1, until: 2026-09-14", "in-date conforms, matched conforms, needed conforms, permitted conforms")]
    [InlineData("rule: socket-rcd, subject: DB2/1, until: 2026-09-13", "in-date nonconforming, matched conforms, permitted conforms")]
    [InlineData("rule: socket-rcd, subject: DB1/1", "matched conforms, needed nonconforming, permitted conforms")]
    [InlineData("rule: zs-cold, subject: DB1/1", "matched conforms, permitted nonconforming")]
    [InlineData("rule: no-such-rule, subject: DB1/1", "matched nonconforming")]
    [InlineData("rule: record-departure-matched, subject: \"*\"", "matched conforms, permitted nonconforming")]
    public void The_record_itself_is_judged(string departure, string findings)
    {
        var result = Audit(departure);
        var subject = Assert.Single(result.Subjects, subject => subject.Shape.Name == "departure");
        var own = result.Findings.Where(finding => finding.Subject == subject).ToArray();

        Assert.Equal(findings, string.Join(", ", own.Select(finding => $"{finding.Rule.Id["record-departure-".Length..]} {finding.Verdict.Word()}")));
        Assert.All(own, finding => Assert.Equal(result.Departures[0].Span, finding.Location));
    }

    [Fact]
    public void A_finding_on_a_departure_says_which_one_who_agreed_and_the_days()
    {
        var result = Audit("rule: socket-rcd, subject: DB2/1, until: 2026-09-13");

        Assert.Equal(
            "The departure from `socket-rcd` at DB2/1, agreed by B. Helper on 2026-09-01, holds until 2026-09-13, that day included; this audit is as of 2026-09-14.",
            result.Find("record-departure-in-date:departure/socket-rcd:DB2/1")!.Message);
    }

    [Fact]
    public void Two_departures_of_one_rule_and_subject_have_keys_of_their_own() =>
        Assert.Equal(
            ["departure/socket-rcd:DB2/1", "departure/socket-rcd:DB2/1 (2)"],
            Audit("rule: socket-rcd, subject: DB2/1", "rule: socket-rcd, subject: DB2/1, until: 2030-01-01")
                .Subjects.Where(subject => subject.Shape.Name == "departure").Select(subject => subject.Key));

    [Fact]
    public void A_last_day_before_the_agreement_is_a_problem()
    {
        var problems = new Problems();
        Evaluation.Audit.Run(Small.Build(With("rule: socket-rcd, subject: DB2/1, until: 2026-08-31")), Small.Today, problems);

        var problem = Assert.Single(problems.All);
        Assert.Equal("departure-ends-first", problem.Code);
        Assert.Equal("2026-08-31", problem.Span!.Value.Text);
    }

    [Fact]
    public void No_set_has_a_rule_of_the_record()
    {
        using var rules = new TemporaryRules()
            .With("set.yaml", "set: set\ntitle: Set\nuses: { provisions: [record-departure-matched.yaml] }\n")
            .With("record-departure-matched.yaml", File.ReadAllText(Testing.Repository.PathOf("rules/record/record-departure-matched.yaml")));
        Assert.Null(rules.Load("set.yaml", out var problems));

        var problem = Assert.Single(problems.All);
        Assert.Equal(("record-rule", "record-departure-matched.yaml:1:7"), (problem.Code, problem.Span.ToString()));
    }

    [Fact]
    public void A_day_that_the_calendar_lacks_is_a_problem_at_its_place()
    {
        var problems = new Problems();
        var design = Small.Build(With("rule: socket-rcd, subject: DB2/1, until: 2026-02-30", "rule: socket-rcd, subject: DB2/1, until: 2028-02-29"));
        var result = Evaluation.Audit.Run(design, Small.Today, problems);

        var problem = Assert.Single(problems.All);
        Assert.Equal("not-a-date: `2026-02-30` is not a day of the calendar", $"{problem.Code}: {problem.Message}");
        Assert.Equal("2026-02-30", problem.Span!.Value.Text);
        Assert.Single(result.Departures);
    }

    private static AuditResult Audit(params string[] departures) => Small.Audit(With(departures));

    private static string With(params string[] departures) => Small.DesignText("house") + "departures:\n"
        + string.Concat(departures.Select(departure => $"  - {{ {departure}, reason: no less safe, agreed-by: B. Helper, date: 2026-09-01 }}\n"));
}
