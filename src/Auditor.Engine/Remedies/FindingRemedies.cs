using Auditor.Engine.Findings;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Remedies;

/// <summary>What would put one finding right.</summary>
/// <param name="Finding">The finding.</param>
/// <param name="Remedies">The proven remedies, the least change first; none where none was found.</param>
/// <param name="Tried">How many adjustments of the rule data have a part in the rule, singly and in pairs.</param>
/// <param name="Obstacles">
/// Rules that changes would break, or leave without a judgement, which would otherwise have put the finding right; in the order of findings.
/// </param>
public sealed record FindingRemedies(Finding Finding, IReadOnlyList<Remedy> Remedies, int Tried, IReadOnlyList<RuleAt> Obstacles);
