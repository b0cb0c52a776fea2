using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Variation;

/// <summary>A rule at a subject of its kind, whether or not it applies there.</summary>
/// <param name="Rule">The rule.</param>
/// <param name="Subject">The subject.</param>
public readonly record struct RuleAt(Rule Rule, DesignSubject Subject)
{
    /// <summary>Key of the finding that it makes where it applies.</summary>
    public string Key => $"{Rule.Id}:{Subject.Key}";
}
