namespace Auditor.Documents.Tests;

public class ScalarPlacesTests
{
    private static ScalarNode ValueOf(string text) => Assert.IsType<ScalarNode>(Assert.IsType<MappingNode>(Yaml.Read(text)).Find("a"));

    [Theory]
    [InlineData("a: plain X text")]
    [InlineData("a: \"quoted X text\"")]
    [InlineData("a: 'quoted X text'")]
    [InlineData("a: 'it''s X'")]
    [InlineData("a: \"tab \\t, quote \\\", \\x41 \\u00e9 \\U0001d11e X\"")]
    [InlineData("a: |\n  first\n  second X\n")]
    [InlineData("a: >-\n  first\n  second X\n")]
    [InlineData("a: |+\n    deep\n      deeper X\n\n")]
    [InlineData("a: plain\n  on two X lines")]
    [InlineData("a: \"quoted\n  on two X lines\"")]
    [InlineData("a: \"quoted \\\n  on two X lines\"")]
    [InlineData("a: |\r\n  first\r\n  second X\r\n")]
    [InlineData("a: !!str X")]
    public void A_character_of_the_text_is_found_in_the_source(string text)
    {
        var scalar = ValueOf(text);

        Assert.Equal(text.IndexOf('X'), scalar.OffsetOf(scalar.Text.IndexOf('X')));
    }

    [Fact]
    public void The_end_of_the_text_is_after_its_last_character()
    {
        Assert.Equal("a: text".Length, ValueOf("a: text").OffsetOf(4));
        Assert.Equal("a: 'text".Length, ValueOf("a: 'text'").OffsetOf(4));
    }

    [Fact]
    public void A_part_of_the_text_has_its_span()
    {
        Assert.Equal("mn", ValueOf("a: 25 mn").SpanOf(3, 2).Text);
        Assert.Equal("mn", ValueOf("a: \"25 mn\"").SpanOf(3, 2).Text);
        Assert.Equal("", ValueOf("a: 25 mn").SpanOf(2, 0).Text);
    }

    [Theory]
    [InlineData(-1)]
    [InlineData(5)]
    public void An_index_outside_the_text_is_refused(int index)
        => Assert.Throws<ArgumentOutOfRangeException>(() => ValueOf("a: text").OffsetOf(index));
}
