namespace Auditor.Reports.Comparisons;

/// <summary>One side of a comparison.</summary>
/// <param name="Name">What was compared: a path, or a revision and a path.</param>
/// <param name="Mark">Words by which the design calls its own revision; empty where it has none.</param>
/// <param name="RuleSet">Name of the rule set.</param>
/// <param name="Edition">Edition of the standard that its figures state; empty where it has none.</param>
/// <param name="Sha256">Hash over all files of the rule set.</param>
/// <param name="Findings">How many findings it has.</param>
public sealed record ComparedRevision(
    string Name, string Mark, string RuleSet, string Edition, string Sha256, int Findings);
