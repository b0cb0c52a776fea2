namespace Auditor.Reports.Model;

/// <summary>A board that findings belong to.</summary>
/// <param name="Key">Its key.</param>
/// <param name="Label">Key and name.</param>
public sealed record ReportBoard(string Key, string Label);
