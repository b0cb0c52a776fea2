using Auditor.Engine.Comparisons;

namespace Auditor.Reports.Comparisons;

/// <summary>A part of the rule set that was added, removed or changed.</summary>
/// <param name="Item">What it is.</param>
/// <param name="Name">Its name.</param>
/// <param name="Title">What it is in words; empty where nobody knows.</param>
/// <param name="State">What became of it.</param>
/// <param name="Details">What differs in it.</param>
public sealed record ChangedRuleItem(string Item, string Name, string Title, string State, IReadOnlyList<RuleDetail> Details);
