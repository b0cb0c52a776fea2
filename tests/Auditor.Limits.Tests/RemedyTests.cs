using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Remedies;
using Auditor.Engine.RuleSets;
using CsCheck;

namespace Auditor.Limits.Tests;

/// <summary>Remedies, made in the text of the design that they were found for and audited as a whole.</summary>
public class RemedyTests
{
    private static readonly DateOnly Day = new(2026, 3, 1);

    [Fact]
    public void A_remedy_made_in_the_design_puts_its_finding_right_and_makes_nothing_nonconforming() =>
        Plans.Any.Sample(plan => Verify(plan, Decision.Simple, 20), iter: 6, threads: 1);

    [Fact]
    public void By_guarded_acceptance_a_remedy_leaves_nothing_unproven_that_was_proven() =>
        Plans.Toleranced.Sample(plan => Verify(plan, Decision.Guarded, 4), iter: 3, threads: 1);

    [Fact]
    public void Least_changes_come_first() =>
        Plans.Any.Sample(
            plan => Assert.All(Search(plan, Decision.Simple).Findings, each => Assert.Equal(each.Remedies.Select(remedy => remedy.Effort).Order(), each.Remedies.Select(remedy => remedy.Effort))),
            iter: 4, threads: 1);

    [Fact]
    public void The_smallest_conductor_that_carries_the_load_is_a_remedy()
    {
        // A B20 asks for Iz of 20 A. Four circuits bunched (0.65, BS 7671 Table 4C1) leave 27 A × 0.65 = 17.55 A of 2.5 mm² and 37 A × 0.65 = 24.05 A of 4 mm², method C.
        var found = Find(Radial.With("MB/2/leg 1", "grouped-circuits", "4"), "overload-capacity:MB/2");
        var size = Assert.Single(found.Remedies, remedy => Ids(remedy) is ["cable-size"]);

        Assert.Equal(4e-6, size.Changes[0].Value.Number, 1e-12);
        Assert.Equal(1 - (20 / 17.55), size.Before!.Relative!.Value, 0.001);
        Assert.Equal(1 - (20 / 24.05), size.After!.Relative!.Value, 0.001);
    }

    [Fact]
    public void A_run_is_shortened_no_more_than_the_voltage_drop_asks_for()
    {
        // 18 mV/A/m for 2.5 mm² (common practice), 12 A: 5 % of 230 V are used up at 53.24 m, and half a metre is the step.
        var found = Find(Radial.With("MB/2/leg 1", "length", "60 m"), "voltage-drop-other:MB/2");
        var shorter = Assert.Single(found.Remedies, remedy => Ids(remedy) is ["cable-length"]);

        Assert.Equal(53, shorter.Changes[0].Value.Number, 9);
    }

    [Fact]
    public void Two_changes_are_made_together_where_neither_does_alone()
    {
        // 22 A is more than In of 20 A. 25 A is more than Iz: two circuits bunched (0.8) leave 27 A × 0.8 = 21.6 A of 2.5 mm²; 4 mm² has 37 A × 0.8 = 29.6 A.
        var found = Find(Radial.With("MB/2", "load.current", "22 A").With("MB/2/leg 1", "grouped-circuits", "2"), "overload-design-current:MB/2");

        Assert.DoesNotContain(found.Remedies, remedy => Ids(remedy) is ["device-rating"]);
        var both = Assert.Single(found.Remedies, remedy => Ids(remedy).Order().SequenceEqual(["cable-size", "device-rating"]));
        Assert.Equal([25.0, 4e-6], both.Changes.Select(change => change.Value.Number).OrderDescending().Select(number => Math.Round(number, 9)));
    }

    [Fact]
    public void What_a_remedy_costs_elsewhere_is_told()
    {
        // 12 A on In of 20 A leaves 40 % of it, on 16 A 25 %; 16 A lie within the 17.55 A that four bunched circuits leave of 2.5 mm².
        var found = Find(Radial.With("MB/2/leg 1", "grouped-circuits", "4"), "overload-capacity:MB/2");
        var rating = Assert.Single(found.Remedies, remedy => Ids(remedy) is ["device-rating"]);
        var move = Assert.Single(rating.Worsened, move => move.At.Key == "overload-design-current:MB/2");

        Assert.Equal(16, rating.Changes[0].Value.Number, 9);
        Assert.Equal(0.40, move.Before.Relative!.Value, 9);
        Assert.Equal(0.25, move.After.Relative!.Value, 9);
    }

    [Fact]
    public void Where_no_adjustment_has_a_part_in_a_rule_there_is_no_remedy_and_that_is_told_apart()
    {
        var none = Find(Radial, "supply-never:-", Shipped.House("no-remedy"));
        var blocked = Find(Radial, "length-never:MB/2/leg 1", Shipped.House("no-remedy"));

        Assert.Equal((0, 0), (none.Remedies.Count, none.Tried));
        Assert.Empty(blocked.Remedies);
        Assert.True(blocked.Tried > 0);
    }

    [Fact]
    public void A_house_set_changes_what_may_be_adjusted()
    {
        var plan = Radial.With("MB/2", "device.curve", "D").With("MB/2/leg 1", "length", "30 m");
        var shipped = Find(plan, "disconnection-tn:MB/2");
        var house = Find(plan, "disconnection-tn:MB/2", Shipped.House("no-remedy"));

        Assert.Contains(shipped.Remedies, remedy => Ids(remedy) is ["device-curve"]);
        Assert.DoesNotContain(house.Remedies, remedy => Ids(remedy).Contains("device-curve"));
    }

    private static Plan Radial => Plans.Fixed;

    private static string[] Ids(Remedy remedy) => [.. remedy.Changes.Select(change => change.Place.Adjustment.Id)];

    private static FindingRemedies Find(Plan plan, string key, RuleSet? rules = null)
    {
        var set = rules ?? Shipped.UnitedKingdom;
        var audit = Audit.Run(plan.Build(set), Day, new Problems());
        return RemedySearch.Run(audit, [audit.Find(key)!]).Findings[0];
    }

    private static RemedyResult Search(Plan plan, Decision decision)
    {
        var audit = Audit.Run(plan.Build(Shipped.UnitedKingdom), Day, new Problems(), new Acceptance(decision));
        return RemedySearch.Run(audit, RemedySearch.Wanting(audit));
    }

    private static void Verify(Plan plan, Decision decision, int most)
    {
        var result = Search(plan, decision);
        var bad = Bad(result.Audit);
        foreach (var (each, remedy) in result.Findings.SelectMany(each => each.Remedies.Take(2).Select(remedy => (each, remedy))).Take(most))
        {
            var after = RemedySearch.Reaudit(result.Audit, remedy.Inputs, Plan.Rereading(Shipped.UnitedKingdom))!;
            Assert.True(after.Find(each.Finding.Key)?.Verdict is null or Verdict.Conforms, $"{each.Finding.Key}: {after.Find(each.Finding.Key)?.Verdict} by {string.Join(' ', Ids(remedy))}");
            Assert.Empty(Bad(after).Except(bad));
            if (decision == Decision.Simple)
            {
                Assert.Equal(after.Find(each.Finding.Key)?.Judgement.Margin?.Absolute ?? 0, remedy.After?.Absolute ?? 0, 1e-9);
            }
        }
    }

    private static HashSet<string> Bad(AuditResult audit) =>
        [.. audit.Findings.Where(finding => finding.Verdict is Verdict.Nonconforming or Verdict.Unproven).Select(finding => finding.Key)];
}
