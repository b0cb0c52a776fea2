using Auditor.Engine.RuleSets;

namespace Auditor.Rules.Tests;

/// <summary>What every parameter of a shipped set must have.</summary>
public class ParameterTests
{
    private static readonly IReadOnlyList<Parameter> All = ShippedRule.Set.Parameters;

    [Fact]
    public void A_formula_uses_each_parameter()
    {
        var ofRules = ShippedRule.Set.Rules.SelectMany(rule => rule.Check.Limits.Append(rule.Check.Value).Append(rule.When));
        var formulas = ShippedRule.Set.Quantities.Select(quantity => quantity.Formula).Concat(ofRules).Select(formula => formula?.Text ?? "");
        var all = string.Join('\n', formulas);
        Assert.All(All, parameter => Assert.Contains("param." + parameter.Slot.Name, all, StringComparison.Ordinal));
    }

    [Fact]
    public void Each_parameter_says_what_it_decides() =>
        Assert.All(All, parameter => Assert.False(string.IsNullOrWhiteSpace(parameter.About), parameter.Id));

    [Fact]
    public void A_figure_names_its_source() =>
        Assert.All(All.Where(parameter => parameter.Trust is not null), parameter => Assert.False(parameter.Source.Length == 0, parameter.Id));

    [Fact]
    public void The_United_Kingdom_set_names_the_clause_of_each_parameter_that_it_changes() =>
        Assert.All(
            All.Where(parameter => parameter.Span.Source.Path.EndsWith("united-kingdom.yaml", StringComparison.Ordinal)),
            parameter => Assert.False(parameter.Clause.Length == 0, parameter.Id));
}
