using Auditor.Documents;
using Auditor.Engine.Departures;
using Auditor.Engine.Findings;

namespace Auditor.Engine.Tests;

public class DepartureTests
{
    [Theory]
    [InlineData("rule: socket-rcd, subject: DB2/1", DepartureState.InForce)]
    [InlineData("rule: socket-rcd, subject: DB2/1, expires: 2026-09-15", DepartureState.InForce)]
    [InlineData("rule: socket-rcd, subject: DB2/1, expires: 2026-09-14", DepartureState.InForce)]
    [InlineData("rule: socket-rcd, subject: DB2/1, expires: 2026-09-13", DepartureState.Expired)]
    [InlineData("rule: socket-rcd, subject: DB1/1", DepartureState.NotNeeded)]
    [InlineData("rule: socket-rcd, subject: DB1/1, expires: 2026-09-13", DepartureState.Expired)]
    [InlineData("rule: zs-limit, subject: DB2/1", DepartureState.NotNeeded)]
    [InlineData("rule: zs-cold, subject: DB1/1", DepartureState.Refused)]
    [InlineData("rule: zs-cold, subject: DB1/1, expires: 2000-01-01", DepartureState.Refused)]
    [InlineData("rule: socket-rcd, subject: DB1/2", DepartureState.Unmatched)]
    [InlineData("rule: socket-rcd, subject: DB9/1", DepartureState.Unmatched)]
    [InlineData("rule: no-such-rule, subject: DB1/1", DepartureState.Unmatched)]
    [InlineData("rule: bonding-size, subject: bonding/gas", DepartureState.InForce)]
    [InlineData("rule: supply-voltage, subject: \"-\"", DepartureState.NotNeeded)]
    [InlineData("rule: zs-in-time, subject: DB1/1", DepartureState.NotNeeded)]
    public void A_departure_comes_to_what_its_finding_and_the_day_make_of_it(string departure, DepartureState state) =>
        Assert.Equal(state, Assert.Single(Audit(departure).Departures).State);

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
            result.Findings.Where(each => each.Key != finding.Key).Select(each => $"{each.Key} {each.Verdict}"));
    }

    [Theory]
    [InlineData("rule: socket-rcd, subject: DB2/1, expires: 2026-09-13")]
    [InlineData("rule: zs-cold, subject: DB2/1")]
    public void A_departure_out_of_force_changes_nothing(string departure) => Assert.All(Audit(departure).Findings, finding => Assert.Null(finding.Departure));

    [Fact]
    public void Departures_come_in_their_order_and_one_nonconformity_may_have_two()
    {
        var result = Audit("rule: bonding-size, subject: bonding/gas", "rule: socket-rcd, subject: DB2/1", "rule: socket-rcd, subject: DB2/1, expires: 2030-01-01");

        Assert.Equal(["bonding-size", "socket-rcd", "socket-rcd"], result.Departures.Select(departure => departure.Rule));
        Assert.Null(result.Find("socket-rcd:DB2/1")!.Departure!.Expires);
        Assert.Equal(2, result.Count(Verdict.Departed));
    }

    [Fact]
    public void A_day_that_the_calendar_lacks_is_a_problem_at_its_place()
    {
        var problems = new Problems();
        var design = Small.Build(With("rule: socket-rcd, subject: DB2/1, expires: 2026-02-30", "rule: socket-rcd, subject: DB2/1, expires: 2028-02-29"));
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
