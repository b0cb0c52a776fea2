using Auditor.Documents;

namespace Auditor.Rules.Tests;

/// <summary>One figure of a printed table of greatest loop impedances.</summary>
/// <param name="Table">The table.</param>
/// <param name="Standard">Product standard of the device.</param>
/// <param name="Rating">Rated current as printed, in A.</param>
/// <param name="Time">Disconnection time as printed, in s.</param>
/// <param name="Printed">The impedance as printed, in Ω.</param>
internal sealed record ZsTableRow(MappingNode Table, string Standard, string Rating, string Time, ScalarNode Printed)
{
    public string Name => $"{Table.Text("table")} · {Standard} · {Rating} A · {Time} s";

    /// <summary>How the sheets agree with the print: <c>rounding</c> unless the table says otherwise.</summary>
    public string Agreement => Table.Text("agreement") ?? "rounding";

    /// <summary>One step in the last digit of the print.</summary>
    public double Step
    {
        get
        {
            var point = Printed.Text.IndexOf('.', StringComparison.Ordinal);
            return Math.Pow(10, point < 0 ? 0 : point + 1 - Printed.Text.Length);
        }
    }

    /// <summary>Every figure of every table.</summary>
    public static IEnumerable<ZsTableRow> All() =>
        from table in PublishedExample.Read("zs-tables.yaml").Mappings("tables")
        from standard in table.Texts("standard")
        from row in table.Items("rows").OfType<SequenceNode>()
        from figure in row.Items.OfType<ScalarNode>().Skip(1).Zip(table.Texts("times"))
        where figure.First.Kind == ScalarKind.Number
        select new ZsTableRow(table, standard, ((ScalarNode)row.Items[0]).Text, figure.Second, figure.First);
}
