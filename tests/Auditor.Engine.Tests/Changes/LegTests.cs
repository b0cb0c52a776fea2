using Auditor.Engine.Adjustments;
using Auditor.Engine.Findings;
using Auditor.Engine.Remedies;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Tests.Changes;

/// <summary>Runs of several legs: what is changed together, what follows from it, and how it is written.</summary>
public class LegTests
{
    private const string Run = "of: circuit\ncompare: { value: \"sum_of(legs, length / csa * (1 mm2))\", at-most: 10.2 m }\n";

    private const string Together = Runs.Size + "legs: all\nalso: { cpc: csa, neutral-csa: 2 * csa }\n";

    private const string TwoAlike = "{ csa: 1.5 mm², cpc: 1.5 mm², length: 14 m }, { csa: 1.5 mm², cpc: 1.5 mm², length: 13 m }";

    private const string TwoUnlike = "{ csa: 1.5 mm², length: 20 m }, { csa: 4 mm², length: 3 m }";

    [Fact]
    public void Legs_that_are_alike_change_together_with_all_that_follows()
    {
        var (_, remedy) = Put(TwoAlike);

        Assert.Equal(
            [
                "A/1/leg 1 csa = 4 mm²", "A/1/leg 1 cpc = 4 mm²", "A/1/leg 1 neutral-csa = 8 mm²",
                "A/1/leg 2 csa = 4 mm²", "A/1/leg 2 cpc = 4 mm²", "A/1/leg 2 neutral-csa = 8 mm²",
            ],
            remedy.Inputs.Select(Shown));
        Assert.Equal("A/1", Assert.Single(remedy.Changes).Place.Subject.Key);
    }

    [Fact]
    public void What_follows_is_written_into_the_design_as_well()
    {
        var (audit, remedy) = Put(TwoAlike);

        var text = Assert.Single(DesignEdits.Of(audit.Design, remedy.Inputs)).After;

        Assert.Equal(3, text.Split("4 mm², cpc: 4 mm²").Length);
        Assert.Equal(3, text.Split("neutral-csa: 8 mm²").Length);
    }

    [Fact]
    public void Legs_that_are_not_alike_change_each_by_itself()
    {
        var (_, remedy) = Put(TwoUnlike, Runs.Size + "legs: all\n");

        Assert.Equal(["A/1/leg 1 csa = 2.5 mm²"], remedy.Inputs.Select(Shown));
        Assert.Equal("A/1/leg 1", Assert.Single(remedy.Changes).Place.Subject.Key);
    }

    [Fact]
    public void Legs_that_are_alike_change_each_by_itself_where_that_is_how_they_are_changed()
    {
        var places = Places(TwoAlike, Runs.Size + "legs: each\n");

        Assert.Equal(["A/1/leg 1", "A/1/leg 2"], places.Select(place => place.Subject.Key));
        Assert.All(places, place => Assert.Single(place.Holders));
    }

    [Fact]
    public void A_leg_that_states_nothing_has_nothing_to_change() =>
        Assert.Equal(["A/1/leg 2"], Places("{ csa: 1.5 mm² }, { csa: 1.5 mm², length: 12 m }", Runs.Length).Select(place => place.Subject.Key));

    [Fact]
    public void A_size_between_those_of_the_series_is_one_of_its_steps()
    {
        var place = Assert.Single(Places("{ csa: 3 mm², length: 12 m }", Runs.Size));

        Assert.Equal([1.5, 2.5, 3, 4, 6], place.Steps()!.Select(step => Math.Round(step.Number * 1e6, 6)));
    }

    [Fact]
    public void The_remedies_of_a_finding_are_found_by_its_key()
    {
        var (audit, _) = Put(TwoAlike);
        var result = RemedySearch.Run(audit, RemedySearch.Wanting(audit));

        Assert.Equal("run:A/1", result.Of("run:A/1")!.Finding.Key);
        Assert.Null(result.Of("run:A/2"));
    }

    private static (AuditResult Audit, Remedy Remedy) Put(string legs, string size = Together)
    {
        var audit = Runs.Audit(Design(legs), Set(size));
        return (audit, Assert.Single(RemedySearch.Run(audit, RemedySearch.Wanting(audit)).Findings[0].Remedies));
    }

    private static IReadOnlyList<Adjustable> Places(string legs, string adjustment) => Adjustables.WithLimits(Runs.Build(Design(legs), Set(adjustment)));

    private static RuleSet Set(string adjustment) => Runs.Set([("run", Run)], ("it", adjustment));

    private static string Design(string legs) =>
        Runs.Design("1 m").Replace("cable: { csa: 1.5 mm², length: 1 m }", $"legs: [{legs}]", StringComparison.Ordinal);

    private static string Shown(ChangedInput changed) => $"{changed.Input} = {ValueText.Show(changed.After, changed.Input.Slot.Unit)}";
}
