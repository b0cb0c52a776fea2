namespace Auditor.Reports.Comparisons;

/// <summary>Findings of which the same became.</summary>
/// <param name="Kind">What became of them, in one word.</param>
/// <param name="Heading">The same as a heading.</param>
/// <param name="IsUrgent">Whether a reviewer has to act on them.</param>
/// <param name="Findings">The findings, requirements first.</param>
public sealed record ChangedFindings(string Kind, string Heading, bool IsUrgent, IReadOnlyList<ChangedFinding> Findings)
{
    /// <summary>How many of them are of requirements.</summary>
    public int Requirements => Findings.Count(finding => finding.IsRequirement);

    /// <summary>How many of them are of recommendations.</summary>
    public int Recommendations => Findings.Count - Requirements;
}
