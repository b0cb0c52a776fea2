using CsCheck;

namespace Auditor.Documents.Tests;

public class SourceTextTests
{
    private static readonly Gen<string> Texts = Gen.OneOf("a", "é", "𝄞", " ", "\t", "\n", "\r", "\r\n", "word").Array[0, 40].Select(string.Concat);

    [Fact]
    public void Lines_end_at_each_kind_of_line_break()
    {
        var source = new SourceText("a.yaml", "one\ntwo\r\nthree\rfour\n");

        Assert.Equal(5, source.LineCount);
        Assert.Equal(["one", "two", "three", "four", ""], Enumerable.Range(1, 5).Select(source.LineAt));
    }

    [Fact]
    public void Columns_count_from_one()
    {
        var source = new SourceText("a.yaml", "one\ntwo");

        Assert.Equal(new Location(1, 1), source.LocationOf(0));
        Assert.Equal(new Location(1, 4), source.LocationOf(3));
        Assert.Equal(new Location(2, 1), source.LocationOf(4));
        Assert.Equal(new Location(2, 4), source.LocationOf(7));
    }

    [Fact]
    public void An_empty_text_has_one_empty_line()
    {
        var source = new SourceText("a.yaml", "");

        Assert.Equal(new Location(1, 1), source.LocationOf(0));
        Assert.Equal("", source.LineAt(1));
    }

    [Theory]
    [InlineData(-1)]
    [InlineData(4)]
    public void An_offset_outside_the_text_is_refused(int offset)
        => Assert.Throws<ArgumentOutOfRangeException>(() => new SourceText("a.yaml", "abc").LocationOf(offset));

    [Theory]
    [InlineData(0)]
    [InlineData(3)]
    public void A_line_outside_the_text_is_refused(int line)
        => Assert.Throws<ArgumentOutOfRangeException>(() => new SourceText("a.yaml", "abc\ndef").LineAt(line));

    [Fact]
    public void Places_agree_with_counting_from_the_start() => Texts.Sample(text =>
    {
        var source = new SourceText("a.yaml", text);
        var (line, column) = (1, 1);
        for (var offset = 0; offset <= text.Length; offset++)
        {
            Assert.Equal(new Location(line, column), source.LocationOf(offset));
            var endsLine = offset < text.Length && (text[offset] == '\n' || (text[offset] == '\r' && text.ElementAtOrDefault(offset + 1) != '\n'));
            (line, column) = endsLine ? (line + 1, 1) : (line, column + 1);
        }
    });

    [Fact]
    public void Lines_and_their_breaks_make_up_the_text() => Texts.Sample(text =>
    {
        var source = new SourceText("a.yaml", text);
        var lines = Enumerable.Range(1, source.LineCount).Select(source.LineAt);
        Assert.Equal(text.Replace("\r\n", "\n").Replace('\r', '\n'), string.Join('\n', lines));
    });

    [Fact]
    public void A_slice_is_cut_to_its_span()
    {
        var span = new SourceSpan(new SourceText("a.yaml", "0123456789"), 2, 6);

        Assert.Equal("34", span.Slice(1, 2).Text);
        Assert.Equal("5", span.Slice(3, 100).Text);
        Assert.Equal("", span.Slice(100, 1).Text);
        Assert.Equal("23", span.Slice(-5, 2).Text);
    }

    [Fact]
    public void Values_are_equal_wherever_they_stand()
    {
        var source = new SourceText("a.yaml", "x x");
        var first = new Located<string>("x", new SourceSpan(source, 0, 1));
        var second = new Located<string>("x", new SourceSpan(source, 2, 3));

        Assert.Equal(first, second);
        Assert.Equal(first.GetHashCode(), second.GetHashCode());
        Assert.NotEqual(first, first with { Value = "y" });
    }
}
