namespace Auditor.Engine.Comparisons;

/// <summary>Something that differs between the rule sets of two revisions.</summary>
/// <param name="Item">What it is.</param>
/// <param name="Name">Its name in the rule set; of a quantity, the kind of subject and the symbol.</param>
/// <param name="Title">What it is in words; empty where nobody knows.</param>
/// <param name="IsAdded">Whether only the later rule set has it.</param>
/// <param name="IsRemoved">Whether only the earlier rule set has it.</param>
/// <param name="Details">What differs in it, in a fixed order; of a whole that was added or removed, at most what it holds.</param>
public sealed record RuleChange(
    RuleItem Item, string Name, string Title, bool IsAdded, bool IsRemoved, IReadOnlyList<RuleDetail> Details) : Change;
