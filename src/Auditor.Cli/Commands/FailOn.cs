using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;

namespace Auditor.Cli.Commands;

/// <summary>From which kind of finding on the exit code is 1; each kind counts those before it as well.</summary>
internal enum FailOn
{
    /// <summary>Requirements that are not kept.</summary>
    Nonconforming,

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
    public static bool Counts(this FailOn threshold, Finding finding) => KindOf(finding) is { } kind && kind <= threshold;

    private static FailOn? KindOf(Finding finding)
    {
        if (finding.Rule.Provision == Provision.Recommendation)
        {
            return finding.Verdict == Verdict.Nonconforming ? FailOn.Recommendation : null;
        }

        return finding.Verdict switch
        {
            Verdict.Nonconforming => FailOn.Nonconforming,
            Verdict.Undetermined => FailOn.Undetermined,
            Verdict.Conforms when finding.OnAssumption => FailOn.Assumption,
            _ => null,
        };
    }
}
