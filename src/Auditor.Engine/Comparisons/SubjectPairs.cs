namespace Auditor.Engine.Comparisons;

/// <summary>Which subject of one revision is which of the other.</summary>
internal sealed class SubjectPairs
{
    private readonly Dictionary<string, RevisionSubject> _after = new(StringComparer.Ordinal);
    private readonly Dictionary<string, RevisionSubject> _before = new(StringComparer.Ordinal);
    private readonly Dictionary<string, Recognition> _by = new(StringComparer.Ordinal);

    /// <summary>The later subject that an earlier key became; null for one that was removed.</summary>
    public RevisionSubject? AfterOf(string? keyBefore) => keyBefore is null ? null : _after.GetValueOrDefault(keyBefore);

    /// <summary>The earlier subject that a later key was; null for one that was added.</summary>
    public RevisionSubject? BeforeOf(string? keyAfter) => keyAfter is null ? null : _before.GetValueOrDefault(keyAfter);

    /// <summary>By what the subject with a later key was recognised.</summary>
    public Recognition RecognisedBy(string keyAfter) => _by[keyAfter];

    /// <summary>A key in the words of the later revision, where its subject is still there.</summary>
    public string Translated(string keyBefore) => AfterOf(keyBefore)?.Key ?? keyBefore;

    /// <summary>Whether both stand at the same place: the same id on what is the same board or circuit.</summary>
    public bool AreAtSamePlace(RevisionSubject before, RevisionSubject after) =>
        before.Id == after.Id && (before.Kind == "board" || AfterOf(before.Parent)?.Key == after.Parent);

    public void Add(RevisionSubject before, RevisionSubject after, Recognition by)
    {
        _after.Add(before.Key, after);
        _before.Add(after.Key, before);
        _by.Add(after.Key, by);
    }
}
