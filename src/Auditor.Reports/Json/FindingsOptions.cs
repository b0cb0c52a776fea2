namespace Auditor.Reports.Json;

/// <summary>What a findings file holds beyond the findings.</summary>
/// <param name="AllEvidence">Whether it also holds every input stated and every quantity computed.</param>
public sealed record FindingsOptions(bool AllEvidence = false);
