using Auditor.Engine.Comparisons;

namespace Auditor.Reports.Comparisons;

/// <summary>Builds the model of a comparison.</summary>
internal sealed class ComparisonBuilder(RevisionComparison comparison)
{
    private static readonly FindingChangeKind[] MarginKinds = [FindingChangeKind.Closer, FindingChangeKind.Further];

    private readonly HashSet<(string Rule, bool IsAdded)> _oneSidedRules = [.. comparison.RuleSet.Changes
        .Where(change => change.Item == RuleItem.Rule && (change.IsAdded || change.IsRemoved)).Select(change => (change.Name, change.IsAdded))];

    public ComparisonModel Build()
    {
        var byKind = comparison.Findings.ToLookup(change => change.Kind);
        var told = Enum.GetValues<FindingChangeKind>().Where(kind => !MarginKinds.Contains(kind) && kind != FindingChangeKind.Unchanged);
        return new ComparisonModel
        {
            Before = Of(comparison.Before),
            After = Of(comparison.After),
            Files = Files(),
            NewOrWorse = comparison.CountNewOrWorse,
            Findings = Groups(told, byKind),
            Margins = Groups(MarginKinds, byKind),
            Unchanged = Group(FindingChangeKind.Unchanged, byKind),
            Inputs = Inputs(),
            KnowsInputs = comparison.KnowsInputs,
            KnowsCauses = comparison.KnowsCauses,
            Subjects = [.. comparison.Subjects.Select(Of)],
            Departures = [.. comparison.Departures.Select(Of)],
            RuleSet = new ChangedRuleSet(comparison.RuleSet.IsSame, comparison.RuleSet.IsFullyKnown, [.. comparison.RuleSet.Changes.Select(Of)]),
        };
    }

    private static ComparedRevision Of(Revision revision) => new(
        revision.Name, revision.Mark, revision.Rules.Id, revision.Rules.Edition, revision.Rules.Sha256, revision.Findings.Count);

    private List<ComparedFile> Files()
    {
        var before = comparison.Before.Inputs.ToDictionary(file => file.Path, file => file.Sha256, StringComparer.Ordinal);
        var after = comparison.After.Inputs.ToDictionary(file => file.Path, file => file.Sha256, StringComparer.Ordinal);
        return [.. before.Keys.Union(after.Keys, StringComparer.Ordinal).Order(StringComparer.Ordinal)
            .Select(path => new ComparedFile(path, before.GetValueOrDefault(path, ""), after.GetValueOrDefault(path, "")))];
    }

    private List<ChangedFindings> Groups(IEnumerable<FindingChangeKind> kinds, ILookup<FindingChangeKind, FindingChange> byKind) =>
        [.. kinds.Where(byKind.Contains).Select(kind => Group(kind, byKind))];

    private ChangedFindings Group(FindingChangeKind kind, ILookup<FindingChangeKind, FindingChange> byKind) =>
        new(ChangeWords.Word(kind), ChangeWords.Heading(kind), kind <= FindingChangeKind.Undetermined, [.. byKind[kind].Select(Of)]);

    private ChangedFinding Of(FindingChange change)
    {
        var finding = change.Finding;
        return new ChangedFinding
        {
            Key = finding.Key,
            Rule = finding.Rule,
            Title = finding.Title,
            Subject = finding.Subject,
            IsRequirement = finding.IsRequirement,
            Sentence = finding.Message,
            Before = Of(change.Before, change),
            After = Of(change.After, change),
            HasOtherLimit = change.HasOtherLimit,
            MovedBy = ChangeWords.Text(change.MovedBy, change.Kind),
            Causes = [.. change.Causes.Select(ChangeWords.Cause)],
        };
    }

    /// <summary>A finding in one revision; where it has none, why.</summary>
    private FindingState Of(RevisionFinding? finding, FindingChange change)
    {
        if (finding is not null)
        {
            return new FindingState(finding.VerdictText, finding.Value?.Text ?? "", finding.LimitShown, finding.MarginText, finding.Missing, finding.Place?.ToString() ?? "");
        }

        var isNew = change.Before is null;
        var why = "does not apply";
        if (comparison.Subjects.Any(subject => (isNew ? subject.IsAdded : subject.IsRemoved) && IsOf(change.Finding, subject.Subject)))
        {
            why = "no such subject";
        }
        else if (_oneSidedRules.Contains((change.Finding.Rule, isNew)))
        {
            why = "no such rule";
        }

        return new FindingState(why, "", "", "", [], "");
    }

    /// <summary>Whether a finding is one of a subject that came or went, or of a leg that came or went with its circuit.</summary>
    private static bool IsOf(RevisionFinding finding, RevisionSubject subject) => finding.Subject == subject.Key
        || (subject.Kind == "circuit" && finding.Subject.StartsWith(subject.Key + "/", StringComparison.Ordinal));

    private List<ChangedInput> Inputs() =>
        [.. comparison.Inputs
            .GroupBy(change => (change.Path, Before: ChangeWords.Stated(change.Before), After: ChangeWords.Stated(change.After), One: change.Before?.Place, Other: change.After?.Place))
            .Select(group => new ChangedInput(
                group.Key.Path, [.. group.Select(change => change.SubjectAfter)], group.Key.Before, group.Key.After,
                group.Key.One?.ToString() ?? "", group.Key.Other?.ToString() ?? ""))];

    private static ChangedSubject Of(SubjectChange change) => new(
        ChangeWords.State(change), change.Subject.Kind, change.Subject.Name ?? "", change.Before?.Key ?? "", change.After?.Key ?? "",
        ChangeWords.Text(change.By), change.Subject.Place?.ToString() ?? "");

    private static ChangedDeparture Of(DepartureChange change)
    {
        var departure = (change.After ?? change.Before)!;
        return new ChangedDeparture(
            ChangeWords.State(change.Before is null, change.After is null), departure.Rule, departure.Subject, Said(change.Before), Said(change.After),
            departure.Place?.ToString() ?? "");
    }

    private static string Said(RevisionDeparture? departure)
    {
        if (departure is null)
        {
            return "";
        }

        var end = departure.Until is null ? "" : $", until {departure.Until}";
        return $"{departure.Reason} ({departure.AgreedBy}, {departure.Date}{end}; {ChangeWords.Text(departure.State)})";
    }

    private static ChangedRuleItem Of(RuleChange change) => new(
        ChangeWords.Word(change.Item), change.Name, change.Title, ChangeWords.State(change.IsAdded, change.IsRemoved), change.Details);
}
