using Auditor.Engine.RuleTests;

namespace Auditor.Rules.Tests;

public class FormulaOutlineTests
{
    [Fact]
    public void A_formula_is_split_at_and_outside_brackets_and_words() =>
        Assert.Equal(
            ["has(serves ?? none, 'a && b')", "(x || y)", "z > 3"],
            Texts(FormulaOutline.Conjuncts("has(serves ?? none, 'a && b') && (x || y) && z > 3")));

    [Theory]
    [InlineData("a && b || c")]
    [InlineData("a ?? b && c")]
    [InlineData("a")]
    public void A_formula_with_a_looser_operator_at_its_top_is_one_conjunct(string formula) =>
        Assert.Equal([formula], Texts(FormulaOutline.Conjuncts(formula)));

    [Fact]
    public void Conditions_are_found_inside_brackets_and_negations() =>
        Assert.Equal(["a == 'x'", "b", "given(c)", "!d"], Texts(FormulaOutline.Conditions("a == 'x' && (b || !(given(c) && !d))")));

    [Fact]
    public void Brackets_that_do_not_enclose_the_whole_stay() =>
        Assert.Equal(["(a + b) * (c + d) > 1"], Texts(FormulaOutline.Conditions("(a + b) * (c + d) > 1")));

    [Fact]
    public void A_comparison_ends_where_its_bracket_or_a_looser_operator_does()
    {
        var comparisons = FormulaOutline.Comparisons("any_of(circuits, In <= (32 A) * 2) && x != 'a<b' || y >= max(1, z)");
        Assert.Equal(["<=", "!=", ">="], comparisons.Select(comparison => comparison.Operator.Text));
        Assert.Equal(["(32 A) * 2", "'a<b'", "max(1, z)"], comparisons.Select(comparison => comparison.Right.Text));
        Assert.Equal([true, false, true], comparisons.Select(comparison => comparison.IsOrdered));
    }

    [Fact]
    public void Places_are_those_of_the_text()
    {
        const string Formula = "a &&  load.power > 0.37 kW ";
        var second = FormulaOutline.Conjuncts(Formula)[1];
        var sign = FormulaOutline.Comparisons(Formula)[0].Operator;
        Assert.Equal("load.power > 0.37 kW", Formula[second.Start..second.End]);
        Assert.Equal(">", Formula[sign.Start..sign.End]);
    }

    private static IEnumerable<string> Texts(IEnumerable<FormulaPart> parts) => parts.Select(part => part.Text);
}
