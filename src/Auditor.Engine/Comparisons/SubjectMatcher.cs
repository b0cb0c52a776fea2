namespace Auditor.Engine.Comparisons;

/// <summary>
/// Recognises the subjects of one revision in another. In this order: what the design declares; the same place and name; the same name
/// and stated inputs, where only one subject on each side has them; a name that only one subject of its kind has in each revision; the
/// same place. What is left was removed or added.
/// </summary>
internal sealed class SubjectMatcher
{
    private readonly SubjectPairs _pairs = new();
    private readonly Revision _before;
    private readonly Revision _after;
    private readonly Contents _contentsBefore;
    private readonly Contents _contentsAfter;

    private SubjectMatcher(Revision before, Revision after)
    {
        _before = before;
        _after = after;
        _contentsBefore = new Contents(before);
        _contentsAfter = new Contents(after);
    }

    public static SubjectPairs Match(Revision before, Revision after)
    {
        var matcher = new SubjectMatcher(before, after);
        foreach (var kind in new[] { "installation", "board", "circuit", "bonding", RevisionSubject.Departure, RevisionSubject.Change })
        {
            matcher.MatchKind(kind);
        }

        matcher.MatchLegs();
        return matcher._pairs;
    }

    private void MatchKind(string kind)
    {
        var before = OfKind(_before, kind);
        var after = OfKind(_after, kind);
        MatchDeclared(before, after);
        MatchPlaces(before, after, (one, other) => one.Name == other.Name);
        MatchUnique([.. before.Where(IsLeftBefore)], [.. after.Where(IsLeftAfter)], Recognition.Content, _contentsBefore.Of, _contentsAfter.Of);
        MatchUnique(before, after, Recognition.Name, subject => subject.Name, subject => subject.Name);
        MatchPlaces(before, after, (_, _) => true);
    }

    private static RevisionSubject[] OfKind(Revision revision, string kind) => [.. revision.Subjects.Where(subject => subject.Kind == kind)];

    private bool IsLeftBefore(RevisionSubject subject) => _pairs.AfterOf(subject.Key) is null;

    private bool IsLeftAfter(RevisionSubject subject) => _pairs.BeforeOf(subject.Key) is null;

    private void MatchDeclared(RevisionSubject[] before, RevisionSubject[] after)
    {
        var byKey = before.ToDictionary(subject => subject.Key, StringComparer.Ordinal);
        foreach (var subject in after)
        {
            var former = subject.Formerly.Select(key => byKey.GetValueOrDefault(key)).FirstOrDefault(found => found is not null);
            if (former is not null && IsLeftBefore(former) && !IsOld(subject, former, byKey.GetValueOrDefault(subject.Key)))
            {
                _pairs.Add(former, subject, Recognition.Declared);
            }
        }
    }

    /// <summary>Whether a declaration speaks of a renaming before the earlier revision, which already had the subject under its present key.</summary>
    private static bool IsOld(RevisionSubject subject, RevisionSubject former, RevisionSubject? sameKey) =>
        sameKey is not null && (sameKey.Stated is null ? sameKey.Name == subject.Name : sameKey.Formerly.Contains(former.Key));

    private void MatchPlaces(RevisionSubject[] before, RevisionSubject[] after, Func<RevisionSubject, RevisionSubject, bool> fits)
    {
        var byId = after.Where(IsLeftAfter).ToLookup(subject => subject.Id, StringComparer.Ordinal);
        foreach (var subject in before.Where(IsLeftBefore))
        {
            if (byId[subject.Id].FirstOrDefault(other => _pairs.AreAtSamePlace(subject, other) && fits(subject, other)) is { } found)
            {
                _pairs.Add(subject, found, Recognition.Key);
            }
        }
    }

    private void MatchUnique(
        RevisionSubject[] before, RevisionSubject[] after, Recognition by, Func<RevisionSubject, string?> markBefore, Func<RevisionSubject, string?> markAfter)
    {
        var later = after.ToLookup(markAfter, StringComparer.Ordinal);
        foreach (var group in before.GroupBy(markBefore, StringComparer.Ordinal).Where(group => group.Key is not null))
        {
            if (group.ToArray() is [var one] && later[group.Key].ToArray() is [var other] && IsLeftBefore(one) && IsLeftAfter(other))
            {
                _pairs.Add(one, other, by);
            }
        }
    }

    private void MatchLegs()
    {
        var before = OfKind(_before, "leg").ToLookup(leg => leg.Parent);
        var after = OfKind(_after, "leg").ToLookup(leg => leg.Parent);
        foreach (var run in before)
        {
            if (_pairs.AfterOf(run.Key) is { } circuit)
            {
                MatchRun([.. run], [.. after[circuit.Key]]);
            }
        }
    }

    /// <summary>Legs that say the same are the same, the one in the same position first; of the rest, the first is the first.</summary>
    private void MatchRun(RevisionSubject[] before, RevisionSubject[] after)
    {
        foreach (var leg in before.Where(leg => _contentsBefore.Of(leg) is not null))
        {
            var twins = after.Where(other => IsLeftAfter(other) && _contentsAfter.Of(other) == _contentsBefore.Of(leg)).ToArray();
            if ((Array.Find(twins, twin => twin.Id == leg.Id) ?? twins.FirstOrDefault()) is { } twin)
            {
                _pairs.Add(leg, twin, twin.Id == leg.Id ? Recognition.Key : Recognition.Content);
            }
        }

        foreach (var (leg, other) in before.Where(IsLeftBefore).Zip(after.Where(IsLeftAfter)).ToArray())
        {
            _pairs.Add(leg, other, Recognition.Key);
        }
    }
}
