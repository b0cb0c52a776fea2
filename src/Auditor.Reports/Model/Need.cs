using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;

namespace Auditor.Reports.Model;

/// <summary>
/// How much a finding needs to be looked at: requirements not met, recommendations not followed, what is not proven, what cannot be told, departures, and last
/// what conforms; within each, the least margin first.
/// </summary>
internal static class Need
{
    /// <summary>A margin below this share of the limit is looked at like what needs action.</summary>
    private const double Tight = 0.1;

    private const int UndeterminedGrade = 3;

    /// <summary>Grade, 0 for the gravest, and relative margin, infinite where nothing was measured; less is more urgent.</summary>
    public static (int Grade, double Margin) Of(Finding finding) =>
        (GradeOf(finding), finding.Judgement.Margin?.Relative ?? double.PositiveInfinity);

    /// <summary>The same for a derivation: what cannot be told is told by what is missing, so tight margins go before it.</summary>
    public static (int Grade, double Margin) OfDerivation(Finding finding)
    {
        var (grade, margin) = Of(finding);
        return (finding.Verdict == Verdict.Conforms && margin < Tight ? UndeterminedGrade - 1 : finding.Verdict == Verdict.Departed ? 1 : grade, margin);
    }

    private static int GradeOf(Finding finding) => finding.Verdict switch
    {
        Verdict.Nonconforming => finding.Rule.Provision == Provision.Requirement ? 0 : 1,
        Verdict.Unproven => UndeterminedGrade - 1,
        Verdict.Undetermined => UndeterminedGrade,
        Verdict.Departed => UndeterminedGrade + 1,
        _ => UndeterminedGrade + 2,
    };
}
