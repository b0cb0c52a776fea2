namespace Auditor.Reports.Model;

/// <summary>The rule set in force.</summary>
/// <param name="Id">Its name.</param>
/// <param name="Title">Its title.</param>
/// <param name="Edition">Edition of the standard that its figures state; empty where it has none.</param>
/// <param name="Notice">What a reader must know of the edition; empty for nothing.</param>
/// <param name="Chain">Names of the sets that it is made of, the base first.</param>
/// <param name="Sha256">Hash over all its files.</param>
/// <param name="Rules">How many rules it has.</param>
/// <param name="Loosened">What house rules loosen, drop or replace; empty for nothing. Every report shows it.</param>
public sealed record ReportRuleSet(
    string Id, string Title, string Edition, string Notice, IReadOnlyList<string> Chain, string Sha256, int Rules, string Loosened);
