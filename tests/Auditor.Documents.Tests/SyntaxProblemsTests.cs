namespace Auditor.Documents.Tests;

public class SyntaxProblemsTests
{
    [Theory]
    [InlineData("a:1\nb: 2", "a key where the text of the line before goes on")]
    [InlineData("a: b: c", "a second key on the same line, or a key that is indented too far")]
    [InlineData("a: : b", "a colon where no value can follow")]
    [InlineData("a: ? b", "a `?` where no key can start")]
    [InlineData("a: - b", "a dash where no list item can start")]
    [InlineData("a: 1\n- b", "a `key: value` line is expected here")]
    [InlineData("- a\nb: 1", "a list item is expected here")]
    [InlineData("- a\nb", "a key without its colon")]
    [InlineData("{ a: 1 b: 2 }", "a comma or `}` is expected here")]
    [InlineData("[ a, 'b' 'c' ]", "a comma or `]` is expected here")]
    [InlineData("[ a,", "a value is expected here")]
    [InlineData("a: 'b", "the quoted text that starts here is not closed")]
    [InlineData("'a\n--- b", "the quoted text is not closed before the document ends")]
    [InlineData("\"\\q\"", "an escape that means nothing")]
    [InlineData("\"\\xg\"", "an escape without its hexadecimal digits")]
    [InlineData("\"\\ud800\\u0041\"", "the quoted text holds an escape that names no character")]
    [InlineData("a: @b", "a character that no value can start with")]
    [InlineData("a: |b", "the text block does not start or indent as it should")]
    [InlineData("a: >0\n b", "the text block does not start or indent as it should")]
    [InlineData("a: |\n   \n  b", "the text block does not start or indent as it should")]
    [InlineData("a:\n  b: \"c\nd\"", "the quoted text that starts here is not closed on its line")]
    [InlineData("a: \"b\"#c", "a comment that does not stand apart")]
    [InlineData("a: &[b", "an anchor or alias that cannot be read")]
    [InlineData("&a - b", "an anchor or alias that cannot be read")]
    [InlineData("a: !<b", "a tag that cannot be read")]
    [InlineData("a: !b!c d", "a tag that cannot be read")]
    [InlineData("%YAML 9.9\n---\na", "a directive that cannot be read")]
    [InlineData("%-", "a directive that cannot be read")]
    [InlineData("%YAML x", "a directive that cannot be read")]
    [InlineData("'a' 'b'", "something is left over after the end of the value")]
    [InlineData("a:\n\tb: 1", "a tab where only blanks may indent")]
    [InlineData("{ a: 1 }}", "a bracket is closed that was not opened")]
    [InlineData("a: [ 1\nb: 2\n", "the bracket that opens here is not closed, or what it holds is not YAML")]
    [InlineData("[-[", "the text is not YAML from here on")]
    public void A_fault_of_syntax_is_put_in_our_words(string text, string message)
    {
        Assert.Null(Yaml.Read(text, out var problems));

        var problem = Assert.Single(problems.All);
        Assert.Equal("yaml-syntax", problem.Code);
        Assert.Equal(message, problem.Message);
        Assert.NotNull(problem.Help);
    }

    [Fact]
    public void The_bracket_that_is_still_open_is_shown()
    {
        Yaml.Read("a: [ b, { c: 1,", out var problems);

        Assert.Equal("{", Assert.Single(problems.All[0].Labels).Span.Text);
    }

    [Fact]
    public void The_tab_itself_is_marked()
    {
        Yaml.Read("a:\n  b: 1\n  \tc: 2", out var problems);

        Assert.All(problems.All, problem => Assert.Equal(new Location(3, 3), problem.Span!.Value.StartLocation));
        Assert.Single(problems.All);
    }
}
