namespace Auditor.Rules.Tests;

/// <summary>What every parameter of a shipped set must have.</summary>
public class ParameterTests
{
    [Fact]
    public void A_formula_uses_each_parameter()
    {
        var formulas = ShippedRule.Set.Quantities.Select(quantity => quantity.Formula.Text)
            .Concat(ShippedRule.Set.Rules.SelectMany(rule => rule.Check.Limits.Append(rule.Check.Value).Append(rule.When)).Select(formula => formula?.Text ?? ""));
        var all = string.Join('\n', formulas);
        Assert.Empty(ShippedRule.Set.Parameters.Where(parameter => !all.Contains("param." + parameter.Slot.Name, StringComparison.Ordinal)).Select(parameter => parameter.Id));
    }

    [Fact]
    public void Each_parameter_says_what_it_decides() =>
        Assert.Empty(ShippedRule.Set.Parameters.Where(parameter => string.IsNullOrWhiteSpace(parameter.About)).Select(parameter => parameter.Id));

    [Fact]
    public void A_figure_names_its_source() =>
        Assert.Empty(ShippedRule.Set.Parameters.Where(parameter => parameter.Trust is not null && parameter.Source.Length == 0).Select(parameter => parameter.Id));

    /// <summary>A change to a shipped figure in one set must say so with a source of its own.</summary>
    [Fact]
    public void The_United_Kingdom_set_gives_a_source_for_each_figure_that_it_changes() =>
        Assert.Empty(ShippedRule.Set.Parameters
            .Where(parameter => parameter.Span.Source.Path.EndsWith("united-kingdom.yaml", StringComparison.Ordinal) && parameter.Clause.Length == 0)
            .Select(parameter => parameter.Id));
}
