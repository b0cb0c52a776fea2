namespace Auditor.Engine.Comparisons;

/// <summary>A parameter of the rule set of a revision.</summary>
/// <param name="Id">Its name.</param>
/// <param name="About">What it decides; empty where a findings file does not tell.</param>
/// <param name="Value">The value in force.</param>
public sealed record RevisionParameter(string Id, string About, Figure Value);
