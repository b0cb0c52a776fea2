using Auditor.Engine.Adjustments;
using Auditor.Engine.Findings;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Remedies;

/// <summary>Searches for what would put one finding right.</summary>
/// <param name="map">The map of the design.</param>
/// <param name="recheck">Judges again what a change touches.</param>
/// <param name="reaudit">Audits the design with changes as a whole.</param>
/// <param name="finding">The finding.</param>
internal sealed class FindingSearch(
    DependencyMap map, Recheck recheck, Func<IReadOnlyList<ChangedInput>, AuditResult?> reaudit, Finding finding)
{
    public long Judged { get; private set; }

    public FindingRemedies Run()
    {
        var (reading, beside) = Candidates.Of(map, finding);
        var found = new List<(Remedy Remedy, bool IsNamed)>();
        var rest = reading.Where(candidate => !Add(found, candidate)).ToArray();
        var tried = reading.Count;
        for (var first = 0; first < rest.Length; first++)
        {
            foreach (var second in rest.Skip(first + 1).Concat(beside).Where(second => !second.IsSameInput(rest[first])))
            {
                Add(found, rest[first], second);
                tried++;
            }
        }

        var ordered = found.OrderBy(pair => pair.Remedy.Effort).ThenBy(pair => pair.Remedy.Changes.Count).ThenBy(pair => pair.IsNamed ? 0 : 1)
            .ThenBy(pair => string.Join(' ', pair.Remedy.Changes.Select(change => $"{change.Place.Subject.Key} {change.Place.Adjustment.Id}")), StringComparer.Ordinal);
        return new FindingRemedies(finding, [.. ordered.Select(pair => pair.Remedy)], tried);
    }

    private bool Add(List<(Remedy Remedy, bool IsNamed)> found, params IReadOnlyList<Candidate> candidates)
    {
        var attempt = new Attempt(map, recheck, reaudit, finding, candidates);
        var remedy = attempt.Run();
        Judged += attempt.Judged;
        if (remedy is not null)
        {
            found.Add((remedy, candidates.All(candidate => candidate.IsNamed)));
        }

        return remedy is not null;
    }
}
