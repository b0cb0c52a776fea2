using Auditor.Documents;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Curves;
using Auditor.Formulas.Tables;
using Auditor.Quantities;

namespace Auditor.Formulas.Tests;

/// <summary>Words that an input can never be, and parts that are no formula, are told wherever they stand.</summary>
public class WordTests
{
    [Theory]
    [InlineData("(kind ?? kind) == 'rind'")]
    [InlineData("choose(on, kind, kind) == 'rind'")]
    [InlineData("choose(on, kind, 'radial') == 'rind'")]
    public void Words_stay_known_where_both_sides_have_them(string formula) => Assert.Equal(["unknown-word"], CodesOf(formula));

    [Theory]
    [InlineData("(kind ?? device.curve) == 'B'")]
    [InlineData("(device.curve ?? kind) == 'ring'")]
    [InlineData("choose(on, kind, device.curve) == 'C'")]
    [InlineData("(kind ?? 'none of them') == 'none of them'")]
    public void Where_two_inputs_have_other_words_either_may_be_meant(string formula) => Assert.Empty(CodesOf(formula));

    [Theory]
    [InlineData("kind", "'rind'")]
    [InlineData("'rind'", "kind")]
    public void A_limit_and_a_value_that_cannot_be_the_same_word_are_told_of(string value, string limit)
    {
        var problems = new Problems();
        FormulaBinder.CheckWords(Bound.Formula(value), Bound.Formula(limit), problems);

        Assert.Equal("unknown-word", Assert.Single(problems.All).Code);
    }

    [Theory]
    [InlineData("(n + 1).Z")]
    [InlineData("sqrt(n).Z")]
    [InlineData("'up'.Zdb")]
    public void Nothing_but_a_name_has_parts(string formula) => Assert.NotEmpty(CodesOf(formula));

    [Theory]
    [InlineData("one_of(on, 'ring')")]
    [InlineData("one_of(kind, 'rind')")]
    [InlineData("on && n")]
    [InlineData("n || on")]
    [InlineData("trip_current(n, 'B', 32 A, 5 s)")]
    [InlineData("trip_current('EN 60898', n, 32 A, 5 s)")]
    [InlineData("trip_current('EN 60898', 'B', 32, 5 s)")]
    [InlineData("trip_time('EN 60898', 'B', 32 A, 5 s)")]
    public void A_call_with_one_bad_part_is_no_formula(string formula)
    {
        Assert.Null(Bound.TryFormula(formula, Plant.Circuit, out var problems));
        Assert.Single(problems.All);
    }

    [Fact]
    public void A_table_may_have_more_keys_than_any_of_ours()
    {
        var lookup = new Lookup("wide", "", [.. "abcdefghi".Select(name => new LookupKey($"{name}", Unit.One, Between.None))], Unit.One, "");
        lookup.Enter([1.0, 2.0, 3.0, 4.0, 5.0, 6.0, 7.0, 8.0, 9.0], new TableCell(new TableSource("wide", "Wide", [], "wide.yaml"), "", "", 42, null, Trust.OneSource, 1));
        lookup.Close();
        var text = "table('wide', 1, 2, 3, 4, 5, 6, 7, 8, 9)";
        var formula = FormulaBinder.Bind(
            new ScalarNode(new SourceText("formula", text).WholeSpan(), text, ScalarKind.Text), Plant.Circuit,
            new FormulaWorld(new Dictionary<string, Lookup> { ["wide"] = lookup }, new CurveSet(), Plant.Parameters), null, new Problems());

        Assert.Equal(42, formula!.Evaluate(new Thing(Plant.Circuit).Scope).Number);
    }

    private static IEnumerable<string> CodesOf(string formula)
    {
        Bound.TryFormula(formula, Plant.Circuit, out var problems);
        return problems.All.Select(problem => problem.Code);
    }
}
