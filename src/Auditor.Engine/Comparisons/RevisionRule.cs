namespace Auditor.Engine.Comparisons;

/// <summary>A rule of the rule set of a revision.</summary>
/// <param name="Id">Its id.</param>
/// <param name="Title">What is right when it conforms; empty where a findings file does not tell.</param>
/// <param name="Formerly">Earlier ids; empty where a findings file does not tell.</param>
public sealed record RevisionRule(string Id, string Title, IReadOnlyList<string> Formerly);
