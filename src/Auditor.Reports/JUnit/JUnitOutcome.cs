using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;

namespace Auditor.Reports.JUnit;

/// <summary>What a finding is to a reader of test results.</summary>
internal enum JUnitOutcome
{
    /// <summary>It conforms.</summary>
    Passed,

    /// <summary>A requirement is not met, or not proven to be met where guarded acceptance asks for it.</summary>
    Failure,

    /// <summary>A requirement cannot be judged: that may never look like a pass.</summary>
    Error,

    /// <summary>It wants a look, but is no reason to stop: a recommendation that is not followed or cannot be judged, or a departure in force.</summary>
    Skipped,
}

/// <summary>Sorts findings.</summary>
internal static class JUnitOutcomes
{
    public static JUnitOutcome Outcome(this Finding finding) => (finding.Verdict, finding.Rule.Provision) switch
    {
        (Verdict.Conforms, _) => JUnitOutcome.Passed,
        (Verdict.Nonconforming or Verdict.Unproven, Provision.Requirement) => JUnitOutcome.Failure,
        (Verdict.Undetermined, Provision.Requirement) => JUnitOutcome.Error,
        _ => JUnitOutcome.Skipped,
    };
}
