using Auditor.Engine.Findings;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Remedies;

/// <summary>Searches for what would put one finding right.</summary>
/// <param name="map">The map of the design.</param>
/// <param name="recheck">Judges again what a change touches.</param>
/// <param name="finding">The finding.</param>
internal sealed class FindingSearch(DependencyMap map, Recheck recheck, Finding finding)
{
    private readonly HashSet<RuleAt> _obstacles = [];

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
        return new FindingRemedies(finding, [.. ordered.Select(pair => pair.Remedy)], tried, Attempt.InOrder(_obstacles));
    }

    private bool Add(List<(Remedy Remedy, bool IsNamed)> found, params IReadOnlyList<Candidate> candidates)
    {
        var attempt = new Attempt(map, recheck, finding, candidates);
        var remedy = attempt.Run();
        Judged += attempt.Judged;
        _obstacles.UnionWith(attempt.Obstacles);
        if (remedy is not null)
        {
            found.Add((remedy, candidates.All(candidate => candidate.IsNamed)));
        }

        return remedy is not null;
    }
}
