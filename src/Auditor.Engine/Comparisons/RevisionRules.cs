namespace Auditor.Engine.Comparisons;

/// <summary>The rule set that a revision was audited with.</summary>
/// <param name="Id">Its name.</param>
/// <param name="Title">Its title.</param>
/// <param name="Edition">Edition of the standard that its figures state; empty where it has none.</param>
/// <param name="Sha256">Hash over all its files.</param>
/// <param name="Parameters">Its parameters, by id.</param>
/// <param name="Rules">Its rules, by id.</param>
public sealed record RevisionRules(
    string Id, string Title, string Edition, string Sha256, IReadOnlyList<RevisionParameter> Parameters, IReadOnlyList<RevisionRule> Rules);
