using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Engine.RuleTests;

namespace Auditor.Rules.Tests;

/// <summary>Small changes to the shipped rules and sheets, each of which some case must notice.</summary>
public class MutationTests
{
    private static readonly MutationRunner Mutations = new(ShippedRule.Set);
    private static readonly EquivalentMutation[] Equivalent = [.. EquivalentMutation.All()];

    [Theory]
    [InlineData(Shipped.Base)]
    [InlineData(Shipped.UnitedKingdom)]
    public void The_cases_notice_every_small_change(string set)
    {
        var report = new MutationRunner(Shipped.Set(set)).Run();
        Assert.InRange(report.Count, Shipped.Set(set).Rules.Count, int.MaxValue);
        var unnoticed = ProblemText.Render(
            report.Survivors.Where(mutation => !Array.Exists(Equivalent, known => known.Is(mutation))).Select(mutation => mutation.Unnoticed()));
        Assert.True(unnoticed.Length == 0, unnoticed);
    }

    [Fact]
    public void A_change_held_to_be_equivalent_survives_and_has_its_reason()
    {
        var survivors = Mutations.Run().Survivors;
        Assert.All(Equivalent, known =>
        {
            Assert.Contains(survivors, known.Is);
            Assert.NotEqual("", known.Reason);
        });
    }

    [Fact]
    public void Survivors_are_told_with_their_place_and_change()
    {
        var rule = WithCases(ShippedRule.Of("disconnection-tn"), "well inside the limit", "the earthing system is not stated");
        var survivors = Mutations.Run(rule).Survivors;
        Assert.Contains(survivors, mutation => Says(mutation, "Zs_max", "`Zs_max` is lowered by 1 %"));
        Assert.Contains(survivors, mutation => Says(mutation, "shock == 'ADS'", "this part of the condition is dropped"));
        Assert.DoesNotContain(survivors, mutation => Says(mutation, "Zs_max", "`at-most` becomes `at-least`"));
    }

    [Fact]
    public void A_rule_without_a_case_lets_every_change_pass()
    {
        var report = Mutations.Run(WithCases(ShippedRule.Of("disconnection-tn")));
        Assert.Equal(report.Count, report.Survivors.Count);
        Assert.InRange(report.Count, 9, int.MaxValue);
    }

    [Fact]
    public void The_same_set_gives_the_same_report()
    {
        var first = Mutations.Run();
        var second = Mutations.Run();
        Assert.Equal(first.Count, second.Count);
        Assert.Equal(first.Survivors, second.Survivors);
    }

    private static bool Says(Mutation mutation, string place, string change) =>
        mutation.Owner == "disconnection-tn" && mutation.Span.Text == place && mutation.Change == change;

    /// <summary>The rule with only some of its cases.</summary>
    private static Rule WithCases(Rule rule, params string[] names)
    {
        var span = rule.Node.Span;
        var cases = new SequenceNode(span, [.. ShippedRule.Cases(rule).Where(node => names.Contains(node.Text("name")))]);
        var entries = rule.Node.Entries.Select(entry => entry.Key.Value == "cases" ? entry with { Value = cases } : entry);
        return rule with { Node = new MappingNode(span, [.. entries]) };
    }
}
