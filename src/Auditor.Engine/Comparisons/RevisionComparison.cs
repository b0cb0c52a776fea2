namespace Auditor.Engine.Comparisons;

/// <summary>What differs between two revisions of a design, or between two audits of one design.</summary>
/// <param name="Before">The earlier revision.</param>
/// <param name="After">The later revision.</param>
/// <param name="RuleSet">How the rule sets differ.</param>
/// <param name="Subjects">Subjects added, renamed and moved, in the order of the later revision, then those removed.</param>
/// <param name="Inputs">Changed inputs of the subjects that both have, in the order of the later revision, then by path.</param>
/// <param name="Departures">Departures that differ.</param>
/// <param name="Findings">What became of the findings, what needs a reviewer first standing first; those that conform as before are left out.</param>
public sealed record RevisionComparison(
    Revision Before, Revision After, RuleSetChange RuleSet, IReadOnlyList<SubjectChange> Subjects, IReadOnlyList<InputChange> Inputs,
    IReadOnlyList<DepartureChange> Departures, IReadOnlyList<FindingChange> Findings)
{
    /// <summary>Whether both revisions tell what the design states, so that no changed input is left out.</summary>
    public bool KnowsInputs => Before.StatesInputs && After.StatesInputs;

    /// <summary>Whether both audits are at hand, so that the causes of each change are known.</summary>
    public bool KnowsCauses => Before.Audit is not null && After.Audit is not null;

    /// <summary>Compares two revisions.</summary>
    public static RevisionComparison Of(Revision before, Revision after)
    {
        var pairs = SubjectMatcher.Match(before, after);
        var names = new RuleNames(before.Rules, after.Rules);
        var rules = RuleSetComparer.Compare(before, after, names);
        var comparer = new SubjectComparer(before, after, pairs);
        var subjects = comparer.Subjects();
        var inputs = comparer.Inputs();
        var index = before.Audit is null || after.Audit is null ? null : new ChangeIndex(before.Audit.Rules, after.Audit.Rules, subjects, inputs, rules);
        var finder = index is null ? null : new CauseFinder(
            new RevisionSide(before, subject => pairs.AfterOf(subject.Key), isLater: false),
            new RevisionSide(after, subject => pairs.BeforeOf(subject.Key), isLater: true), index);
        var findings = new FindingComparer(before, after, pairs, names, rules, index, finder).Compare();
        return new RevisionComparison(before, after, rules, subjects, inputs, new DepartureComparer(before, after, pairs, names).Compare(), findings);
    }

    /// <summary>The findings of one kind.</summary>
    public IEnumerable<FindingChange> Of(FindingChangeKind kind) => Findings.Where(change => change.Kind == kind);

    /// <summary>How many findings of the later revision are new or worse.</summary>
    public int CountNewOrWorse => Findings.Count(change => change.IsNewOrWorse);
}
