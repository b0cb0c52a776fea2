namespace Auditor.Reports.Model;

/// <summary>A rule that applied to nothing in the design.</summary>
/// <param name="Id">Its id.</param>
/// <param name="Title">What is right when it conforms.</param>
/// <param name="References">Clauses of the standards.</param>
public sealed record ReportRule(string Id, string Title, IReadOnlyList<string> References);
