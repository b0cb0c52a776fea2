using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;

namespace Auditor.Cli.Summaries;

/// <summary>One thing that is missing, for all findings that wait for it.</summary>
/// <param name="Why">What is missing.</param>
/// <param name="Help">What to give instead; empty where the name says it all.</param>
/// <param name="Subjects">Keys of the subjects that lack it, in the order of the design.</param>
/// <param name="Findings">How many requirements cannot be judged for want of it.</param>
internal sealed record Gap(string Why, string Help, IReadOnlyList<string> Subjects, int Findings)
{
    /// <summary>The gaps of an audit, those that hold up most findings first.</summary>
    public static IReadOnlyList<Gap> Of(AuditResult result)
    {
        var waiting = result.Findings.Where(finding => finding.Verdict == Verdict.Undetermined && finding.Rule.Provision == Provision.Requirement);
        return [.. waiting
            .SelectMany(finding => finding.Judgement.Absences!.Items.Select(absence => (finding, absence)))
            .GroupBy(pair => (pair.absence.Kind, pair.absence.Name, pair.absence.Why, pair.absence.Help))
            .Select(group => new Gap(
                group.Key.Why, group.Key.Help, [.. group.Select(pair => pair.absence.Subject).Where(key => key.Length > 0).Distinct(StringComparer.Ordinal)],
                group.Select(pair => pair.finding.Key).Distinct(StringComparer.Ordinal).Count()))
            .OrderByDescending(gap => gap.Findings).ThenBy(gap => gap.Why, StringComparer.Ordinal)];
    }
}
