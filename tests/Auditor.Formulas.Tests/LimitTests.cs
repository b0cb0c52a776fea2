namespace Auditor.Formulas.Tests;

/// <summary>Formulas at the limits of what is read: nothing hangs, overflows the stack or passes in silence.</summary>
public class LimitTests
{
    [Fact]
    public void A_formula_may_have_two_thousand_characters_and_no_more()
    {
        Assert.Empty(CodesOf("1" + new string(' ', 1999)));
        Assert.Equal(["formula-too-long"], CodesOf("1" + new string(' ', 2000)));
        Assert.Equal(["formula-too-long"], CodesOf("'" + new string('x', 1_000_000) + "'"));
    }

    [Fact]
    public void A_chain_or_nest_may_be_sixty_deep_and_no_more()
    {
        Assert.Empty(CodesOf(string.Join(" + ", Enumerable.Repeat("n", 50))));
        Assert.Empty(CodesOf(Nested("(", 50, "n", ")")));
        Assert.Equal("50", Bound.Truth(string.Join(" + ", Enumerable.Repeat("n", 50)), new Thing(Plant.Circuit).Say(("n", "1"))));
        Assert.Equal(["formula-too-deep"], CodesOf(string.Join(" + ", Enumerable.Repeat("n", 70))));
    }

    [Theory]
    [InlineData("(", "n", ")")]
    [InlineData("sqrt(", "n", ")")]
    [InlineData("!", "on", "")]
    [InlineData("- ", "n", "")]
    [InlineData("n + ", "n", "")]
    [InlineData("n ?? ", "n", "")]
    [InlineData("n ^ ", "n", "")]
    [InlineData("n ", "n", "")]
    [InlineData("up.", "Zdb", "")]
    [InlineData("[", "n", "]")]
    [InlineData("{a:", "n", "}")]
    [InlineData("@", "n", "")]
    [InlineData("min(n, ", "n", ")")]
    [InlineData("sum_of(legs, ", "length", ")")]
    public void However_deep_a_formula_goes_it_is_told_to_be_too_deep(string open, string core, string close)
    {
        var depth = 1990 / (open.Length + close.Length);

        Assert.Equal(["formula-too-deep"], CodesOf(Nested(open, Math.Min(depth, 900), core, close)));
    }

    [Theory]
    [InlineData("1e99999999")]
    [InlineData("1e99999999999999999999")]
    [InlineData("1.5e99999999 V")]
    [InlineData("0x9")]
    [InlineData("2 * 1e999999")]
    public void A_number_of_absurd_size_takes_no_time(string formula)
    {
        var watch = System.Diagnostics.Stopwatch.StartNew();
        var codes = CodesOf(formula);

        Assert.Single(codes);
        Assert.True(watch.Elapsed < TimeSpan.FromSeconds(2));
    }

    [Fact]
    public void A_number_of_a_thousand_digits_is_too_large_or_read_as_it_is()
    {
        Assert.Equal(["number-too-large"], CodesOf(new string('9', 1000)));
        Assert.Equal(1e300, Bound.Number("1" + new string('0', 300)));
        Assert.Equal(0, Bound.Number("0." + new string('0', 1000) + "1"));
    }

    private static string Nested(string open, int depth, string core, string close) =>
        string.Concat(Enumerable.Repeat(open, depth)) + core + string.Concat(Enumerable.Repeat(close, depth));

    private static IEnumerable<string> CodesOf(string formula)
    {
        Bound.TryFormula(formula, Plant.Circuit, out var problems);
        return problems.All.Select(problem => problem.Code);
    }
}
