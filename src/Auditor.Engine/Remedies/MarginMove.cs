using Auditor.Engine.Findings;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Remedies;

/// <summary>A rule whose margin a remedy changes.</summary>
/// <param name="At">The rule and the subject that it judges.</param>
/// <param name="Before">The margin before.</param>
/// <param name="After">The margin with the remedy.</param>
public sealed record MarginMove(RuleAt At, Margin Before, Margin After)
{
    /// <summary>How much margin is lost, as a share of the limit, or absolute for a limit of zero.</summary>
    public double Loss => (Before.Relative ?? Before.Absolute) - (After.Relative ?? After.Absolute);
}
