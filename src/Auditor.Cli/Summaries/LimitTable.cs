using Auditor.Reports.Limits;
using Spectre.Console;

namespace Auditor.Cli.Summaries;

/// <summary>Shows limits on a terminal, subject by subject.</summary>
/// <param name="console">The console.</param>
internal sealed class LimitTable(IAnsiConsole console)
{
    /// <summary>Writes the tables.</summary>
    public void Write(LimitsModel model)
    {
        foreach (var group in model.Groups)
        {
            console.MarkupLineInterpolated($"[bold]{group.Label}[/]");
            var table = new Table().Border(TableBorder.None).Expand();
            foreach (var heading in new[] { "input", "now", "at least", "at most", "governed by" })
            {
                table.AddColumn(new TableColumn(heading) { Padding = new Padding(0, 0, 2, 0), NoWrap = heading is "now" or "at least" or "at most" });
            }

            foreach (var row in group.Rows)
            {
                table.AddRow(Cells(row));
            }

            console.Write(table);
            console.WriteLine();
        }
    }

    private static Markup[] Cells(LimitsRow row)
    {
        var rules = string.Join(", ", new[] { row.LeastRule, row.MostRule }.Where(rule => rule.Length > 0).Distinct());
        var notes = row.Guarded.Length == 0 ? row.Notes : [$"with the uncertainty of the instrument: {row.Guarded}", .. row.Notes];
        var told = string.Join("; ", new[] { rules }.Concat(notes).Where(text => text.Length > 0));
        var now = row.Stated.Length > 0 || row.Expected.Length == 0 ? row.Stated : $"({row.Expected})";
        return [.. new[] { row.Input, now, row.Least, row.Most, told.Length == 0 ? "no limit" : told }.Select(text => new Markup(Markup.Escape(text)))];
    }
}
