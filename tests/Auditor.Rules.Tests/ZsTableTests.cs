using System.Globalization;
using Auditor.Documents;
using Auditor.Formulas.Values;

namespace Auditor.Rules.Tests;

/// <summary>The greatest loop impedance of the sheets against the tables as they are printed.</summary>
public class ZsTableTests
{
    private static readonly ZsTableRow[] Rows = [.. ZsTableRow.All()];

    public static IEnumerable<TheoryDataRow<int>> Figures() =>
        Rows.Select((row, place) => new TheoryDataRow<int>(place) { TestDisplayName = $"Zs · {row.Name} · {row.Printed.Text} Ω" });

    [Theory]
    [MemberData(nameof(Figures))]
    public void The_sheets_agree_with_a_printed_table(int place)
    {
        var row = Rows[place];
        var zs = Zs_max(row);
        switch (row.Agreement)
        {
            case "rounding":
                // Some prints are cut off, not rounded: then the value lies up to a whole step above.
                Assert.InRange(zs, row.Printed.Number - (0.501 * row.Step), row.Printed.Number + (1.001 * row.Step));
                break;
            case "stricter":
                Assert.True(zs < row.Printed.Number - (0.5 * row.Step), $"{zs} Ω is no stricter");
                break;
            default:
                Assert.Equal("half", row.Agreement);
                Assert.InRange(2 * zs, row.Printed.Number - (0.501 * row.Step), row.Printed.Number + (1.001 * row.Step));
                break;
        }
    }

    [Fact]
    public void Every_table_names_its_source_and_trust() =>
        Assert.All(Rows, row =>
        {
            Assert.NotEmpty(row.Table.Texts("source"));
            Assert.NotNull(row.Table.Text("trust"));
        });

    /// <summary>A standard that designs no longer name has a curve, but its devices cannot be described: then the curve is read.</summary>
    private static double Zs_max(ZsTableRow row)
    {
        var set = Shipped.Set(Shipped.UnitedKingdom);
        var curve = set.World.Curves.Find(row.Standard, row.Table.Text("type") ?? "any");
        var known = set.Schema.Shapes.Circuit.Input("device.standard")!.Type.Vocabulary!.Contains(row.Standard);
        var device = known
            ? $"device.standard: {row.Standard}\ndevice.rating: {row.Rating} A\nt_max: {row.Time} s{Curve(row)}"
            : $"Ia: {Amperes(curve!.TripCurrent(Number(row.Rating), Number(row.Time)))} A";
        var given = $"{device}\nparam.cmin: {row.Table.Text("cmin")}\norigin.U0: 230 V";
        return Shipped.Compute(Shipped.UnitedKingdom, "circuit", "Zs_max", given);
    }

    private static string Curve(ZsTableRow row) => row.Table.Text("type") is { } type ? $"\ndevice.curve: {type}" : "";

    private static string Amperes(Value current) => current.Number.ToString("R", CultureInfo.InvariantCulture);

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
