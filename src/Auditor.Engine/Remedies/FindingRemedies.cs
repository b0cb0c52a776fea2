using Auditor.Engine.Findings;

namespace Auditor.Engine.Remedies;

/// <summary>What would put one finding right.</summary>
/// <param name="Finding">The finding.</param>
/// <param name="Remedies">The proven remedies, the least change first; none where none was found.</param>
/// <param name="Tried">How many adjustments of the rule data have a part in the rule, singly and in pairs.</param>
public sealed record FindingRemedies(Finding Finding, IReadOnlyList<Remedy> Remedies, int Tried);
