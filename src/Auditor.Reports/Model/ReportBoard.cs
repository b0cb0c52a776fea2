namespace Auditor.Reports.Model;

/// <summary>A board that findings belong to.</summary>
/// <param name="Key">Its key.</param>
/// <param name="Anchor">Its key as the ids of its findings write it, after the rule and two underscores.</param>
/// <param name="Label">Key and name.</param>
public sealed record ReportBoard(string Key, string Anchor, string Label);
