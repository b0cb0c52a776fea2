using Auditor.Reports.Remedies;
using Spectre.Console;

namespace Auditor.Cli.Summaries;

/// <summary>Shows remedies on a terminal, finding by finding.</summary>
/// <param name="console">The console.</param>
internal sealed class RemedyList(IAnsiConsole console)
{
    private static readonly Padding Narrow = new(2, 0, 1, 0);

    /// <summary>Writes the lists.</summary>
    public void Write(RemediesModel model)
    {
        foreach (var group in model.Groups)
        {
            console.MarkupLineInterpolated($"[bold]{group.SubjectLabel}[/]: {group.Sentence} [[{group.Key}]]");
            if (group.None.Length > 0)
            {
                console.MarkupLineInterpolated($"  no proven remedy: {group.None}");
            }

            var table = new Table().Border(TableBorder.None).HideHeaders().AddColumn(new TableColumn("") { Padding = Narrow, NoWrap = true }).AddColumn("");
            foreach (var row in group.Rows)
            {
                table.AddRow(new Text($"{row.Number}"), new Text(string.Join("\n", Lines(row))));
            }

            console.Write(table);
            if (group.More > 0)
            {
                console.MarkupLineInterpolated($"  and {group.More} more, of greater effort");
            }

            console.WriteLine();
        }

        console.MarkupLineInterpolated($"{model.Solved} of {model.Groups.Count} findings have a proven remedy among the adjustments of the rule set.");
    }

    private static IEnumerable<string> Lines(RemedyRow row) =>
        row.Changes.Append(string.Join("; ", row.Besides.Prepend(row.Margins).Where(text => text.Length > 0))).Where(line => line.Length > 0);
}
