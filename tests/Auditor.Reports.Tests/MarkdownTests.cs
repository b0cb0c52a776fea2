using Auditor.Reports.Files;

namespace Auditor.Reports.Tests;

/// <summary>What a design says is shown in Markdown as it says it, wherever it stands.</summary>
public class MarkdownTests
{
    [Theory]
    [InlineData("a | b", @"a \| b")]
    [InlineData("`rm`", @"\`rm\`")]
    [InlineData("<b>", "&lt;b>")]
    [InlineData("[a](b)", @"\[a\](b)")]
    [InlineData("![a](b)", @"!\[a\](b)")]
    [InlineData(@"a\|b", @"a\\\|b")]
    [InlineData("*a* ~~b~~ $c$", @"\*a\* \~\~b\~\~ \$c\$")]
    [InlineData("_a_ but Zs_max", @"\_a\_ but Zs_max")]
    [InlineData("&lt; and R & D", "&amp;lt; and R & D")]
    [InlineData("see http://x.example or www.x.example", @"see http\://x.example or www\.x.example")]
    [InlineData("C# or #1", @"C# or \#1")]
    [InlineData("one\n\n# two", @"one \# two")]
    [InlineData("turned\u202Earound", "turned\uFFFDaround")]
    [InlineData("Zs 1.37 Ω, 2.5 mm²", "Zs 1.37 Ω, 2.5 mm²")]
    public void Text_within_a_line_is_inert(string said, string written) =>
        Assert.Equal($"Job: {written}\n", Write("Job: {{ report.project.title }}", said));

    [Theory]
    [InlineData("- a", @"\- a")]
    [InlineData("+ a", @"\+ a")]
    [InlineData("> a", @"\> a")]
    [InlineData("# a", @"\# a")]
    [InlineData("===", @"\===")]
    [InlineData("12. a", @"12\. a")]
    [InlineData("3) a", @"3\) a")]
    [InlineData("    a", "a")]
    [InlineData("12 m", "12 m")]
    public void Text_at_the_start_of_a_line_or_list_item_opens_no_block(string said, string written)
    {
        Assert.Equal($"{written}\n", Write("{{ report.project.title }}", said));
        Assert.Equal($"- {written}\n", Write("- {{ report.project.title }}", said));
        Assert.Equal($"> {written}\n", Write("> {{ report.project.title }}", said));
    }

    [Theory]
    [InlineData("Zs_max * 2", "`Zs_max * 2`")]
    [InlineData(" a\nb ", "`a b`")]
    [InlineData("a || b", @"<code>a \|\| b</code>")]
    [InlineData("a`b<i>", @"<code>a\`b&lt;i></code>")]
    public void Code_stays_code(string said, string written) =>
        Assert.Equal($"{written}\n", Write("{{ code report.project.title }}", said));

    [Theory]
    [InlineData("`cable.length` is *not* given", @"`cable.length` is \*not\* given")]
    [InlineData("one ` alone <b>", @"one \` alone &lt;b>")]
    public void A_sentence_sets_off_names_as_code(string said, string written) =>
        Assert.Equal($"{written}\n", Write("{{ prose report.project.title }}", said));

    [Fact]
    public void Text_that_a_template_puts_together_is_inert_as_well() =>
        Assert.Equal("&lt;b>A\\|B\n", Write("{{ '<b>' + (report.project.title | string.upcase) }}", "a|b"));

    [Fact]
    public void Nothing_is_nothing_as_code_and_as_prose() =>
        Assert.Equal("<code></code>.\n", Write("{{ code report.action[0].departure }}.{{ prose report.action[0].departure }}", ""));

    [Fact]
    public void An_included_part_is_made_inert_once()
    {
        using var folder = new TemporaryFolder();
        folder.Write("part.scriban-md", "*{{ report.project.title }}*");

        Assert.Equal("**a\\|b** a\\|b\n", Write("*{{ include 'part.scriban-md' }}* {{ report.project.title }}", "a|b", folder));
    }

    private static string Write(string template, string title)
    {
        using var folder = new TemporaryFolder();
        return Write(template, title, folder);
    }

    private static string Write(string template, string title, TemporaryFolder folder) =>
        Piece.Write(ReportFormat.Markdown, template, title, folder);
}
