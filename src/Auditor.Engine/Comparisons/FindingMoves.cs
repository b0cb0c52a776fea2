using Auditor.Engine.Findings;

namespace Auditor.Engine.Comparisons;

/// <summary>Decides what became of a finding by verdict and margin alone.</summary>
internal static class FindingMoves
{
    /// <summary>Margins that differ by less, as a share of the limit, are the same: full precision but for the last digits of the arithmetic.</summary>
    private const double Slack = 1e-9;

    /// <summary>What became of a finding; null where nobody need be told: it conforms as before, or came or went with its subject.</summary>
    /// <param name="before">The finding in the earlier revision; null for none.</param>
    /// <param name="after">The finding in the later revision; null for none.</param>
    /// <param name="onBoth">Whether both revisions have the subject.</param>
    public static FindingChangeKind? Of(RevisionFinding? before, RevisionFinding? after, bool onBoth) => (before?.Verdict, after?.Verdict) switch
    {
        (Verdict.Conforms, null) => onBoth ? FindingChangeKind.Ceased : null,
        (Verdict.Undetermined, null) => onBoth ? FindingChangeKind.Settled : null,
        (_, null) => FindingChangeKind.Gone,
        (null, Verdict.Conforms) => onBoth || after!.OnAssumption ? FindingChangeKind.Started : null,
        (Verdict.Conforms, Verdict.Conforms) => Conforming(before!, after!),
        (Verdict.Undetermined, Verdict.Conforms) => FindingChangeKind.Settled,
        (_, Verdict.Conforms) => FindingChangeKind.Gone,
        (Verdict.Undetermined, Verdict.Undetermined) => Open(before!, after!),
        (_, Verdict.Undetermined) => FindingChangeKind.Undetermined,
        var (earlier, later) when earlier == later => Broken(before!, after!),
        (Verdict.Unproven, Verdict.Nonconforming) => FindingChangeKind.Worse,
        (Verdict.Nonconforming, Verdict.Unproven) => FindingChangeKind.Better,
        (_, Verdict.Departed) => FindingChangeKind.Accepted,
        _ => FindingChangeKind.New,
    };

    /// <summary>Whether value, limit or margin differ.</summary>
    public static bool HasOtherFigures(RevisionFinding before, RevisionFinding after) =>
        MarginMove(before, after) != 0 || !Figure.Same(before.Value, after.Value) || !Figure.Same(before.Limits, after.Limits);

    private static FindingChangeKind? Conforming(RevisionFinding before, RevisionFinding after) => MarginMove(before, after) switch
    {
        < 0 => FindingChangeKind.Closer,
        > 0 => FindingChangeKind.Further,
        _ => IsOtherwise(before, after) ? FindingChangeKind.Changed : null,
    };

    private static FindingChangeKind Broken(RevisionFinding before, RevisionFinding after) => MarginMove(before, after) switch
    {
        < 0 => FindingChangeKind.Worse,
        > 0 => FindingChangeKind.Better,
        _ => IsOtherwise(before, after) ? FindingChangeKind.Changed : FindingChangeKind.Unchanged,
    };

    private static FindingChangeKind Open(RevisionFinding before, RevisionFinding after) =>
        before.IsRequirement != after.IsRequirement || !before.Missing.Order(StringComparer.Ordinal).SequenceEqual(after.Missing.Order(StringComparer.Ordinal))
            ? FindingChangeKind.Changed
            : FindingChangeKind.Unchanged;

    private static bool IsOtherwise(RevisionFinding before, RevisionFinding after) =>
        HasOtherFigures(before, after) || before.OnAssumption != after.OnAssumption || before.IsRequirement != after.IsRequirement;

    /// <summary>-1 for a margin that became smaller, 1 for one that became larger, 0 for the same or none.</summary>
    private static int MarginMove(RevisionFinding before, RevisionFinding after)
    {
        var (one, other) = before.RelativeMargin is not null && after.RelativeMargin is not null
            ? (before.RelativeMargin, after.RelativeMargin)
            : (before.AbsoluteMargin, after.AbsoluteMargin);
        if (one is not { } x || other is not { } y || Math.Abs(x - y) <= Slack * Math.Max(1, Math.Max(Math.Abs(x), Math.Abs(y))))
        {
            return 0;
        }

        return y < x ? -1 : 1;
    }
}
