namespace Auditor.Engine.RuleSets;

/// <summary>What a rule set calls itself.</summary>
/// <param name="Id">Its name.</param>
/// <param name="Text">Its title.</param>
/// <param name="Edition">Edition of the standard that its figures state.</param>
/// <param name="Notice">What a reader of every report must know of the edition; empty for nothing.</param>
/// <param name="Chain">Names of the sets it is made of, the base first.</param>
/// <param name="Sha256">Hash over all its files, in the order of their paths.</param>
public sealed record RuleSetTitle(string Id, string Text, string Edition, string Notice, IReadOnlyList<string> Chain, string Sha256)
{
    /// <summary>Name of the set that house sets are built on; its own where there is none.</summary>
    public required string BuiltOn { get; init; }
}
