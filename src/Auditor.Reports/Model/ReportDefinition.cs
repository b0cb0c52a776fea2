namespace Auditor.Reports.Model;

/// <summary>Where the formula of a quantity comes from, once for all subjects that have it.</summary>
/// <param name="Anchor">Its id within the report.</param>
/// <param name="Kind">Kind of subject.</param>
/// <param name="Symbol">Symbol of the quantity.</param>
/// <param name="Name">What it is.</param>
/// <param name="References">Clauses of the standards; empty for none.</param>
/// <param name="Note">Remark of the sheet; empty for none.</param>
/// <param name="Place">Where the formula stands, as path:line:column.</param>
public sealed record ReportDefinition(
    string Anchor, string Kind, string Symbol, string Name, IReadOnlyList<string> References, string Note, string Place);
