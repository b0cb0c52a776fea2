using Auditor.Documents;

namespace Auditor.Cli.Importing;

/// <summary>One cell of a table in CSV.</summary>
/// <param name="Text">What it says, without quotes and without blanks around it; empty for nothing.</param>
/// <param name="Span">Where it stands in the file: what lies between its quotes, where it has any.</param>
/// <param name="Row">Number of its record, counted from 1 as spreadsheets do; the header is row 1.</param>
/// <param name="Column">Number of its column, counted from 0.</param>
internal sealed record CsvCell(string Text, SourceSpan Span, int Row, int Column);
