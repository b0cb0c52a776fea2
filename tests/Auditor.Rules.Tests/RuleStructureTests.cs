using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;

namespace Auditor.Rules.Tests;

/// <summary>What every shipped rule must have.</summary>
public class RuleStructureTests
{
    private static readonly HashSet<string> RegisterIds = [.. Shipped.Register.Rows.Select(row => row.Id)];

    public static IEnumerable<TheoryDataRow<string>> Rules() => ShippedRule.Rows("rule");

    [Fact]
    public void Rule_ids_are_unique_former_ones_included()
    {
        var ids = ShippedRule.Set.Rules.SelectMany(rule => rule.Formerly.Append(rule.Id)).ToArray();
        Assert.Equal(ids.Length, ids.Distinct().Count());
    }

    [Theory]
    [MemberData(nameof(Rules))]
    public void A_rule_stands_in_a_file_of_its_name(string id) =>
        Assert.Equal(id, Path.GetFileNameWithoutExtension(ShippedRule.Of(id).Path));

    [Theory]
    [MemberData(nameof(Rules))]
    public void A_rule_has_a_case_that_conforms_and_one_that_does_not(string id)
    {
        Assert.Contains(Verdict.Conforms, ShippedRule.Verdicts(ShippedRule.Of(id)));
        Assert.Contains(Verdict.Nonconforming, ShippedRule.Verdicts(ShippedRule.Of(id)));
    }

    [Theory]
    [MemberData(nameof(Rules))]
    public void A_rule_that_can_lack_something_has_a_case_that_does(string id)
    {
        var rule = ShippedRule.Of(id);
        if (Presence.CanBeMissing(rule))
        {
            Assert.Contains(Verdict.Undetermined, ShippedRule.Verdicts(rule));
        }
    }

    [Theory]
    [MemberData(nameof(Rules))]
    public void A_rule_with_a_condition_has_a_case_that_it_does_not_apply_to(string id)
    {
        var rule = ShippedRule.Of(id);
        if (rule.When is not null)
        {
            Assert.Contains(null, ShippedRule.Verdicts(rule));
        }
    }

    [Theory]
    [MemberData(nameof(Rules))]
    public void A_comparison_has_a_case_at_its_limit(string id)
    {
        var rule = ShippedRule.Of(id);
        if (ShippedRule.Measures(rule))
        {
            Assert.Contains(ShippedRule.Runner.Judgements(rule), IsAtLimit);
        }
    }

    [Theory]
    [MemberData(nameof(Rules))]
    public void A_rule_covers_rows_of_the_register(string id)
    {
        var rule = ShippedRule.Of(id);
        Assert.Empty(rule.Covers.Except(RegisterIds));
        Assert.NotEmpty(rule.Clause.References);
    }

    [Theory]
    [MemberData(nameof(Rules))]
    public void A_comparison_says_its_value_or_limit(string id)
    {
        var rule = ShippedRule.Of(id);
        if (rule.Check.How != CheckKind.Require)
        {
            Assert.Contains(rule.Says.Parts, part => part.IsPlace);
        }
    }

    [Theory]
    [MemberData(nameof(Rules))]
    public void What_puts_a_rule_right_is_an_input(string id)
    {
        var rule = ShippedRule.Of(id);
        Assert.All(rule.PutRightBy, path => Assert.True(Inputs.Has(path), $"a design has no `{path}`"));
    }

    /// <summary>At its limit and keeping it.</summary>
    private static bool IsAtLimit(Judgement judgement) =>
        judgement is { Verdict: Verdict.Conforms, Margin: { } margin }
        && Math.Abs(margin.Absolute) <= 1e-9 * Math.Abs(judgement.Value.Number);
}
