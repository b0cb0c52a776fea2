namespace Auditor.Reports.Model;

/// <summary>One thing that a value was computed from.</summary>
/// <param name="Kind">What it is, in a word: design, quantity, parameter, table, curve or missing.</param>
/// <param name="Label">Its name: subject and input, subject and symbol, parameter, table with row and column, curve with reading.</param>
/// <param name="Text">Its value with its unit, or as written.</param>
/// <param name="Place">Where it stands, as path:line:column; empty where it has no place of its own.</param>
/// <param name="Remark">Source of a figure and how far it can be trusted, or why something is missing; empty for nothing.</param>
/// <param name="Anchor">Id of the working of a quantity within the report; empty where the report shows none.</param>
public sealed record ReportSource(string Kind, string Label, string Text, string Place, string Remark, string Anchor);
