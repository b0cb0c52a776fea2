using Auditor.Documents;

namespace Auditor.Formulas.Tables;

/// <summary>A cell that a set built on others entered into a lookup.</summary>
/// <param name="Lookup">The lookup.</param>
/// <param name="Before">The cell of an earlier set that gave way to it; null for none.</param>
/// <param name="Cell">The cell.</param>
/// <param name="Set">Number of its set in the chain.</param>
/// <param name="Span">Where it stands.</param>
public sealed record LaterCell(Lookup Lookup, TableCell? Before, TableCell Cell, int Set, SourceSpan Span);
