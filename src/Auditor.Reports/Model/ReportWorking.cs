namespace Auditor.Reports.Model;

/// <summary>How one quantity of one subject was computed.</summary>
/// <param name="Anchor">Its id within the report.</param>
/// <param name="Symbol">Its symbol.</param>
/// <param name="Name">What it is.</param>
/// <param name="Value">Its value with its unit.</param>
/// <param name="Formula">The formula as written.</param>
/// <param name="WithNumbers">The same with numbers put in; empty where that says no more than formula or value.</param>
/// <param name="Definition">Id of its definition within the report.</param>
/// <param name="From">What it was computed from, each thing once, in the order of the formula.</param>
public sealed record ReportWorking(
    string Anchor, string Symbol, string Name, string Value, string Formula, string WithNumbers, string Definition, IReadOnlyList<ReportSource> From);
