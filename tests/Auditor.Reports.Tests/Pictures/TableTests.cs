using Auditor.Engine.Findings;

namespace Auditor.Reports.Tests.Pictures;

/// <summary>The tables behind the pictures say what the audit computed.</summary>
public class TableTests
{
    public static TheoryData<string> Designs => Gallery.Designs;

    // The text report of the example says the same: 18 m, 1.69 %, 5 %, 12 A behind 63 A, Zs 0.8414 ohm and so 0.95 x 230 V / 0.8414 ohm.
    [Theory]
    [InlineData("profile", "GO/1", "Desk sockets", "18 m", "1.69 %", "5 %")]
    [InlineData("balance", "GO", "", "12 A", "0 A", "0 A")]
    [InlineData("time-current", "least fault", "259.7 A")]
    [InlineData("time-current", "greatest fault", "1.6 kA")]
    [InlineData("time-current", "disconnection", "0.4 s")]
    [InlineData("time-current", "line k²S²", "82660 A²s")]
    public void The_values_of_one_circuit(string kind, params string[] cells)
    {
        var rows = Gallery.Of("one-circuit/one-circuit.design.yaml").Of(kind).Single().Table.Rows;

        Assert.Contains(rows, row => row.Take(cells.Length).SequenceEqual(cells));
    }

    [Theory]
    [MemberData(nameof(Designs))]
    public void Voltage_drops_are_those_of_the_model(string design)
    {
        var shown = Gallery.Of(design);
        var rows = shown.Of("profile").SelectMany(picture => picture.Table.Rows).ToDictionary(row => row[0], row => row[3]);

        Assert.NotEmpty(rows);
        foreach (var (key, value) in rows)
        {
            var circuit = shown.Audit.Design.Find(key)!;
            var slot = circuit.Shape.Quantity("vd_total")!;
            Assert.Equal(ValueText.Show(circuit.Quantity(slot.Index), slot.Unit), value);
        }
    }

    [Theory]
    [MemberData(nameof(Designs))]
    public void Every_measured_finding_counts_among_the_margins(string design)
    {
        var shown = Gallery.Of(design);
        var rows = shown.Of("margins").Single().Table.Rows;

        Assert.Equal(shown.Audit.Findings.Count(finding => finding.Judgement.Margin?.Relative is not null), rows.Sum(row => int.Parse(row[1])));
        Assert.All(rows, row => Assert.Equal(ValueText.ShowMargin(Least(shown.Audit, row[0])), row[4]));
    }

    [Fact]
    public void Each_dot_of_a_strip_is_a_finding()
    {
        var shown = Gallery.Of("one-circuit/one-circuit.design.yaml");
        var dots = Gallery.Xml(shown.Of("margins").Single()).Descendants().Where(element => element.Attribute("class")?.Value == "p-conforms p-dot")
            .Sum(element => element.Attribute("d")!.Value.Split("h0").Length - 1);

        Assert.Equal(shown.Audit.Findings.Count(finding => finding.Judgement.Margin?.Relative is not null), dots);
    }

    [Fact]
    public void The_whole_has_the_insulation_that_its_circuits_make()
    {
        var table = Gallery.Of("bakery-verified/bakery-verified.design.yaml").Of("parts").Single().Table;

        Assert.Equal(["Part", "Name", "between live conductors", "live to earth", "Least permitted"], table.Headings);
        Assert.Contains(table.Rows, row => row.SequenceEqual(["BK/14", "Bakehouse lighting", "95 MΩ", "0.7 MΩ", "1 MΩ"]));
        Assert.Equal("whole", table.Rows[0][0]);
    }

    [Fact]
    public void What_is_not_known_is_not_drawn_but_said()
    {
        var shown = Gallery.Of("bakery/bakery.design.yaml");
        var row = shown.Of("profile").Single().Table.Rows.Single(row => row[0] == "FL/7");

        Assert.Equal(ValueText.Unknown, row[3]);
    }

    [Fact]
    public void Circuits_without_a_chart_are_counted_with_the_first_one()
    {
        var charts = Gallery.Of("bakery/bakery.design.yaml").Of("time-current").ToArray();

        Assert.Equal(24, charts.Length);
        Assert.Equal(
            "What the chart of BK/1 draws. 4 circuits with less grave findings and greater margins have no chart.", charts[0].Table.Caption);
    }

    private static double Least(AuditResult audit, string type) => audit.Findings.Where(finding => finding.Rule.Clause.Type == type)
        .Min(finding => finding.Judgement.Margin?.Relative ?? double.PositiveInfinity);
}
