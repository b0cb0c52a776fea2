namespace Auditor.Engine.Comparisons;

/// <summary>Tells which subjects were added, removed, renamed and moved, and which inputs of the others changed.</summary>
internal sealed class SubjectComparer(Revision before, Revision after, SubjectPairs pairs)
{
    private static readonly string[] NoInputs = ["id", "to", "formerly"];

    /// <summary>The changed subjects: those of the later revision in its order, then the removed ones in the order of the earlier one.</summary>
    public IReadOnlyList<SubjectChange> Subjects()
    {
        var kept = Parts(after).Select(Of).OfType<SubjectChange>();
        var removed = Parts(before).Where(subject => pairs.AfterOf(subject.Key) is null && IsToldOfItself(pairs.AfterOf(subject.Parent), subject));
        return [.. kept, .. removed.Select(subject => new SubjectChange(subject, null, false, false, null))];
    }

    /// <summary>The changed inputs, in the order of the later revision, then by path; empty where one revision does not tell its inputs.</summary>
    public IReadOnlyList<InputChange> Inputs() =>
        [.. Parts(after).SelectMany(subject => pairs.BeforeOf(subject.Key) is { } earlier ? Inputs(earlier, subject) : [])];

    private static IEnumerable<RevisionSubject> Parts(Revision revision) => revision.Subjects.Where(subject => !subject.IsOnRecord);

    private SubjectChange? Of(RevisionSubject subject)
    {
        if (pairs.BeforeOf(subject.Key) is not { } earlier)
        {
            return IsToldOfItself(pairs.BeforeOf(subject.Parent), subject) ? new SubjectChange(null, subject, false, false, null) : null;
        }

        var isRenamed = subject.Kind != "leg" && earlier.Id != subject.Id;
        var isMoved = pairs.AfterOf(earlier.Parent)?.Key != subject.Parent;
        return isRenamed || isMoved ? new SubjectChange(earlier, subject, isRenamed, isMoved, pairs.RecognisedBy(subject.Key)) : null;
    }

    /// <summary>The legs of a circuit that came or went come and go with it.</summary>
    private static bool IsToldOfItself(RevisionSubject? whole, RevisionSubject subject) => subject.Kind != "leg" || whole is not null;

    private IEnumerable<InputChange> Inputs(RevisionSubject earlier, RevisionSubject later)
    {
        if (earlier.Stated is null || later.Stated is null)
        {
            return [];
        }

        return earlier.Stated.Concat(later.Stated).Select(input => input.Path).Distinct(StringComparer.Ordinal)
            .Where(path => !NoInputs.Contains(path))
            .Order(StringComparer.Ordinal)
            .Select(path => new InputChange(earlier.Key, later.Key, path, earlier.Input(path), later.Input(path)))
            .Where(change => !IsSame(change));
    }

    private bool IsSame(InputChange change) => change is { Before: { } one, After: { } other }
        && (RevisionInput.Same(one, other) || (change.Path == "feeds" && pairs.Translated(one.Text) == other.Text));
}
