namespace Auditor.Engine.Comparisons;

/// <summary>A subject that was added, removed, renamed or moved.</summary>
/// <param name="Before">The subject in the earlier revision; null for one that was added.</param>
/// <param name="After">The subject in the later revision; null for one that was removed.</param>
/// <param name="IsRenamed">Whether it has another id.</param>
/// <param name="IsMoved">Whether it stands on another board, or is fed from another circuit.</param>
/// <param name="By">By what it was recognised; null for one that was added or removed.</param>
public sealed record SubjectChange(RevisionSubject? Before, RevisionSubject? After, bool IsRenamed, bool IsMoved, Recognition? By) : Change
{
    /// <summary>Whether it was added.</summary>
    public bool IsAdded => Before is null;

    /// <summary>Whether it was removed.</summary>
    public bool IsRemoved => After is null;

    /// <summary>The subject in the later revision, or in the earlier one when it was removed.</summary>
    public RevisionSubject Subject => After ?? Before!;
}
