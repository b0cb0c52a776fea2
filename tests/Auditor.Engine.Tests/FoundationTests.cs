using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;

namespace Auditor.Engine.Tests;

public class FoundationTests
{
    private static readonly AuditResult House = Small.Audit(Small.DesignText("house"));

    [Theory]
    [InlineData("supply-voltage:-")]
    [InlineData("bonding-size:bonding/gas")]
    [InlineData("leg-length:DB1/1/leg 1")]
    [InlineData("socket-rcd:DB1/1")]
    public void A_finding_on_firm_ground_has_none(string key) => Assert.Empty(new Foundations(House).Of(House.Find(key)!));

    [Theory]
    [InlineData("board-loop:DB1", "AssumedInput - supply.loop-impedance 0.35 ohm, assumed 6")]
    [InlineData("zs-limit:DB1/1", "AssumedInput - supply.loop-impedance 0.35 ohm, assumed 6")]
    [InlineData("zs-limit:DB1/2", "AssumedInput - supply.loop-impedance 0.35 ohm, assumed 6", "AssumedInput DB1/2/leg 1 length 30 m, assumed 38")]
    [InlineData("leg-length:DB1/2/leg 1", "AssumedInput DB1/2/leg 1 length 30 m, assumed 38")]
    [InlineData("zs-limit:DB1/shed", "AssumedInput - supply.loop-impedance 0.35 ohm, assumed 6", "FigureFromMemory  IEC 60228, class 1  ")]
    [InlineData("zs-cold:DB1/1", "AssumedInput - supply.loop-impedance 0.35 ohm, assumed 6", "FigureFromMemory  param.cold_factor 80 % 12")]
    [InlineData("board-loop:DB2", "AssumedInput - supply.loop-impedance 0.35 ohm, assumed 6", "FigureFromMemory  IEC 60228, class 1  ")]
    public void A_finding_names_the_assumptions_and_the_figures_from_memory_that_it_rests_on(string key, params string[] foundations) =>
        Assert.Equal(foundations, new Foundations(House).Of(House.Find(key)!)
            .Select(each => $"{each.Kind} {each.Subject} {each.Name} {each.Text} {each.Span?.StartLocation.Line}"));

    [Fact]
    public void A_finding_names_the_curve_from_memory_that_it_rests_on()
    {
        using var rules = new TemporaryRules()
            .With("set.yaml", "set: set\ntitle: Set\nuses: { curves: [curve.yaml], provisions: [opens.yaml] }\n")
            .With("curve.yaml", "curve: made\ntitle: A curve as remembered\nsource: from memory\ntrust: memory\nstandard: EN 60898\nof: rating\nslow: [{ ratings-up-to: 32 A, points: [[5, 0.1]] }]\n")
            .With("opens.yaml", "rule: opens\ntitle: A rule\nclause: { type: plausibility }\nprovision: requirement\nstatus: { since: 1.0 }\nof: circuit\n"
                + "compare: { value: \"trip_current('EN 60898', 'any', device.rating, 0.1 s)\", at-least: 100 A }\nsays: Made.\nwhy: Made.\ndepartures: allowed\n"
                + "cases: [{ name: one, verdict: undetermined }]\n");
        var audit = Small.Audit(Small.DesignText("house"), rules: rules.LoadSound("set.yaml"));
        var finding = audit.Find("opens:DB1/1")!;

        Assert.True(finding.FromMemory);
        Assert.Equal(
            new Foundation(FoundationKind.FigureFromMemory, null, "A curve as remembered", "", null), Assert.Single(new Foundations(audit).Of(finding)));
    }

    [Fact]
    public void Every_finding_marked_has_a_foundation_and_no_other_has()
    {
        var foundations = new Foundations(House);
        foreach (var finding in House.Findings)
        {
            var found = foundations.Of(finding);

            Assert.Equal(finding.OnAssumption, found.Any(each => each.Kind == FoundationKind.AssumedInput));
            Assert.Equal(finding.FromMemory, found.Any(each => each.Kind == FoundationKind.FigureFromMemory));
        }
    }
}
