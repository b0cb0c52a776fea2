using Auditor.Documents;
using CsvHelper;

namespace Auditor.Cli.Importing;

/// <summary>All wordings of the stage that reads circuit lists.</summary>
internal static class ImportMessages
{
    public static Problem NoFile() => Problem.Error("no-file", "no circuit list is named", null, "name a CSV file; `--columns` lists the columns it may have");

    public static Problem NoOption(string option, string what) => Problem.Error(
        "missing-option", $"a circuit list does not say {what}", null, $"add `{option}`");

    public static Problem NoHeader(SourceText source) => Problem.Error(
        "no-header", "the file has no header", source.WholeSpan().Slice(0, 0), "name the columns in the first row, for example `board,id,name,device.rating`");

    public static Problem NoRows(SourceText source) => Problem.Error(
        "no-circuits", "the file has a header and nothing below it", source.WholeSpan().Slice(0, 1), "write one row for each circuit");

    public static Problem Malformed(SourceText source, int offset, CsvMalformedReason reason) => Problem.Error(
        "bad-quotes",
        reason switch
        {
            CsvMalformedReason.StrayQuote => "a quote stands inside a cell without quotes",
            CsvMalformedReason.TextAfterClosingQuote => "text follows the closing quote of a cell",
            _ => "a quote is opened and never closed",
        },
        new SourceSpan(source, offset, offset),
        "put quotes around the whole cell, and write a quote inside it twice (RFC 4180)");

    public static Problem Uneven(IReadOnlyList<CsvCell> record, int due) => record.Count > due
        ? Problem.Error("too-many-cells", $"row {record[0].Row} has {record.Count} cells, the header {due}", record[due].Span, "put quotes around a cell with a comma in it")
        : Problem.Error("too-few-cells", $"row {record[0].Row} has {record.Count} cells, the header {due}", record[^1].Span, "write a comma for each cell that is left empty");

    public static Problem UnknownColumn(CsvCell cell, string? nearest, bool isAlone) => Problem.Error(
        "unknown-column", $"no column of a circuit list is called {ProblemText.Quote(cell.Text)}", cell.Span,
        isAlone ? "put commas between the columns"
            : nearest is null ? "columns are called by the path in a circuit of the design file; `auditor import --columns` lists them"
            : $"did you mean `{nearest}`? `auditor import --columns` lists all");

    public static Problem SecondColumn(CsvCell cell, CsvCell first) => Problem.Error(
        "second-column", $"there are two columns {ProblemText.Quote(cell.Text)}", cell.Span, "keep one of them", new ProblemLabel(first.Span, "the first stands here"));

    public static Problem NoColumn(CsvCell first, string name) => Problem.Error(
        "missing-column", $"the header has no column `{name}`", first.Span, $"add it: each row says its `{name}`");

    public static Problem NoIdentifier(CsvCell cell, string name) => Problem.Error(
        "missing-cell", $"row {cell.Row}, column {name}: nothing is said", cell.Span, $"each row says its `{name}`");

    /// <summary>The same problem with its row and column.</summary>
    public static Problem InCell(Problem problem, CsvCell cell, string column) =>
        problem with { Message = $"row {cell.Row}, column {column}: {problem.Message}" };
}
