using Auditor.Documents;

namespace Auditor.Cli.Importing;

/// <summary>A circuit list: a table whose columns are known.</summary>
/// <param name="Table">The table.</param>
/// <param name="Columns">The column of each cell of the header; null for one that is not known.</param>
internal sealed record CircuitList(CsvTable Table, IReadOnlyList<CircuitColumn?> Columns)
{
    /// <summary>Reads a circuit list; null, with problems added, when there is nothing to read in it.</summary>
    public static CircuitList? Read(SourceText source, IReadOnlyList<CircuitColumn> known, Problems problems)
    {
        if (CsvTable.Read(source, problems) is not { } table)
        {
            return null;
        }

        if (table.Rows.Count == 0)
        {
            problems.Add(ImportMessages.NoRows(source));
            return null;
        }

        var byName = known.ToDictionary(column => column.Name);
        var list = new CircuitList(table, [.. table.Header.Select(cell => byName.GetValueOrDefault(cell.Text))]);
        list.CheckHeader(known, problems);
        list.CheckIdentifiers(problems);
        return list;
    }

    /// <summary>The cells of a row that say something, with their columns.</summary>
    public IEnumerable<(CircuitColumn Column, CsvCell Cell)> Said(IReadOnlyList<CsvCell> row) =>
        row.Take(Columns.Count).Where(cell => cell.Text.Length > 0 && Columns[cell.Column] is not null).Select(cell => (Columns[cell.Column]!, cell));

    /// <summary>The cell of a row in a column; null where it says nothing.</summary>
    public CsvCell? Cell(IReadOnlyList<CsvCell> row, string column) => Said(row).FirstOrDefault(pair => pair.Column.Name == column).Cell;

    /// <summary>The problem with row and column, where it is one of a cell.</summary>
    public Problem WithCell(Problem problem)
    {
        var cell = problem.Span is { } span && span.Source == Table.Source
            ? Table.Rows.SelectMany(row => row).FirstOrDefault(cell => cell.Span.Start <= span.Start && span.Start <= cell.Span.End)
            : null;
        return cell is null ? problem : ImportMessages.InCell(problem, cell, Columns.ElementAtOrDefault(cell.Column)?.Name ?? "");
    }

    /// <summary>The cell that names the board or circuit of a row; where it says nothing, a stand-in, so that all else can be checked.</summary>
    public CsvCell Identifier(IReadOnlyList<CsvCell> row, string column) =>
        Cell(row, column) ?? Empty(row, column) with { Text = $"{column} of row {row[0].Row}" };

    private CsvCell Empty(IReadOnlyList<CsvCell> row, string column) =>
        row.FirstOrDefault(cell => Columns.ElementAtOrDefault(cell.Column)?.Name == column) ?? row[0] with { Span = row[0].Span.Slice(0, 0) };

    private void CheckHeader(IReadOnlyList<CircuitColumn> known, Problems problems)
    {
        var first = new Dictionary<string, CsvCell>();
        var unknown = 0;
        foreach (var cell in Table.Header)
        {
            if (Columns[cell.Column] is null)
            {
                // Looking for what was meant takes time, and of more than so many nothing is shown.
                if (++unknown > Problems.PerFile + 1)
                {
                    continue;
                }

                var nearest = NearestWord.Find(cell.Text, known.Select(column => column.Name));
                problems.Add(ImportMessages.UnknownColumn(cell, nearest, isAlone: Table.Header.Count == 1));
            }
            else if (!first.TryAdd(cell.Text, cell))
            {
                problems.Add(ImportMessages.SecondColumn(cell, first[cell.Text]));
            }
        }
    }

    private void CheckIdentifiers(Problems problems)
    {
        if (Columns is [null])
        {
            return;
        }

        foreach (var name in new[] { CircuitColumn.Board, CircuitColumn.Id })
        {
            if (!Columns.Any(column => column?.Name == name))
            {
                problems.Add(ImportMessages.NoColumn(Table.Header[0], name));
                continue;
            }

            foreach (var row in Table.Rows.Where(row => Cell(row, name) is null))
            {
                problems.Add(ImportMessages.NoIdentifier(Empty(row, name), name));
            }
        }
    }
}
