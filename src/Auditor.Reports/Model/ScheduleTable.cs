namespace Auditor.Reports.Model;

/// <summary>The schedule of circuits.</summary>
/// <param name="Headings">Headings of the columns that the schedule file asks for and the rule set knows.</param>
/// <param name="Rows">One row for each circuit, in the order of the design.</param>
public sealed record ScheduleTable(IReadOnlyList<string> Headings, IReadOnlyList<ScheduleRow> Rows);
