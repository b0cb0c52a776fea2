namespace Auditor.Engine.Comparisons;

/// <summary>Joins the departures of two revisions by rule and subject.</summary>
internal sealed class DepartureComparer(Revision before, Revision after, SubjectPairs pairs, RuleNames names)
{
    /// <summary>The departures that differ: those of the later revision in its order, then those that only the earlier one has.</summary>
    public IReadOnlyList<DepartureChange> Compare()
    {
        var left = before.Departures.ToList();
        var changes = new List<DepartureChange>();
        foreach (var departure in after.Departures)
        {
            var earlier = left.Find(other => AreOne(other, departure));
            if (earlier is not null)
            {
                left.Remove(earlier);
            }

            if (earlier is null || !SaySame(earlier, departure))
            {
                changes.Add(new DepartureChange(earlier, departure));
            }
        }

        return [.. changes, .. left.Select(departure => new DepartureChange(departure, null))];
    }

    private bool AreOne(RevisionDeparture one, RevisionDeparture other) =>
        names.Settled(one.Rule) == names.Settled(other.Rule) && pairs.Translated(one.Subject) == other.Subject;

    private static bool SaySame(RevisionDeparture one, RevisionDeparture other) =>
        one with { Rule = other.Rule, Subject = other.Subject, Place = other.Place } == other;
}
