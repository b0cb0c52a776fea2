using System.Globalization;
using Auditor.Reports.Pictures;
using Auditor.Testing;

namespace Auditor.Reports.Tests.Pictures;

/// <summary>The same design gives the same bytes.</summary>
public class GoldenPictureTests
{
    [Theory]
    [InlineData("single-line")]
    [InlineData("time-current")]
    public void The_pictures_of_one_circuit_are_as_they_were(string kind)
    {
        var picture = Gallery.Of("one-circuit/one-circuit.design.yaml").Of(kind).Single();

        Golden.Match(picture.Svg.Replace("><", ">\n<", StringComparison.Ordinal) + "\n", $"tests/Auditor.Reports.Tests/Pictures/golden/{kind}", "svg");
    }

    [Fact]
    public void Culture_changes_no_byte()
    {
        var before = Everything();
        var culture = CultureInfo.CurrentCulture;
        try
        {
            var contrary = (CultureInfo)CultureInfo.InvariantCulture.Clone();
            contrary.NumberFormat.NumberDecimalSeparator = ",";
            contrary.NumberFormat.NegativeSign = "minus";
            CultureInfo.CurrentCulture = contrary;

            Assert.Equal("1,5", 1.5.ToString());
            Assert.Equal(before, Everything());
        }
        finally
        {
            CultureInfo.CurrentCulture = culture;
        }
    }

    private static string Everything() =>
        string.Join('\n', PictureBuilder.Of(ExampleAudit.Of("workshop/workshop.design.yaml")).SelectMany(picture => picture.Table.Rows.SelectMany(row => row).Prepend(picture.Svg)));
}
