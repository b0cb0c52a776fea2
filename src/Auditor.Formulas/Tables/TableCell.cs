namespace Auditor.Formulas.Tables;

/// <summary>One figure of a table, with where it stands.</summary>
/// <param name="Table">The table.</param>
/// <param name="Row">The row's keys as the table writes them.</param>
/// <param name="Column">The column's keys as the table writes them; empty where there is only one column.</param>
/// <param name="Number">The figure in coherent units; NaN where the table leaves the cell empty or holds a word.</param>
/// <param name="Word">The word, where the lookup gives words.</param>
/// <param name="Trust">How far the row may be trusted.</param>
/// <param name="Line">Line of the row in the table's file, from 1.</param>
public sealed record TableCell(TableSource Table, string Row, string Column, double Number, string? Word, Trust Trust, int Line)
{
    /// <summary>Whether the table leaves this cell empty.</summary>
    public bool IsEmpty => double.IsNaN(Number) && Word is null;
}
