using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Comparisons;

/// <summary>Joins the findings of two revisions by rule and subject, and tells what became of each and what moved it.</summary>
internal sealed class FindingComparer(
    Revision before, Revision after, SubjectPairs pairs, RuleNames names, RuleSetChange rules, ChangeIndex? index, CauseFinder? finder)
{
    private readonly Dictionary<string, RevisionSubject> _earlier = before.Subjects.ToDictionary(subject => subject.Key, StringComparer.Ordinal);
    private readonly Dictionary<string, RevisionSubject> _later = after.Subjects.ToDictionary(subject => subject.Key, StringComparer.Ordinal);
    private readonly Dictionary<string, Rule> _rulesBefore = ById(before);
    private readonly Dictionary<string, Rule> _rulesAfter = ById(after);
    private readonly MovedBy _byElimination = ByElimination(before, after, rules);

    /// <summary>
    /// What became of the findings: by kind, requirements before recommendations, the gravest verdict first, then in the order of the
    /// later revision and last what only the earlier one has. Findings that conform as before are left out.
    /// </summary>
    public IReadOnlyList<FindingChange> Compare()
    {
        var joined = new Dictionary<string, RevisionFinding>(StringComparer.Ordinal);
        foreach (var finding in before.Findings)
        {
            joined.TryAdd(LaterKey(finding), finding);
        }

        var changes = new List<FindingChange?>();
        foreach (var finding in after.Findings)
        {
            joined.Remove(finding.Key, out var earlier);
            changes.Add(Change(earlier, finding));
        }

        changes.AddRange(before.Findings.Where(finding => joined.GetValueOrDefault(LaterKey(finding)) == finding).Select(finding => Change(finding, null)));
        return [.. changes.OfType<FindingChange>()
            .OrderBy(change => change.Kind)
            .ThenBy(change => change.Finding.IsRequirement ? 0 : 1)
            .ThenBy(change => change.Finding.Verdict == Verdict.Conforms ? 1 : 0)];
    }

    /// <summary>
    /// The key that a finding would have in the later revision. What was removed keeps its key behind a mark, lest it be taken for
    /// another subject that bears its key now.
    /// </summary>
    private string LaterKey(RevisionFinding finding)
    {
        var subject = pairs.AfterOf(finding.Subject)?.Key ?? "\0" + finding.Subject;
        var rule = names.AfterOf(finding.Rule) ?? "\0" + finding.Rule;
        return $"{rule}:{subject}";
    }

    private FindingChange? Change(RevisionFinding? one, RevisionFinding? other)
    {
        var onBoth = one is not null && other is not null
            || (one is not null && pairs.AfterOf(one.Subject) is not null)
            || (other is not null && pairs.BeforeOf(other.Subject) is not null);
        if (FindingMoves.Of(one, other, onBoth) is not { } kind)
        {
            return null;
        }

        if (kind == FindingChangeKind.Unchanged)
        {
            return new FindingChange(kind, one, other, MovedBy.Untold, () => []);
        }

        var isAccepted = (one?.Verdict, other?.Verdict) is (Verdict.Nonconforming, Verdict.Departed) or (Verdict.Departed, Verdict.Nonconforming);
        if (isAccepted && !FindingMoves.HasOtherFigures(one!, other!))
        {
            return new FindingChange(kind, one, other, MovedBy.Departure, () => []);
        }

        var (by, bits) = Moved(one, other);
        return new FindingChange(kind, one, other, isAccepted ? by | MovedBy.Departure : by, () => index?.Of(bits) ?? []);
    }

    private (MovedBy By, ChangeBits Bits) Moved(RevisionFinding? one, RevisionFinding? other)
    {
        var earlier = one is null ? pairs.BeforeOf(other!.Subject) : _earlier[one.Subject];
        var later = other is null ? pairs.AfterOf(one!.Subject) : _later[other.Subject];
        if (earlier is null || later is null)
        {
            var (subject, isLater) = later is null ? (earlier!, false) : (later, true);
            if (subject.IsOnRecord)
            {
                return (OfRecord(subject), ChangeBits.None);
            }

            return (MovedBy.Design, index is null ? ChangeBits.None : OfWhole(subject, isLater));
        }

        if (later.IsOnRecord)
        {
            return (OfRecord(later), ChangeBits.None);
        }

        var ruleBefore = one?.Rule ?? names.BeforeOf(other!.Rule);
        var ruleAfter = other?.Rule ?? names.AfterOf(one!.Rule);
        if (finder is null || index is null)
        {
            return (ruleBefore is null || ruleAfter is null ? MovedBy.RuleSet : _byElimination, ChangeBits.None);
        }

        var bits = finder.Of(
            ruleBefore is null ? null : _rulesBefore[ruleBefore], earlier.Source!, ruleAfter is null ? null : _rulesAfter[ruleAfter], later.Source!);
        var by = index.Of(bits).Aggregate(MovedBy.Untold, (all, change) => all | (change is RuleChange ? MovedBy.RuleSet : MovedBy.Design));
        return (by, bits);
    }

    private static MovedBy OfRecord(RevisionSubject subject) => subject.Kind == RevisionSubject.Departure ? MovedBy.Departure : MovedBy.RuleSet;

    /// <summary>The change of an added or removed subject; a leg comes and goes with its circuit.</summary>
    private ChangeBits OfWhole(RevisionSubject subject, bool isLater)
    {
        var bits = index!.OfSubject(subject);
        var whole = subject.Parent is null ? null : (isLater ? _later : _earlier).GetValueOrDefault(subject.Parent);
        return ReferenceEquals(bits, ChangeBits.None) && whole is not null ? OfWhole(whole, isLater) : bits;
    }

    private static Dictionary<string, Rule> ById(Revision revision) =>
        revision.Audit?.Rules.AllRules.ToDictionary(rule => rule.Id, StringComparer.Ordinal) ?? [];

    /// <summary>What must have moved a margin when nobody knows what it was computed from: where only one thing differs, that one.</summary>
    private static MovedBy ByElimination(Revision before, Revision after, RuleSetChange rules)
    {
        if (rules.IsSame)
        {
            return MovedBy.Design;
        }

        return before.Inputs.SequenceEqual(after.Inputs) ? MovedBy.RuleSet : MovedBy.Untold;
    }
}
