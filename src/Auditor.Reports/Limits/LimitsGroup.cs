namespace Auditor.Reports.Limits;

/// <summary>The adjustable inputs of one subject.</summary>
/// <param name="Subject">Key of the subject.</param>
/// <param name="Label">The subject as people name it: key and name.</param>
/// <param name="Rows">Its inputs, by name of the adjustment.</param>
public sealed record LimitsGroup(string Subject, string Label, IReadOnlyList<LimitsRow> Rows);
