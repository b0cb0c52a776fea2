using Auditor.Engine.Findings;

namespace Auditor.Reports.Model;

/// <summary>Gathers what the undetermined findings of an audit wait for.</summary>
internal static class MissingThings
{
    /// <summary>Each thing once, those that most findings wait for first.</summary>
    public static IReadOnlyList<MissingThing> Of(AuditResult result) =>
        [.. result.Findings
            .SelectMany(finding => (finding.Judgement.Absences?.Items ?? []).Select(absence => (Absence: absence, Finding: finding)))
            .GroupBy(pair => (pair.Absence.Kind, pair.Absence.Name, pair.Absence.Why, pair.Absence.Help))
            .Select(group => new MissingThing(
                group.Key.Name, group.Key.Why, group.Key.Help,
                [.. group.Select(pair => Lacking(pair.Absence.Subject, pair.Finding)).Distinct()],
                [.. group.Select(pair => pair.Finding.Key).Distinct()]))
            .OrderByDescending(thing => thing.Findings.Count)];

    /// <summary>Rule data lack nothing of a subject's: there the subject of the finding stands for it.</summary>
    private static string Lacking(string subject, Finding finding) => subject.Length == 0 ? finding.Subject.Key : subject;
}
