using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;

namespace Auditor.Reports.Pictures;

/// <summary>How one subject stands: its gravest finding and its least margin.</summary>
/// <param name="Lead">
/// The finding that a reader should see first: an unmet requirement, then one that is unproven, then an undecided one, then recommendations likewise, then what was departed
/// from, then what conforms; among equals the least margin, and what has none before that. Null where no rule applied.
/// </param>
/// <param name="Tightest">The finding with the least relative margin; null where nothing was measured.</param>
/// <param name="NotMet">How many findings are not met.</param>
/// <param name="Open">How many could not be decided.</param>
internal sealed record Standing(Finding? Lead, Finding? Tightest, int NotMet, int Open)
{
    /// <summary>The standing over some findings.</summary>
    public static Standing Of(IReadOnlyCollection<Finding> findings) => new(
        findings.OrderBy(GravityOf).ThenBy(finding => Margin(finding) ?? double.NegativeInfinity).FirstOrDefault(),
        findings.Where(finding => Margin(finding) is not null).MinBy(finding => Margin(finding)),
        findings.Count(finding => finding.Verdict == Verdict.Nonconforming), findings.Count(finding => finding.Verdict == Verdict.Undetermined));

    /// <summary>The relative margin of a finding; null where it has none.</summary>
    public static double? Margin(Finding finding) => finding.Judgement.Margin?.Relative;

    /// <summary>The shape that marks a finding, as <see cref="Drawing.Badges"/> draws it.</summary>
    public static string Mark(Finding finding) => (finding.Verdict, finding.Rule.Provision) switch
    {
        (Verdict.Nonconforming, Provision.Requirement) => "nonconforming",
        (Verdict.Nonconforming, _) => "advised",
        (Verdict.Unproven, _) => "unproven",
        (Verdict.Undetermined, _) => "undetermined",
        (Verdict.Departed, _) => "departed",
        _ => "conforms",
    };

    /// <summary>What is to be said of the lead in few words: its margin where it has one, else its state.</summary>
    public string Headline => Lead switch
    {
        null => "no rule applied",
        { Verdict: Verdict.Undetermined } => Open == 1 ? "1 open" : $"{Open} open",
        { Verdict: Verdict.Unproven } => "unproven",
        { Verdict: Verdict.Conforms } => Tightest is null ? "conforms" : ValueText.ShowMargin(Margin(Tightest)!.Value),
        var finding when Margin(finding) is { } margin => ValueText.ShowMargin(margin),
        { Verdict: Verdict.Departed } => "departed",
        _ => "not met",
    };

    /// <summary>The type of clause that the headline speaks of.</summary>
    public string Topic => (Lead?.Verdict == Verdict.Conforms ? Tightest ?? Lead : Lead)?.Rule.Clause.Type ?? "";

    /// <summary>The least margin, where the headline does not tell it.</summary>
    public string Least =>
        Tightest is { } tightest && ValueText.ShowMargin(Margin(tightest)!.Value) is var least && least != Headline ? "least " + least : "";

    /// <summary>How grave the lead is; lower is graver.</summary>
    public int Gravity => Lead is null ? 8 : GravityOf(Lead);

    private static int GravityOf(Finding finding) => (finding.Verdict, finding.Rule.Provision) switch
    {
        (Verdict.Nonconforming, Provision.Requirement) => 0,
        (Verdict.Unproven, Provision.Requirement) => 1,
        (Verdict.Undetermined, Provision.Requirement) => 2,
        (Verdict.Nonconforming, _) => 3,
        (Verdict.Unproven, _) => 4,
        (Verdict.Undetermined, _) => 5,
        (Verdict.Departed, _) => 6,
        _ => 7,
    };
}
