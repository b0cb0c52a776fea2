using System.Diagnostics;
using Auditor.Documents;

namespace Auditor.Formulas.Tests;

/// <summary>The function <c>matches</c>: a whole text against a regular expression that cannot hold up the program.</summary>
public class PatternTests
{
    [Theory]
    [InlineData("matches('DB12', 'DB[0-9]+')", "true")]
    [InlineData("matches('DB12', 'DB[0-9]')", "false")]
    [InlineData("matches('xDB1', 'DB[0-9]')", "false")]
    [InlineData("matches('db1', 'DB[0-9]')", "false")]
    [InlineData("matches('ring', 'ring|radial')", "true")]
    [InlineData("matches('ringx', 'ring|radial')", "false")]
    [InlineData("matches('', '')", "true")]
    [InlineData("matches('7', '[0-9]{2}')", "false")]
    [InlineData("matches('Küche, Süd', '[A-Z].+, .+')", "true")]
    [InlineData("matches(choose(true, 'ring', 'star'), 'r[a-z]+')", "true")]
    [InlineData("!matches('ring', 'star')", "true")]
    public void A_pattern_speaks_of_the_whole_text(string formula, string value) => Assert.Equal(value, Bound.Truth(formula));

    [Theory]
    [InlineData("(a+)+b")]
    [InlineData("(a|aa)+b")]
    [InlineData("(.*)(.*)(.*)(.*)(.*)b")]
    public void A_pattern_that_others_choke_on_takes_no_time(string pattern)
    {
        var clock = Stopwatch.StartNew();
        Assert.Equal("false", Bound.Truth($"matches(kind, '{pattern}')", new Thing(Plant.Circuit).Say(("kind", new string('a', 4000)))));
        Assert.InRange(clock.Elapsed, TimeSpan.Zero, TimeSpan.FromSeconds(5));
    }

    [Theory]
    [InlineData("a)(b", "a bracket `)` closes nothing at character 2")]
    [InlineData("(a", "a bracket `(` is not closed at character 2")]
    [InlineData("[a", "a bracket `[` is not closed at character 2")]
    [InlineData("*a", "there is nothing to repeat at character 1")]
    [InlineData("[z-a]", "a range runs backwards at character 4")]
    [InlineData("a{3,1}", "a number of repetitions runs backwards at character 6")]
    [InlineData("(?=a)b", "it looks around, refers back or counts too far")]
    [InlineData("(?<!a)b", "it looks around, refers back or counts too far")]
    [InlineData("((a{1000}){1000}){1000}", "it looks around, refers back or counts too far")]
    public void A_pattern_that_is_none_is_told_at_its_place(string pattern, string fault)
    {
        var problem = Assert.Single(Problems($"matches(kind, '{pattern}')"));
        Assert.Equal($"this pattern cannot be used: {fault}", problem.Message);
        Assert.Equal($"'{pattern}'", problem.Span!.Value.Text);
    }

    [Theory]
    [InlineData("matches(kind)", "`matches` is called as `matches(text, 'pattern')`")]
    [InlineData("matches(Z, 'a')", "`matches` needs a text, and this is a quantity in Ω")]
    [InlineData("matches(kind, kind)", "anything but a pattern in quotes may not stand in a formula")]
    public void A_call_of_another_form_is_told(string formula, string message) => Assert.Equal(message, Assert.Single(Problems(formula)).Message);

    [Theory]
    [InlineData(4000, "true")]
    [InlineData(4001, "false")]
    public void A_text_beyond_all_sense_fits_no_pattern(int length, string value) =>
        Assert.Equal(value, Bound.Truth("matches(kind, 'a*')", new Thing(Plant.Circuit).Say(("kind", new string('a', length)))));

    [Fact]
    public void A_pattern_has_a_greatest_length() =>
        Assert.Contains("longer than 200 characters", Assert.Single(Problems($"matches(kind, '{new string('a', 201)}')")).Message, StringComparison.Ordinal);

    private static IReadOnlyList<Problem> Problems(string formula)
    {
        Assert.Null(Bound.TryFormula(formula, Plant.Circuit, out var problems));
        return problems.All;
    }
}
