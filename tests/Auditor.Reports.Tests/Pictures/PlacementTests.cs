namespace Auditor.Reports.Tests.Pictures;

/// <summary>Nothing lies over anything else, and nothing is cut off.</summary>
public class PlacementTests
{
    public static TheoryData<string> Designs => Gallery.Designs;

    [Theory]
    [MemberData(nameof(Designs))]
    public void No_text_reaches_beyond_its_picture(string design)
    {
        foreach (var picture in Gallery.Of(design).Pictures)
        {
            var svg = Gallery.Xml(picture);
            var (width, height) = (Placement.Number(svg, "width"), Placement.Number(svg, "height"));

            Assert.All(Placement.Texts(svg), box => Assert.True(box.Left >= 0 && box.Top >= 0 && box.Right <= width && box.Bottom <= height, $"{picture.Id}: {box}"));
        }
    }

    [Theory]
    [MemberData(nameof(Designs))]
    public void No_text_lies_over_another(string design)
    {
        foreach (var picture in Gallery.Of(design).Pictures)
        {
            Assert.Empty(Placement.Overlaps(Placement.Texts(Gallery.Xml(picture))).Select(pair => $"{picture.Id}: {pair}"));
        }
    }

    [Theory]
    [MemberData(nameof(Designs))]
    public void No_symbol_of_a_single_line_diagram_lies_over_another_or_over_a_text(string design)
    {
        foreach (var picture in Gallery.Of(design).Of("single-line"))
        {
            var svg = Gallery.Xml(picture);

            Assert.Empty(Placement.Overlaps([.. Placement.Uses(svg, picture.Id), .. Placement.Texts(svg)]).Select(pair => $"{picture.Id}: {pair}"));
        }
    }
}
