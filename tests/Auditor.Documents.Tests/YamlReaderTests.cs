namespace Auditor.Documents.Tests;

public class YamlReaderTests
{
    // YAML 1.2.2, section 10.3.2; `.inf`, `.nan` and numbers beyond the finite ones are texts here.
    [Theory]
    [InlineData("null", ScalarKind.Null)]
    [InlineData("Null", ScalarKind.Null)]
    [InlineData("NULL", ScalarKind.Null)]
    [InlineData("~", ScalarKind.Null)]
    [InlineData("nULL", ScalarKind.Text)]
    [InlineData("true", ScalarKind.Flag)]
    [InlineData("False", ScalarKind.Flag)]
    [InlineData("TRUE", ScalarKind.Flag)]
    [InlineData("tRUE", ScalarKind.Text)]
    [InlineData("yes", ScalarKind.Text)]
    [InlineData("no", ScalarKind.Text)]
    [InlineData("on", ScalarKind.Text)]
    [InlineData("off", ScalarKind.Text)]
    [InlineData("0", ScalarKind.Number)]
    [InlineData("-12", ScalarKind.Number)]
    [InlineData("+12", ScalarKind.Number)]
    [InlineData("0o17", ScalarKind.Number)]
    [InlineData("0xFf", ScalarKind.Number)]
    [InlineData("0o18", ScalarKind.Text)]
    [InlineData("0x", ScalarKind.Text)]
    [InlineData("1_000", ScalarKind.Text)]
    [InlineData("12:30", ScalarKind.Text)]
    [InlineData("2026-09-14", ScalarKind.Text)]
    [InlineData("0.", ScalarKind.Number)]
    [InlineData(".5", ScalarKind.Number)]
    [InlineData("-1.5e-3", ScalarKind.Number)]
    [InlineData("1e3", ScalarKind.Number)]
    [InlineData(".", ScalarKind.Text)]
    [InlineData("+", ScalarKind.Text)]
    [InlineData("1e", ScalarKind.Text)]
    [InlineData("1e999", ScalarKind.Text)]
    [InlineData(".inf", ScalarKind.Text)]
    [InlineData("-.INF", ScalarKind.Text)]
    [InlineData(".nan", ScalarKind.Text)]
    [InlineData("NaN", ScalarKind.Text)]
    [InlineData("٣", ScalarKind.Text)]
    [InlineData("\"12\"", ScalarKind.Text)]
    [InlineData("'true'", ScalarKind.Text)]
    [InlineData("\"\"", ScalarKind.Text)]
    [InlineData("!!str 12", ScalarKind.Text)]
    [InlineData("! true", ScalarKind.Text)]
    [InlineData("!!float 12", ScalarKind.Number)]
    public void A_scalar_is_what_the_core_schema_says(string text, ScalarKind kind) => Assert.Equal(kind, Yaml.Scalar(text).Kind);

    [Theory]
    [InlineData("-12", -12.0)]
    [InlineData("0o17", 15.0)]
    [InlineData("0xFf", 255.0)]
    [InlineData(".5", 0.5)]
    [InlineData("-1.5e-3", -0.0015)]
    [InlineData("0123", 123.0)]
    public void A_number_has_its_value(string text, double number) => Assert.Equal(number, Yaml.Scalar(text).Number);

    [Fact]
    public void A_flag_has_its_value()
    {
        Assert.True(Yaml.Scalar("True").Flag);
        Assert.False(Yaml.Scalar("false").Flag);
    }

    [Fact]
    public void What_a_scalar_is_not_cannot_be_asked_of_it()
    {
        Assert.Throws<InvalidOperationException>(() => Yaml.Scalar("text").Number);
        Assert.Throws<InvalidOperationException>(() => Yaml.Scalar("12").Flag);
    }

    [Fact]
    public void A_mapping_finds_its_keys()
    {
        var mapping = Assert.IsType<MappingNode>(Yaml.Read("b: 1\n'a': two\n3: c\n"));

        Assert.Equal(["b", "a", "3"], mapping.Entries.Select(entry => entry.Key.Value));
        Assert.Equal("two", Assert.IsType<ScalarNode>(mapping.Find("a")).Text);
        Assert.Equal("'a'", mapping.Entry("a")!.Key.Span.Text);
        Assert.Null(mapping.Find("c"));
        Assert.False(mapping.IsPartial);
    }

