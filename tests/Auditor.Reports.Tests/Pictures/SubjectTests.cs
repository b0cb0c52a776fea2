using Auditor.Testing;


namespace Auditor.Reports.Tests.Pictures;

/// <summary>Single-line diagrams show the whole design.</summary>
public class SubjectTests
{
    public static TheoryData<string> Designs => Gallery.Designs;

    [Theory]
    [MemberData(nameof(Designs))]
    public void Each_subject_is_drawn_exactly_once(string design)
    {
        var shown = Gallery.Of(design);
        var drawn = shown.Of("single-line").SelectMany(picture => Gallery.Xml(picture).Descendants()).Select(element => element.Attribute("data-subject")?.Value).OfType<string>();

        Assert.Equal(shown.Audit.Design.Subjects.Select(subject => subject.Key).Order(StringComparer.Ordinal), drawn.Order(StringComparer.Ordinal));
    }

    [Theory]
    [MemberData(nameof(Designs))]
    public void Each_subject_has_its_row_in_a_table(string design)
    {
        var shown = Gallery.Of(design);
        var rows = shown.Of("single-line").SelectMany(picture => picture.Table.Rows).Select(row => row[0]);

        Assert.Equal(
            shown.Audit.Design.Subjects.Select(subject => subject.Parent is null ? "The installation" : subject.Key).Order(StringComparer.Ordinal),
            rows.Order(StringComparer.Ordinal));
    }

    [Fact]
    public void Few_boards_share_a_diagram_and_many_have_one_each()
    {
        Assert.Single(Gallery.Of("bakery/bakery.design.yaml").Of("single-line"));

        var large = Gallery.Of(Gallery.Large).Of("single-line").Select(picture => picture.Title).ToArray();
        Assert.Contains("Single-line diagram: origin and boards, part 1 of 2", large);
        Assert.Contains("Single-line diagram: DB20 Unit 20", large);
    }

    [Fact]
    public void A_node_leads_to_its_gravest_finding()
    {
        var node = Gallery.Xml(Gallery.Of("bakery/bakery.design.yaml").Of("single-line").Single()).Descendants()
            .Single(element => element.Attribute("data-subject")?.Value == "BK/16");
        var link = node.Descendants().Single(element => element.Name.LocalName == "a");

        Assert.Equal("#f-voltage-drop-lighting__BK_-16", link.Attribute("href")!.Value);
        Assert.Equal("BK/16 Yard floodlights and gable sign: nonconforming, -50.8 %, voltage drop", link.Elements().First().Value);
    }

    [Fact]
    public void What_is_kept_only_as_stated_has_a_mark_of_its_own()
    {
        var design = File.ReadAllText(Repository.PathOf("examples/one-circuit/one-circuit.design.yaml"))
            .Replace("basis: {", "basis: { decision: guarded,", StringComparison.Ordinal)
            .Replace("length: 18 m", "length: 18 m ± 14 m", StringComparison.Ordinal)
            .Replace("current: 12 A", "current: 19 A ± 2 A", StringComparison.Ordinal);
        var svg = Gallery.Xml(Gallery.OfText(design).Of("single-line").Single());
        var node = svg.Descendants().Single(element => element.Attribute("data-subject")?.Value == "GO/1");

        Assert.Contains(node.Descendants(), element => element.Attribute("href")?.Value == "#single-line-unproven");
        Assert.Contains(svg.Descendants(), element => element.Name.LocalName == "text" && element.Value == "unproven within tolerances");
    }
}
