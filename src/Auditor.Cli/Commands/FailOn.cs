using Auditor.Engine.Comparisons;
using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;

namespace Auditor.Cli.Commands;

/// <summary>From which kind of finding on the exit code is 1; each kind counts those before it as well.</summary>
internal enum FailOn
{
    /// <summary>Requirements that are not kept.</summary>
    Nonconforming,

    /// <summary>Requirements that are kept as stated, but not everywhere within the tolerances.</summary>
    Unproven,

    /// <summary>Requirements that cannot be judged.</summary>
    Undetermined,

    /// <summary>Requirements that are kept only as an assumed input is right.</summary>
    Assumption,

    /// <summary>Recommendations that are not kept.</summary>
    Recommendation,
}

/// <summary>Applies the threshold.</summary>
internal static class FailOnThreshold
{
    /// <summary>Whether a finding lies at or above the threshold.</summary>
    public static bool Counts(this FailOn threshold, Finding finding) =>
        KindOf(finding.Verdict, finding.Rule.Provision == Provision.Requirement, finding.OnAssumption) is { } kind && kind <= threshold;

    /// <summary>Whether a finding that became new or worse lies at or above the threshold.</summary>
    public static bool Counts(this FailOn threshold, FindingChange change) => change.IsNewOrWorse
        && KindOf(change.Finding.Verdict, change.Finding.IsRequirement, change.Finding.OnAssumption) is { } kind && kind <= threshold;

    private static FailOn? KindOf(Verdict verdict, bool isRequirement, bool onAssumption)
    {
        if (!isRequirement)
        {
            return verdict is Verdict.Nonconforming or Verdict.Unproven ? FailOn.Recommendation : null;
        }

        return verdict switch
        {
            Verdict.Nonconforming => FailOn.Nonconforming,
            Verdict.Unproven => FailOn.Unproven,
            Verdict.Undetermined => FailOn.Undetermined,
            Verdict.Conforms when onAssumption => FailOn.Assumption,
            _ => null,
        };
    }
}
