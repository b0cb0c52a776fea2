using Auditor.Reports.Files;

namespace Auditor.Reports.Tests;

/// <summary>What a design says stays text in a page, wherever a template puts it, whether or not its author thought of that.</summary>
public class HtmlTests
{
    [Theory]
    [InlineData("<b>", "&lt;b&gt;")]
    [InlineData("</p><script>alert(1)</script>", "&lt;/p&gt;&lt;script&gt;alert(1)&lt;/script&gt;")]
    [InlineData("R & D &amp; &#60;", "R &amp; D &amp;amp; &amp;#60;")]
    [InlineData("a 'b' \"c\"", "a 'b' \"c\"")]
    [InlineData("one\n\n two", "one two")]
    [InlineData("turned\u202Earound", "turned&#65533;around")]
    [InlineData("Zs 1.37 Ω, 2.5 mm²", "Zs 1.37 &#937;, 2.5 mm&#178;")]
    [InlineData("𝄞", "&#119070;")]
    public void Text_between_tags_is_inert(string said, string written) =>
        Assert.Equal($"<p>{written}</p>\n", Write("<p>{{ report.project.title }}</p>", said));

    [Theory]
    [InlineData("\" onclick=\"alert(1)", "&quot; onclick=&quot;alert(1)")]
    [InlineData("' onclick='alert(1)", "&#39; onclick=&#39;alert(1)")]
    [InlineData("<&>", "&lt;&amp;&gt;")]
    public void Text_in_a_quoted_attribute_ends_neither_kind_of_quote(string said, string written)
    {
        Assert.Equal($"<p title=\"{written}\">x</p>\n", Write("<p title=\"{{ report.project.title }}\">x</p>", said));
        Assert.Equal($"<p title='{written}'>x</p>\n", Write("<p title='{{ report.project.title }}'>x</p>", said));
    }

    [Fact]
    public void An_address_may_be_a_place_on_the_page() =>
        Assert.Equal("<a href=\"#x&quot;&gt;\">x</a>\n", Write("<a href=\"#{{ report.project.title }}\">x</a>", "x\">"));

    [Theory]
    [InlineData("<style>p > a { color: red }</style><p>{{ report.project.title }}</p>", "<style>p > a { color: red }</style><p>&lt;</p>\n")]
    [InlineData("<!-- a > b --><p>{{ report.project.title }}</p>", "<!-- a > b --><p>&lt;</p>\n")]
    [InlineData("<p title=\"a > b\">{{ report.project.title }}</p>", "<p title=\"a > b\">&lt;</p>\n")]
    [InlineData("<p hidden title = 'a'>{{ report.project.title }}</p>", "<p hidden title = 'a'>&lt;</p>\n")]
    [InlineData("<br/>1 < 2 {{ report.project.title }}", "<br/>1 < 2 &lt;\n")]
    [InlineData("<noscript><i title=\"{{ report.project.title }}\">{{ report.project.title }}</i></noscript>", "<noscript><i title=\"&lt;\">&lt;</i></noscript>\n")]
    [InlineData("<script>if (1 < 2) '</p>'</script >{{ report.project.title }}", "<script>if (1 < 2) '</p>'</script >&lt;\n")]
    public void Text_may_follow_whatever_a_template_writes_itself(string template, string page) => Assert.Equal(page, Write(template, "<"));

    [Fact]
    public void A_sentence_sets_off_names_as_code() =>
        Assert.Equal("<p><code>a&lt;b</code> is *not* &lt;i&gt;</p>\n", Write("<p>{{ prose report.project.title }}</p>", "`a<b` is *not* <i>"));

    [Fact]
    public void Markup_that_a_template_puts_together_is_text() =>
        Assert.Equal("&lt;b&gt;A&lt;I&gt;\n", Write("{{ '<b>' + (report.project.title | string.upcase) }}", "a<i>"));

    [Fact]
    public void An_included_part_is_made_inert_once()
    {
        using var folder = new TemporaryFolder();
        folder.Write("part.scriban-html", "<b>{{ report.project.title }}</b>");

        Assert.Equal("<p><b>&lt;</b> &lt;</p>\n", Write("<p>{{ include 'part.scriban-html' }} {{ report.project.title }}</p>", "<", folder));
    }

    [Fact]
    public void A_script_of_the_folder_is_put_in_whole_and_named_by_its_hash()
    {
        using var folder = new TemporaryFolder();
        folder.Write("a.js", "let a = 1 < 2;\r\n");

        var page = Write("<meta content=\"'{{ hash 'a.js' }}'\"><script>{{ inline 'a.js' }}</script>", "", folder);

        // printf 'let a = 1 < 2;\n' | openssl dgst -sha256 -binary | base64
        Assert.Equal("<meta content=\"'sha256-ittdVKm3ObeDhin4huNcmyz3lnTwKtOGek/4gq0irPU='\"><script>let a = 1 < 2;\n</script>\n", page);
    }

    private static string Write(string template, string title)
    {
        using var folder = new TemporaryFolder();
        return Write(template, title, folder);
    }

    private static string Write(string template, string title, TemporaryFolder folder) =>
        Piece.Write(ReportFormat.Html, template, title, folder);
}
