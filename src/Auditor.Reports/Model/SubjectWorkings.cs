namespace Auditor.Reports.Model;

/// <summary>The workings of one subject.</summary>
/// <param name="Anchor">Its id within the report.</param>
/// <param name="Label">The subject as people name it.</param>
/// <param name="Quantities">Its quantities, in the order of the sheets.</param>
public sealed record SubjectWorkings(string Anchor, string Label, IReadOnlyList<ReportWorking> Quantities);
