using System.Text.RegularExpressions;
using Auditor.Reports.Pictures;
using Auditor.Testing;

namespace Auditor.Reports.Tests.Pictures;

/// <summary>Every picture can stand in a page: well formed, named, with ids and links of its own and all looks left to the style sheet.</summary>
public partial class SvgTests
{
    private static readonly string[] Elements = ["svg", "title", "desc", "defs", "g", "a", "use", "path", "rect", "circle", "text", "clipPath"];

    private static readonly string[] Attributes =
    [
        "id", "class", "role", "aria-labelledby", "viewBox", "width", "height", "xmlns", "d", "x", "y", "cx", "cy", "r", "rx", "href",
        "transform", "clip-path", "data-subject",
    ];

    public static TheoryData<string> Designs => Gallery.Designs;

    [Theory]
    [MemberData(nameof(Designs))]
    public void A_picture_is_named_by_title_and_description(string design)
    {
        foreach (var picture in Gallery.Of(design).Pictures)
        {
            var svg = Gallery.Xml(picture);
            var names = svg.Attribute("aria-labelledby")!.Value.Split(' ').Select(id => svg.Elements().Single(element => element.Attribute("id")?.Value == id).Value);

            Assert.Equal([picture.Title, picture.Description], names);
            Assert.Equal(svg.Descendants().Any(element => element.Name.LocalName == "a") ? "group" : "img", svg.Attribute("role")!.Value);
        }
    }

    [Theory]
    [MemberData(nameof(Designs))]
    public void Ids_of_all_pictures_of_a_page_differ_and_begin_with_that_of_their_picture(string design)
    {
        var ids = new HashSet<string>();
        foreach (var picture in Gallery.Of(design).Pictures)
        {
            foreach (var id in Gallery.Xml(picture).DescendantsAndSelf().Select(element => element.Attribute("id")?.Value).OfType<string>())
            {
                Assert.StartsWith(picture.Id, id);
                Assert.True(ids.Add(id), id);
            }
        }
    }

    [Theory]
    [MemberData(nameof(Designs))]
    public void Links_lead_to_findings_or_to_other_pictures(string design)
    {
        var shown = Gallery.Of(design);
        var targets = shown.Audit.Findings.Select(finding => Anchor.Of(finding.Key)).Concat(shown.Pictures.Select(picture => picture.Id)).ToHashSet();
        var links = shown.Pictures.SelectMany(picture => Gallery.Xml(picture).Descendants()).Where(element => element.Name.LocalName == "a").ToArray();

        Assert.NotEmpty(links);
        Assert.All(links, link => Assert.Contains(link.Attribute("href")!.Value[1..], targets));
        Assert.All(links, link => Assert.NotEmpty(link.Elements().First().Value));
    }

    [Theory]
    [MemberData(nameof(Designs))]
    public void Used_symbols_are_defined_in_their_picture(string design)
    {
        foreach (var svg in Gallery.Of(design).Pictures.Select(Gallery.Xml))
        {
            var ids = svg.Descendants().Select(element => element.Attribute("id")?.Value).OfType<string>().ToHashSet();
            Assert.All(svg.Descendants().Where(element => element.Name.LocalName == "use"), use => Assert.Contains(use.Attribute("href")!.Value[1..], ids));
        }
    }

    [Theory]
    [MemberData(nameof(Designs))]
    public void A_picture_is_made_of_plain_shapes_without_colour_or_script(string design)
    {
        foreach (var element in Gallery.Of(design).Pictures.SelectMany(picture => Gallery.Xml(picture).DescendantsAndSelf()))
        {
            Assert.Contains(element.Name.LocalName, Elements);
            Assert.All(element.Attributes(), attribute => Assert.Contains(attribute.Name.LocalName, Attributes));
        }
    }

    [Theory]
    [MemberData(nameof(Designs))]
    public void Every_class_stands_in_the_style_sheet(string design)
    {
        var known = Selector().Matches(File.ReadAllText(Repository.PathOf("templates/pictures.css"))).Select(match => match.Value).ToHashSet();
        var used = Gallery.Of(design).Pictures.SelectMany(picture => Gallery.Xml(picture).DescendantsAndSelf())
            .SelectMany(element => element.Attribute("class")?.Value.Split(' ') ?? []).Distinct().Order(StringComparer.Ordinal);

        Assert.Empty(used.Except(known));
    }

    [Fact]
    public void The_style_sheet_sets_every_property_that_it_uses_for_light_and_dark()
    {
        var css = File.ReadAllText(Repository.PathOf("templates/pictures.css"));
        var used = Regex.Matches(css, @"(?<=var\()--[a-z0-9-]+(?=\))", RegexOptions.None, TimeSpan.FromSeconds(1)).Select(match => match.Value).Distinct();
        var set = Regex.Matches(css, @"--[a-z0-9-]+(?=:)", RegexOptions.None, TimeSpan.FromSeconds(1)).Select(match => match.Value).CountBy(name => name)
            .ToDictionary();

        Assert.All(used, name => Assert.True(set.GetValueOrDefault(name) >= 2, name));
    }

    [Fact]
    public void Six_hundred_circuits_stay_within_two_megabytes()
    {
        var pictures = Gallery.Of(Gallery.Large).Pictures;

        Assert.InRange(pictures.Sum(picture => picture.Svg.Length + picture.Table.Rows.Sum(row => row.Sum(cell => cell.Length + 9))), 1, 2_000_000);
    }

    [Theory]
    [MemberData(nameof(Designs))]
    public void Every_row_of_a_table_has_a_cell_for_each_heading(string design) =>
        Assert.All(Gallery.Of(design).Pictures.Select(picture => picture.Table), table =>
            Assert.All(table.Rows, row => Assert.Equal(table.Headings.Count, row.Count)));

    [GeneratedRegex(@"(?<=\.)p-[a-z0-9]+", RegexOptions.None, 1000)]
    private static partial Regex Selector();
}
