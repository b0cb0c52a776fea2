using System.Runtime.InteropServices;
using Auditor.Engine.Findings;

namespace Auditor.Engine.Remedies;

/// <summary>How a rule comes out, in as much as a remedy can change it.</summary>
/// <param name="Verdict">The verdict; null where the rule does not apply.</param>
/// <param name="Margin">The margin; null where nothing is measured.</param>
[StructLayout(LayoutKind.Auto)]
internal readonly record struct Standing(Verdict? Verdict, Margin? Margin)
{
    /// <summary>Margins that differ by less are the same: the last digits of the arithmetic.</summary>
    private const double Slack = 1e-9;

    /// <summary>Whether the rule is kept, or does not apply.</summary>
    public bool IsKept => Verdict is null or Findings.Verdict.Conforms;

    /// <summary>Whether it is a nonconformity, or conformity that guarded acceptance does not grant.</summary>
    public bool IsBroken => Verdict is Findings.Verdict.Nonconforming or Findings.Verdict.Unproven;

    /// <summary>As a judgement has it.</summary>
    public static Standing Of(Judgement judgement) => new(judgement.Verdict, judgement.Margin);

    /// <summary>As a finding of an audit has it; by guarded acceptance with the margin of the worst case. A departure changes nothing of it.</summary>
    public static Standing Of(Finding finding, bool isGuarded)
    {
        var verdict = finding.IsUnproven ? Findings.Verdict.Unproven : finding.Judgement.Verdict;
        return new Standing(verdict, isGuarded && finding.WorstCase is { } worst ? worst.Margin : finding.Judgement.Margin);
    }

    /// <summary>The margin as a share of the limit, or absolute for a limit of zero; null where nothing is measured.</summary>
    public double? Measure => Margin is null ? null : Margin.Relative ?? Margin.Absolute;

    /// <summary>Whether the margin is smaller than another.</summary>
    public bool IsCloserThan(Standing other) =>
        Measure is { } own && other.Measure is { } before && own < before - (Slack * Math.Max(1, Math.Abs(before)));
}
