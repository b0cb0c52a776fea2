using Auditor.Engine.Findings;

namespace Auditor.Engine.Comparisons;

/// <summary>What became of one finding from one revision to the next.</summary>
public sealed class FindingChange
{
    private readonly Func<IReadOnlyList<Change>> _causes;
    private IReadOnlyList<Change>? _told;

    internal FindingChange(FindingChangeKind kind, RevisionFinding? before, RevisionFinding? after, MovedBy movedBy, Func<IReadOnlyList<Change>> causes)
    {
        Kind = kind;
        Before = before;
        After = after;
        MovedBy = movedBy;
        _causes = causes;
    }

    /// <summary>What became of it.</summary>
    public FindingChangeKind Kind { get; }

    /// <summary>The finding in the earlier revision; null where there was none.</summary>
    public RevisionFinding? Before { get; }

    /// <summary>The finding in the later revision; null where there is none.</summary>
    public RevisionFinding? After { get; }

    /// <summary>What moved it; nothing for an unchanged one.</summary>
    public MovedBy MovedBy { get; }

    /// <summary>The changes that it rests on: of subjects, then of inputs, then of the rule set; empty where they are not known.</summary>
    public IReadOnlyList<Change> Causes => _told ??= _causes();

    /// <summary>The finding of the later revision, or of the earlier one where it is gone.</summary>
    public RevisionFinding Finding => After ?? Before!;

    /// <summary>Whether the limit differs.</summary>
    public bool HasOtherLimit => Before is not null && After is not null && !Figure.Same(Before.Limits, After.Limits);

    /// <summary>
    /// Whether the later revision is the worse for it: a graver verdict than before, a nonconformity further from its limit,
    /// or a recommendation not followed that became a requirement.
    /// </summary>
    public bool IsNewOrWorse => After is not null
        && (Gravity(After) > Gravity(Before)
            || Kind is FindingChangeKind.Worse or FindingChangeKind.Undetermined
            || (After.Verdict != Verdict.Conforms && After.IsRequirement && Before is { IsRequirement: false }));

    /// <summary>How grave a verdict is: a departure is accepted, a verdict on an assumption may yet turn out otherwise.</summary>
    private static int Gravity(RevisionFinding? finding) => finding switch
    {
        null => 0,
        { Verdict: Verdict.Nonconforming } => 5,
        { Verdict: Verdict.Unproven } => 4,
        { Verdict: Verdict.Undetermined } => 3,
        { Verdict: Verdict.Departed } => 2,
        { OnAssumption: true } => 1,
        _ => 0,
    };
}