    [Theory]
    [InlineData("a: { b: 1, c: [2, 3] } # end", "{ b: 1, c: [2, 3] }")]
    [InlineData("a: [\n  1,\n  2\n]\n", "[\n  1,\n  2\n]")]
    [InlineData("a:\n  b: 1\n  c: 2\n\n# end\n", "b: 1\n  c: 2")]
    [InlineData("a:\n- 1\n- 2\n", "- 1\n- 2")]
    [InlineData("a: {}\n", "{}")]
    [InlineData("a: []", "[]")]
    [InlineData("a: plain text   # end\n", "plain text")]
    [InlineData("a: \"quoted # text\"\n", "\"quoted # text\"")]
    [InlineData("a: one\n  two\nb: 1\n", "one\n  two")]
    [InlineData("a:\nb: 1\n", "")]
    [InlineData("a: !!map { b: 1 }\n", "!!map { b: 1 }")]
    public void A_value_spans_just_what_states_it(string text, string expected)
        => Assert.Equal(expected, Assert.IsType<MappingNode>(Yaml.Read(text)).Find("a")!.Span.Text);

    [Fact]
    public void A_pair_inside_brackets_ends_before_the_bracket()
    {
        var sequence = Assert.IsType<SequenceNode>(Yaml.Read("[ a: 1, b ]"));

        Assert.Equal("a: 1", sequence.Items[0].Span.Text);
        Assert.Equal("[ a: 1, b ]", sequence.Span.Text);
    }

    [Fact]
    public void A_collection_with_a_refused_part_is_partial()
    {
        var root = Assert.IsType<MappingNode>(Yaml.Read("a: { b: *x }\nc: [*y, 1]\nd: { e: 1 }\n", out var problems));

        Assert.Equal(["alias", "alias"], problems.Codes());
        Assert.True(root.Find("a")!.IsPartial);
        Assert.True(root.Find("c")!.IsPartial);
        Assert.False(root.Find("d")!.IsPartial);
        Assert.False(root.IsPartial);
    }

    [Fact]
    public void A_text_that_did_not_come_from_a_file_is_held_to_the_same_characters()
    {
        Assert.Null(Yaml.Read("a: 1\0\nb: [", out var problems));
        Assert.Equal(["forbidden-character"], problems.Codes());
    }

    [Fact]
    public void Characters_that_stand_for_nothing_are_refused()
    {
        foreach (var text in new[] { "\ud800", "a: \udc00\ud800", "\ufeffa: 1", "a: \u0085", "a: \u007f", "a: \uffff" })
        {
            Assert.Null(Yaml.Read(text, out var problems));
            Assert.Equal(["forbidden-character"], problems.Codes());
        }
    }

    [Fact]
    public void Nesting_of_64_is_read()
    {
        var text = new string('[', 64) + new string(']', 64);

        Assert.Equal(64, Yaml.Read(text).AndAllBelow().Count());
        Assert.Null(Yaml.Read("[" + text + "]", out var problems));
        Assert.Equal(["too-deep"], problems.Codes());
    }

    // Each of these is a few megabytes; a reader that takes a time that grows with the square of the size would not come to an end.
    [Theory]
    [InlineData("[", 2_000_000, "too-deep")]
    [InlineData("- ", 1_000_000, "too-deep")]
    [InlineData("? ", 1_000_000, "too-deep")]
    [InlineData("{a: ", 500_000, "too-deep")]
    [InlineData("a:\n", 1_000_000, "duplicate-key")]
    [InlineData("&a ", 1_000_000, "yaml-syntax")]
    [InlineData("*a\n", 1_000_000, "yaml-syntax")]
    [InlineData("!a ", 1_000_000, "yaml-syntax")]
    [InlineData("\"", 1_999_999, "yaml-syntax")]
    [InlineData("- !x &y *z\n", 200_000, "yaml-syntax")]
    [InlineData("---\n", 500_000, "second-document")]
    [InlineData("- [\n", 500_000, "yaml-syntax")]
    public void A_huge_hostile_text_comes_to_an_end(string part, int times, string code)
    {
        Yaml.Read(string.Concat(Enumerable.Repeat(part, times)), out var problems);

        Assert.Contains(code, problems.Codes());
        Assert.InRange(problems.All.Count, 1, Problems.PerFile + 1);
    }

    [Theory]
    [InlineData("word ", 1_000_000)]
    [InlineData("line\n", 1_000_000)]
    [InlineData("# comment\n", 500_000)]
    public void A_huge_harmless_text_comes_to_an_end(string part, int times)
    {
        var node = Yaml.Read("a: 1\nb: x\n  " + string.Concat(Enumerable.Repeat(part, times)).Replace("\n", "\n  ") + "\n", out var problems);

        Assert.NotNull(node);
        Assert.Empty(problems.All);
    }
}
