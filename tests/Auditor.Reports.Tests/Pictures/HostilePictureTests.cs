using System.Text;
using Auditor.Reports.Pictures;
using Auditor.Testing;

namespace Auditor.Reports.Tests.Pictures;

/// <summary>Whatever a design calls things, a picture shows it and does nothing else.</summary>
public class HostilePictureTests
{
    private const string Markup = "</svg><script>alert(1)</script><img src=x onerror=alert(1)> &amp; ]]> \" ' {{ report }}";

    /// <summary>Ids hold no slash.</summary>
    private const string MarkupOfId = "<script>alert(1)<img src=x onerror=alert(1)> &amp; ]]> \" ' {{ report }}";

    [Theory]
    [InlineData("name: Desk sockets", Markup)]
    [InlineData("id: GO", MarkupOfId)]
    [InlineData("id: 1\n", MarkupOfId)]
    public void Markup_in_names_and_ids_stays_text(string place, string hostile)
    {
        var shown = Gallery.OfText(WithText(place, hostile));

        foreach (var picture in shown.Pictures)
        {
            var svg = Gallery.Xml(picture);
            Assert.DoesNotContain(svg.Descendants(), element => element.Name.LocalName is "script" or "img" or "foreignObject" or "style");
            Assert.DoesNotContain("<script", picture.Svg);
            Assert.DoesNotContain("<img", picture.Svg);
            Assert.All(svg.Descendants().Select(element => element.Attribute("href")?.Value).OfType<string>(), link => Assert.Matches("^#[A-Za-z0-9_-]+$", link));
        }
    }

    [Fact]
    public void Characters_that_turn_the_text_around_are_replaced()
    {
        var shown = Gallery.OfText(WithText("name: Desk sockets", "left \u202E right \u200B end"));
        var picture = shown.Of("single-line").Single();

        Assert.DoesNotContain('\u202E', picture.Svg);
        Assert.Contains("left \uFFFD right \uFFFD end", picture.Svg);
    }

    [Fact]
    public void A_name_without_end_is_cut_and_told_whole_to_whoever_points_at_it()
    {
        var name = string.Join(' ', Enumerable.Repeat("workshop", 60));
        var shown = Gallery.OfText(WithText("name: Desk sockets", name));
        foreach (var picture in shown.Pictures)
        {
            var svg = Gallery.Xml(picture);
            var width = Placement.Number(svg, "width");
            Assert.All(Placement.Texts(svg), box => Assert.True(box.Right <= width, $"{picture.Id}: {box}"));
        }

        Assert.Contains(Gallery.Xml(shown.Of("single-line").Single()).Descendants(), element => element.Name.LocalName == "title" && element.Value == name);
    }

    [Theory]
    [InlineData("rule:DB-1", "rule:DB/1")]
    [InlineData("rule:DB_1", "rule:DB/1")]
    [InlineData("rule:a:b", "rule:a/b")]
    [InlineData("rule:_-", "rule:/")]
    [InlineData("rule:é", "rule:e")]
    public void No_two_findings_share_an_anchor(string one, string other)
    {
        Assert.NotEqual(Anchor.Of(one), Anchor.Of(other));
        Assert.Matches("^f-[A-Za-z0-9_-]+$", Anchor.Of(one));
    }

    private static string WithText(string place, string text)
    {
        var design = File.ReadAllText(Repository.PathOf("examples/one-circuit/one-circuit.design.yaml"));
        var key = place[..place.IndexOf(':')];
        var quoted = new StringBuilder("\"").Append(text.Replace("\\", "\\\\", StringComparison.Ordinal).Replace("\"", "\\\"", StringComparison.Ordinal)).Append('"');
        Assert.Contains(place, design);
        return design.Replace(place, $"{key}: {quoted}" + (place.EndsWith('\n') ? "\n" : ""), StringComparison.Ordinal);
    }
}
